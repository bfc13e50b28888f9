#include "gainsay/estimation/objective.h"

#include "gainsay/core/require.h"

#include <utility>

namespace gainsay::estimation {

using Want = Evaluator::Want;

LocalModel local_model(const Evaluation& evaluation) {
  GAINSAY_REQUIRE(evaluation.J.rows() == evaluation.r.size(), "the evaluation has a Jacobian");
  LocalModel model;
  model.value = evaluation.objective;
  model.gradient = evaluation.J.transpose() * evaluation.slope;
  model.curvature = evaluation.J.transpose() * evaluation.curvature.asDiagonal() * evaluation.J;
  return model;
}

Allowance::Allowance(Evaluator& evaluator, long integrations_at_most, std::stop_token stop)
    : evaluator_(evaluator),
      integrations_at_most_(integrations_at_most),
      stop_(std::move(stop)),
      before_(evaluator.integrations()) {}

std::optional<Evaluation> Allowance::evaluate(const Eigen::VectorXd& x, Want want,
                                              const Stage& stage, double give_up_above) {
  if (closed()) return std::nullopt;
  ++(want == Want::ResidualsAndJacobian ? jacobians_ : evaluations_);
  auto evaluated = evaluator_.evaluate(x, want, stage, give_up_above);
  return evaluated ? std::move(evaluated).value() : std::nullopt;
}

std::optional<double> Objective::value(const Eigen::VectorXd& x, double give_up_above) {
  const auto evaluation = allowance_.evaluate(x, Want::Residuals, stage_, give_up_above);
  return evaluation ? std::optional(evaluation->objective) : std::nullopt;
}

std::optional<LocalModel> Objective::model(const Eigen::VectorXd& x) {
  const auto evaluation = allowance_.evaluate(x, Want::ResidualsAndJacobian, stage_);
  return evaluation ? std::optional(local_model(*evaluation)) : std::nullopt;
}

}  // namespace gainsay::estimation
