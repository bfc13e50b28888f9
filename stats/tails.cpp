#include "gainsay/stats/tails.h"

#include <boost/math/distributions/chi_squared.hpp>
#include <boost/math/distributions/non_central_chi_squared.hpp>
#include <boost/math/distributions/normal.hpp>
#include <boost/math/distributions/students_t.hpp>

namespace gainsay::stats {

double chi_square_upper_tail(double x, double freedom) {
  if (x <= 0.0) return 1.0;
  return cdf(complement(boost::math::chi_squared(freedom), x));
}

double chi_square_quantile(double tail, double freedom) {
  return quantile(complement(boost::math::chi_squared(freedom), tail));
}

double noncentral_chi_square_upper_tail(double x, double freedom, double L) {
  if (x <= 0.0) return 1.0;
  return cdf(complement(boost::math::non_central_chi_squared(freedom, L), x));
}

double normal_quantile(double tail) { return quantile(complement(boost::math::normal(), tail)); }

double student_t_quantile(double tail, double freedom) {
  return quantile(complement(boost::math::students_t(freedom), tail));
}

}  // namespace gainsay::stats
