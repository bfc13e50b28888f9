#include "gainsay/estimation/residuals.h"

#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/objective.h"
#include "gainsay/testing/small_problems.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::estimation {
namespace {

using gainsay::testing::linear_unknown;
using gainsay::testing::small_problem;
using gainsay::testing::SmallExperiment;
using gainsay::testing::SystemText;
using gainsay::testing::unknown;
using Want = Evaluator::Want;

// Everything here is integrated to 1e-10 relative; the states stay near 1, and residuals divide
// them by sds of 0.1 and more: 1e-8 leaves room for the solver's global error.
constexpr double kIntegration = 1e-8;

/// Two runs of a decay, A = a0 u exp(-k t) with the input u, seen plainly and through scale and
/// offset.
const SystemText kDecay{.states = {{"A", "-k * A", "a0 * u"}},
                        .unknowns = {"k", "a0", "scale", "offset"},
                        .inputs = {"u"},
                        .readouts = {"A", "scale * A + offset"}};
const std::vector<double> kValues = {0.7, 1.5, 2.0, 0.3};

std::vector<Unknown> decay_unknowns() {
  return {unknown("k", 0.01, 10), unknown("a0", 0.1, 10), unknown("scale", 0.1, 100),
          linear_unknown("offset", -2, 6)};
}

std::vector<SmallExperiment> decay_runs(Noise noise, double sd = kNotGiven) {
  return {{{1.0}, {{0, {{0.5, 1.1}, {1.0, 0.6}, {2.0, 0.5}, {3.0, 0.2}}, sd, noise}}},
          {{2.0}, {{1, {{1.0, 3.0}, {3.0, 1.4}}, 0.2, {}}, {0, {{2.0, 0.6}}, sd, noise}}}};
}

Problem decay(Noise noise, double sd = kNotGiven) {
  return small_problem(kDecay, decay_unknowns(), decay_runs(noise, sd));
}

Eigen::VectorXd at(const Problem& problem, const std::vector<double>& values = kValues) {
  return to_coordinates(problem.unknowns, values);
}

/// What is shown, by hand, in order of residuals.
std::vector<double> shown_by_hand() {
  const auto A = [](double u, double t) { return 1.5 * u * std::exp(-0.7 * t); };
  return {A(1, 0.5), A(1, 1), A(1, 2), A(1, 3), 2 * A(2, 1) + 0.3, 2 * A(2, 3) + 0.3, A(2, 2)};
}
const std::vector<double> kObserved = {1.1, 0.6, 0.5, 0.2, 3.0, 1.4, 0.6};

Evaluation evaluated(Evaluator& evaluator, const Eigen::VectorXd& x, const Stage& stage = {},
                     Want want = Want::ResidualsAndJacobian) {
  const auto result = evaluator.evaluate(x, want, stage);
  if (!result || !*result) {
    ADD_FAILURE() << "not evaluated";
    return {};
  }
  return **result;
}

TEST(Evaluator, WeighsWhatTheModelShows) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  for (const Want want : {Want::Residuals, Want::ResidualsAndJacobian}) {
    const Evaluation evaluation = evaluated(evaluator, at(problem), {}, want);
    const std::vector<double> shown = shown_by_hand();
    double V = 0.0;
    for (int i = 0; i < 7; ++i) {
      const double sd = i == 4 || i == 5 ? 0.2 : 0.1;
      EXPECT_NEAR(evaluation.shown[i], shown[i], kIntegration);
      EXPECT_DOUBLE_EQ(evaluation.sd[i], sd);
      EXPECT_NEAR(evaluation.r[i], (shown[i] - kObserved[i]) / sd, 10 * kIntegration);
      V += std::pow((shown[i] - kObserved[i]) / sd, 2);
    }
    EXPECT_NEAR(evaluation.V, V, 1e-6);  // twenty times r, times the error of r
    EXPECT_EQ(evaluation.V, evaluation.objective);
  }
  EXPECT_EQ(evaluator.integrations(), 4);
}

