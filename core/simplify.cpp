#include "gainsay/core/simplify.h"

#include "gainsay/core/fold.h"

#include <cmath>
#include <optional>
#include <vector>

namespace gainsay::core {
namespace {

Expression negated(const Expression& x) {
  if (x.is_number()) return -x.number();
  if (x.operation() == Operation::Negate) return x.operands()[0];
  if (x.operation() == Operation::Subtract) return x.operands()[1] - x.operands()[0];
  return -x;
}

/// The number, if it is finite and `rest`, what rounding has taken from it, is nothing.
std::optional<double> if_exact(double value, double rest) {
  if (!std::isfinite(value) || rest != 0.0) return std::nullopt;
  return value;
}

/// What rounding takes from a + b (Knuth 1969; Moller 1965).
double rest_of_sum(double a, double b) {
  const double sum = a + b;
  const double part = sum - a;
  return (a - (sum - part)) + (b - part);
}

std::optional<double> folded(Operation operation, double a, double b) {
  switch (operation) {
    case Operation::Add:
      return if_exact(a + b, rest_of_sum(a, b));
    case Operation::Subtract:
      return if_exact(a - b, rest_of_sum(a, -b));
    case Operation::Multiply:
      return if_exact(a * b, std::fma(a, b, -(a * b)));
    case Operation::Divide:
      if (b == 0.0) return std::nullopt;
      return if_exact(a / b, std::fma(a / b, b, -a));
    default:
      return std::nullopt;
  }
}

Expression sum(const Expression& a, const Expression& b) {
  if (a.is_number(0.0)) return b;
  if (b.is_number(0.0)) return a;
  if (a == b) return 2.0 * a;
  if (b.operation() == Operation::Negate) return a - b.operands()[0];
  if (a.operation() == Operation::Negate) return b - a.operands()[0];
  return a + b;
}

Expression difference(const Expression& a, const Expression& b) {
  if (b.is_number(0.0)) return a;
  if (a.is_number(0.0)) return negated(b);
  if (a == b) return 0.0;
  if (b.operation() == Operation::Negate) return sum(a, b.operands()[0]);
  return a - b;
}

Expression product(const Expression& a, const Expression& b) {
  if (a.is_number(0.0) || b.is_number(0.0)) return 0.0;
  if (a.is_number(1.0)) return b;
  if (b.is_number(1.0)) return a;
  if (a.is_number(-1.0)) return negated(b);
  if (b.is_number(-1.0)) return negated(a);
  if (a.operation() == Operation::Negate) return negated(product(a.operands()[0], b));
  if (b.operation() == Operation::Negate) return negated(product(a, b.operands()[0]));
  return a * b;
}

Expression quotient(const Expression& a, const Expression& b) {
  if (a.is_number(0.0)) return 0.0;
  if (b.is_number(1.0)) return a;
  if (b.is_number(-1.0)) return negated(a);
  if (a == b) return 1.0;
  if (a.operation() == Operation::Negate) return negated(quotient(a.operands()[0], b));
  if (b.operation() == Operation::Negate) return negated(quotient(a, b.operands()[0]));
  return a / b;
}

Expression power(const Expression& a, const Expression& b) {
  if (b.is_number(1.0)) return a;
  if (b.is_number(0.0)) return 1.0;
  if (a.is_number(1.0)) return 1.0;
  return pow(a, b);
}

Expression chosen(const Expression& node, const std::vector<Expression>& x) {
  if (x[0].is_number()) return x[0].number() != 0.0 ? x[1] : x[2];
  if (x[1] == x[2]) return x[1];
  return with_operands(node, x);
}

Expression simplified(const Expression& node, const std::vector<Expression>& x) {
  if (x.size() == 2 && x[0].is_number() && x[1].is_number()) {
    const auto number = folded(node.operation(), x[0].number(), x[1].number());
    if (number) return *number;
  }
  switch (node.operation()) {
    case Operation::Negate:
      return negated(x[0]);
    case Operation::Add:
      return sum(x[0], x[1]);
    case Operation::Subtract:
      return difference(x[0], x[1]);
    case Operation::Multiply:
      return product(x[0], x[1]);
    case Operation::Divide:
      return quotient(x[0], x[1]);
    case Operation::Power:
      return power(x[0], x[1]);
    case Operation::If:
      return chosen(node, x);
    default:
      return with_operands(node, x);
  }
}

}  // namespace

Expression simplify(const Expression& expression) {
  return fold<Expression>(expression, simplified);
}

}  // namespace gainsay::core
