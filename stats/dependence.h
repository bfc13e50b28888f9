#pragma once

#include "gainsay/estimation/problem.h"

#include <Eigen/Core>

#include <optional>
#include <string>
#include <vector>

namespace gainsay::stats {

/// Readouts of which one was computed from others rather than measured (sums closed to 100 %): the
/// names of those in the relation, in order.
struct Dependence {
  std::vector<std::string> readouts;
};

/// Looks for a linear relation, with constants of each experiment, among readouts that were read at
/// the same times: a direction in which the centred readings vary no more than rounding to their
/// printed digits explains (Box, Hunter, MacGregor & Erjavec 1973), and, where the noise is known,
/// less than independent noise would let them. `sd` holds the sd of each datum. Methods (72).
///
/// The least eigenvalue of the readings' cross-products, in units of the variance of rounding
/// h^2 / 12, has at most the law of chi-square with rows - experiments - (readouts - 1) degrees if
/// rounding is all that disturbs the relation; asked at 1 % above, and for the noise at 0.1 %
/// below. h is the step of the last decimal in which half of a readout's values are printed.
std::optional<Dependence> dependent_readouts(const estimation::Problem& problem,
                                             const Eigen::VectorXd& sd);

/// The step of the last decimal of the middle one of `values`, ordered by their count of decimals:
/// 0.1 for 3.2, 4, 7.1. At least 1e-10 of the largest |value|; zeros are left out.
double printed_step(const std::vector<double>& values);

}  // namespace gainsay::stats
