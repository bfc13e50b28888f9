#include "gainsay/core/lowering.h"

#include <cmath>

namespace gainsay::core {

namespace {

// Up to here a whole exponent is multiplied out; an odd one keeps the sign of its base.
constexpr double kLargestWholeExponent = 1024.0;

Code unary_code(Operation operation) {
  switch (operation) {
    case Operation::Exp:
      return Code::Exp;
    case Operation::Ln:
      return Code::Ln;
    case Operation::Log10:
      return Code::Log10;
    case Operation::Sin:
      return Code::Sin;
    case Operation::Cos:
      return Code::Cos;
    case Operation::Tan:
      return Code::Tan;
    default:
      return Code::Tanh;
  }
}

}  // namespace

Value Lowering::of(const Expression& expression) {
  if (const auto found = known_.find(expression.identity()); found != known_.end()) {
    return found->second;
  }
  const Value value = make(expression);
  known_[expression.identity()] = value;
  return value;
}

Value Lowering::make(const Expression& expression) {
  const auto operand = [&](std::size_t i) { return of(expression.operands()[i]); };
  const auto binary = [&](Code code, std::size_t first, std::size_t second) {
    const Value a = operand(first);
    return list_.make(code, a, operand(second));
  };
  switch (expression.operation()) {
    case Operation::Number:
      return list_.constant(expression.number());
    case Operation::Symbol:
      return symbol(expression.name());
    case Operation::Negate:
      return list_.negate(operand(0));
    case Operation::Add:
      return list_.add(operand(0), operand(1));
    case Operation::Subtract:
      return list_.subtract(operand(0), operand(1));
    case Operation::Multiply:
      return list_.multiply(operand(0), operand(1));
    case Operation::Divide:
      return list_.divide(operand(0), operand(1));
    case Operation::Power:
      return power(operand(0), operand(1));
    case Operation::Sqrt:
      return list_.make(Code::Sqrt, guarded(operand(0)));
    case Operation::Abs:
      return absolute(operand(0));
    case Operation::Min:
      return list_.select(binary(Code::LessEqual, 0, 1), operand(0), operand(1));
    case Operation::Max:
      return list_.select(binary(Code::LessEqual, 1, 0), operand(0), operand(1));
    case Operation::Less:
      return binary(Code::Less, 0, 1);
    case Operation::LessEqual:
      return binary(Code::LessEqual, 0, 1);
    case Operation::Greater:
      return binary(Code::Less, 1, 0);
    case Operation::GreaterEqual:
      return binary(Code::LessEqual, 1, 0);
    case Operation::Equal:
      return binary(Code::Equal, 0, 1);
    case Operation::NotEqual:
      return negation(binary(Code::Equal, 0, 1));
    case Operation::And:
      return binary(Code::And, 0, 1);
    case Operation::Or:
      return binary(Code::Or, 0, 1);
    case Operation::Not:
      return negation(operand(0));
    case Operation::If:
      return list_.select(operand(0), operand(1), operand(2));
    default:
      return list_.make(unary_code(expression.operation()), operand(0));
  }
}

Value Lowering::symbol(const std::string& name) {
  if (const auto found = names_.find(name); found != names_.end()) return found->second;
  if (!unknown_name_) unknown_name_ = name;
  return list_.constant(0.0);
}

Value Lowering::power(Value base, Value exponent) {
  if (!list_.is_constant(exponent)) return list_.make(Code::Power, guarded(base), exponent);
  const double number = list_[exponent].number;
  if (number == std::trunc(number) && std::abs(number) <= kLargestWholeExponent) {
    return list_.whole_power(base, static_cast<long>(number));
  }
  if (number < 0.0) return list_.inverse(power(base, list_.constant(-number)));
  if (number == 0.5) return list_.make(Code::Sqrt, guarded(base));
  return list_.make(Code::Power, guarded(base), exponent);
}

Value Lowering::absolute(Value a) {
  return list_.select(list_.make(Code::Less, a, list_.constant(0.0)), list_.negate(a), a);
}

Value Lowering::guarded(Value argument) {
  Value allowance = list_.constant(0.0);
  const Gradient gradient = gradients_.of(argument);
  for (const auto& [variable, slope] : gradient) {
    const auto guard = guards_.find(variable);
    if (guard == guards_.end()) continue;
    allowance = list_.add(allowance, list_.multiply(absolute(slope), guard->second));
  }
  return list_.is_constant(allowance) ? argument : list_.make(Code::Guarded, argument, allowance);
}

}  // namespace gainsay::core
