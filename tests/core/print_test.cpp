#include "gainsay/core/print.h"

#include "gainsay/core/parse.h"
#include "gainsay/testing/random_expressions.h"

#include <gtest/gtest.h>

#include <bit>
#include <clocale>
#include <cmath>
#include <cstdint>
#include <cstdlib>
#include <limits>
#include <random>

namespace gainsay::core {
namespace {

std::string again(std::string_view text) { return print_text(parse(text)->expression); }

TEST(PrintNumber, AsAPersonWouldWriteIt) {
  EXPECT_EQ(print_number(0.0), "0");
  EXPECT_EQ(print_number(-0.5), "-0.5");
  EXPECT_EQ(print_number(0.001), "0.001");
  EXPECT_EQ(print_number(0.0001), "0.0001");
  EXPECT_EQ(print_number(1e-5), "1e-5");
  EXPECT_EQ(print_number(250000.0), "250000");
  EXPECT_EQ(print_number(1e22), "1e22");
  EXPECT_EQ(print_number(6.02214076e23), "6.02214076e23");
  EXPECT_EQ(print_number(123456789.0), "123456789");
  EXPECT_EQ(print_number(0.1), "0.1");
  EXPECT_EQ(print_number(1.0 / 3.0), "0.3333333333333333");
}

TEST(PrintNumber, AtTheEndsOfTheRange) {
  EXPECT_EQ(print_number(std::numeric_limits<double>::max()), "1.7976931348623157e308");
  EXPECT_EQ(print_number(std::numeric_limits<double>::denorm_min()), "5e-324");
  EXPECT_EQ(print_number(std::numeric_limits<double>::infinity()), "inf");
}

TEST(PrintNumber, ReadsBackToTheSameBits) {
  std::mt19937_64 generator(3);
  for (int i = 0; i < 20'000; ++i) {
    const double value = std::bit_cast<double>(generator());
    if (!std::isfinite(value)) continue;
    EXPECT_EQ(std::strtod(print_number(value).c_str(), nullptr), value);
  }
}

TEST(PrintText, UsesTheFewestBrackets) {
  for (const char* text : {"a + b * c",
                           "(a + b) * c",
                           "a - (b - c)",
                           "a - b - c",
                           "a + (b + c)",
                           "a / (b * c)",
                           "a / b / c",
                           "a * (b / c)",
                           "x^y^z",
                           "(x^y)^z",
                           "-x^2",
                           "(-x)^2",
                           "-(a * b)",
                           "-a * b",
                           "--a",
                           "-(2)",
                           "2^-x",
                           "2^-1",
                           "(-2)^x",
                           "a - -2",
                           "a < b",
                           "(a < b) < c",
                           "a and b or c",
                           "a and (b or c)",
                           "not (a and b)",
                           "not a < b",
                           "(not a) + 1",
                           "(a < b) * c",
                           "if(a < b, c, d)",
                           "min(a, b)",
                           "exp(-Ea / (gas_constant * T))",
                           "-pi * x",
                           "x^(n - 1)"}) {
    EXPECT_EQ(again(text), text);
  }
}

TEST(PrintText, DropsBracketsThatAreNotNeeded) {
  EXPECT_EQ(again("((a)) + (b * c)"), "a + b * c");
  EXPECT_EQ(again("(a + b) - c"), "a + b - c");
  EXPECT_EQ(again("x^(-y)"), "x^-y");
  EXPECT_EQ(again("min(a, b, c)"), "min(min(a, b), c)");
}

TEST(PrintText, TellsNegativeNumbersFromNegatedOnes) {
  const Expression number = -2.0;
  const Expression negated = -Expression(2.0);
  EXPECT_EQ(print_text(number), "-2");
  EXPECT_EQ(print_text(negated), "-(2)");
  EXPECT_EQ(parse("-2")->expression, number);
  EXPECT_EQ(parse("-(2)")->expression, negated);
}

TEST(PrintText, DeepAndLongExpressions) {
  Expression deep = Expression::symbol("x");
  for (int i = 0; i < 3000; ++i) deep = deep + 1.0;
  EXPECT_EQ(print_text(deep).size(), 1 + 3000 * std::string_view(" + 1").size());
}

}  // namespace
}  // namespace gainsay::core
