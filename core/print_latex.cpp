#include "gainsay/core/print.h"
#include "gainsay/core/shown_name.h"
#include "gainsay/core/tokens.h"
#include "gainsay/core/typeset.h"

#include <cstddef>

namespace gainsay::core {
namespace {

std::string escaped(std::string_view text) {
  std::string result;
  for (const char c : text) {
    switch (c) {
      case '\\':
        result += "\\backslash{}";
        break;
      case '^':
        result += "\\wedge{}";
        break;
      case '~':
        result += "\\sim{}";
        break;
      case '#':
      case '$':
      case '%':
      case '&':
      case '_':
      case '{':
      case '}':
        result += std::string("\\") + c;
        break;
      default:
        result += c;
    }
  }
  return result;
}

/// A part of a name: a Greek letter, a letter in italics, a whole number, or a word upright.
std::string part(std::string_view text) {
  if (const GreekLetter* letter = find_greek_letter(text)) return std::string(letter->latex);
  const bool digits = text.find_first_not_of("0123456789") == std::string_view::npos;
  if (text.size() == 1 || digits) return escaped(text);
  return "\\mathrm{" + escaped(text) + "}";
}

std::string_view sign(Operation operation) {
  switch (operation) {
    case Operation::Add:
      return " + ";
    case Operation::Subtract:
      return " - ";
    case Operation::Less:
      return " < ";
    case Operation::LessEqual:
      return " \\le ";
    case Operation::Greater:
      return " > ";
    case Operation::GreaterEqual:
      return " \\ge ";
    case Operation::Equal:
      return " = ";
    case Operation::NotEqual:
      return " \\ne ";
    case Operation::And:
      return " \\;\\text{and}\\; ";
    default:
      return " \\;\\text{or}\\; ";
  }
}

std::string_view function_name(Operation function) {
  switch (function) {
    case Operation::Exp:
      return "\\exp";
    case Operation::Ln:
      return "\\ln";
    case Operation::Log10:
      return "\\log_{10}";
    case Operation::Sin:
      return "\\sin";
    case Operation::Cos:
      return "\\cos";
    case Operation::Tan:
      return "\\tan";
    case Operation::Tanh:
      return "\\tanh";
    case Operation::Min:
      return "\\min";
    default:
      return "\\max";
  }
}

class Latex final : public Typesetter {
 public:
  explicit Latex(const NameShown& shown) : shown_(shown) {}

  std::string name(std::string_view name) const override { return shown_(name); }
  std::string digits(std::string_view digits) const override { return std::string(digits); }
  std::string constant(std::string_view name) const override {
    return name == "pi" ? "\\pi" : "R_{\\mathrm{gas}}";
  }
  std::string minus(const std::string& x) const override { return "-" + x; }
  std::string times(const std::string& a, Times sign, const std::string& b) const override {
    return a + (sign == Times::Dot ? " \\cdot " : " \\, ") + b;
  }
  std::string between(const std::string& a, Operation operation,
                      const std::string& b) const override {
    return a + std::string(sign(operation)) + b;
  }
  std::string negation(const std::string& x) const override { return "\\text{not}\\; " + x; }
  std::string fraction(const std::string& above, const std::string& below) const override {
    return "\\frac{" + above + "}{" + below + "}";
  }
  std::string power(const std::string& base, const std::string& exponent) const override {
    // LaTeX takes no second superscript: a base with one of its own goes in braces.
    const bool braces = base.find('^') != std::string::npos;
    return (braces ? "{" + base + "}" : base) + "^{" + exponent + "}";
  }
  std::string root(const std::string& x) const override { return "\\sqrt{" + x + "}"; }
  std::string magnitude(const std::string& x) const override { return "\\left|" + x + "\\right|"; }
  std::string call(Operation function, const std::vector<std::string>& arguments) const override {
    std::string inside;
    for (const std::string& argument : arguments) inside += (inside.empty() ? "" : ", ") + argument;
    return std::string(function_name(function)) + brackets(inside);
  }
  std::string brackets(const std::string& x) const override { return "\\left(" + x + "\\right)"; }
  std::string indicator(const std::string& x) const override { return "\\left[" + x + "\\right]"; }
  std::string cases(const std::vector<Case>& rows) const override {
    std::string text = "\\begin{cases} ";
    for (std::size_t i = 0; i < rows.size(); ++i) {
      text += (i > 0 ? " \\\\ " : "") + rows[i].value + " & ";
      text +=
          rows[i].condition.empty() ? "\\text{otherwise}" : "\\text{if}\\; " + rows[i].condition;
    }
    return text + " \\end{cases}";
  }

 private:
  const NameShown& shown_;
};

}  // namespace

std::string latex_name(std::string_view name) {
  const ShownName shown = split_name(name);
  std::string below;
  for (const std::string& subscript : shown.below)
    below += (below.empty() ? "" : ",") + part(subscript);
  return part(shown.base) + (below.empty() ? "" : "_{" + below + "}");
}

std::string print_latex(const Expression& expression, const NameShown& shown) {
  return typeset(expression, Latex(shown));
}

}  // namespace gainsay::core
