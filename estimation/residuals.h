#pragma once

#include "gainsay/core/integrator.h"
#include "gainsay/core/result.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/weighing.h"

#include <Eigen/Core>

#include <cstddef>
#include <limits>
#include <memory>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// What one evaluation of all experiments gives. r and J are weighted; J = dr/dx in search
/// coordinates (coordinates.h). With model-dependent sd, r = (shown - observed) / sd(shown) and J =
/// (dshown/dx) / sd with sd held. With unknown noise, r = shown - observed is in units of the
/// readout and sds are estimated from it. Data beyond the horizon of a stage have zeros (shown:
/// NaN); the pull of a stage adds one row for each unknown at the end.
struct Evaluation {
  Eigen::VectorXd r;       ///< N: data (shown - observed) / sd, then priors
  Eigen::MatrixXd J;       ///< N x k unknowns, or empty
  Eigen::VectorXd shown;   ///< modelled values of the data (without priors)
  Eigen::VectorXd sd;      ///< of each datum, as used; 1 where unknown
  Eigen::MatrixXd dshown;  ///< d shown / dx, or empty
  double V = std::numeric_limits<double>::quiet_NaN();  ///< sum of r^2 (unknown noise: of (r /
                                                        ///< estimated sd)^2)
  double objective =
      std::numeric_limits<double>::quiet_NaN();  ///< -2 ln L up to a constant: what a fit lowers
  /// Half the gradient of the objective is J' slope, half its curvature (Gauss-Newton; Fisher's
  /// information) J' diag(curvature) J. Methods (12)-(14).
  Eigen::VectorXd slope;
  Eigen::VectorXd curvature;
  std::vector<double> group_sds;  ///< estimated, of Problem::noise_groups
};

/// Which experiment could not be integrated, and why.
struct EvaluationFailure {
  std::string experiment;
  core::IntegrationFailure integration;
};

/// What counts in a stage of a descent. Methods (19).
struct Stage {
  double horizon = 1.0;   ///< share of each experiment's own last time up to which data count
  bool tempered = false;  ///< sd^2 + (0.1 max|z|)^2, z the values of one readout in one experiment;
                          ///< an unknown sd is taken as 0 here
  bool pulled =
      false;  ///< weak residuals (x - centre) / (high - low) in coordinates, one for each unknown
  Aim aim = Aim::Likelihood;
};

/// Evaluates one problem; owns an integrator for each experiment; one for each worker. An
/// evaluation depends on its arguments alone, not on what was evaluated before.
class Evaluator {
 public:
  explicit Evaluator(const Problem& problem);  ///< `problem` must outlive it
  ~Evaluator();
  Evaluator(Evaluator&&) noexcept;

  enum class Want { Residuals, ResidualsAndJacobian };
  /// The value is nullopt where the objective exceeds `give_up_above`: Residuals alone then stop
  /// integrating as soon as the partial objective does.
  core::Result<std::optional<Evaluation>, EvaluationFailure> evaluate(
      const Eigen::VectorXd& x, Want want, const Stage& stage = {},
      double give_up_above = std::numeric_limits<double>::infinity());

  /// How many data lie within the horizon of a stage.
  std::size_t data_within(double horizon) const;
  const Problem& problem() const;
  long integrations() const;  ///< of one experiment each, since made
  void set_relative_accuracy(double relative, double absolute_factor = 1.0);
  void set_engine(core::Engine engine);

 private:
  struct Content;
  std::unique_ptr<Content> content_;
};

}  // namespace gainsay::estimation
