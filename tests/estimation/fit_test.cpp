#include "gainsay/estimation/fit.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/starts.h"
#include "gainsay/testing/decay_data.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::estimation {
namespace {

using testing::TwoSteps;

Fit descended(const Problem& problem, const Eigen::VectorXd& start, const DescentPlan& plan = {}) {
  Evaluator evaluator(problem);
  return descend(evaluator, start, plan);
}

Eigen::VectorXd near_truth(const Problem& problem) {
  return to_coordinates(problem.unknowns, std::vector{0.5, 0.5, 3.0});
}

TEST(Descend, SaysEverythingAboutItsEnd) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  const Fit fit = descend(evaluator, near_truth(problem));
  EXPECT_EQ(fit.stopped, Stopped::Converged);
  EXPECT_FALSE(fit.why.empty());
  EXPECT_EQ(fit.values, from_coordinates(problem.unknowns, fit.x));
  EXPECT_EQ(fit.on_bound, std::vector<bool>(3, false));
  EXPECT_EQ(fit.integrations, evaluator.integrations());
  EXPECT_EQ(fit.evaluations + fit.jacobians, evaluator.integrations());  // one experiment
  const auto here = *evaluator.evaluate(fit.x, Evaluator::Want::ResidualsAndJacobian);
  EXPECT_EQ(fit.V, here->V);
  EXPECT_EQ(fit.objective, here->objective);
  EXPECT_EQ(fit.shown, here->shown);
  EXPECT_EQ(fit.sd, here->sd);
}

TEST(Descend, BeginsInsideTheBoxWhateverTheStart) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  const Fit fit = descended(problem, Eigen::Vector3d(-0.5, -50.0, 1.0));
  EXPECT_NE(fit.stopped, Stopped::NeverRun);
  EXPECT_GE(fit.values[1], problem.unknowns[1].low * (1 - 1e-14));
}

TEST(Descend, GivesTheEstimatedSdsOfUnknownNoise) {
  const Problem problem = TwoSteps::problem({.sd_unknown = true}, 0.1, 0.0);
  const Fit fit = descended(problem, near_truth(problem));
  EXPECT_EQ(fit.stopped, Stopped::Converged);
  // 20 readings about 3 unknowns with sd 0.1: within half and twice of it at odds beyond 1e4.
  EXPECT_GT(fit.sd[0], 0.05);
  EXPECT_LT(fit.sd[0], 0.2);
  EXPECT_NEAR(fit.V, 20.0, 1e-6);  // N, but for the floor of the sds
}

TEST(Descend, PolishesFromNearWithLess) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  const Fit first = descended(problem, Eigen::Vector3d(3.0, -3.0, 3.0));
  const Fit polished = descended(problem, first.x, {.polish_only = true});
  EXPECT_EQ(polished.stopped, Stopped::Converged);
  EXPECT_NEAR(polished.V, first.V, 1e-8 * first.V);
  EXPECT_LT(polished.integrations, first.integrations);
}

TEST(Descend, SaysThatAStartCannotBeIntegrated) {
  const Problem problem = testing::small_problem(
      {.states = {{"y", "k * y^2", "1"}}, .unknowns = {"k"}, .readouts = {"y"}},
      {testing::unknown("k", 0.01, 10)}, {{{}, {{0, {{1.0, 1.2}, {2.0, 1.4}}, 0.1, {}}}}});
  const Fit fit = descended(problem, Eigen::VectorXd::Constant(1, std::log(5.0)));
  EXPECT_EQ(fit.stopped, Stopped::CannotIntegrate);
  EXPECT_FALSE(fit.ended());
  EXPECT_TRUE(std::isnan(fit.V));
}

TEST(Descend, EndsWithItsBudget) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  for (const long budget : {0L, 1L, 7L}) {
    const Fit fit =
        descended(problem, Eigen::Vector3d(3.0, -3.0, 3.0), {.integrations_at_most = budget});
    EXPECT_EQ(fit.stopped, Stopped::OutOfBudget);
    EXPECT_EQ(fit.integrations, budget);
  }
}

TEST(Descend, EndsWhenInterrupted) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  std::stop_source source;
  source.request_stop();
  const Fit fit = descended(problem, near_truth(problem), {.stop = source.get_token()});
  EXPECT_EQ(fit.stopped, Stopped::Interrupted);
  EXPECT_EQ(fit.integrations, 0);
}

TEST(Descend, OfNoUnknownsIsOneEvaluation) {
  const Problem problem =
      testing::small_problem({.states = {{"y", "-y", "1"}}, .unknowns = {}, .readouts = {"y"}}, {},
                             {{{}, {{0, {{1.0, 0.5}}, 0.1, {}}}}});
  const Fit fit = descended(problem, Eigen::VectorXd(0));
  EXPECT_EQ(fit.stopped, Stopped::Converged);
  EXPECT_NEAR(fit.V, std::pow((std::exp(-1.0) - 0.5) / 0.1, 2), 1e-6);
}

