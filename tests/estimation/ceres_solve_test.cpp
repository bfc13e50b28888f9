#include "gainsay/estimation/ceres_solve.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/approach.h"
#include "gainsay/testing/decay_data.h"

#include <Eigen/QR>
#include <gtest/gtest.h>

#include <limits>
#include <numeric>

namespace gainsay::estimation {
namespace {

using testing::TwoSteps;
constexpr long kNoLimit = std::numeric_limits<long>::max();

std::vector<Eigen::Index> all(Eigen::Index n) {
  std::vector<Eigen::Index> numbers(static_cast<std::size_t>(n));
  std::iota(numbers.begin(), numbers.end(), Eigen::Index{0});
  return numbers;
}

/// A straight line with known sds: readout b + m t, no states.
Problem line() {
  return testing::small_problem(
      {.states = {}, .unknowns = {"b", "m"}, .readouts = {"b + m * t"}},
      {testing::linear_unknown("b", -10, 10), testing::linear_unknown("m", -10, 10)},
      {{{}, {{0, {{0.0, 1.2}, {1.0, 1.9}, {2.0, 3.3}, {4.0, 4.8}}, 0.5, {}}}}});
}

TEST(SolveWithCeres, SolvesARegressionAsTheNormalEquationsDo) {
  const Problem problem = line();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector2d(-0.2, 0.1));
  bench.set_free(all(2));
  const CeresEnd end = solve_with_ceres(bench);
  EXPECT_TRUE(end.converged) << end.why;
  Eigen::MatrixXd design(4, 2);
  design << 1, 0, 1, 1, 1, 2, 1, 4;
  const Eigen::VectorXd expected =
      design.householderQr().solve(Eigen::Vector4d(1.2, 1.9, 3.3, 4.8)) / 20.0;  // of the width
  // Nothing is integrated; what is left is rounding, of a well-conditioned design.
  EXPECT_LT((bench.x() - expected).cwiseAbs().maxCoeff(), 1e-12);
}

TEST(SolveWithCeres, MovesTheFreeUnknownsAlone) {
  const Problem problem = line();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector2d(0.0, 0.1));
  bench.set_free({1});
  EXPECT_TRUE(solve_with_ceres(bench).converged);
  EXPECT_EQ(bench.x()[0], 0.0);
  // Through the origin: sum t z / sum t^2 = 27.7 / 21.
  EXPECT_NEAR(bench.x()[1] * 20.0, 27.7 / 21.0, 1e-12);
}

TEST(SolveWithCeres, LeavesTheBenchAtTheBestPointItMayEvaluate) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, 3, {});
  const Box box = box_of(problem);
  const Eigen::VectorXd from = Eigen::Vector3d(1.0, -2.0, 0.0);
  Workbench bench(allowance, box, from);
  bench.set_free(all(3));
  const double before = bench.evaluate()->V;
  (void)solve_with_ceres(bench);
  EXPECT_EQ(evaluator.integrations(), 3);
  EXPECT_LE((*evaluator.evaluate(bench.x(), Evaluator::Want::ResidualsAndJacobian))->V, before);
}

TEST(SolveWithCeres, WantsAnUnknownToMove) {
  const Problem problem = line();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector2d(0.0, 0.1));
  EXPECT_THROW((void)solve_with_ceres(bench), core::BrokenPromise);
}

TEST(SolveWithCeres, PrintsNothing) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, 2, {});  // so that every evaluation after the second fails
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector3d(1.0, -2.0, 0.0));
  bench.set_free(all(3));
  ::testing::internal::CaptureStderr();
  ::testing::internal::CaptureStdout();
  (void)solve_with_ceres(bench);
  EXPECT_EQ(::testing::internal::GetCapturedStdout(), "");
  EXPECT_EQ(::testing::internal::GetCapturedStderr(), "");
}

TEST(Workbench, IntegratesAPointOnce) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  const Eigen::VectorXd x = Eigen::Vector3d(0.1, 0.2, 0.3);
  Workbench bench(allowance, box, x);
  const Evaluation* first = bench.evaluate();
  ASSERT_NE(first, nullptr);
  EXPECT_GT(first->J.size(), 0);
  EXPECT_EQ(bench.evaluate(x), first);
  EXPECT_EQ(evaluator.integrations(), 1);
}

TEST(Workbench, RefusesPointsOutsideTheBox) {
  const Problem problem = line();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector2d(0.0, 0.1));
  EXPECT_EQ(bench.evaluate(Eigen::Vector2d(0.0, 0.51)), nullptr);
  EXPECT_NE(bench.evaluate(Eigen::Vector2d(0.0, 0.5)), nullptr);
}

TEST(Workbench, ChangesTheFreeUnknownsAlone) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Box box = box_of(problem);
  Workbench bench(allowance, box, Eigen::Vector3d(0.1, 0.2, 0.3));
  bench.set_free({0, 2});
  const double values[] = {7.0, 9.0};
  EXPECT_EQ(bench.with_free(values), Eigen::VectorXd(Eigen::Vector3d(7.0, 0.2, 9.0)));
}

}  // namespace
}  // namespace gainsay::estimation
