#include "gainsay/estimation/residuals.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/data_rows.h"

#include <algorithm>
#include <cmath>
#include <span>
#include <utility>

namespace gainsay::estimation {
namespace {

using Want = Evaluator::Want;

Eigen::Index index(std::size_t number) { return static_cast<Eigen::Index>(number); }

/// One experiment ready to be run again and again.
struct Bench {
  ExperimentRows data;
  core::Integrator integrator;
  const FittedExperiment* experiment;
  std::vector<double> values;  // of the program's unknowns, natural units
  std::vector<double> scale;   // dp/dx of each
};

core::Accuracy accuracy_of(const Problem& problem, const FittedExperiment& experiment) {
  core::Accuracy accuracy;
  accuracy.relative = problem.relative_accuracy;
  accuracy.absolute = experiment.absolute;
  return accuracy;
}

/// The objective as it grows during an evaluation, so that it can be given up early.
struct Growing {
  double known = 0.0;    // all that is not in a group of unknown noise
  double squares = 0.0;  // of it, the squares of data and priors
  std::vector<NoiseGroup> groups;

  double objective() const {
    double sum = known;
    for (const NoiseGroup& group : groups) sum += group.objective();
    return sum;
  }
};

/// A residual of earlier knowledge: (x - value) / sd, or ln(x / value) / ln(geometric_sd).
/// Methods (15).
struct PriorResidual {
  double r;
  double dr_dvalue;
};

PriorResidual prior_residual(const Prior& prior, double value) {
  if (prior.sd) return {(value - prior.value) / *prior.sd, 1.0 / *prior.sd};
  GAINSAY_REQUIRE(prior.geometric_sd.has_value(), "a prior has an sd of one kind");
  const double width = std::log(*prior.geometric_sd);
  return {std::log(value / prior.value) / width, 1.0 / (value * width)};
}

}  // namespace

struct Evaluator::Content {
  const Problem& problem;
  std::vector<Bench> benches;
  std::vector<NoiseGroup> groups;
  std::vector<core::Accuracy> accuracies;
  Eigen::VectorXd low, high;
  std::size_t data = 0;  // N without priors
  long integrations = 0;

  explicit Content(const Problem& of) : problem(of), groups(noise_groups(of)) {
    std::vector<ExperimentRows> tables = data_rows(of);
    for (std::size_t e = 0; e < of.experiments.size(); ++e) {
      const FittedExperiment& experiment = of.experiments[e];
      accuracies.push_back(accuracy_of(of, experiment));
      data += tables[e].rows.size();
      const std::size_t count = experiment.unknown_numbers.size();
      benches.push_back(
          {std::move(tables[e]),
           core::Integrator(*experiment.program, experiment.schedule, accuracies.back()),
           &experiment, std::vector<double>(count), std::vector<double>(count)});
    }
    low = lower_bounds(of.unknowns);
    high = upper_bounds(of.unknowns);
  }

  void apply_accuracies() {
    for (std::size_t e = 0; e < benches.size(); ++e)
      benches[e].integrator.set_accuracy(accuracies[e]);
  }

  std::size_t unknowns() const { return problem.unknowns.size(); }

  Evaluation blank(Want want, const Stage& stage) const {
    const std::size_t rows = data + problem.priors() + (stage.pulled ? unknowns() : 0);
    Evaluation blank;
    blank.r = blank.slope = blank.curvature = Eigen::VectorXd::Zero(index(rows));
    blank.shown = Eigen::VectorXd::Constant(index(data), std::numeric_limits<double>::quiet_NaN());
    blank.sd = Eigen::VectorXd::Ones(index(data));
    if (want == Want::ResidualsAndJacobian) {
      blank.J = Eigen::MatrixXd::Zero(index(rows), index(unknowns()));
      blank.dshown = Eigen::MatrixXd::Zero(index(data), index(unknowns()));
    }
    return blank;
  }

