#pragma once

#include <Eigen/Core>

namespace gainsay::estimation {

/// The exact minimiser of g'p + p'Ap / 2 over the box low <= p <= high: primal active set, LDLT of
/// the free block in each round (Nocedal & Wright 2006, algorithm 16.3, for bounds alone). Methods
/// (16). Requires A symmetric and positive definite, and low <= 0 <= high. Every round lowers the
/// quadratic; coordinates on a bound lie on it exactly.
Eigen::VectorXd box_step(const Eigen::MatrixXd& A, const Eigen::VectorXd& g,
                         const Eigen::VectorXd& low, const Eigen::VectorXd& high);

}  // namespace gainsay::estimation
