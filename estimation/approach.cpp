#include "gainsay/estimation/approach.h"

#include "gainsay/estimation/coordinates.h"

#include <algorithm>
#include <array>

namespace gainsay::estimation {
namespace {

struct PlannedStage {
  Stage stage;
  double enough;  // eps, in units of V
  int models;     // Jacobians at most
};

constexpr double kThird = 1.0 / 3.0;
constexpr std::array<PlannedStage, 4> kStages = {{
    {{.horizon = kThird, .tempered = true, .pulled = true}, 0.5, 33},
    {{.horizon = 2.0 * kThird, .tempered = true, .pulled = true}, 0.5, 33},
    {{.horizon = 1.0, .tempered = true, .pulled = true}, 0.1, 100},
    {{}, 0.01, 200},
}};
constexpr int kModelsInAll = 200;
/// A linear range holds this many steps that count as 1, about as many as a logarithmic one.
constexpr double kStepsInLinearRange = 10.0;

/// A stage that sees no more than the next one does, or nothing, teaches nothing.
bool is_idle(const Evaluator& evaluator, std::size_t number) {
  const double horizon = kStages[number].stage.horizon;
  if (horizon >= 1.0) return false;
  const std::size_t seen = evaluator.data_within(horizon);
  return seen == 0 || seen == evaluator.data_within(kStages[number + 1].stage.horizon);
}

}  // namespace

Box box_of(const Problem& problem) {
  return {lower_bounds(problem.unknowns), upper_bounds(problem.unknowns)};
}

Eigen::VectorXd units_of(const Problem& problem) {
  Eigen::VectorXd units(static_cast<Eigen::Index>(problem.unknowns.size()));
  std::transform(
      problem.unknowns.begin(), problem.unknowns.end(), units.begin(),
      [](const Unknown& unknown) { return unknown.linear ? 1.0 / kStepsInLinearRange : 1.0; });
  return units;
}

std::optional<Eigen::VectorXd> approach(Allowance& allowance, const Eigen::VectorXd& start,
                                        Stages stages) {
  const Box box = box_of(allowance.problem());
  Eigen::VectorXd x = start;
  bool begun = false;
  int models_left = kModelsInAll;
  for (std::size_t number = stages == Stages::All ? 0 : kStages.size() - 1; number < kStages.size();
       ++number) {
    if (is_idle(allowance.evaluator(), number)) continue;
    const PlannedStage& planned = kStages[number];
    Objective objective(allowance, planned.stage);
    const RegionEnd end = descend_in_region(
        objective, box, x,
        {planned.enough, std::min(planned.models, models_left), units_of(allowance.problem())});
    // A later stage may find that what fits the beginning cannot be integrated to its end; the
    // next one, or the finish, then has the word.
    begun = begun || end.here;
    models_left -= end.models;
    x = end.x;
  }
  return begun ? std::optional(x) : std::nullopt;
}

}  // namespace gainsay::estimation
