#include "gainsay/estimation/fit.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/approach.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/data_rows.h"
#include "gainsay/estimation/finish.h"
#include "gainsay/estimation/regression.h"

#include <algorithm>
#include <optional>
#include <utility>

namespace gainsay::estimation {
namespace {

/// The start with scales and offsets where its own trajectory puts them; as it is where it cannot
/// be integrated to the end (the approach then tries its beginning).
Eigen::VectorXd with_scales_set(Allowance& allowance, const Eigen::VectorXd& start,
                                bool keep_guessed) {
  const Problem& problem = allowance.problem();
  std::vector<std::size_t> which = linear_unknowns(problem);
  if (keep_guessed) {
    std::erase_if(which, [&](std::size_t i) { return !problem.unknowns[i].first.empty(); });
  }
  return regressed(allowance, start, which).value_or(start);
}

/// Sds as used, those of unknown noise as estimated.
Eigen::VectorXd final_sds(const Problem& problem, const Evaluation& evaluation) {
  Eigen::VectorXd sds = evaluation.sd;
  if (!problem.noise_unknown()) return sds;
  for (const ExperimentRows& table : data_rows(problem))
    for (const DataRow& row : table.rows)
      if (row.group) sds[static_cast<Eigen::Index>(row.number)] = evaluation.group_sds[*row.group];
  return sds;
}

Stopped why_stopped(const Allowance& allowance, bool converged) {
  if (converged) return Stopped::Converged;
  if (allowance.interrupted()) return Stopped::Interrupted;
  return allowance.out_of_budget() ? Stopped::OutOfBudget : Stopped::NotConverged;
}

void count(const Allowance& allowance, Fit& fit) {
  fit.evaluations = allowance.evaluations();
  fit.jacobians = allowance.jacobians();
  fit.integrations = allowance.integrations();
}

Fit no_fit(const Allowance& allowance, const Eigen::VectorXd& start) {
  Fit fit;
  fit.x = start;
  fit.values = from_coordinates(allowance.problem().unknowns, start);
  fit.on_bound.assign(fit.values.size(), false);
  fit.stopped = allowance.closed() ? why_stopped(allowance, false) : Stopped::CannotIntegrate;
  fit.why = allowance.closed() ? "ended before the start was evaluated"
                               : "the start cannot be integrated";
  count(allowance, fit);
  return fit;
}

Fit fit_of(const Allowance& allowance, const FinishEnd& end) {
  Fit fit;
  fit.x = end.x;
  fit.values = from_coordinates(allowance.problem().unknowns, end.x);
  fit.on_bound.assign(fit.values.size(), false);
  if (end.evaluation) {
    fit.V = end.evaluation->V;
    fit.objective = end.evaluation->objective;
    fit.on_bound = end.on_bound;
    fit.shown = end.evaluation->shown;
    fit.sd = final_sds(allowance.problem(), *end.evaluation);
  }
  fit.stopped = why_stopped(allowance, end.converged);
  fit.why = end.why;
  count(allowance, fit);
  return fit;
}

FinishEnd finished(Allowance& allowance, const Eigen::VectorXd& x, Aim aim) {
  const Box box = box_of(allowance.problem());
  return allowance.problem().noise_depends_on_model() ? finish_in_region(allowance, box, x, aim)
                                                      : finish(allowance, box, x);
}

/// Inside its range, where rounding put a value just beyond it.
Eigen::VectorXd inside(const Box& box, const Eigen::VectorXd& x) {
  return x.cwiseMax(box.low).cwiseMin(box.high);
}

}  // namespace

Fit descend(Evaluator& evaluator, const Eigen::VectorXd& start, const DescentPlan& plan) {
  Allowance allowance(evaluator, plan.integrations_at_most, plan.stop);
  const Box box = box_of(evaluator.problem());
  Eigen::VectorXd x = inside(box, start);
  if (plan.regress && !plan.polish_only) {
    x = inside(box, with_scales_set(allowance, x, plan.keep_guessed));
  }
  const std::optional<Eigen::VectorXd> near =
      approach(allowance, x, plan.polish_only ? Stages::LastOnly : Stages::All);
  if (!near) return no_fit(allowance, x);
  return fit_of(allowance, finished(allowance, *near, Aim::Likelihood));
}

Fit least_V(Evaluator& evaluator, const Eigen::VectorXd& from, const DescentPlan& plan) {
  GAINSAY_REQUIRE(!evaluator.problem().noise_unknown(), "the noise is known");
  Allowance allowance(evaluator, plan.integrations_at_most, plan.stop);
  const Eigen::VectorXd x = inside(box_of(evaluator.problem()), from);
  const FinishEnd end = finished(allowance, x, Aim::Misfit);
  return end.evaluation ? fit_of(allowance, end) : no_fit(allowance, x);
}

}  // namespace gainsay::estimation
