#include "gainsay/core/exact.h"

#include <cmath>

namespace gainsay::core {
namespace {

using Value = std::optional<double>;

// Below this size the error of a product may itself be too small to be held, and look like none.
constexpr double kSmallest = 0x1p-960;

bool is_safe(double x) { return std::isfinite(x) && std::abs(x) >= kSmallest; }

Value sum(double a, double b) {
  const double rounded = a + b;
  if (!std::isfinite(rounded)) return {};
  const double share_of_b = rounded - a;
  const double error = (a - (rounded - share_of_b)) + (b - share_of_b);
  return error == 0.0 ? Value(rounded) : Value();
}

Value product(double a, double b) {
  if (a == 0.0 || b == 0.0) return a * b;
  const double rounded = a * b;
  if (!is_safe(rounded) || std::fma(a, b, -rounded) != 0.0) return {};
  return rounded;
}

Value quotient(double a, double b) {
  if (b == 0.0) return {};
  if (a == 0.0) return a / b;
  const double rounded = a / b;
  if (!is_safe(a) || !is_safe(rounded) || std::fma(rounded, b, -a) != 0.0) return {};
  return rounded;
}

/// Whole exponents alone, by repeated multiplication.
Value power(double base, double exponent) {
  constexpr double kMost = 64.0;
  if (exponent != std::floor(exponent) || std::abs(exponent) > kMost) return {};
  Value result = 1.0;
  for (double i = 0.0; i < std::abs(exponent) && result; i += 1.0) result = product(*result, base);
  return result && exponent < 0.0 ? quotient(1.0, *result) : result;
}

Value root(double x) {
  const double rounded = std::sqrt(x);
  const Value square = product(rounded, rounded);
  return square && *square == x ? Value(rounded) : Value();
}

/// Functions that have one rational value at a rational argument.
Value at(double x, double argument, double value) { return x == argument ? Value(value) : Value(); }

Value truth(bool holds) { return holds ? 1.0 : 0.0; }

}  // namespace

std::optional<double> exact_value(Operation operation, std::span<const double> x) {
  switch (operation) {
    case Operation::Number:
    case Operation::Symbol:
      break;
    case Operation::Negate:
      return -x[0];
    case Operation::Add:
      return sum(x[0], x[1]);
    case Operation::Subtract:
      return sum(x[0], -x[1]);
    case Operation::Multiply:
      return product(x[0], x[1]);
    case Operation::Divide:
      return quotient(x[0], x[1]);
    case Operation::Power:
      return power(x[0], x[1]);
    case Operation::Exp:
      return at(x[0], 0.0, 1.0);
    case Operation::Ln:
      return at(x[0], 1.0, 0.0);
    case Operation::Log10:
      return x[0] == 10.0 ? Value(1.0) : at(x[0], 1.0, 0.0);
    case Operation::Sqrt:
      return root(x[0]);
    case Operation::Abs:
      return std::abs(x[0]);
    case Operation::Sin:
    case Operation::Tan:
    case Operation::Tanh:
      return at(x[0], 0.0, 0.0);
    case Operation::Cos:
      return at(x[0], 0.0, 1.0);
    case Operation::Min:
      return x[0] <= x[1] ? x[0] : x[1];
    case Operation::Max:
      return x[0] >= x[1] ? x[0] : x[1];
    case Operation::Less:
      return truth(x[0] < x[1]);
    case Operation::LessEqual:
      return truth(x[0] <= x[1]);
    case Operation::Greater:
      return truth(x[0] > x[1]);
    case Operation::GreaterEqual:
      return truth(x[0] >= x[1]);
    case Operation::Equal:
      return truth(x[0] == x[1]);
    case Operation::NotEqual:
      return truth(x[0] != x[1]);
    case Operation::And:
      return truth(x[0] != 0.0 && x[1] != 0.0);
    case Operation::Or:
      return truth(x[0] != 0.0 || x[1] != 0.0);
    case Operation::Not:
      return truth(x[0] == 0.0);
    case Operation::If:
      return x[0] != 0.0 ? x[1] : x[2];
  }
  return {};
}

}  // namespace gainsay::core
