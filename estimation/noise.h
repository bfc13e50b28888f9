#pragma once

#include <optional>
#include <string>

namespace gainsay::estimation {

/// How a readout scatters: variance = sd^2 + (relative f)^2, f the modelled value as the instrument
/// shows it. A point with an sd of its own uses that alone.
struct Noise {
  std::optional<double> sd;        ///< in units of the readout
  std::optional<double> relative;  ///< of the modelled value
  bool sd_unknown = false;         ///< constant, fitted; then neither of the above
  std::string same_as;             ///< the readout whose unknown sd this one shares; else empty
  bool operator==(const Noise&) const = default;
  bool said() const { return sd || relative || sd_unknown; }
  bool depends_on_model() const { return relative.value_or(0.0) != 0.0; }
};

}  // namespace gainsay::estimation
