#pragma once

#include "gainsay/core/hypothesis.h"

#include <Eigen/Core>

#include <cstddef>
#include <span>
#include <string>
#include <vector>

namespace gainsay::core {

/// What something does to the rate of a reaction when there is more of it.
enum class Sign { Raises, Lowers, Either };

/// A species or input that appears in a reaction's rate without being one of its reactants
/// (products of a reversible reaction count as reactants of its way back).
struct Influence {
  std::string by;  ///< species or input
  std::size_t reaction = 0;
  Sign sign = Sign::Either;
  bool operator==(const Influence&) const = default;
};

/// A sum that the reactions leave unchanged: sum of weight x amount.
struct ConservedSum {
  std::vector<double>
      weights;       ///< one for each species, smallest whole numbers where there are such
  std::string text;  ///< "nitrile + amide + acid"
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

/// A reactant whose rate does not vanish with it; a species that nothing makes or uses; a name
/// under [where] that nothing uses. `used_elsewhere` holds names that readouts and start values
/// use.
std::vector<Warning> warnings(const Hypothesis& hypothesis, const Network& network,
                              const std::vector<std::string>& used_elsewhere);

/// Whether two hypotheses are the same system of equations: equal derivatives, starts and values of
/// `shown` (what readouts show) for species of the same names, unknowns of the same names. Tested
/// at keyed random points in 50 digits, in the sense of identity testing: Schwartz (1980).
bool same_system(const Hypothesis& a, const Hypothesis& b, std::span<const Expression> shown = {});

}  // namespace gainsay::core
