#include "gainsay/core/print.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/notation.h"

#include <array>
#include <charconv>
#include <vector>

namespace gainsay::core {
namespace {

struct Shown {
  std::string text;
  Binding binding = Binding::Closed;
};

std::string bracketed(const Shown& shown, Binding least) {
  return shown.binding < least ? "(" + shown.text + ")" : shown.text;
}

Shown show_number(double value) {
  if (const NamedConstant* constant = find_constant(value)) return {std::string(constant->name)};
  const std::string text = print_number(value);
  return {text, text.front() == '-' ? Binding::Minus : Binding::Closed};
}

Shown show_call(const Function& function, const std::vector<Shown>& operands) {
  std::string text = std::string(function.name) + "(";
  for (const Shown& operand : operands) text += (text.back() == '(' ? "" : ", ") + operand.text;
  return {text + ")"};
}

Shown show_negated(const Expression& negated, const Shown& operand) {
  // A bare number behind the minus would read back as a negative number.
  const bool bare = negated.is_number() && operand.binding == Binding::Closed &&
                    find_constant(negated.number()) == nullptr;
  const std::string text = bare ? "(" + operand.text + ")" : bracketed(operand, Binding::Minus);
  return {"-" + text, Binding::Minus};
}

Shown show_infix(const InfixSign& sign, const Shown& left, const Shown& right) {
  // A power is written without blanks, and a minus behind it needs no brackets: 2^-x.
  if (sign.operation == Operation::Power) {
    return {bracketed(left, Binding::Closed) + "^" + bracketed(right, Binding::Minus),
            sign.binding};
  }
  const bool chains = sign.binding != Binding::Comparison;
  return {bracketed(left, chains ? sign.binding : tighter(sign.binding)) + " " +
              std::string(sign.text) + " " + bracketed(right, tighter(sign.binding)),
          sign.binding};
}

Shown show(const Expression& node, const std::vector<Shown>& operands) {
  const Operation operation = node.operation();
  if (operation == Operation::Number) return show_number(node.number());
  if (operation == Operation::Symbol) return {node.name()};
  if (operation == Operation::Negate) return show_negated(node.operands()[0], operands[0]);
  if (operation == Operation::Not) {
    return {"not " + bracketed(operands[0], Binding::Not), Binding::Not};
  }
  if (const Function* function = find_function(operation)) return show_call(*function, operands);
  return show_infix(*find_infix_sign(operation), operands[0], operands[1]);
}

}  // namespace

std::string print_number(double value) {
  std::array<char, 400> room{};  // 309 digits before the point, or 324 behind it, and some
  const auto written = [&](std::chars_format format) {
    const auto end = std::to_chars(room.data(), room.data() + room.size(), value, format).ptr;
    return std::string(room.data(), end);
  };
  std::string scientific = written(std::chars_format::scientific);
  const std::size_t e = scientific.find('e');
  if (e == std::string::npos) return scientific;  // infinity, nan
  int exponent = 0;
  const char* digits = scientific.data() + e + (scientific[e + 1] == '+' ? 2 : 1);
  std::from_chars(digits, scientific.data() + scientific.size(), exponent);
  scientific = scientific.substr(0, e + 1) + std::to_string(exponent);

  const std::string fixed = written(std::chars_format::fixed);
  const bool everyday = exponent >= -4 && exponent <= 6;
  return everyday || fixed.size() <= scientific.size() ? fixed : scientific;
}

std::string print_text(const Expression& expression) { return fold<Shown>(expression, show).text; }

}  // namespace gainsay::core
