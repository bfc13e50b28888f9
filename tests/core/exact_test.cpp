#include "gainsay/core/exact.h"

#include "gainsay/testing/fifty_digits.h"
#include "gainsay/testing/random_expressions.h"

#include <gtest/gtest.h>

#include <array>
#include <cmath>
#include <limits>

namespace gainsay::core {
namespace {

std::optional<double> exact(Operation operation, std::vector<double> operands) {
  return exact_value(operation, operands);
}

TEST(ExactValue, IsThereWhereNothingIsRounded) {
  EXPECT_EQ(exact(Operation::Add, {0.5, 0.25}), 0.75);
  EXPECT_EQ(exact(Operation::Subtract, {2.1, 1.0}), 2.1 - 1.0);
  EXPECT_EQ(exact(Operation::Multiply, {3.0, 0.125}), 0.375);
  EXPECT_EQ(exact(Operation::Divide, {6.0, 3.0}), 2.0);
  EXPECT_EQ(exact(Operation::Power, {2.0, 10.0}), 1024.0);
  EXPECT_EQ(exact(Operation::Power, {2.0, -2.0}), 0.25);
  EXPECT_EQ(exact(Operation::Power, {-3.0, 3.0}), -27.0);
  EXPECT_EQ(exact(Operation::Sqrt, {2.25}), 1.5);
  EXPECT_EQ(exact(Operation::Exp, {0.0}), 1.0);
  EXPECT_EQ(exact(Operation::Ln, {1.0}), 0.0);
  EXPECT_EQ(exact(Operation::Log10, {10.0}), 1.0);
  EXPECT_EQ(exact(Operation::Cos, {0.0}), 1.0);
  EXPECT_EQ(exact(Operation::Sin, {0.0}), 0.0);
  EXPECT_EQ(exact(Operation::Abs, {-0.1}), 0.1);
  EXPECT_EQ(exact(Operation::Min, {0.1, 0.2}), 0.1);
  EXPECT_EQ(exact(Operation::Max, {0.1, 0.2}), 0.2);
  EXPECT_EQ(exact(Operation::Less, {0.1, 0.2}), 1.0);
  EXPECT_EQ(exact(Operation::Or, {0.0, 0.0}), 0.0);
  EXPECT_EQ(exact(Operation::Not, {0.0}), 1.0);
  EXPECT_EQ(exact(Operation::If, {0.0, 1.0, 2.0}), 2.0);
}

TEST(ExactValue, IsNotThereWhereSomethingIs) {
  EXPECT_EQ(exact(Operation::Add, {0.1, 0.2}), std::nullopt);
  EXPECT_EQ(exact(Operation::Multiply, {0.1, 3.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Divide, {1.0, 3.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Power, {3.0, -1.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Power, {4.0, 0.5}), std::nullopt);
  EXPECT_EQ(exact(Operation::Power, {3.0, 60.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Sqrt, {2.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Ln, {10.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Exp, {1.0}), std::nullopt);
}

TEST(ExactValue, IsNotThereBeyondTheRangeOfDoubles) {
  constexpr double kLargest = std::numeric_limits<double>::max();
  constexpr double kTiny = std::numeric_limits<double>::denorm_min();
  EXPECT_EQ(exact(Operation::Add, {kLargest, kLargest}), std::nullopt);
  EXPECT_EQ(exact(Operation::Multiply, {1e200, 1e200}), std::nullopt);
  EXPECT_EQ(exact(Operation::Multiply, {1e-200, 1e-200}), std::nullopt);
  EXPECT_EQ(exact(Operation::Divide, {kTiny, 3.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Divide, {1.0, 0.0}), std::nullopt);
  EXPECT_EQ(exact(Operation::Sqrt, {-4.0}), std::nullopt);
}

TEST(ExactValue, AgreesWithFiftyDigitsWhereverItIsThere) {
  using gainsay::testing::Fifty;
  constexpr std::uint64_t kSeed = 11;
  gainsay::testing::Dice dice(kSeed);
  int exact_ones = 0;
  for (int i = 0; i < 20'000; ++i) {
    // Short binary fractions, so that a good part of the results is exact.
    const double a = std::ldexp(static_cast<double>(dice.below(4096)) - 2048.0, -5);
    const double b = std::ldexp(static_cast<double>(dice.below(64)) + 1.0, -3);
    const std::array<std::pair<Operation, Fifty>, 4> expected{{{Operation::Add, Fifty(a) + b},
                                                               {Operation::Subtract, Fifty(a) - b},
                                                               {Operation::Multiply, Fifty(a) * b},
                                                               {Operation::Divide, Fifty(a / b)}}};
    for (const auto& [operation, value] : expected) {
      const auto found = exact(operation, {a, b});
      const bool quotient = operation == Operation::Divide;
      const bool held = quotient ? value * b == a : Fifty(value.convert_to<double>()) == value;
      EXPECT_EQ(found.has_value(), held) << a << " " << b;
      if (!found) continue;
      EXPECT_EQ(Fifty(*found), value);
      ++exact_ones;
    }
  }
  EXPECT_GT(exact_ones, 60'000);
}

}  // namespace
}  // namespace gainsay::core
