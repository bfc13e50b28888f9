#include "gainsay/estimation/regression.h"

#include "gainsay/estimation/box_step.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/data_rows.h"

#include <cmath>
#include <set>

namespace gainsay::estimation {
namespace {

/// Keeps the normal equations solvable where a scale and an offset cannot be told apart.
constexpr double kRidge = 1e-12;

/// 1 / sd of each datum, before anything is known of what the model shows.
Eigen::VectorXd weights(const Problem& problem, Eigen::Index data) {
  Eigen::VectorXd inverse_sd(data);
  for (const ExperimentRows& table : data_rows(problem)) {
    for (const DataRow& row : table.rows) {
      inverse_sd[static_cast<Eigen::Index>(row.number)] =
          row.group ? 1.0 / row.readout_size
                    : 1.0 / weigh(row.scatter, row.observed, row.observed, Aim::Misfit).sd;
    }
  }
  return inverse_sd;
}

Eigen::VectorXd observations(const Problem& problem, Eigen::Index data) {
  Eigen::VectorXd observed(data);
  for (const ExperimentRows& table : data_rows(problem))
    for (const DataRow& row : table.rows)
      observed[static_cast<Eigen::Index>(row.number)] = row.observed;
  return observed;
}

}  // namespace

std::vector<std::size_t> linear_unknowns(const Problem& problem) {
  std::set<std::size_t> all;
  for (const FittedExperiment& experiment : problem.experiments) {
    for (const LinearUnknowns& linear : experiment.linear) {
      if (linear.scale) all.insert(*linear.scale);
      if (linear.offset) all.insert(*linear.offset);
    }
  }
  return {all.begin(), all.end()};
}

std::optional<Eigen::VectorXd> regressed(Allowance& allowance, const Eigen::VectorXd& x,
                                         const std::vector<std::size_t>& which) {
  if (which.empty()) return x;
  const Problem& problem = allowance.problem();
  const auto here = allowance.evaluate(x, Evaluator::Want::ResidualsAndJacobian, {});
  if (!here) return std::nullopt;
  std::vector<double> values = from_coordinates(problem.unknowns, x);
  const Eigen::VectorXd scale = scale_at(problem.unknowns, values);

  // What is shown is linear in these unknowns, so that its derivatives are the design matrix, and
  // one step of the normal equations from where they are is the regression. Columns are brought to
  // unit length first.
  const Eigen::VectorXd weight = weights(problem, here->shown.size());
  const Eigen::VectorXd r =
      weight.cwiseProduct(here->shown - observations(problem, here->shown.size()));
  const auto columns = static_cast<Eigen::Index>(which.size());
  Eigen::MatrixXd design(r.size(), columns);
  Eigen::VectorXd low(columns), high(columns), length(columns);
  for (Eigen::Index k = 0; k < columns; ++k) {
    const std::size_t number = which[static_cast<std::size_t>(k)];
    const auto i = static_cast<Eigen::Index>(number);
    design.col(k) = weight.cwiseProduct(here->dshown.col(i)) / scale[i];
    length[k] = design.col(k).norm();
    if (length[k] == 0.0) length[k] = 1.0;
    design.col(k) /= length[k];
    low[k] = std::fmin(0.0, (problem.unknowns[number].low - values[number]) * length[k]);
    high[k] = std::fmax(0.0, (problem.unknowns[number].high - values[number]) * length[k]);
  }
  Eigen::MatrixXd A = design.transpose() * design;
  A.diagonal().array() += kRidge;
  const Eigen::VectorXd step = box_step(A, design.transpose() * r, low, high);
  for (Eigen::Index k = 0; k < columns; ++k) {
    const std::size_t number = which[static_cast<std::size_t>(k)];
    const Unknown& unknown = problem.unknowns[number];
    values[number] =
        std::fmin(std::fmax(values[number] + step[k] / length[k], unknown.low), unknown.high);
  }
  return to_coordinates(problem.unknowns, values);
}

}  // namespace gainsay::estimation
