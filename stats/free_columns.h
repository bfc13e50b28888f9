#pragma once

#include <Eigen/Core>

#include <cstddef>
#include <vector>

namespace gainsay::stats {

/// Singular values at or below this share of the largest count as zero (verdicts keep their size
/// with it; a cut of 1e-8 counts the integrator's noise as information).
inline constexpr double kRankTolerance = 1e-4;

/// What the weighted sensitivities J = dr/dx say of the unknowns that are free at a fit (not on a
/// bound): J over their columns, taken apart as Q S W' (singular value decomposition).
struct FreeColumns {
  std::vector<std::size_t> unknowns;  ///< numbers of the free unknowns, ascending
  Eigen::VectorXd singular_values;    ///< descending
  std::size_t rank = 0;               ///< k: singular values above kRankTolerance of the largest
  Eigen::MatrixXd Q;                  ///< N x k, orthonormal: H = Q Q' projects on the free columns
  Eigen::MatrixXd W;                  ///< free x free, right singular vectors
};

/// J is N x all unknowns, finite; `on_bound` has one entry an unknown. Methods (63). The free ones
/// alone count: the fit is a projection on a cone whose face they span (Bartholomew 1961, Shapiro
/// 1988).
FreeColumns free_columns(const Eigen::MatrixXd& J, const std::vector<bool>& on_bound);

}  // namespace gainsay::stats
