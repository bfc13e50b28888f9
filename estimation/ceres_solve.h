#pragma once

#include "gainsay/estimation/objective.h"
#include "gainsay/estimation/region.h"

#include <Eigen/Core>

#include <optional>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// A point of which the free unknowns move and the others are held. Keeps its last evaluation,
/// Jacobian included: a point is integrated once, whatever is asked of it, and every value comes
/// from an integration with one and the same error control.
class Workbench {
 public:
  /// `allowance` and `box` must outlive it; `x` lies in the box.
  Workbench(Allowance& allowance, const Box& box, Eigen::VectorXd x);

  /// The evaluation at x, lent until the next call; null outside the box and where there is none.
  const Evaluation* evaluate(const Eigen::VectorXd& x);
  const Evaluation* evaluate() { return evaluate(x_); }

  const Eigen::VectorXd& x() const { return x_; }
  void move_to(const Eigen::VectorXd& x) { x_ = x; }
  const std::vector<Eigen::Index>& free() const { return free_; }
  void set_free(std::vector<Eigen::Index> free) { free_ = std::move(free); }
  /// x with other values of the free unknowns.
  Eigen::VectorXd with_free(const double* values) const;
  const Problem& problem() const { return allowance_.problem(); }

 private:
  Allowance& allowance_;
  const Box& box_;
  Eigen::VectorXd x_;
  std::vector<Eigen::Index> free_;
  Eigen::VectorXd kept_x_;
  std::optional<Evaluation> kept_;
};

struct CeresEnd {
  bool converged = false;  ///< Ceres ended with CONVERGENCE
  std::string why;         ///< in its words
};

/// Moves the bench to where Ceres' Levenberg-Marquardt descent over the free unknowns ends: one
/// residual block for data of known noise and priors, one with its loss for each group of unknown
/// noise. Points outside the box, and those that cannot be integrated, are refused. Methods (14),
/// (20). Requires a free unknown, and noise that does not depend on the model.
CeresEnd solve_with_ceres(Workbench& bench);

}  // namespace gainsay::estimation
