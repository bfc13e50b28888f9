#include "gainsay/core/derive.h"

#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"
#include "gainsay/testing/derivatives.h"
#include "gainsay/testing/random_expressions.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

using ::gainsay::testing::check_derivatives;
using ::gainsay::testing::derivative_entries;
using ::gainsay::testing::DerivativeCheck;
using ::gainsay::testing::DerivativeEntry;
using ::gainsay::testing::Dice;
using ::gainsay::testing::FiftyValues;
using ::gainsay::testing::random_expression;
using ::gainsay::testing::random_point;
using ::gainsay::testing::Smoothness;
using ::testing::ElementsAre;
using ::testing::IsEmpty;

Expression read(std::string_view text) { return parse(text)->expression; }
std::string derived(std::string_view text) { return print_text(derivative(read(text), "x")); }

// Differentiation rules of any textbook of calculus, e.g. Abramowitz & Stegun (1964), 3.3, 4.
TEST(Derivative, FollowsTheRulesOfTheTextbook) {
  EXPECT_EQ(derived("3"), "0");
  EXPECT_EQ(derived("y"), "0");
  EXPECT_EQ(derived("x"), "1");
  EXPECT_EQ(derived("-x"), "-1");
  EXPECT_EQ(derived("a * x + b"), "a");
  EXPECT_EQ(derived("a - x"), "-1");
  EXPECT_EQ(derived("x * x"), "2 * x");
  EXPECT_EQ(derived("x / a"), "1 / a");
  EXPECT_EQ(derived("x^3"), "3 * x^2");
  EXPECT_EQ(derived("x^2"), "2 * x");
  EXPECT_EQ(derived("x^-1"), "-x^-2");
  EXPECT_EQ(derived("x^n"), "n * x^(n - 1)");
  EXPECT_EQ(derived("a^x"), "a^x * ln(a)");
  EXPECT_EQ(derived("exp(x)"), "exp(x)");
  EXPECT_EQ(derived("ln(x)"), "1 / x");
  EXPECT_EQ(derived("log10(x)"), "1 / (x * ln(10))");
  EXPECT_EQ(derived("sqrt(x)"), "1 / (2 * sqrt(x))");
  EXPECT_EQ(derived("sin(x)"), "cos(x)");
  EXPECT_EQ(derived("cos(x)"), "-sin(x)");
  EXPECT_EQ(derived("tan(x)"), "1 + tan(x)^2");
  EXPECT_EQ(derived("tanh(x)"), "1 - tanh(x)^2");
}

TEST(Derivative, TakesTheBranchThatIsTaken) {
  EXPECT_EQ(derived("abs(x)"), "if(x < 0, -1, 1)");
  EXPECT_EQ(derived("min(x, a)"), "if(x <= a, 1, 0)");
  EXPECT_EQ(derived("max(x, a)"), "if(x >= a, 1, 0)");
  EXPECT_EQ(derived("if(x > a, x^2, b)"), "if(x > a, 2 * x, 0)");
  EXPECT_EQ(derived("x < a and not x == b"), "0");
}

TEST(Derivative, OfAPowerByItsExponentIsExact) {
  EXPECT_EQ(print_text(derivative(read("x^h"), "h")), "x^h * ln(x)");
  EXPECT_EQ(print_text(derivative(read("x^x"), "x")), "x * x^(x - 1) + x^x * ln(x)");
}

TEST(Derivative, ByTimeGoesBySymbolT) {
  EXPECT_EQ(print_text(derivative(read("a * t"), "t")), "a");
}

TEST(Derivative, OfRandomExpressionsAgreesWithFiftyDigitDifferences) {
  constexpr std::uint64_t kSeed = 20240611;
  constexpr int kExpressions = 400;
  Dice dice(kSeed);
  DerivativeCheck total;
  for (int i = 0; i < kExpressions; ++i) {
    const Expression function = random_expression(dice, 4, Smoothness::Any);
    const std::vector<FiftyValues> points{random_point(dice), random_point(dice)};
    const DerivativeCheck check =
        check_derivatives(derivative_entries(print_text(function), function), points);
    EXPECT_THAT(check.mismatches, IsEmpty());
    total.compared += check.compared;
    total.not_comparable += check.not_comparable;
  }
  // Most of what chance throws is defined; a checker that compared nothing would be worthless.
  EXPECT_GT(total.compared, 2 * total.not_comparable);
  EXPECT_GT(total.compared, 500U);
}

TEST(DerivativeChecker, NamesASpoiltEntry) {
  const Expression rate = read("Vmax * S / (Km + S)");
  std::vector<DerivativeEntry> entries = derivative_entries("rate", rate);
  const std::vector<FiftyValues> points{{{"Vmax", 2}, {"Km", 0.5}, {"S", 3}}};
  ASSERT_EQ(entries.size(), 3U);
  EXPECT_THAT(check_derivatives(entries, points).mismatches, IsEmpty());
  entries[0].derivative = -entries[0].derivative;
  EXPECT_THAT(check_derivatives(entries, points).mismatches, ElementsAre("d rate / d Km"));
}

TEST(DerivativeChecker, SeesAnErrorInTheLastDigitOfADouble) {
  std::vector<DerivativeEntry> entries = derivative_entries("f", read("log10(x)"));
  const std::vector<FiftyValues> points{{{"x", 2}}};
  EXPECT_THAT(check_derivatives(entries, points).mismatches, IsEmpty());
  entries[0].derivative = read("1 / (x * 2.302585092994046)");  // ln 10, rounded
  EXPECT_THAT(check_derivatives(entries, points).mismatches, ElementsAre("d f / d x"));
}

TEST(DerivativeChecker, DoesNotTakeAnUndefinedClaimForRight) {
  std::vector<DerivativeEntry> entries = derivative_entries("f", read("x^2"));
  entries[0].derivative = read("ln(-x)");
  const DerivativeCheck check = check_derivatives(entries, {{{"x", 2}}});
  EXPECT_THAT(check.mismatches, ElementsAre("d f / d x"));
}

TEST(Derivative, CostsNoMoreForSharedParts) {
  // Written out, 60 doublings have 2^60 terms; the graph has 60 nodes.
  Expression doubled = Expression::symbol("x");
  for (int i = 0; i < 60; ++i) doubled = doubled * doubled + Expression::symbol("y");
  const Expression by_x = derivative(doubled, "x");
  EXPECT_EQ(evaluate(by_x, {{"x", 0.0}, {"y", 0.0}}), 0.0);
  EXPECT_EQ(evaluate(derivative(doubled, "y"), {{"x", 0.0}, {"y", 0.0}}), 1.0);
}

}  // namespace
}  // namespace gainsay::core
