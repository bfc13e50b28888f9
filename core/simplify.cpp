#include "gainsay/core/simplify.h"

#include "gainsay/core/exact.h"
#include "gainsay/core/fold.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>
#include <vector>

namespace gainsay::core {
namespace {

bool is(Operation operation, const Expression& x) { return x.operation() == operation; }
const Expression& operand(const Expression& x, std::size_t i = 0) { return x.operands()[i]; }
bool is_whole(double x) { return x == std::floor(x); }

std::optional<double> exact(Operation operation, double a, double b) {
  return exact_value(operation, std::array{a, b});
}

Expression negated(const Expression& x) {
  if (x.is_number(0.0)) return x;
  if (x.is_number()) return -x.number();
  if (is(Operation::Negate, x)) return operand(x);
  if (is(Operation::Subtract, x)) return operand(x, 1) - operand(x, 0);
  if (is(Operation::Multiply, x) && operand(x).is_number()) {
    return -operand(x).number() * operand(x, 1);
  }
  return -x;
}

/// coefficient * rest.
struct Multiple {
  double coefficient = 1.0;
  Expression rest;
};

Multiple as_multiple(const Expression& x) {
  if (is(Operation::Negate, x)) {
    const Multiple inside = as_multiple(operand(x));
    return {-inside.coefficient, inside.rest};
  }
  if (is(Operation::Multiply, x) && operand(x).is_number()) {
    return {operand(x).number(), operand(x, 1)};
  }
  return {1.0, x};
}

Expression multiple(double coefficient, const Expression& rest) {
  if (coefficient == 0.0) return 0.0;
  if (coefficient == 1.0) return rest;
  if (rest.is_number(1.0)) return coefficient;
  if (coefficient == -1.0) return negated(rest);
  return coefficient * rest;
}

/// The sum of a x and b x as (a + b) x, where a + b is exact.
std::optional<Expression> like_terms(const Expression& a, const Expression& b, Operation sign) {
  const Multiple left = as_multiple(a);
  const Multiple right = as_multiple(b);
  if (!(left.rest == right.rest)) return {};
  const auto coefficient = exact(sign, left.coefficient, right.coefficient);
  if (!coefficient) return {};
  return multiple(*coefficient, left.rest);
}

Expression sum(const Expression& a, const Expression& b) {
  if (a.is_number(0.0)) return b;
  if (b.is_number(0.0)) return a;
  if (const auto together = like_terms(a, b, Operation::Add)) return *together;
  if (is(Operation::Negate, b)) return a - operand(b);
  if (is(Operation::Negate, a)) return b - operand(a);
  return a + b;
}

Expression difference(const Expression& a, const Expression& b) {
  if (b.is_number(0.0)) return a;
  if (a.is_number(0.0)) return negated(b);
  if (const auto together = like_terms(a, b, Operation::Subtract)) return *together;
  if (is(Operation::Negate, b)) return sum(a, operand(b));
  return a - b;
}

Expression power(const Expression& a, const Expression& b) {
  if (b.is_number(1.0)) return a;
  if (b.is_number(0.0) || a.is_number(1.0)) return 1.0;
  // (x^m)^n = x^(m n) for whole numbers alone: (x^2)^0.5 is |x|.
  if (is(Operation::Power, a) && b.is_number() && operand(a, 1).is_number()) {
    const double inner = operand(a, 1).number();
    const auto exponent = exact(Operation::Multiply, inner, b.number());
    if (exponent && is_whole(inner) && is_whole(b.number())) return power(operand(a), *exponent);
  }
  return pow(a, b);
}

/// base^exponent.
struct Factor {
  Expression base;
  double exponent = 1.0;
};

/// coefficient * factors, in the order in which they stand; each base once.
struct Product {
  double coefficient = 1.0;
  std::vector<Factor> factors;
  int numbers = 0;      ///< how many went into the coefficient, 1 apart
  bool merged = false;  ///< whether anything became less

