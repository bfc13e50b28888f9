#include "gainsay/core/simplify.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"
#include "gainsay/testing/fifty_digits.h"
#include "gainsay/testing/random_expressions.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

using ::gainsay::testing::Dice;
using ::gainsay::testing::Fifty;
using ::gainsay::testing::FiftyValues;
using ::gainsay::testing::in_fifty_digits;
using ::gainsay::testing::random_expression;
using ::gainsay::testing::random_point;
using ::gainsay::testing::Smoothness;

std::size_t operations(const Expression& expression) {
  std::size_t count = 0;
  for (const Expression& node : nodes_in_order(expression))
    count += node.operands().empty() ? 0 : 1;
  return count;
}

std::string simple(std::string_view text) { return print_text(simplify(parse(text)->expression)); }

TEST(Simplify, FoldsNumbersWhereThatIsExact) {
  EXPECT_EQ(simple("1 + 2 * 3"), "7");
  EXPECT_EQ(simple("x^(3 - 1)"), "x^2");
  EXPECT_EQ(simple("1 / 3"), "1 / 3");
  EXPECT_EQ(simple("0.1 + 0.2"), "0.1 + 0.2");
  EXPECT_EQ(simple("exp(0) + sqrt(9)"), "4");
  EXPECT_EQ(simple("ln(10)"), "ln(10)");
}

TEST(Simplify, RemovesZerosAndOnes) {
  EXPECT_EQ(simple("x + 0"), "x");
  EXPECT_EQ(simple("0 + x"), "x");
  EXPECT_EQ(simple("x - 0"), "x");
  EXPECT_EQ(simple("0 - x"), "-x");
  EXPECT_EQ(simple("0 * x"), "0");
  EXPECT_EQ(simple("x * 1"), "x");
  EXPECT_EQ(simple("-1 * x"), "-x");
  EXPECT_EQ(simple("0 / x"), "0");
  EXPECT_EQ(simple("x / 1"), "x");
  EXPECT_EQ(simple("x^1"), "x");
  EXPECT_EQ(simple("x^0"), "1");
  EXPECT_EQ(simple("1^x"), "1");
}

TEST(Simplify, UndoesMinuses) {
  EXPECT_EQ(simple("--x"), "x");
  EXPECT_EQ(simple("a - -b"), "a + b");
  EXPECT_EQ(simple("a + -b"), "a - b");
  EXPECT_EQ(simple("-a + b"), "b - a");
  EXPECT_EQ(simple("-(a - b)"), "b - a");
  EXPECT_EQ(simple("-a * -b"), "a * b");
  EXPECT_EQ(simple("-a / b"), "-(a / b)");
  EXPECT_EQ(simple("-(2 * x)"), "-2 * x");
}

TEST(Simplify, GathersLikeTerms) {
  EXPECT_EQ(simple("x + x"), "2 * x");
  EXPECT_EQ(simple("2 * x + 3 * x"), "5 * x");
  EXPECT_EQ(simple("x - x"), "0");
  EXPECT_EQ(simple("3 * x - 2 * x"), "x");
  EXPECT_EQ(simple("x - 2 * x"), "-x");
  EXPECT_EQ(simple("0.1 * x + 0.2 * x"), "0.1 * x + 0.2 * x");
}

TEST(Simplify, GathersEqualPowers) {
  EXPECT_EQ(simple("x * x"), "x^2");
  EXPECT_EQ(simple("a * b * (a * b)"), "(a * b)^2");
  EXPECT_EQ(simple("x^2 * y * x^3"), "x^5 * y");
  EXPECT_EQ(simple("2 * x * 3"), "6 * x");
  EXPECT_EQ(simple("2 * (x * 3)"), "6 * x");
  EXPECT_EQ(simple("x / x"), "1");
  EXPECT_EQ(simple("a * x / x"), "a");
  EXPECT_EQ(simple("x^3 / x"), "x^2");
  EXPECT_EQ(simple("x / x^3"), "1 / x^2");
  EXPECT_EQ(simple("4 * x / 2"), "2 * x");
  EXPECT_EQ(simple("(x^2)^3"), "x^6");
  EXPECT_EQ(simple("a * (1 / b)"), "a / b");
}

TEST(Simplify, KeepsWhatWouldChangeValues) {
  EXPECT_EQ(simple("(x^2)^0.5"), "(x^2)^0.5");  // |x|
  EXPECT_EQ(simple("x^n * x"), "x^n * x");
  EXPECT_EQ(simple("1 / 0"), "1 / 0");
  EXPECT_EQ(simple("0 / 0"), "0 / 0");
  EXPECT_EQ(simple("a * b + c * b"), "a * b + c * b");
}

TEST(Simplify, DecidesWhatIsDecided) {
  EXPECT_EQ(simple("if(1 < 2, a, b)"), "a");
  EXPECT_EQ(simple("if(c, a, a)"), "a");
  EXPECT_EQ(simple("not 0 and 3 > 2"), "1");
}

TEST(Simplify, LeavesTheNodeWhereNothingChanges) {
  const Expression simple_already = parse("k * A / (K + A) - exp(-B)")->expression;
  EXPECT_EQ(simplify(simple_already).identity(), simple_already.identity());
}

TEST(Simplify, KeepsSharing) {
  Expression shared = Expression::symbol("x");
  for (int i = 0; i < 100; ++i) shared = shared * shared + Expression::symbol("y") * 1.0;
  EXPECT_LE(nodes_in_order(simplify(shared)).size(), 1000U);
}

TEST(Simplify, LongChainsStayAsTheyAre) {
  Expression product = Expression::symbol("x");
  for (int i = 0; i < 20'000; ++i) product = product * Expression::symbol("y");
  EXPECT_EQ(evaluate(simplify(product), {{"x", 3.0}, {"y", 1.0}}), 3.0);
}

TEST(Simplify, NeverChangesTheValue) {
  constexpr std::uint64_t kSeed = 99;
  // All folding is exact: fifty digits are lost to the condition of the expression alone, and 20 of
  // them leave room for that of any expression of depth 4 that keeps its values below 1e10.
  const Fifty tolerance("1e-30");
  Dice dice(kSeed);
  int compared = 0;
  for (int i = 0; i < 2000; ++i) {
    const Expression expression = random_expression(dice, 4, Smoothness::Any);
    const FiftyValues point = random_point(dice);
    const Fifty before = in_fifty_digits(expression, point);
    if (!isfinite(before) || abs(before) > Fifty("1e10")) continue;
    const Fifty after = in_fifty_digits(simplify(expression), point);
    EXPECT_LE(abs(after - before), tolerance * (1 + abs(before)))
        << print_text(expression) << " became " << print_text(simplify(expression));
    ++compared;
  }
  EXPECT_GT(compared, 1000);
}

TEST(Simplify, NeverNeedsMoreOperations) {
  constexpr std::uint64_t kSeed = 5;
  Dice dice(kSeed);
  for (int i = 0; i < 2000; ++i) {
    const Expression expression = random_expression(dice, 5, Smoothness::Any);
    EXPECT_LE(operations(simplify(expression)), operations(expression))
        << print_text(expression) << " became " << print_text(simplify(expression));
  }
}

}  // namespace
}  // namespace gainsay::core
