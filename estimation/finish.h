#pragma once

#include "gainsay/estimation/objective.h"
#include "gainsay/estimation/region.h"

#include <Eigen/Core>

#include <optional>
#include <string>
#include <vector>

namespace gainsay::estimation {

struct FinishEnd {
  Eigen::VectorXd x;
  std::optional<Evaluation> evaluation;  ///< with Jacobian, at x; none if x cannot be evaluated
  std::vector<bool> on_bound;            ///< on it, with the gradient pointing outward
  bool converged = false;                ///< by the word of what finished
  std::string why;
};

/// The second part of a descent, by Ceres' trust region (Levenberg-Marquardt), on the unknowns that
/// are not on a bound: Methods (20)-(22). An unknown that ends within 1e-6 of its range from a
/// bound is put on it and held, one whose gradient wants back is released, and the finish is
/// repeated until neither happens. Requires noise that does not depend on the model.
FinishEnd finish(Allowance& allowance, const Box& box, const Eigen::VectorXd& from);

/// The same by the region of trust, for objectives that are no sum of squares: -2 ln L with
/// model-dependent sd, and V where sd depends on the modelled value.
FinishEnd finish_in_region(Allowance& allowance, const Box& box, const Eigen::VectorXd& from,
                           Aim aim);

/// Which unknowns lie within 1e-6 of their range from a bound with the gradient pointing outward.
std::vector<bool> on_bound(const Box& box, const Eigen::VectorXd& x,
                           const Eigen::VectorXd& gradient);

}  // namespace gainsay::estimation
