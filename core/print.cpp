#include "gainsay/core/print.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/notation.h"

#include <array>
#include <charconv>
#include <vector>

namespace gainsay::core {
namespace {

/// How strongly the outermost sign of a text binds; the order is the parser's.
enum Strength : int { kOr, kAnd, kNot, kComparison, kSum, kProduct, kMinus, kPower, kClosed };

struct Shown {
  std::string text;
  Strength strength = kClosed;
};

struct BinarySign {
  std::string_view text;
  Strength strength;
};

BinarySign sign_of(Operation operation) {
  switch (operation) {
    case Operation::Or:
      return {" or ", kOr};
    case Operation::And:
      return {" and ", kAnd};
    case Operation::Less:
      return {" < ", kComparison};
    case Operation::LessEqual:
      return {" <= ", kComparison};
    case Operation::Greater:
      return {" > ", kComparison};
    case Operation::GreaterEqual:
      return {" >= ", kComparison};
    case Operation::Equal:
      return {" == ", kComparison};
    case Operation::NotEqual:
      return {" != ", kComparison};
    case Operation::Add:
      return {" + ", kSum};
    case Operation::Subtract:
      return {" - ", kSum};
    case Operation::Multiply:
      return {" * ", kProduct};
    case Operation::Divide:
      return {" / ", kProduct};
    default:
      return {"^", kPower};
  }
}

std::string bracketed(const Shown& shown, int least) {
  return shown.strength < least ? "(" + shown.text + ")" : shown.text;
}

Shown show_number(double value) {
  for (const NamedConstant& constant : all_constants()) {
    if (constant.value == value) return {std::string(constant.name)};
  }
  return {print_number(value), value < 0.0 ? kMinus : kClosed};
}

Shown show_call(const Function& function, const std::vector<Shown>& operands) {
  std::string text = std::string(function.name) + "(";
  for (const Shown& operand : operands) text += (text.back() == '(' ? "" : ", ") + operand.text;
  return {text + ")"};
}

/// A bare number behind the minus would read back as a negative number.
Shown show_negated(const Expression& negated, const Shown& operand) {
  const bool bare =
      negated.is_number() && operand.text.front() >= '0' && operand.text.front() <= '9';
  return {"-" + (bare ? "(" + operand.text + ")" : bracketed(operand, kMinus)), kMinus};
}

Shown show_binary(Operation operation, const std::vector<Shown>& x) {
  const BinarySign sign = sign_of(operation);
  const bool to_the_right = operation == Operation::Power;
  const bool chains = sign.strength != kComparison && !to_the_right;
  const int least_left = chains ? sign.strength : sign.strength + 1;
  // Behind a power a minus needs no brackets: 2^-x.
  const int least_right = to_the_right ? kMinus : sign.strength + 1;
  return {bracketed(x[0], least_left) + std::string(sign.text) + bracketed(x[1], least_right),
          sign.strength};
}

Shown show(const Expression& node, const std::vector<Shown>& operands) {
  const Operation operation = node.operation();
  if (operation == Operation::Number) return show_number(node.number());
  if (operation == Operation::Symbol) return {node.name()};
  if (const Function* function = find_function(operation)) return show_call(*function, operands);
  if (operation == Operation::Negate) return show_negated(node.operands()[0], operands[0]);
  if (operation == Operation::Not) return {"not " + bracketed(operands[0], kNot), kNot};
  return show_binary(operation, operands);
}

}  // namespace

std::string print_number(double value) {
  std::array<char, 32> text{};
  const auto written = std::to_chars(text.data(), text.data() + text.size(), value);
  return {text.data(), written.ptr};
}

std::string print_text(const Expression& expression) { return fold<Shown>(expression, show).text; }

}  // namespace gainsay::core
