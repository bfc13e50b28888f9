#include "gainsay/stats/departure.h"

#include "gainsay/core/require.h"
#include "gainsay/stats/tails.h"

#include <boost/math/distributions/non_central_chi_squared.hpp>

#include <cmath>

namespace gainsay::stats {
namespace {

constexpr double kCaught = 0.9;

}  // namespace

double least_noncentrality(double limit, double freedom) {
  GAINSAY_REQUIRE(limit > 0.0 && freedom > 0.0, "a departure is asked of a limit with freedom");
  if (chi_square_upper_tail(limit, freedom) >= kCaught) return 0.0;
  return boost::math::non_central_chi_squared::find_non_centrality(freedom, limit, 1.0 - kCaught);
}

double departure_in_sds(double limit, double freedom, std::size_t N) {
  GAINSAY_REQUIRE(N > 0, "a departure is spread over data");
  return std::sqrt(least_noncentrality(limit, freedom) / static_cast<double>(N));
}

}  // namespace gainsay::stats
