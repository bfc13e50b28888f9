#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/stats/limits.h"
#include "gainsay/stats/standardized.h"

#include <cstddef>
#include <vector>

namespace gainsay::stats {

/// -2 ln L up to a constant of the data, Methods (69): V where sd is known, sum (r^2 + 2 ln sd)
/// where an sd depends on the modelled value; groups of unknown sd add N_g ln(sd_g^2) in place of
/// their squares.
double minus_two_ln_likelihood(const estimation::Problem& problem, const Standardized& all);

/// What weighs agreement against the number of unknowns, each less the better.
struct Criteria {
  double K = 0.0;              ///< k + fitted sds
  double AIC = kNotComputed;   ///< -2 ln L + 2 K (Akaike 1974)
  double AICc = kNotComputed;  ///< where sd is fitted: + 2 K (K + 1) / (N - K - 1) (Hurvich & Tsai
                               ///< 1989); not defined unless N > K + 1
  double BIC = kNotComputed;   ///< -2 ln L + K ln N (Schwarz 1978)
};

/// Methods (70).
Criteria criteria(double minus_two_ln_L, std::size_t N, std::size_t k, std::size_t fitted_sds);

/// exp(-D / 2), D the distance to the least criterion, divided by their sum; Burnham & Anderson
/// (2002), Methods (71). NaN, and no part in the sum, where the criterion is not a number.
std::vector<double> akaike_weights(const std::vector<double>& criterion);

}  // namespace gainsay::stats