  /// False where a number would be rounded.
  bool take_number(double number, double exponent) {
    const Operation sign = exponent > 0.0 ? Operation::Multiply : Operation::Divide;
    const auto product = exact(sign, coefficient, number);
    if (!product) return false;
    coefficient = *product;
    if (number != 1.0) merged = ++numbers > 1 || merged;
    return true;
  }
  bool take_factor(const Expression& base, double exponent) {
    for (Factor& factor : factors) {
      if (!(factor.base == base)) continue;
      const auto total = exact(Operation::Add, factor.exponent, exponent);
      if (!total) return false;
      factor.exponent = *total;
      return merged = true;
    }
    factors.push_back({base, exponent});
    return true;
  }
};

/// Multiplies x^exponent in, exponent 1 or -1; false where that rounds a number.
bool gather(Product& product, const Expression& x, double exponent) {
  // A longer product is left as it stands, else a chain of n factors would take n^2 steps.
  constexpr int kMostNodes = 32;
  std::vector<Expression> open{x};
  for (int nodes = 0; !open.empty(); ++nodes) {
    if (nodes == kMostNodes) return false;
    const Expression here = std::move(open.back());
    open.pop_back();
    bool taken = true;
    if (is(Operation::Multiply, here)) {
      open.push_back(operand(here, 1));
      open.push_back(operand(here, 0));
    } else if (is(Operation::Negate, here)) {
      product.coefficient = -product.coefficient;
      open.push_back(operand(here));
    } else if (here.is_number()) {
      taken = product.take_number(here.number(), exponent);
    } else if (is(Operation::Power, here) && operand(here, 1).is_number()) {
      taken = product.take_factor(operand(here), exponent * operand(here, 1).number());
    } else {
      taken = product.take_factor(here, exponent);
    }
    if (!taken) return false;
  }
  return true;
}

Expression times(const Expression& a, const Expression& b) { return a.is_number(1.0) ? b : a * b; }

/// a * b with equal bases and numbers gathered, if that leaves fewer.
Expression gathered_product(const Expression& a, const Expression& b) {
  Product all;
  if (!gather(all, a, 1.0) || !gather(all, b, 1.0) || !all.merged) return a * b;
  Expression result = 1.0;
  for (const Factor& factor : all.factors) {
    if (factor.exponent != 0.0) result = times(result, power(factor.base, factor.exponent));
  }
  return multiple(all.coefficient, result);
}

/// a / b with what stands above and below cancelled, if there is any.
Expression gathered_quotient(const Expression& a, const Expression& b) {
  Product all;
  if (!gather(all, a, 1.0) || !gather(all, b, -1.0) || !all.merged) return a / b;
  Expression above = 1.0;
  Expression below = 1.0;
  for (const Factor& factor : all.factors) {
    Expression& side = factor.exponent > 0.0 ? above : below;
    if (factor.exponent != 0.0) side = times(side, power(factor.base, std::abs(factor.exponent)));
  }
  const Expression top = multiple(all.coefficient, above);
  return below.is_number(1.0) ? top : top / below;
}

Expression quotient(const Expression& a, const Expression& b) {
  if (a.is_number(0.0) && !b.is_number(0.0)) return 0.0;
  if (b.is_number(1.0)) return a;
  if (b.is_number(-1.0)) return negated(a);
  if (is(Operation::Negate, a)) return negated(quotient(operand(a), b));
  if (is(Operation::Negate, b)) return negated(quotient(a, operand(b)));
  return gathered_quotient(a, b);
}

Expression product(const Expression& a, const Expression& b) {
  if (a.is_number(0.0) || b.is_number(0.0)) return 0.0;
  if (b.is_number()) return product(b, a);
  if (a.is_number(1.0) || a.is_number(-1.0)) return multiple(a.number(), b);
  if (is(Operation::Negate, a)) return negated(product(operand(a), b));
  if (is(Operation::Negate, b)) return negated(product(a, operand(b)));
  if (a == b) return power(a, 2.0);
  if (is(Operation::Divide, b) && operand(b).is_number(1.0)) return quotient(a, operand(b, 1));
  return gathered_product(a, b);
}

Expression chosen(const Expression& node, const std::vector<Expression>& x) {
  if (x[0].is_number()) return x[0].number() != 0.0 ? x[1] : x[2];
  if (x[1] == x[2]) return x[1];
  return with_operands(node, x);
}

Expression simplified_if_numbers(const Expression& node, const std::vector<Expression>& x) {
  std::vector<double> numbers;
  for (const Expression& operand : x) numbers.push_back(operand.number());
  const auto value = exact_value(node.operation(), numbers);
  return value ? Expression(*value) : with_operands(node, x);
}

/// A node whose operands x are simple already and not all numbers.
Expression by_rules(const Expression& node, const std::vector<Expression>& x) {
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

Expression simplified(const Expression& node, const std::vector<Expression>& x) {
  const auto is_number = [](const Expression& operand) { return operand.is_number(); };
  if (x.empty()) return node;
  if (std::all_of(x.begin(), x.end(), is_number)) return simplified_if_numbers(node, x);
  const Expression result = by_rules(node, x);
  // Where nothing changed the node itself is kept, and with it what it shares.
  if (result.operation() != node.operation()) return result;
  return with_operands(node, {result.operands().begin(), result.operands().end()});
}

}  // namespace

Expression simplify(const Expression& expression) {
  return fold<Expression>(expression, simplified);
}

}  // namespace gainsay::core