TEST(Evaluator, DoesNotRememberEarlierPoints) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  const Eigen::VectorXd x = at(problem);
  const Evaluation first = evaluated(evaluator, x);
  evaluated(evaluator, at(problem, {3.0, 0.2, 9.0, -1.0}));
  evaluated(evaluator, x, {.horizon = 0.4}, Want::Residuals);
  const Evaluation second = evaluated(evaluator, x);
  EXPECT_EQ(first.r, second.r);
  EXPECT_EQ(first.J, second.J);
}

/// Central differences of a function of x, one column for each coordinate.
template <class Function>
Eigen::MatrixXd differences(const Eigen::VectorXd& x, Function function) {
  constexpr double kStep = 1e-4;
  Eigen::MatrixXd J(function(x).size(), x.size());
  for (Eigen::Index i = 0; i < x.size(); ++i) {
    Eigen::VectorXd up = x, down = x;
    up[i] += kStep;
    down[i] -= kStep;
    J.col(i) = (function(up) - function(down)) / (2.0 * kStep);
  }
  return J;
}
// h^2 / 6 of third derivatives up to about 100, and integration errors of about 1e-8 over 2h.
constexpr double kDifference = 1e-3;

std::vector<Problem> problems_of_every_noise() {
  std::vector<Problem> all;
  all.push_back(decay({}, 0.1));
  all.push_back(decay({.sd = 0.1}));
  all.push_back(decay({.sd = 0.1, .relative = 0.2}));
  all.push_back(decay({.relative = 0.2}));
  all.push_back(decay({.sd_unknown = true}));
  all.push_back(decay({}, 0.1));
  all.back().unknowns[0].prior = Prior{.value = 0.5, .sd = 0.2};
  all.back().unknowns[1].prior = Prior{.value = 2.0, .geometric_sd = 1.3};
  all.back().unknowns[3].prior = Prior{.value = 0.1, .sd = 0.5};
  return all;
}

const std::vector<Stage> kEveryStage = {{},
                                        {.horizon = 0.5},
                                        {.tempered = true},
                                        {.pulled = true},
                                        {.horizon = 0.7, .tempered = true, .pulled = true},
                                        {.aim = Aim::Misfit}};

TEST(Evaluator, ShownHasTheDerivativesOfItsDifferences) {
  for (const Problem& problem : problems_of_every_noise()) {
    Evaluator evaluator(problem);
    const Eigen::MatrixXd expected = differences(at(problem), [&](const Eigen::VectorXd& x) {
      return evaluated(evaluator, x, {}, Want::Residuals).shown;
    });
    const Evaluation here = evaluated(evaluator, at(problem));
    EXPECT_LT((here.dshown - expected).cwiseAbs().maxCoeff(), kDifference);
    const Eigen::MatrixXd J = here.sd.asDiagonal() * here.J.topRows(here.sd.size());
    EXPECT_LT((J - expected).cwiseAbs().maxCoeff(), kDifference);
  }
}

TEST(Evaluator, ObjectiveHasTheGradientOfItsDifferences) {
  int number = 0;
  for (const Problem& problem : problems_of_every_noise()) {
    Evaluator evaluator(problem);
    for (const Stage& stage : kEveryStage) {
      if (problem.noise_unknown() && stage.horizon < 1.0 && !stage.tempered) continue;
      if (problem.noise_unknown() && stage.aim == Aim::Misfit) continue;
      const Eigen::MatrixXd expected = differences(at(problem), [&](const Eigen::VectorXd& x) {
        return Eigen::VectorXd::Constant(1,
                                         evaluated(evaluator, x, stage, Want::Residuals).objective);
      });
      const Eigen::VectorXd gradient =
          2.0 * local_model(evaluated(evaluator, at(problem), stage)).gradient;
      // Relative to the largest entry: objectives reach 1e3, and so does what they err by.
      EXPECT_LT((gradient - expected.transpose()).cwiseAbs().maxCoeff(),
                kDifference * (1.0 + gradient.cwiseAbs().maxCoeff()))
          << "problem " << number << ", horizon " << stage.horizon;
    }
    ++number;
  }
}

