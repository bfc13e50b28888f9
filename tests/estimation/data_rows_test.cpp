#include "gainsay/estimation/data_rows.h"

#include "gainsay/testing/small_problems.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::estimation {
namespace {

using gainsay::testing::small_problem;
using gainsay::testing::SystemText;
using ::testing::DoubleEq;

const SystemText kDecay{
    .states = {{"A", "-k * A", "a0"}}, .unknowns = {"k", "a0"}, .readouts = {"A", "2 * A"}};

Problem problem_with(Noise first, double sd = kNotGiven) {
  return small_problem(
      kDecay, {gainsay::testing::unknown("k", 0.1, 10), gainsay::testing::unknown("a0", 0.1, 10)},
      {{{},
        {{0, {{0.5, 3.0}, {1.0, -4.0}, {3.0, 1.0}}, sd, first},
         {1, {{1.0, 0.0}, {2.0, 0.0}}, 0.3, {}}}}});
}

TEST(DataRows, AreNumberedByResidualAndOrderedByTime) {
  const auto tables = data_rows(problem_with({.sd = 0.5}));
  ASSERT_EQ(tables.size(), 1u);
  std::vector<std::size_t> numbers;
  std::vector<double> times;
  for (const DataRow& row : tables[0].rows) {
    numbers.push_back(row.number);
    times.push_back(row.time);
  }
  EXPECT_THAT(times, ::testing::ElementsAre(0.5, 1.0, 1.0, 2.0, 3.0));
  EXPECT_THAT(numbers, ::testing::ElementsAre(0, 1, 3, 4, 2));
  EXPECT_EQ(tables[0].last, 3.0);
}

TEST(DataRows, WithinAHorizonAreThoseUpToItsShareOfTheTime) {
  const ExperimentRows table = data_rows(problem_with({.sd = 0.5}))[0];
  EXPECT_EQ(table.within(0.1), 0u);
  EXPECT_EQ(table.within(1.0 / 3.0), 3u);  // up to 1.0
  EXPECT_EQ(table.within(2.0 / 3.0), 4u);
  EXPECT_EQ(table.within(1.0), 5u);
}

TEST(DataRows, TakeThePointsOwnSdBeforeTheNoise) {
  const auto own = data_rows(problem_with({.sd = 0.5, .relative = 0.1}, 0.25))[0].rows[0];
  EXPECT_THAT(own.scatter.constant, DoubleEq(0.0625));
  EXPECT_EQ(own.scatter.relative_squared, 0.0);
  const auto noise = data_rows(problem_with({.sd = 0.5, .relative = 0.1}))[0].rows[0];
  EXPECT_THAT(noise.scatter.constant, DoubleEq(0.25));
  EXPECT_THAT(noise.scatter.relative_squared, DoubleEq(0.01));
  EXPECT_EQ(noise.scatter.floor, 0.0);
}

TEST(DataRows, FloorOnlyAProportionalSd) {
  const auto row = data_rows(problem_with({.relative = 0.1}))[0].rows[0];
  EXPECT_EQ(row.scatter.constant, 0.0);
  EXPECT_THAT(row.scatter.floor, DoubleEq(4e-6 * 4e-6));  // 1e-6 of the largest |value|, 4
}

TEST(DataRows, TemperByATenthOfTheLargestValueOfTheSeries) {
  const auto rows = data_rows(problem_with({.sd = 0.5}))[0].rows;
  EXPECT_THAT(rows[0].tempered().constant, DoubleEq(0.25 + 0.16));
  // A series of zeros alone takes the readout's size, which is 1 where that is 0 too.
  EXPECT_THAT(rows[2].tempered().constant, DoubleEq(0.09 + 0.01));
}

TEST(DataRows, OfUnknownNoiseBelongToAGroup) {
  const Problem problem = problem_with({.sd_unknown = true});
  const auto rows = data_rows(problem)[0].rows;
  EXPECT_EQ(rows[0].group, 0u);
  EXPECT_FALSE(rows[2].group.has_value());
  EXPECT_THAT(rows[0].tempered().constant, DoubleEq(0.16));
  const std::vector<NoiseGroup> groups = noise_groups(problem);
  ASSERT_EQ(groups.size(), 1u);
  EXPECT_EQ(groups[0].count, 3u);
  EXPECT_THAT(groups[0].floor, DoubleEq(4e-6));
  EXPECT_EQ(groups[0].sum_squares, 0.0);
}

TEST(DataRows, WithAnSdOfTheirOwnAreInNoGroup) {
  const Problem problem = problem_with({.sd_unknown = true}, 0.25);
  EXPECT_FALSE(data_rows(problem)[0].rows[0].group.has_value());
  EXPECT_EQ(noise_groups(problem)[0].count, 0u);
}

}  // namespace
}  // namespace gainsay::estimation
