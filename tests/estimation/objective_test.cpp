#include "gainsay/estimation/objective.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/testing/small_problems.h"

#include <gtest/gtest.h>

#include <limits>

namespace gainsay::estimation {
namespace {

using Want = Evaluator::Want;
constexpr long kNoLimit = std::numeric_limits<long>::max();

Problem decay() {
  return testing::small_problem(
      {.states = {{"A", "-k * A", "a0"}}, .unknowns = {"k", "a0"}, .readouts = {"A"}},
      {testing::unknown("k", 0.01, 10), testing::unknown("a0", 0.1, 10)},
      {{{}, {{0, {{1.0, 0.9}, {2.0, 0.3}}, 0.1, {}}}}});
}

TEST(LocalModel, IsHalfTheQuadraticModelOfASumOfSquares) {
  Evaluation evaluation;
  evaluation.r = evaluation.slope = Eigen::Vector2d(1.0, -2.0);
  evaluation.curvature = Eigen::Vector2d(1.0, 1.0);
  evaluation.J = (Eigen::Matrix2d() << 1.0, 2.0, 3.0, 4.0).finished();
  evaluation.objective = 5.0;
  const LocalModel model = local_model(evaluation);
  EXPECT_EQ(model.value, 5.0);
  EXPECT_EQ(model.gradient, Eigen::VectorXd(Eigen::Vector2d(-5.0, -6.0)));
  EXPECT_EQ(model.curvature, Eigen::MatrixXd((Eigen::Matrix2d() << 10, 14, 14, 20).finished()));
}

TEST(LocalModel, WantsAJacobian) {
  Evaluation evaluation;
  evaluation.r = Eigen::Vector2d(1.0, -2.0);
  EXPECT_THROW((void)local_model(evaluation), core::BrokenPromise);
}

TEST(Allowance, CountsWhatIsUsed) {
  const Problem problem = decay();
  Evaluator evaluator(problem);
  const Eigen::VectorXd x = Eigen::Vector2d(0.0, 0.0);
  (void)evaluator.evaluate(x, Want::Residuals);
  Allowance allowance(evaluator, kNoLimit, {});
  EXPECT_TRUE(allowance.evaluate(x, Want::Residuals, {}));
  EXPECT_TRUE(allowance.evaluate(x, Want::ResidualsAndJacobian, {}));
  EXPECT_FALSE(allowance.evaluate(x, Want::Residuals, {}, 0.0));
  EXPECT_EQ(allowance.evaluations(), 2);
  EXPECT_EQ(allowance.jacobians(), 1);
  EXPECT_EQ(allowance.integrations(), 3);  // without the one before it was made
}

TEST(Allowance, ClosesWhenItIsUsedUp) {
  const Problem problem = decay();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, 1, {});
  const Eigen::VectorXd x = Eigen::Vector2d(0.0, 0.0);
  EXPECT_FALSE(allowance.closed());
  EXPECT_TRUE(allowance.evaluate(x, Want::Residuals, {}));
  EXPECT_TRUE(allowance.out_of_budget());
  EXPECT_FALSE(allowance.evaluate(x, Want::Residuals, {}));
  EXPECT_EQ(evaluator.integrations(), 1);
}

TEST(Allowance, ClosesWhenInterrupted) {
  const Problem problem = decay();
  Evaluator evaluator(problem);
  std::stop_source source;
  Allowance allowance(evaluator, kNoLimit, source.get_token());
  EXPECT_FALSE(allowance.interrupted());
  source.request_stop();
  EXPECT_TRUE(allowance.closed());
  EXPECT_FALSE(allowance.evaluate(Eigen::Vector2d(0.0, 0.0), Want::Residuals, {}));
}

TEST(Objective, IsTheLandscapeOfItsStage) {
  const Problem problem = decay();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Stage tempered{.tempered = true};
  Objective objective(allowance, tempered);
  const Eigen::VectorXd x = Eigen::Vector2d(0.3, -0.2);
  const double value = (*evaluator.evaluate(x, Want::Residuals, tempered))->objective;
  EXPECT_EQ(objective.value(x, 1e9), value);
  EXPECT_FALSE(objective.value(x, 0.5 * value));
  // The two differ by their integrations, to 1e-10 of states that are divided by sds above 0.1.
  EXPECT_NEAR(objective.model(x)->value, value, 1e-7 * value);
}

}  // namespace
}  // namespace gainsay::estimation