TEST(Evaluator, LeavesOutWhatLiesBeyondTheHorizon) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  const Stage half{.horizon = 0.5};  // up to 1.5 in both runs
  const Evaluation evaluation = evaluated(evaluator, at(problem), half);
  const Evaluation whole = evaluated(evaluator, at(problem));
  for (int i = 0; i < 7; ++i) {
    const bool within = i == 0 || i == 1 || i == 4;
    EXPECT_EQ(std::isnan(evaluation.shown[i]), !within);
    EXPECT_NEAR(evaluation.r[i], within ? whole.r[i] : 0.0, 10 * kIntegration);
    EXPECT_EQ(evaluation.J.row(i).norm() > 0.0, within);
  }
  EXPECT_EQ(evaluator.data_within(0.5), 3u);
  EXPECT_EQ(evaluator.data_within(1.0), 7u);
}

TEST(Evaluator, DoesNotIntegrateWhatHasNoDataWithinTheHorizon) {
  const Problem problem = small_problem(
      kDecay, decay_unknowns(),
      {{{1.0}, {{0, {{0.1, 1.0}, {1.0, 0.6}}, 0.1, {}}}}, {{1.0}, {{0, {{1.0, 0.6}}, 0.1, {}}}}});
  Evaluator evaluator(problem);
  evaluated(evaluator, at(problem), {.horizon = 0.5});
  EXPECT_EQ(evaluator.integrations(), 1);
}

TEST(Evaluator, TempersAndPulls) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  const Evaluation tempered = evaluated(evaluator, at(problem), {.tempered = true});
  EXPECT_DOUBLE_EQ(tempered.sd[0], std::sqrt(0.01 + 0.0121));  // 0.1 and a tenth of 1.1
  EXPECT_DOUBLE_EQ(tempered.sd[4], std::sqrt(0.04 + 0.09));    // 0.2 and a tenth of 3.0
  const Evaluation pulled = evaluated(evaluator, at(problem), {.pulled = true});
  ASSERT_EQ(pulled.r.size(), 7 + 4);
  const double middle_of_k = 0.5 * (std::log(0.01) + std::log(10));
  EXPECT_DOUBLE_EQ(pulled.r[7], (std::log(0.7) - middle_of_k) / std::log(1000.0));
  EXPECT_DOUBLE_EQ(pulled.r[10], 0.3 / 8.0 - 2.0 / 8.0);  // linear: the range is 1 wide
  EXPECT_NEAR(pulled.objective, pulled.V + pulled.r.tail(4).squaredNorm(), 1e-12 * pulled.V);
}

TEST(Evaluator, TakesPriorsAsMeasurements) {
  const Problem problem = problems_of_every_noise().back();
  Evaluator evaluator(problem);
  const Evaluation evaluation = evaluated(evaluator, at(problem));
  ASSERT_EQ(evaluation.r.size(), 7 + 3);
  EXPECT_NEAR(evaluation.r[7], (0.7 - 0.5) / 0.2, 1e-14);
  EXPECT_NEAR(evaluation.r[8], std::log(1.5 / 2.0) / std::log(1.3), 1e-14);
  EXPECT_NEAR(evaluation.r[9], (0.3 - 0.1) / 0.5, 1e-14);
  EXPECT_NEAR(evaluation.V, evaluation.r.squaredNorm(), 1e-12 * evaluation.V);
}

