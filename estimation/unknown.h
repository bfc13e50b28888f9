#pragma once

#include <optional>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// Earlier knowledge of an unknown, taken as one more measurement: (x - value) / sd, or ln(x /
/// value) / ln(geometric_sd).
struct Prior {
  double value = 0.0;
  std::optional<double> sd;
  std::optional<double> geometric_sd;
  bool operator==(const Prior&) const = default;
};

enum class UnknownKind { Kinetic, Initial, Measurement };

/// A number to be fitted and the range it is searched in.
struct Unknown {
  std::string name;  ///< as shown: kd, kd[run-03], scale.glow, start.enzyme[run-03]
  double low = 0.0;
  double high = 0.0;
  bool linear = false;  ///< searched on a linear scale, else in its logarithm (then 0 < low)
  bool hard = false;    ///< the range is never moved
  std::optional<Prior> prior;
  std::vector<double> first;  ///< first guesses, tried beside the random starts
  UnknownKind kind = UnknownKind::Kinetic;
  std::string unit;
  bool operator==(const Unknown&) const = default;
};

/// An unknown as declared: `per_experiment` makes one of each experiment that uses it.
struct DeclaredUnknown {
  Unknown unknown;
  bool per_experiment = false;
  bool own =
      false;  ///< by the hypothesis itself, not by the study: a warning where nothing uses it
};

}  // namespace gainsay::estimation
