#include "gainsay/stats/moved_bounds.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

estimation::Unknown ranged(const char* name, double low, double high, bool linear) {
  estimation::Unknown unknown;
  unknown.name = name;
  unknown.low = low;
  unknown.high = high;
  unknown.linear = linear;
  return unknown;
}

estimation::Problem problem_with(std::vector<estimation::Unknown> unknowns) {
  estimation::Problem problem;
  problem.unknowns = std::move(unknowns);
  return problem;
}

TEST(MovableBounds, AreThoseThatTheFitLiesOn) {
  const estimation::Problem problem = problem_with(
      {ranged("a", 0.1, 10, false), ranged("b", 0.1, 10, false), ranged("c", -1, 1, true)});
  const std::vector<Bound> bounds = movable_bounds(problem, {0.1, 5, 1}, {true, false, true});
  ASSERT_EQ(bounds.size(), 2U);
  EXPECT_EQ(bounds[0].unknown, 0U);
  EXPECT_TRUE(bounds[0].lower);
  EXPECT_EQ(bounds[1].unknown, 2U);
  EXPECT_FALSE(bounds[1].lower);
}

TEST(MovableBounds, AreNotHardOnesNorAConstantAtZero) {
  estimation::Unknown hard = ranged("hard", 0.1, 10, false);
  hard.hard = true;
  estimation::Unknown offset = ranged("offset", 0, 1, true);
  offset.kind = estimation::UnknownKind::Measurement;
  const estimation::Problem problem = problem_with({hard, ranged("k", 0, 1, true), offset});
  const std::vector<Bound> bounds = movable_bounds(problem, {0.1, 0, 0}, {true, true, true});
  ASSERT_EQ(bounds.size(), 1U);
  EXPECT_EQ(bounds[0].unknown, 2U);
  EXPECT_EQ(movable_bounds(problem, {0.1, 1, 0.5}, {false, true, false}).size(), 1U);
}

TEST(MovedOut, IsTenfoldOrByOneWidth) {
  const estimation::Problem problem = problem_with(
      {ranged("a", 0.1, 10, false), ranged("b", 0.1, 10, false), ranged("c", 2, 5, true)});
  const estimation::Problem wider = moved_out(problem, {{0, true}, {1, false}, {2, false}});
  EXPECT_DOUBLE_EQ(wider.unknowns[0].low, 0.01);
  EXPECT_EQ(wider.unknowns[0].high, 10);
  EXPECT_EQ(wider.unknowns[1].high, 100);
  EXPECT_EQ(wider.unknowns[2].low, 2);
  EXPECT_EQ(wider.unknowns[2].high, 8);
}

TEST(MovedOut, TakesNoRateConstantBelowZero) {
  estimation::Unknown offset = ranged("offset", 2, 5, true);
  offset.kind = estimation::UnknownKind::Measurement;
  const estimation::Problem problem = problem_with({ranged("k", 2, 5, true), offset});
  const estimation::Problem wider = moved_out(problem, {{0, true}, {1, true}});
  EXPECT_EQ(wider.unknowns[0].low, 0);
  EXPECT_EQ(wider.unknowns[1].low, -1);
}

TEST(MovedBounds, TellWhatMoved) {
  const estimation::Problem problem =
      problem_with({ranged("a", 0.1, 10, false), ranged("b", 0.1, 10, false)});
  const estimation::Problem wider = moved_out(moved_out(problem, {{1, false}}), {{1, false}});
  const std::vector<MovedBound> moved = moved_bounds(problem, wider, 12.5);
  ASSERT_EQ(moved.size(), 1U);
  EXPECT_EQ(moved[0].unknown, "b");
  EXPECT_FALSE(moved[0].lower);
  EXPECT_EQ(moved[0].stated, 10);
  EXPECT_EQ(moved[0].moved_to, 1000);
  EXPECT_EQ(moved[0].V, 12.5);
}

TEST(MovableBounds, WantAValueForEachUnknown) {
  EXPECT_THROW(movable_bounds(problem_with({ranged("a", 1, 2, true)}), {}, {}),
               core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
