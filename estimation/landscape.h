#pragma once

#include <Eigen/Core>

#include <optional>

namespace gainsay::estimation {

/// The quadratic model of an objective at one point: objective(x + p) = value + 2 gradient'p +
/// p' curvature p. So for a sum of squares r'r with Jacobian J: gradient J'r, curvature J'J.
struct LocalModel {
  double value = 0.0;
  Eigen::VectorXd gradient;
  Eigen::MatrixXd curvature;
};

/// What a descent goes down on. Points at which it cannot be evaluated give nothing.
class Landscape {
 public:
  virtual ~Landscape() = default;
  /// The value alone; also nothing where it exceeds `give_up_above`.
  virtual std::optional<double> value(const Eigen::VectorXd& x, double give_up_above) = 0;
  virtual std::optional<LocalModel> model(const Eigen::VectorXd& x) = 0;
  /// True once nothing more may be evaluated: a budget ended, or the user interrupted.
  virtual bool closed() const { return false; }
};

}  // namespace gainsay::estimation