  /// Residuals that need no integration: priors and the pull to the centre.
  void add_beliefs(const Eigen::VectorXd& x, const std::vector<double>& values,
                   const Eigen::VectorXd& scale, const Stage& stage, Evaluation& to) const {
    std::size_t row = data;
    const auto add = [&](double r, double dr_dx, std::size_t unknown) {
      to.r[index(row)] = to.slope[index(row)] = r;
      to.curvature[index(row)] = 1.0;
      if (to.J.size() > 0) to.J(index(row), index(unknown)) = dr_dx;
      ++row;
    };
    for (std::size_t i = 0; i < unknowns(); ++i) {
      if (!problem.unknowns[i].prior) continue;
      const PriorResidual prior = prior_residual(*problem.unknowns[i].prior, values[i]);
      add(prior.r, prior.dr_dvalue * scale[index(i)], i);
    }
    for (std::size_t i = 0; stage.pulled && i < unknowns(); ++i) {
      const double width = high[index(i)] - low[index(i)];
      add((x[index(i)] - 0.5 * (low[index(i)] + high[index(i)])) / width, 1.0 / width, i);
    }
  }

  /// Weighs one datum into the evaluation.
  static void add_datum(const DataRow& row, double shown, const Stage& stage, Evaluation& to,
                        Growing& growing) {
    const Eigen::Index i = index(row.number);
    to.shown[i] = shown;
    if (row.group && !stage.tempered) {
      to.r[i] = shown - row.observed;
      growing.groups[*row.group].sum_squares += to.r[i] * to.r[i];
      return;
    }
    const Weighed weighed =
        weigh(stage.tempered ? row.tempered() : row.scatter, shown, row.observed, stage.aim);
    to.r[i] = weighed.r;
    to.sd[i] = weighed.sd;
    to.slope[i] = weighed.slope;
    to.curvature[i] = weighed.curvature;
    growing.known += weighed.objective;
    growing.squares += weighed.r * weighed.r;
  }

  enum class Run { Done, GivenUp };

  /// Integrates one experiment as far as the stage needs and weighs its data as they come.
  core::Result<Run, core::IntegrationFailure> run(Bench& bench, const Stage& stage, Want want,
                                                  double give_up_above, Evaluation& to,
                                                  Growing& growing) {
    const std::vector<DataRow>& rows = bench.data.rows;
    const std::size_t needed = bench.data.within(stage.horizon);
    if (needed == 0) return Run::Done;
    ++integrations;
    std::size_t next = 0;
    bool given_up = false;
    const bool may_give_up = want == Want::Residuals;
    const core::Observer observer = [&](std::size_t output, std::span<const double> shown) {
      for (; next < needed && rows[next].output == output; ++next)
        add_datum(rows[next], shown[rows[next].readout], stage, to, growing);
      // Written so that a sum that is not a number gives up too.
      given_up = may_give_up && !(growing.objective() <= give_up_above);
      return next < needed && !given_up;
    };
    const auto ran = bench.integrator.run(
        bench.values, bench.scale,
        want == Want::Residuals ? core::Sensitivities::No : core::Sensitivities::Yes, observer);
    if (!ran) return ran.failure();
    if (want == Want::ResidualsAndJacobian) add_derivatives(bench, **ran, needed, to);
    return given_up ? Run::GivenUp : Run::Done;
  }

  static void add_derivatives(const Bench& bench, const core::Trajectory& trajectory,
                              std::size_t needed, Evaluation& to) {
    const std::vector<std::size_t>& numbers = bench.experiment->unknown_numbers;
    for (std::size_t k = 0; k < needed; ++k) {
      const DataRow& row = bench.data.rows[k];
      const Eigen::MatrixXd& dshown_dp = trajectory.dshown_dp[row.output];
      for (std::size_t j = 0; j < numbers.size(); ++j) {
        const double dshown = dshown_dp(index(row.readout), index(j)) * bench.scale[j];
        to.dshown(index(row.number), index(numbers[j])) = dshown;
        to.J(index(row.number), index(numbers[j])) = dshown / to.sd[index(row.number)];
      }
    }
  }

