#include "gainsay/core/expression.h"

#include "gainsay/core/require.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <numbers>
#include <utility>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;

const Expression kX = Expression::symbol("x");
const Expression kY = Expression::symbol("y");

double applied(Operation operation, std::vector<Expression> operands) {
  return evaluate(Expression::make(operation, std::move(operands)), {});
}

/// x doubled n times: 2^n terms when written out, n + 1 nodes as a graph.
Expression doubled(int times) {
  Expression result = kX;
  for (int i = 0; i < times; ++i) result = result + result;
  return result;
}

TEST(Expression, EqualStructuresAreEqualAndHashAlike) {
  const Expression a = kX * (kY + 2.0);
  const Expression b = Expression::symbol("x") * (Expression::symbol("y") + 2.0);
  EXPECT_EQ(a, b);
  EXPECT_EQ(a.hash(), b.hash());
  EXPECT_FALSE(a == kX * (kY + 3.0));
  EXPECT_FALSE(kX + kY == kY + kX);
  EXPECT_FALSE(kX == kY);
  EXPECT_FALSE(kX - kY == kX + kY);
}

TEST(Expression, ZeroAndMinusZeroAreTwoNumbers) {
  EXPECT_FALSE(Expression(0.0) == Expression(-0.0));
  EXPECT_TRUE(Expression(-0.0).is_number(0.0));
}

TEST(Expression, RefusesWhatItIsNot) {
  EXPECT_THROW(kX.number(), BrokenPromise);
  EXPECT_THROW(Expression(1.0).name(), BrokenPromise);
  EXPECT_THROW(Expression::make(Operation::Add, {kX}), BrokenPromise);
  EXPECT_THROW(Expression::make(Operation::Number, {}), BrokenPromise);
  EXPECT_THROW(evaluate(kX, {}), BrokenPromise);
}

TEST(Expression, EvaluatesEveryOperation) {
  EXPECT_EQ(applied(Operation::Negate, {3.0}), -3.0);
  EXPECT_EQ(applied(Operation::Add, {3.0, 4.0}), 7.0);
  EXPECT_EQ(applied(Operation::Subtract, {3.0, 4.0}), -1.0);
  EXPECT_EQ(applied(Operation::Multiply, {3.0, 4.0}), 12.0);
  EXPECT_EQ(applied(Operation::Divide, {3.0, 4.0}), 0.75);
  EXPECT_EQ(applied(Operation::Power, {3.0, 4.0}), 81.0);
  EXPECT_EQ(applied(Operation::Exp, {0.0}), 1.0);
  EXPECT_EQ(applied(Operation::Ln, {1.0}), 0.0);
  EXPECT_EQ(applied(Operation::Log10, {1000.0}), 3.0);
  EXPECT_EQ(applied(Operation::Sqrt, {2.25}), 1.5);
  EXPECT_EQ(applied(Operation::Abs, {-2.0}), 2.0);
  EXPECT_EQ(applied(Operation::Sin, {0.0}), 0.0);
  EXPECT_EQ(applied(Operation::Cos, {0.0}), 1.0);
  EXPECT_EQ(applied(Operation::Tan, {0.0}), 0.0);
  EXPECT_EQ(applied(Operation::Tanh, {0.0}), 0.0);
  EXPECT_EQ(applied(Operation::Min, {3.0, 4.0}), 3.0);
  EXPECT_EQ(applied(Operation::Max, {3.0, 4.0}), 4.0);
  EXPECT_EQ(applied(Operation::If, {1.0, 3.0, 4.0}), 3.0);
  EXPECT_EQ(applied(Operation::If, {0.0, 3.0, 4.0}), 4.0);
}

