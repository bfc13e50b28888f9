#pragma once

#include "gainsay/estimation/problem.h"

#include <Eigen/Core>

#include <cstddef>
#include <vector>

namespace gainsay::stats {

/// The residuals of one readout in one experiment, in order of time.
struct OrderedSeries {
  std::vector<std::vector<std::size_t>> places;  ///< numbers of the residuals at each place
};

/// Which residuals follow each other. Priors and series of one place are left out.
struct OrderLayout {
  std::size_t residuals = 0;                           ///< N, priors included
  std::vector<OrderedSeries> series;                   ///< each of two places at least
  std::vector<std::vector<std::size_t>> noise_groups;  ///< residuals that share a fitted sd
};

OrderLayout order_layout(const estimation::Problem& problem);

/// Statistics of many sets of residuals at once, one entry a set.
struct OrderStatistics {
  Eigen::ArrayXd T;          ///< squared steps over squares: small speaks against
  Eigen::ArrayXd runs;       ///< stretches of one sign: few speak against
  Eigen::ArrayXd ljung_box;  ///< sum over series of Q: large speaks against
};

/// R is sets x N, standardized residuals (of data whose sd is fitted: up to the sd of their group,
/// which is estimated from each set anew, as the fit does). n replicates at one place count as
/// sqrt(n) times their mean. Methods (64)
///   T = sum over series and i >= 2 of (r_i - r_(i-1))^2 / sum over the same series of r_i^2
/// (von Neumann 1941; Durbin & Watson 1950), never across the joint of two series;
/// runs (Wald & Wolfowitz 1940) of the signs; Q = n (n + 2) sum over h of rho_h^2 / (n - h)
/// (Ljung & Box 1978) over lags up to n / 5, at least 1 and at most 10 (common practice).
/// Requires a series; NaN where all residuals are 0.
OrderStatistics order_statistics(const Eigen::MatrixXd& R, const OrderLayout& layout);

}  // namespace gainsay::stats
