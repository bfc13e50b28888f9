#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/fold.h"

#include <boost/multiprecision/cpp_dec_float.hpp>

#include <exception>
#include <functional>
#include <limits>
#include <map>
#include <string>
#include <vector>

namespace gainsay::testing {

/// Decimal numbers of 50 digits (Boost.Multiprecision): an evaluation that shares nothing with the
/// library's own but the order of the nodes.
using Fifty = boost::multiprecision::cpp_dec_float_50;
using FiftyValues = std::map<std::string, Fifty, std::less<>>;

inline Fifty undefined() { return std::numeric_limits<Fifty>::quiet_NaN(); }

/// Powers of 0 and of negative numbers count as defined for whole exponents that are written as
/// numbers: by any other exponent they have no derivative.
inline Fifty power_in_fifty_digits(const Fifty& base, const Fifty& exponent, bool is_number) {
  const bool whole = is_number && floor(exponent) == exponent;
  if (base < 0 && !whole) return undefined();
  if (base == 0 && (!whole || exponent < 0)) return undefined();
  return exponent == 0 ? Fifty(1) : Fifty(pow(base, exponent));
}

inline Fifty applied_in_fifty_digits(const core::Expression& node, const std::vector<Fifty>& x) {
  using core::Operation;
  switch (node.operation()) {
    case Operation::Negate:
      return -x[0];
    case Operation::Add:
      return x[0] + x[1];
    case Operation::Subtract:
      return x[0] - x[1];
    case Operation::Multiply:
      return x[0] * x[1];
    case Operation::Divide:
      return x[1] == 0 ? undefined() : Fifty(x[0] / x[1]);
    case Operation::Power:
      return power_in_fifty_digits(x[0], x[1], node.operands()[1].is_number());
    case Operation::Exp:
      return exp(x[0]);
    case Operation::Ln:
      return x[0] > 0 ? Fifty(log(x[0])) : undefined();
    case Operation::Log10:
      return x[0] > 0 ? Fifty(log10(x[0])) : undefined();
    case Operation::Sqrt:
      return x[0] > 0 ? Fifty(sqrt(x[0])) : undefined();
    case Operation::Abs:
      return x[0] < 0 ? Fifty(-x[0]) : x[0];
    case Operation::Sin:
      return sin(x[0]);
    case Operation::Cos:
      return cos(x[0]);
    case Operation::Tan:
      return tan(x[0]);
    case Operation::Tanh:
      return tanh(x[0]);
    case Operation::Min:
      return x[0] < x[1] ? x[0] : x[1];
    case Operation::Max:
      return x[0] > x[1] ? x[0] : x[1];
    case Operation::Less:
      return x[0] < x[1] ? 1 : 0;
    case Operation::LessEqual:
      return x[0] <= x[1] ? 1 : 0;
    case Operation::Greater:
      return x[0] > x[1] ? 1 : 0;
    case Operation::GreaterEqual:
      return x[0] >= x[1] ? 1 : 0;
    case Operation::Equal:
      return x[0] == x[1] ? 1 : 0;
    case Operation::NotEqual:
      return x[0] != x[1] ? 1 : 0;
    case Operation::And:
      return x[0] != 0 && x[1] != 0 ? 1 : 0;
    case Operation::Or:
      return x[0] != 0 || x[1] != 0 ? 1 : 0;
    case Operation::Not:
      return x[0] == 0 ? 1 : 0;
    case Operation::If:
      return x[0] != 0 ? x[1] : x[2];
    default:
      return undefined();
  }
}

/// NaN where the expression, or a part of it that is not chosen, is not defined or has no
/// derivative (a root of 0).
inline Fifty in_fifty_digits(const core::Expression& expression, const FiftyValues& values) {
  try {
    return core::fold<Fifty>(expression,
                             [&](const core::Expression& node, const std::vector<Fifty>& operands) {
                               if (node.is_number()) return Fifty(node.number());
                               if (node.operation() == core::Operation::Symbol)
                                 return values.at(node.name());
                               for (const Fifty& operand : operands) {
                                 if (!isfinite(operand)) return undefined();
                               }
                               return applied_in_fifty_digits(node, operands);
                             });
  } catch (const std::exception&) {  // Boost throws where the range of exponents ends
    return undefined();
  }
}

}  // namespace gainsay::testing
