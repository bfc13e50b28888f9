#pragma once

#include "gainsay/estimation/landscape.h"
#include "gainsay/estimation/residuals.h"

#include <Eigen/Core>

#include <limits>
#include <optional>
#include <stop_token>

namespace gainsay::estimation {

/// The quadratic model of half the objective at an evaluation with Jacobian. Methods (13).
LocalModel local_model(const Evaluation& evaluation);

/// What one descent may use of an evaluator, and what it has used.
class Allowance {
 public:
  Allowance(Evaluator& evaluator, long integrations_at_most, std::stop_token stop);

  /// Nothing where the point cannot be evaluated, the objective exceeds `give_up_above`, or
  /// nothing more may be evaluated.
  std::optional<Evaluation> evaluate(
      const Eigen::VectorXd& x, Evaluator::Want want, const Stage& stage,
      double give_up_above = std::numeric_limits<double>::infinity());

  bool out_of_budget() const { return integrations() >= integrations_at_most_; }
  bool interrupted() const { return stop_.stop_requested(); }
  bool closed() const { return interrupted() || out_of_budget(); }

  Evaluator& evaluator() const { return evaluator_; }
  const Problem& problem() const { return evaluator_.problem(); }
  long evaluations() const { return evaluations_; }
  long jacobians() const { return jacobians_; }
  long integrations() const { return evaluator_.integrations() - before_; }

 private:
  Evaluator& evaluator_;
  long integrations_at_most_;
  std::stop_token stop_;
  long before_;
  long evaluations_ = 0;
  long jacobians_ = 0;
};

/// One stage's objective as a landscape to descend on.
class Objective : public Landscape {
 public:
  Objective(Allowance& allowance, const Stage& stage) : allowance_(allowance), stage_(stage) {}
  std::optional<double> value(const Eigen::VectorXd& x, double give_up_above) override;
  std::optional<LocalModel> model(const Eigen::VectorXd& x) override;
  bool closed() const override { return allowance_.closed(); }

 private:
  Allowance& allowance_;
  Stage stage_;
};

}  // namespace gainsay::estimation
