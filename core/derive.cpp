#include "gainsay/core/derive.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/require.h"
#include "gainsay/core/simplify.h"

#include <algorithm>
#include <vector>

namespace gainsay::core {
namespace {

Expression of(Operation operation, const Expression& x) { return Expression::make(operation, {x}); }

Expression choose(Operation comparison, const Expression& a, const Expression& b,
                  const Expression& where_true, const Expression& where_false) {
  return Expression::make(Operation::If,
                          {Expression::make(comparison, {a, b}), where_true, where_false});
}

/// d(a^b) = b a^(b - 1) da + a^b ln(a) db.
Expression power_rule(const Expression& power, const Expression& da, const Expression& db) {
  const Expression& a = power.operands()[0];
  const Expression& b = power.operands()[1];
  const Expression by_base = b * pow(a, b - 1.0) * da;
  const Expression by_exponent = power * of(Operation::Ln, a) * db;
  if (db.is_number(0.0)) return by_base;
  if (da.is_number(0.0)) return by_exponent;
  return by_base + by_exponent;
}

/// The chain rule: the derivative of a node with operands x from theirs, dx.
Expression chain_rule(const Expression& node, const std::vector<Expression>& dx) {
  const std::span<const Expression> x = node.operands();
  switch (node.operation()) {
    case Operation::Number:
    case Operation::Symbol:
      break;
    case Operation::Negate:
      return -dx[0];
    case Operation::Add:
      return dx[0] + dx[1];
    case Operation::Subtract:
      return dx[0] - dx[1];
    case Operation::Multiply:
      return dx[0] * x[1] + x[0] * dx[1];
    case Operation::Divide:
      return (dx[0] - node * dx[1]) / x[1];
    case Operation::Power:
      return power_rule(node, dx[0], dx[1]);
    case Operation::Exp:
      return node * dx[0];
    case Operation::Ln:
      return dx[0] / x[0];
    case Operation::Log10:
      return dx[0] / (x[0] * of(Operation::Ln, 10.0));
    case Operation::Sqrt:
      return dx[0] / (2.0 * node);
    case Operation::Abs:
      return choose(Operation::Less, x[0], 0.0, -dx[0], dx[0]);
    case Operation::Sin:
      return of(Operation::Cos, x[0]) * dx[0];
    case Operation::Cos:
      return -of(Operation::Sin, x[0]) * dx[0];
    case Operation::Tan:
      return (1.0 + pow(node, 2.0)) * dx[0];
    case Operation::Tanh:
      return (1.0 - pow(node, 2.0)) * dx[0];
    case Operation::Min:
      return choose(Operation::LessEqual, x[0], x[1], dx[0], dx[1]);
    case Operation::Max:
      return choose(Operation::GreaterEqual, x[0], x[1], dx[0], dx[1]);
    case Operation::If:
      return Expression::make(Operation::If, {x[0], dx[1], dx[2]});
    // Comparisons and logic are constant but for jumps.
    case Operation::Less:
    case Operation::LessEqual:
    case Operation::Greater:
    case Operation::GreaterEqual:
    case Operation::Equal:
    case Operation::NotEqual:
    case Operation::And:
    case Operation::Or:
    case Operation::Not:
      return 0.0;
  }
  throw BrokenPromise("the chain rule is asked of a node with operands");
}

}  // namespace

Expression derivative(const Expression& expression, std::string_view symbol) {
  const Expression zero = 0.0;
  const Expression one = 1.0;
  const auto is_zero = [](const Expression& x) { return x.is_number(0.0); };
  return simplify(fold<Expression>(
      expression, [&](const Expression& node, const std::vector<Expression>& derivatives) {
        if (node.operation() == Operation::Symbol) return node.name() == symbol ? one : zero;
        if (std::all_of(derivatives.begin(), derivatives.end(), is_zero)) return zero;
        return chain_rule(node, derivatives);
      }));
}

}  // namespace gainsay::core
