#include "gainsay/core/gradients.h"

#include <numbers>

namespace gainsay::core {

namespace {

/// Both gradients by each variable of either, put together by `combine`; what is absent is `zero`.
template <class Combine>
Gradient merge(const Gradient& a, const Gradient& b, Value zero, Combine combine) {
  Gradient result;
  result.reserve(a.size() + b.size());
  auto left = a.begin();
  auto right = b.begin();
  while (left != a.end() || right != b.end()) {
    const bool take_left = right == b.end() || (left != a.end() && left->first <= right->first);
    const bool take_right = left == a.end() || (right != b.end() && right->first <= left->first);
    const Value variable = take_left ? left->first : right->first;
    const Value derivative =
        combine(take_left ? left->second : zero, take_right ? right->second : zero);
    if (derivative != zero) result.emplace_back(variable, derivative);
    if (take_left) ++left;
    if (take_right) ++right;
  }
  return result;
}

}  // namespace

void Gradients::derive_by(Value variable) {
  known_[variable] = Gradient{{variable, list_.constant(1.0)}};
}

const Gradient& Gradients::of(Value value) {
  if (const auto found = known_.find(value); found != known_.end()) return found->second;
  Gradient result =
      list_[value].code == Code::Select ? through_branches(value) : through_slopes(value);
  return known_[value] = std::move(result);
}

Gradient Gradients::through_slopes(Value value) {
  const Value zero = list_.constant(0.0);
  Gradient total;
  for (const auto& [operand, slope] : slopes(value)) {
    Gradient part = of(operand);
    for (auto& [variable, derivative] : part) derivative = list_.multiply(slope, derivative);
    total = merge(total, part, zero, [&](Value a, Value b) { return list_.add(a, b); });
  }
  return total;
}

Gradient Gradients::through_branches(Value value) {
  const ValueList::Entry entry = list_[value];
  const Gradient yes = of(entry.b);
  const Gradient no = of(entry.c);
  return merge(yes, no, list_.constant(0.0),
               [&](Value a, Value b) { return a == b ? a : list_.select(entry.a, a, b); });
}

// A quotient is a product with an inverse; its derivative by the divisor shares both:
// d(a / b) = w da - (q w) db with w = 1 / b and q = a w.
Gradients::Slopes Gradients::slopes_of_product(Value value) {
  const auto [code, level, a, b, c, number] = list_[value];
  if (a == b) return {{a, list_.add(a, a)}};
  for (const auto& [factor, other] : {std::pair{b, a}, std::pair{a, b}}) {
    if (list_[factor].code != Code::Inverse) continue;
    const Value divisor = list_[factor].a;
    return {{other, factor}, {divisor, list_.negate(list_.multiply(value, factor))}};
  }
  return {{a, b}, {b, a}};
}

Gradients::Slopes Gradients::slopes(Value value) {
  const auto [code, level, a, b, c, number] = list_[value];
  const Value one = list_.constant(1.0);
  switch (code) {
    case Code::Negate:
      return {{a, list_.constant(-1.0)}};
    case Code::Inverse:
      return {{a, list_.negate(list_.multiply(value, value))}};
    case Code::Add:
      return {{a, one}, {b, one}};
    case Code::Subtract:
      return {{a, one}, {b, list_.constant(-1.0)}};
    case Code::Multiply:
      return slopes_of_product(value);
    case Code::Power:
      return {{a, list_.make(Code::PowerSlope, a, b, value)},
              {b, list_.make(Code::PowerLog, a, value)}};
    case Code::Exp:
      return {{a, value}};
    case Code::Ln:
      return {{a, list_.inverse(a)}};
    case Code::Log10:
      return {{a, list_.multiply(list_.constant(std::numbers::log10e), list_.inverse(a))}};
    case Code::Sqrt:
      return {{a, list_.make(Code::PowerSlope, a, list_.constant(0.5), value)}};
    case Code::Sin:
      return {{a, list_.make(Code::Cos, a)}};
    case Code::Cos:
      return {{a, list_.negate(list_.make(Code::Sin, a))}};
    case Code::Tan:
      return {{a, list_.add(one, list_.multiply(value, value))}};
    case Code::Tanh:
      return {{a, list_.subtract(one, list_.multiply(value, value))}};
    case Code::Guarded:
      return {{a, list_.make(Code::LessEqual, list_.constant(0.0), a)}};
    default:
      return {};  // comparisons are flat; a variable not derived by is a constant
  }
}

}  // namespace gainsay::core
