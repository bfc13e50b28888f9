#include "gainsay/stats/standardized.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::stats {
namespace {

// A few additions and a root.
constexpr double kRounding = 1e-14;

/// Two readings of known sd, two of unknown one, and a prior.
estimation::Problem mixed() {
  estimation::Problem problem;
  problem.noise_groups = {"glow"};
  problem.unknowns.resize(1);
  problem.unknowns[0].prior = estimation::Prior{1.0, 0.1, {}};
  problem.experiments.resize(1);
  problem.experiments[0].series.resize(2);
  for (estimation::FittedSeries& series : problem.experiments[0].series) series.data.resize(2);
  problem.experiments[0].series[0].data[0].sd = 0.5;
  problem.experiments[0].series[0].data[1].sd = 0.5;
  problem.experiments[0].series[1].noise.sd_unknown = true;
  problem.experiments[0].series[1].data[0].value = 100.0;
  problem.experiments[0].series[1].data[1].value = 50.0;
  return problem;
}

estimation::Evaluation evaluation() {
  estimation::Evaluation evaluation;
  evaluation.r.resize(5);
  evaluation.r << 1, 2, 3, -4, 0.5;
  evaluation.J = Eigen::MatrixXd::Constant(5, 1, 10.0);
  evaluation.sd.resize(4);
  evaluation.sd << 0.5, 0.5, 1, 1;
  evaluation.shown = Eigen::VectorXd::Zero(4);
  return evaluation;
}

TEST(Standardized, TakesUnknownNoiseInUnitsOfItsFittedSd) {
  const Standardized all = standardized(mixed(), evaluation());
  const double sd = std::sqrt(12.5 + 1e-8);  // (9 + 16) / 2, and the floor (1e-6 x 100)^2
  ASSERT_EQ(all.noise.size(), 1U);
  EXPECT_EQ(all.noise[0].readout, "glow");
  EXPECT_EQ(all.noise[0].points, 2U);
  EXPECT_EQ(all.noise[0].sum_of_squares, 25.0);
  EXPECT_NEAR(all.noise[0].sd, sd, kRounding);
  EXPECT_NEAR(all.r[2], 3.0 / sd, kRounding);
  EXPECT_NEAR(all.J(3, 0), 10.0 / sd, kRounding);
  EXPECT_NEAR(all.sd[3], sd, kRounding);
  EXPECT_NEAR(all.V, 1 + 4 + 25.0 / (sd * sd) + 0.25, 10 * kRounding);
}

TEST(Standardized, LeavesKnownNoiseAndPriorsAsTheyAre) {
  const Standardized all = standardized(mixed(), evaluation());
  EXPECT_EQ(all.r[1], 2.0);
  EXPECT_EQ(all.J(1, 0), 10.0);
  EXPECT_EQ(all.sd[0], 0.5);
  EXPECT_EQ(all.r[4], 0.5);
}

TEST(Standardized, TakesAPointWithAnSdOfItsOwnByThatAlone) {
  estimation::Problem problem = mixed();
  problem.experiments[0].series[1].data[1].sd = 2.0;
  const Standardized all = standardized(problem, evaluation());
  EXPECT_EQ(all.noise[0].points, 1U);
  EXPECT_EQ(all.r[3], -4.0);
}

TEST(Standardized, WantsAllResiduals) {
  estimation::Evaluation short_one = evaluation();
  short_one.r.conservativeResize(4);
  EXPECT_THROW(standardized(mixed(), short_one), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