/// A decay seen through scale and offset, which lie far from where the readings want them.
Problem scaled() {
  testing::SmallSeries series{.readout = 0, .sd = 0.02};
  for (int i = 1; i <= 10; ++i) series.points.push_back({0.3 * i, 40 * std::exp(-0.2 * i) + 3.0});
  Problem problem = testing::small_problem(
      {.states = {{"A", "-k * A", "1"}},
       .unknowns = {"k", "scale", "offset"},
       .readouts = {"scale * A + offset"}},
      {testing::unknown("k", 1e-3, 1e3), testing::unknown("scale", 4e-5, 4e7),
       testing::linear_unknown("offset", -400, 400)},
      {{{}, {series}}});
  problem.experiments[0].linear.push_back({.scale = 1, .offset = 2, .readout = 0});
  return problem;
}

TEST(Descend, SetsScalesAndOffsetsOnTheStartsOwnTrajectory) {
  const Problem problem = scaled();
  const auto start = [&](double scale, double offset) {
    return to_coordinates(problem.unknowns, std::vector{0.2, scale, offset});
  };
  const Fit far = descended(problem, start(1e6, -300.0));
  const Fit other = descended(problem, start(1e-3, 200.0));
  EXPECT_EQ(far.stopped, Stopped::Converged);
  // Both begin at the same point, but for what rounding and integration make of 1e6 times A.
  EXPECT_NEAR(far.values[0], 2.0 / 3.0, 1e-6);
  EXPECT_NEAR(other.values[0], 2.0 / 3.0, 1e-6);
  EXPECT_NEAR(far.values[1], 40.0, 1e-4);
  EXPECT_NEAR(far.values[2], 3.0, 1e-4);
}

TEST(Descend, KeepsGuessedScalesWhereAsked) {
  Problem problem = scaled();
  problem.unknowns[1].first = {40.0};
  problem.unknowns[2].first = {3.0};
  const Eigen::VectorXd start = to_coordinates(problem.unknowns, std::vector{0.6, 40.0, 3.0});
  const Fit kept = descended(problem, start, {.keep_guessed = true});
  const Fit set = descended(problem, start);
  EXPECT_EQ(set.jacobians + set.evaluations, set.integrations);
  EXPECT_NEAR(kept.V, set.V, 1e-6);
  EXPECT_NE(kept.integrations, set.integrations);  // the regression takes one
}

TEST(LeastV, IsNeverAboveVOfTheLikeliestFit) {
  for (std::uint64_t number = 0; number < 5; ++number) {
    const Problem problem = TwoSteps::problem({.sd = 0.1, .relative = 0.2}, 0.1, 0.2, number);
    Evaluator evaluator(problem);
    const Fit likeliest = descend(evaluator, near_truth(problem));
    const Fit least = least_V(evaluator, likeliest.x);
    EXPECT_EQ(likeliest.stopped, Stopped::Converged) << likeliest.why;
    EXPECT_EQ(least.stopped, Stopped::Converged) << least.why;
    EXPECT_LT(least.V, likeliest.V);
    EXPECT_EQ(least.V, least.objective);
  }
}

TEST(LeastV, OfKnownNoiseIsTheFitItself) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  const Fit fit = descend(evaluator, near_truth(problem));
  EXPECT_NEAR(least_V(evaluator, fit.x).V, fit.V, 1e-8 * fit.V);
}

TEST(LeastV, WantsNoiseThatIsKnown) {
  const Problem problem = TwoSteps::problem({.sd_unknown = true}, 0.1, 0.0);
  Evaluator evaluator(problem);
  EXPECT_THROW((void)least_V(evaluator, near_truth(problem)), core::BrokenPromise);
}

// Whatever the data, the least V is at most V at the truth they were drawn from, and a descent that
// begins there never climbs.
TEST(Descend, FromTheTruthNeverEndsAboveIt) {
  const std::vector<Noise> noises = {
      {.sd = 0.1}, {.sd = 0.05, .relative = 0.1}, {.sd_unknown = true}};
  for (std::uint64_t number = 0; number < 30; ++number) {
    for (const Noise& noise : noises) {
      const Problem problem = TwoSteps::problem(noise, 0.05, 0.1, number, 1e-6);
      Evaluator evaluator(problem);
      const Eigen::VectorXd truth = to_coordinates(problem.unknowns, TwoSteps::kTruth);
      const double at_truth =
          (*evaluator.evaluate(truth, Evaluator::Want::ResidualsAndJacobian))->objective;
      const Fit fit = descend(evaluator, truth, {.polish_only = true});
      EXPECT_LE(fit.objective, at_truth) << "data " << number;
      EXPECT_EQ(fit.stopped, Stopped::Converged) << "data " << number << ": " << fit.why;
    }
  }
}

}  // namespace
}  // namespace gainsay::estimation
