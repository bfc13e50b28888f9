#include "gainsay/estimation/approach.h"

#include "gainsay/estimation/coordinates.h"
#include "gainsay/testing/decay_data.h"

#include <gtest/gtest.h>

#include <limits>

namespace gainsay::estimation {
namespace {

using testing::TwoSteps;
constexpr long kNoLimit = std::numeric_limits<long>::max();

TEST(BoxOf, IsThatOfTheRangesInSearchCoordinates) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  const Box box = box_of(problem);
  EXPECT_EQ(box.low, lower_bounds(problem.unknowns));
  EXPECT_EQ(box.high, upper_bounds(problem.unknowns));
}

TEST(UnitsOf, AreATenthOfALinearRange) {
  Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  problem.unknowns[1].linear = true;
  EXPECT_EQ(units_of(problem), Eigen::VectorXd(Eigen::Vector3d(1.0, 0.1, 1.0)));
}

TEST(Approach, GetsIntoTheBasinFromEveryCornerOfHalfTheBox) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0, 0, 1e-6);
  Evaluator evaluator(problem);
  const double V_at_truth = (*evaluator.evaluate(to_coordinates(problem.unknowns, TwoSteps::kTruth),
                                                 Evaluator::Want::Residuals))
                                ->V;
  const Box box = box_of(problem);
  for (int corner = 0; corner < 8; ++corner) {
    Eigen::VectorXd start(3);
    for (int i = 0; i < 3; ++i) start[i] = 0.5 * ((corner >> i) & 1 ? box.high[i] : box.low[i]);
    Allowance allowance(evaluator, kNoLimit, {});
    const auto near = approach(allowance, start, Stages::All);
    ASSERT_TRUE(near.has_value());
    EXPECT_LE((*evaluator.evaluate(*near, Evaluator::Want::Residuals))->V, V_at_truth)
        << "corner " << corner;
  }
}

TEST(Approach, EndsWhereNothingIsGainedInTheLastStage) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const auto near = approach(allowance, Eigen::Vector3d(0.5, 0.5, 0.5), Stages::All);
  const auto again = approach(allowance, *near, Stages::LastOnly);
  const auto V = [&](const Eigen::VectorXd& x) {
    return (*evaluator.evaluate(x, Evaluator::Want::Residuals))->V;
  };
  EXPECT_LE(V(*again), V(*near));
  EXPECT_LT(V(*near) - V(*again), 0.01);  // the least gain that the last stage goes on for
}

TEST(Approach, SkipsStagesThatSeeNothingNew) {
  // All data at one time: the horizons of the first two stages see none of them.
  const Problem problem =
      testing::small_problem(TwoSteps::text(), TwoSteps::unknowns(),
                             {{{}, {{0, {{4.0, 0.2}}, 0.1, {}}, {1, {{4.0, 1.0}}, 0.1, {}}}}});
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const auto near = approach(allowance, Eigen::Vector3d(-0.5, -1.0, 1.0), Stages::All);
  ASSERT_TRUE(near.has_value());
  EXPECT_LT((*evaluator.evaluate(*near, Evaluator::Want::Residuals))->V,
            0.01);  // 2 data, 3 unknowns
}

TEST(Approach, GivesNothingWhereTheStartCannotBeIntegrated) {
  // dy/dt = k y^2 from 1 is infinite at t = 1 / k, before the first datum.
  const Problem problem = testing::small_problem(
      {.states = {{"y", "k * y^2", "1"}}, .unknowns = {"k"}, .readouts = {"y"}},
      {testing::unknown("k", 0.01, 10)}, {{{}, {{0, {{1.0, 1.2}, {2.0, 1.4}}, 0.1, {}}}}});
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const auto at = [](double k) { return Eigen::VectorXd::Constant(1, std::log(k)); };
  EXPECT_FALSE(approach(allowance, at(5.0), Stages::All).has_value());
  EXPECT_TRUE(approach(allowance, at(0.05), Stages::All).has_value());
}

TEST(Approach, StopsWhenItsAllowanceIsUsedUp) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, 3, {});
  EXPECT_TRUE(approach(allowance, Eigen::Vector3d(3.0, -3.0, 3.0), Stages::All).has_value());
  EXPECT_EQ(evaluator.integrations(), 3);
}

}  // namespace
}  // namespace gainsay::estimation
