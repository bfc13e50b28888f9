#include "gainsay/stats/examiner.h"

#include "gainsay/estimation/coordinates.h"
#include "gainsay/testing/decays.h"

#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::stats {
namespace {

using gainsay::testing::against_decay;
using gainsay::testing::Bench;
using gainsay::testing::first_order;
using gainsay::testing::problem_of;
using gainsay::testing::shows;
using gainsay::testing::SimulatedDecay;
using gainsay::testing::wide_ranges;
using gainsay::testing::zeroth_order;

estimation::Fit fitted(const estimation::Problem& problem) {
  estimation::Evaluator evaluator(problem);
  const std::vector<double> guess = {0.3, 10.0};
  return estimation::descend(evaluator, estimation::to_coordinates(problem.unknowns, guess));
}

TEST(Examiner, AppliesEveryTestToAFit) {
  const estimation::Problem problem = against_decay(first_order());
  Examiner examiner(problem, {});
  const estimation::Fit fit = fitted(problem);
  const std::optional<Verdict> verdict = examiner.examine(fit, fit);
  ASSERT_TRUE(verdict);
  EXPECT_EQ(verdict->N, 12U);
  EXPECT_EQ(verdict->k, 2U);
  EXPECT_EQ(verdict->reduced.freedom, 10.0);
  EXPECT_EQ(verdict->full.freedom, 12.0);
  EXPECT_GT(verdict->order.p_value, 0.0);
  EXPECT_GT(verdict->departure_sd, 0.0);
  EXPECT_EQ(verdict->residuals.size(), 12U);
  EXPECT_EQ(verdict->intervals.size(), 2U);
  EXPECT_EQ(verdict->AIC, verdict->V + 4.0);
  EXPECT_EQ(verdict->BIC, verdict->V + 2.0 * std::log(12.0));
}

TEST(Examiner, KnowsWhatIsAboutToBeRejected) {
  const estimation::Problem truth = against_decay(first_order());
  EXPECT_FALSE(Examiner(truth, {}).about_to_be_rejected(fitted(truth)));
  const estimation::Problem rival = against_decay(zeroth_order());
  EXPECT_TRUE(Examiner(rival, {}).about_to_be_rejected(fitted(rival)));
  EXPECT_TRUE(Examiner(truth, {}).about_to_be_rejected(estimation::Fit{}));
}

TEST(Examiner, FindsTheLeastVBesideTheLikeliest) {
  estimation::Readout readout = shows("signal", "A", 0.05);
  readout.noise.relative = 0.3;
  const estimation::Problem problem =
      problem_of(first_order(), wide_ranges(), {readout},
                 {Bench("run-01").data("signal", SimulatedDecay{}.readings(0))});
  Examiner examiner(problem, {});
  const estimation::Fit likeliest = fitted(problem);
  const estimation::Fit least = examiner.least_V_from(likeliest);
  EXPECT_LT(least.V, likeliest.V);
  const std::optional<Verdict> verdict = examiner.examine(likeliest, least);
  ASSERT_TRUE(verdict);
  EXPECT_EQ(verdict->full.V, least.V);
  EXPECT_EQ(verdict->reduced.V, verdict->V);
}

TEST(Examiner, TakesTheFitForItsLeastVWhereTheSdIsConstant) {
  const estimation::Problem problem = against_decay(first_order());
  const estimation::Fit fit = fitted(problem);
  EXPECT_EQ(Examiner(problem, {}).least_V_from(fit).V, fit.V);
}

TEST(Examiner, GivesVAllOfAlphaWhereOrderCannotCount) {
  SimulatedDecay decay;
  decay.points = 3;  // two unknowns: one degree is left
  const estimation::Problem problem = against_decay(first_order(), decay);
  Examiner examiner(problem, {});
  const estimation::Fit fit = fitted(problem);
  const std::optional<Verdict> verdict = examiner.examine(fit, fit);
  ASSERT_TRUE(verdict);
  EXPECT_EQ(verdict->share_of_V, 1.0);
  EXPECT_EQ(verdict->share_of_order, 0.0);
  EXPECT_EQ(verdict->p_value, verdict->full.p_value);
}

}  // namespace
}  // namespace gainsay::stats
