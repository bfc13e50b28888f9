#pragma once

#include "gainsay/core/hypothesis.h"
#include "gainsay/core/influences.h"

#include <Eigen/Core>

#include <string>
#include <vector>

namespace gainsay::core {

/// A sum that the reactions leave unchanged: sum of weight x amount.
struct ConservedSum {
  std::vector<double>
      weights;       ///< one for each species, smallest whole numbers where there are such
  std::string text;  ///< "nitrile + amide + acid", "depot + drug * plasma": a valid expression
};

struct Warning {
  std::string what;
  std::string to_do;
  std::string about;  ///< name of the species, reaction or unknown it is about, for a place
  bool operator==(const Warning&) const = default;
};

/// The derived interaction graph of a hypothesis.
struct Network {
  Eigen::MatrixXd stoichiometry;  ///< species x reactions: amount made (+) or used (-) by a turn of
                                  ///< the reaction
  std::vector<ConservedSum> conserved;
  std::vector<Influence> influences;
};

/// Held species count as unchanged (their rows are zero and they are left out of conserved sums).
Network derive_network(const Hypothesis& hypothesis);

/// A reactant whose rate does not vanish with it; a species that nothing makes, uses or mentions; a
/// name under [where] and a compartment that nothing uses. `used_elsewhere` holds names that
/// readouts, start values and doses use.
std::vector<Warning> warnings(const Hypothesis& hypothesis, const Network& network,
                              const std::vector<std::string>& used_elsewhere);

}  // namespace gainsay::core