TEST(Evaluator, EstimatesUnknownSdsFromTheirGroup) {
  const Problem problem = decay({.sd_unknown = true});
  Evaluator evaluator(problem);
  const Evaluation evaluation = evaluated(evaluator, at(problem));
  const std::vector<double> shown = shown_by_hand();
  double of_group = 0.0, of_known = 0.0;
  for (int i = 0; i < 7; ++i) {
    const double difference = shown[i] - kObserved[i];
    if (i == 4 || i == 5)
      of_known += std::pow(difference / 0.2, 2);
    else
      of_group += difference * difference;
    if (i < 4) {
      EXPECT_NEAR(evaluation.r[i], difference, kIntegration);
      EXPECT_EQ(evaluation.sd[i], 1.0);
    }
  }
  ASSERT_EQ(evaluation.group_sds.size(), 1u);
  EXPECT_NEAR(evaluation.group_sds[0], std::sqrt(of_group / 5.0), 1e-6);
  EXPECT_NEAR(evaluation.V, of_known + 5.0, 1e-6);  // 5 of a group of 5, but for its floor
}

TEST(Evaluator, GivesUpEarlyWhereTheObjectiveIsExceeded) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  const Eigen::VectorXd x = at(problem);
  const double V = evaluated(evaluator, x, {}, Want::Residuals).V;
  const long before = evaluator.integrations();
  // The first run alone exceeds a tenth of V: the second is not even begun.
  const auto given_up = evaluator.evaluate(x, Want::Residuals, {}, 0.1 * V);
  ASSERT_TRUE(given_up);
  EXPECT_FALSE(given_up->has_value());
  EXPECT_EQ(evaluator.integrations(), before + 1);
  const auto whole = evaluator.evaluate(x, Want::Residuals, {}, 1.001 * V);
  ASSERT_TRUE(whole && *whole);
  EXPECT_EQ((*whole)->V, V);
}

TEST(Evaluator, SaysWhichExperimentCannotBeIntegrated) {
  // dy/dt = k y^2 from y = u is infinite at t = 1 / (k u).
  const SystemText burst{
      .states = {{"y", "k * y^2", "u"}}, .unknowns = {"k"}, .inputs = {"u"}, .readouts = {"y"}};
  const Problem problem =
      small_problem(burst, {unknown("k", 0.01, 10)},
                    {{{1.0}, {{0, {{1.0, 2.0}}, 0.1, {}}}}, {{4.0}, {{0, {{1.0, 2.0}}, 0.1, {}}}}});
  Evaluator evaluator(problem);
  for (const Want want : {Want::Residuals, Want::ResidualsAndJacobian}) {
    const auto failed = evaluator.evaluate(at(problem, {0.5}), want);
    ASSERT_FALSE(failed);
    EXPECT_EQ(failed.failure().experiment, "run 1");
    EXPECT_TRUE(evaluator.evaluate(at(problem, {0.1}), want));
  }
}

TEST(Evaluator, AgreesWithItselfAtOtherAccuraciesAndWithTheReferenceEngine) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  const Evaluation stacked = evaluated(evaluator, at(problem));
  evaluator.set_engine(core::Engine::Reference);
  const Evaluation reference = evaluated(evaluator, at(problem));
  EXPECT_LT((stacked.r - reference.r).cwiseAbs().maxCoeff(), 10 * kIntegration);
  EXPECT_LT((stacked.J - reference.J).cwiseAbs().maxCoeff(), 100 * kIntegration);
  evaluator.set_engine(core::Engine::Stacked);
  evaluator.set_relative_accuracy(1e-4, 1e4);
  const Evaluation loose = evaluated(evaluator, at(problem));
  EXPECT_GT((stacked.r - loose.r).cwiseAbs().maxCoeff(), 10 * kIntegration);
  EXPECT_LT((stacked.r - loose.r).cwiseAbs().maxCoeff(), 0.1);  // 1e-4 times 100 steps over 0.1
  evaluator.set_relative_accuracy(problem.relative_accuracy);
  EXPECT_EQ(evaluated(evaluator, at(problem)).r, stacked.r);
}

TEST(Evaluator, WantsOneCoordinateForEachUnknown) {
  const Problem problem = decay({}, 0.1);
  Evaluator evaluator(problem);
  EXPECT_THROW((void)evaluator.evaluate(Eigen::VectorXd::Zero(3), Want::Residuals),
               core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::estimation
