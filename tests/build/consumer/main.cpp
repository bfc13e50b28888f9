// A program of somebody else's: one call into each layer, checked against known values.

#include "gainsay/core/version.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/stats/tails.h"

#include <cmath>
#include <string_view>
#include <vector>

int main(int count, char** words) {
  if (count != 2 || gainsay::core::version() != std::string_view(words[1])) return 1;

  gainsay::estimation::Unknown rate;
  rate.low = 0.1;
  rate.high = 10.0;
  const Eigen::VectorXd x =
      gainsay::estimation::to_coordinates(std::vector{rate}, std::vector{1.0});
  if (std::abs(x(0)) > 1e-15) return 2;  // ln 1, one rounding of the range at most

  // NIST/SEMATECH e-Handbook, table 1.3.6.7.4: 11.070 is exceeded with P 0.05 at 5 degrees.
  constexpr double kHalfUnitOfLastDigit = 0.0005;
  if (std::abs(gainsay::stats::chi_square_quantile(0.05, 5) - 11.070) > kHalfUnitOfLastDigit) {
    return 3;
  }
  return 0;
}
