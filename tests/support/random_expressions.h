#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/testing/fifty_digits.h"

#include <array>
#include <cstdint>
#include <random>
#include <string>
#include <vector>

namespace gainsay::testing {

/// Whole numbers below `count` and fractions from a generator whose sequence the standard fixes
/// (the standard's own distributions may differ between libraries).
class Dice {
 public:
  explicit Dice(std::uint64_t seed) : generator_(seed) {}
  std::size_t below(std::size_t count) { return generator_() % count; }
  double between(double low, double high) {
    return low + (high - low) * static_cast<double>(generator_() >> 11U) * 0x1p-53;
  }

 private:
  std::mt19937_64 generator_;
};

enum class Smoothness { Smooth, Any };

/// A random expression in x, y and z with at most `depth` levels; `Smooth` leaves out comparisons,
/// logic and choices. Parts are taken up again, as in real graphs.
inline core::Expression random_expression(Dice& dice, int depth, Smoothness smoothness) {
  using core::Expression;
  using core::Operation;
  static constexpr std::array kSmooth{Operation::Negate,   Operation::Add,    Operation::Subtract,
                                      Operation::Multiply, Operation::Divide, Operation::Power,
                                      Operation::Exp,      Operation::Ln,     Operation::Log10,
                                      Operation::Sqrt,     Operation::Sin,    Operation::Cos,
                                      Operation::Tan,      Operation::Tanh};
  static constexpr std::array kOthers{
      Operation::Abs,       Operation::Min,     Operation::Max,          Operation::Less,
      Operation::LessEqual, Operation::Greater, Operation::GreaterEqual, Operation::Equal,
      Operation::NotEqual,  Operation::And,     Operation::Or,           Operation::Not,
      Operation::If};
  static constexpr std::array<double, 10> kNumbers{0, 1, 2, 3, 0.5, -1, -2.5, 10, 1e-3, 0.1};
  if (depth == 0 || dice.below(6) == 0) {
    if (dice.below(3) == 0) return kNumbers[dice.below(kNumbers.size())];
    return Expression::symbol(std::string(1, static_cast<char>('x' + dice.below(3))));
  }
  const std::size_t kinds = kSmooth.size() + (smoothness == Smoothness::Any ? kOthers.size() : 0);
  const std::size_t kind = dice.below(kinds);
  const Operation operation =
      kind < kSmooth.size() ? kSmooth[kind] : kOthers[kind - kSmooth.size()];
  std::vector<Expression> operands;
  for (std::size_t i = 0; i < core::operand_count(operation); ++i) {
    const bool again = !operands.empty() && dice.below(4) == 0;
    operands.push_back(again ? operands.front() : random_expression(dice, depth - 1, smoothness));
  }
  return Expression::make(operation, operands);
}

/// Values for x, y, z where most functions are defined.
inline FiftyValues random_point(Dice& dice) {
  FiftyValues values;
  for (const char* name : {"x", "y", "z"}) values[name] = dice.between(0.2, 3.0);
  return values;
}

}  // namespace gainsay::testing