TEST(Expression, EvaluatesComparisonsAndLogicToOneAndZero) {
  EXPECT_EQ(applied(Operation::Less, {3.0, 3.0}), 0.0);
  EXPECT_EQ(applied(Operation::LessEqual, {3.0, 3.0}), 1.0);
  EXPECT_EQ(applied(Operation::Greater, {4.0, 3.0}), 1.0);
  EXPECT_EQ(applied(Operation::GreaterEqual, {2.0, 3.0}), 0.0);
  EXPECT_EQ(applied(Operation::Equal, {3.0, 3.0}), 1.0);
  EXPECT_EQ(applied(Operation::NotEqual, {3.0, 3.0}), 0.0);
  EXPECT_EQ(applied(Operation::And, {5.0, 0.5}), 1.0);
  EXPECT_EQ(applied(Operation::And, {5.0, 0.0}), 0.0);
  EXPECT_EQ(applied(Operation::Or, {0.0, -1.0}), 1.0);
  EXPECT_EQ(applied(Operation::Or, {0.0, 0.0}), 0.0);
  EXPECT_EQ(applied(Operation::Not, {0.0}), 1.0);
  EXPECT_EQ(applied(Operation::Not, {2.0}), 0.0);
}

// Values of the elementary functions to 10 digits: Abramowitz & Stegun (1964), tables 4.1, 4.4,
// 4.6, 4.15.
TEST(Expression, AgreesWithPrintedTables) {
  constexpr double kHalfOfTheTenthDigit = 0.5e-10;
  EXPECT_NEAR(applied(Operation::Exp, {0.5}), 1.6487212707, kHalfOfTheTenthDigit);
  EXPECT_NEAR(applied(Operation::Ln, {2.0}), 0.6931471806, kHalfOfTheTenthDigit);
  EXPECT_NEAR(applied(Operation::Sin, {1.0}), 0.8414709848, kHalfOfTheTenthDigit);
  EXPECT_NEAR(applied(Operation::Cos, {1.0}), 0.5403023059, kHalfOfTheTenthDigit);
  EXPECT_NEAR(applied(Operation::Tanh, {0.5}), 0.4621171573, kHalfOfTheTenthDigit);
}

TEST(Expression, SubstitutesOnceAndAllAtATime) {
  const Expression swapped = substitute(kX - kY, {{"x", kY}, {"y", kX}});
  EXPECT_EQ(swapped, kY - kX);
}

TEST(Expression, KeepsWhatSubstitutionDoesNotTouch) {
  const Expression untouched = kY * 2.0;
  const Expression before = kX + untouched;
  const Expression after = substitute(before, {{"x", 1.0}});
  EXPECT_EQ(after.operands()[1].identity(), untouched.identity());
  EXPECT_EQ(substitute(before, {{"z", 1.0}}).identity(), before.identity());
}

TEST(Expression, KnowsItsSymbols) {
  const Expression expression = kX * Expression::symbol("t") + kX;
  EXPECT_THAT(symbols(expression), ElementsAre("t", "x"));
  EXPECT_TRUE(depends_on(expression, "t"));
  EXPECT_FALSE(depends_on(expression, "y"));
}

TEST(Expression, SharedPartsCostOnce) {
  const Expression big = doubled(200);
  EXPECT_EQ(evaluate(big, {{"x", 1.0}}), std::ldexp(1.0, 200));
  EXPECT_THAT(symbols(big), ElementsAre("x"));
  EXPECT_EQ(evaluate(substitute(big, {{"x", kY}}), {{"y", 1.0}}), std::ldexp(1.0, 200));
  EXPECT_EQ(big, doubled(200));
  EXPECT_FALSE(big == doubled(199));
}

TEST(Expression, NoDepthExhaustsTheStack) {
  constexpr int kDepth = 100'000;
  Expression deep = kX;
  for (int i = 0; i < kDepth; ++i) deep = -deep;
  Expression same = kX;
  for (int i = 0; i < kDepth; ++i) same = -same;
  EXPECT_EQ(deep, same);
  EXPECT_EQ(evaluate(substitute(deep, {{"x", kY}}), {{"y", 2.0}}), 2.0);
}

}  // namespace
}  // namespace gainsay::core