  /// Slope, curvature and sd of the groups of unknown noise, then V and the objective.
  void close(const Growing& growing, const Stage& stage, Evaluation& to) const {
    to.objective = growing.objective();
    to.V = growing.squares;
    for (const NoiseGroup& group : growing.groups)
      to.group_sds.push_back(std::sqrt(group.variance()));
    if (groups.empty() || stage.tempered) return;
    for (const Bench& bench : benches) {
      for (const DataRow& row : bench.data.rows) {
        if (!row.group) continue;
        const Eigen::Index i = index(row.number);
        const double variance = growing.groups[*row.group].variance();
        to.V += to.r[i] * to.r[i] / variance;
        to.slope[i] = to.r[i] / variance;
        to.curvature[i] = 1.0 / variance;
      }
    }
  }
};

Evaluator::Evaluator(const Problem& problem) : content_(std::make_unique<Content>(problem)) {}
Evaluator::~Evaluator() = default;
Evaluator::Evaluator(Evaluator&&) noexcept = default;

core::Result<std::optional<Evaluation>, EvaluationFailure> Evaluator::evaluate(
    const Eigen::VectorXd& x, Want want, const Stage& stage, double give_up_above) {
  Content& content = *content_;
  GAINSAY_REQUIRE(x.size() == index(content.unknowns()), "x has one coordinate for each unknown");
  const std::vector<double> values = from_coordinates(content.problem.unknowns, x);
  const Eigen::VectorXd scale = scale_at(content.problem.unknowns, values);
  Evaluation evaluation = content.blank(want, stage);
  content.add_beliefs(x, values, scale, stage, evaluation);
  Growing growing{
      .known = evaluation.r.squaredNorm(),
      .squares = evaluation.r.head(index(content.data + content.problem.priors())).squaredNorm(),
      .groups = content.groups};
  for (Bench& bench : content.benches) {
    const std::vector<std::size_t>& numbers = bench.experiment->unknown_numbers;
    for (std::size_t j = 0; j < numbers.size(); ++j) {
      bench.values[j] = values[numbers[j]];
      bench.scale[j] = scale[index(numbers[j])];
    }
    const auto ran = content.run(bench, stage, want, give_up_above, evaluation, growing);
    if (!ran) return EvaluationFailure{bench.experiment->name, ran.failure()};
    if (*ran == Content::Run::GivenUp) return std::optional<Evaluation>();
  }
  content.close(growing, stage, evaluation);
  if (!std::isfinite(evaluation.objective) || !evaluation.J.allFinite()) {
    return EvaluationFailure{
        "", {core::IntegrationFailure::Kind::BlowUp, 0.0, "", "the misfit is not a finite number"}};
  }
  if (evaluation.objective > give_up_above) return std::optional<Evaluation>();
  return std::optional<Evaluation>(std::move(evaluation));
}

std::size_t Evaluator::data_within(double horizon) const {
  std::size_t count = 0;
  for (const Bench& bench : content_->benches) count += bench.data.within(horizon);
  return count;
}

const Problem& Evaluator::problem() const { return content_->problem; }
long Evaluator::integrations() const { return content_->integrations; }

void Evaluator::set_relative_accuracy(double relative, double absolute_factor) {
  for (std::size_t e = 0; e < content_->accuracies.size(); ++e) {
    core::Accuracy& accuracy = content_->accuracies[e];
    accuracy.relative = relative;
    accuracy.absolute = content_->problem.experiments[e].absolute;
    for (double& absolute : accuracy.absolute) absolute *= absolute_factor;
  }
  content_->apply_accuracies();
}

void Evaluator::set_engine(core::Engine engine) {
  for (core::Accuracy& accuracy : content_->accuracies) accuracy.engine = engine;
  content_->apply_accuracies();
}

}  // namespace gainsay::estimation
