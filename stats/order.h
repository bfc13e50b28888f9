#pragma once

#include "gainsay/stats/limits.h"
#include "gainsay/stats/order_statistics.h"

#include <Eigen/Core>

#include <cstddef>
#include <cstdint>
#include <string>

namespace gainsay::stats {

/// The lag-1 test for order among the residuals; runs and Ljung-Box beside it under the same law.
struct OrderTest {
  double T = kNotComputed;  ///< sum of squared steps / sum of squares; small speaks against
  double p_value = kNotComputed;
  std::size_t draws = 0;
  bool close = false;  ///< still within 3 standard errors of its share when the draws ended
  double runs_p = kNotComputed;       ///< decides nothing
  double ljung_box_p = kNotComputed;  ///< decides nothing
  std::string not_counted;            ///< why, where order cannot count

  bool counts() const { return not_counted.empty(); }
};

struct OrderPlan {
  double share = 0.01;  ///< of alpha: the P at which order rejects
  std::uint64_t seed = 1;
  std::size_t least_draws = 9'999;
  std::size_t most_draws = 999'999;
};

/// Tests the residuals r (N; data, then priors) of a fit whose free columns of J span Q
/// (N x k, orthonormal; free_columns.h). The null law of each statistic is that of (I - Q Q') e,
/// e ~ N(0, I): Methods (65). No refit is needed, and fitted residuals are not taken for white
/// noise. P = (b + 1) / (B + 1), b of B draws at least as much against (Davison & Hinkley 1997); B
/// grows tenfold while P is within 3 standard errors of the share. Draws are keyed by (seed,
/// number). Order cannot count where there is no series of two places, N - k = 1, T can take one
/// value only, or P cannot get down to the share.
OrderTest test_order(const Eigen::VectorXd& r, const Eigen::MatrixXd& Q, const OrderLayout& layout,
                     const OrderPlan& plan);

}  // namespace gainsay::stats
