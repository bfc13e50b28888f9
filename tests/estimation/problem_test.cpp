#include "gainsay/estimation/problem.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

namespace gainsay::estimation {
namespace {

Problem small() {
  Problem problem;
  problem.unknowns.resize(2);
  problem.unknowns[0] = {.name = "k", .low = 1, .high = 2};
  problem.unknowns[1] = {.name = "q", .low = 1, .high = 2, .prior = Prior{1.5, 0.1, {}}};
  problem.experiments.resize(1);
  FittedSeries series;
  series.data.resize(3);
  for (auto& datum : series.data) datum.sd = 0.1;
  problem.experiments[0].series.push_back(series);
  return problem;
}

TEST(Problem, PriorsCountAmongTheResiduals) {
  EXPECT_EQ(small().priors(), 1U);
  EXPECT_EQ(small().residuals(), 4U);
}

TEST(Problem, NoiseDependsOnTheModelWhereADatumLeansOnIt) {
  Problem problem = small();
  problem.experiments[0].series[0].noise.relative = 0.1;
  EXPECT_FALSE(problem.noise_depends_on_model()) << "every point has an sd of its own";
  problem.experiments[0].series[0].data[1].sd = kNotGiven;
  EXPECT_TRUE(problem.noise_depends_on_model());
  problem.experiments[0].series[0].noise.relative = 0.0;
  EXPECT_FALSE(problem.noise_depends_on_model());
}

TEST(WithRange, ChangesOneRangeAlone) {
  const Problem problem = small();
  const Problem moved = with_range(problem, 1, 0.1, 2);
  EXPECT_EQ(moved.unknowns[0], problem.unknowns[0]);
  EXPECT_EQ(moved.unknowns[1].low, 0.1);
  EXPECT_EQ(problem.unknowns[1].low, 1);
  EXPECT_THROW(with_range(problem, 2, 0, 1), core::BrokenPromise);
  EXPECT_THROW(with_range(problem, 0, 1, 1), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::estimation
