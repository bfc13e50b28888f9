#pragma once

#include <cmath>

namespace gainsay::testing {

/// Digits of agreement with a published number, -log10 of the relative difference, as is usual with
/// certified sets (NIST StRD); 16 where they are equal.
inline double digits(double found, double published) {
  if (found == published) return 16.0;
  if (!std::isfinite(found)) return 0.0;
  return -std::log10(std::abs(found - published) / std::abs(published));
}

}  // namespace gainsay::testing
