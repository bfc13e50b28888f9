#include "gainsay/stats/tails.h"

#include <boost/math/distributions/chi_squared.hpp>

namespace gainsay::stats {

double chi_square_upper_tail(double x, double freedom) {
  if (x <= 0.0) return 1.0;
  return cdf(complement(boost::math::chi_squared(freedom), x));
}

double chi_square_quantile(double tail, double freedom) {
  return quantile(complement(boost::math::chi_squared(freedom), tail));
}

}  // namespace gainsay::stats
