#include "gainsay/core/print.h"
#include "gainsay/core/shown_name.h"
#include "gainsay/core/typeset.h"

#include <cstddef>

namespace gainsay::core {
namespace {

// Characters by their numbers: the page need not state its encoding.
constexpr std::string_view kMinus = "&#x2212;";
constexpr std::string_view kDot = "&#x22C5;";
constexpr std::string_view kInvisibleTimes = "&#x2062;";
constexpr std::string_view kFunctionApplication = "&#x2061;";

std::string escaped(std::string_view text) {
  std::string result;
  for (const char c : text) {
    switch (c) {
      case '&':
        result += "&amp;";
        break;
      case '<':
        result += "&lt;";
        break;
      case '>':
        result += "&gt;";
        break;
      case '"':
        result += "&quot;";
        break;
      case '\'':
        result += "&#39;";
        break;
      default:
        result += c;
    }
  }
  return result;
}

std::string element(std::string_view tag, std::string_view content) {
  return "<" + std::string(tag) + ">" + std::string(content) + "</" + std::string(tag) + ">";
}

std::string sign(std::string_view text) { return element("mo", text); }

bool is_one(std::string_view tag, std::string_view text) {
  const std::string opens = "<" + std::string(tag) + ">";
  const std::string closes = "</" + std::string(tag) + ">";
  return text.starts_with(opens) && text.find(closes) == text.size() - closes.size();
}

/// One element, as fractions and scripts demand of their parts.
std::string grouped(const std::string& text) {
  return is_one("mi", text) || is_one("mn", text) ? text : element("mrow", text);
}

/// A part of a name: one letter is set in italics, a longer word upright (MathML Core 3.2.2).
std::string part(std::string_view text) {
  if (const GreekLetter* letter = find_greek_letter(text)) return element("mi", letter->utf8);
  const bool digits = text.find_first_not_of("0123456789") == std::string_view::npos;
  return element(digits ? "mn" : "mi", escaped(text));
}

std::string_view sign_text(Operation operation) {
  switch (operation) {
    case Operation::Add:
      return "+";
    case Operation::Subtract:
      return kMinus;
    case Operation::Less:
      return "&lt;";
    case Operation::LessEqual:
      return "&#x2264;";
    case Operation::Greater:
      return "&gt;";
    case Operation::GreaterEqual:
      return "&#x2265;";
    case Operation::Equal:
      return "=";
    case Operation::NotEqual:
      return "&#x2260;";
    case Operation::And:
      return "and";
    default:
      return "or";
  }
}

/// The function's letters stand for themselves.
std::string function_name(Operation function) {
  switch (function) {
    case Operation::Exp:
      return element("mi", "exp");
    case Operation::Ln:
      return element("mi", "ln");
    case Operation::Log10:
      return element("msub", element("mi", "log") + element("mn", "10"));
    case Operation::Sin:
      return element("mi", "sin");
    case Operation::Cos:
      return element("mi", "cos");
    case Operation::Tan:
      return element("mi", "tan");
    case Operation::Tanh:
      return element("mi", "tanh");
    case Operation::Min:
      return element("mi", "min");
    default:
      return element("mi", "max");
  }
}

std::string fenced(std::string_view opens, const std::string& x, std::string_view closes) {
  return element("mrow", sign(opens) + grouped(x) + sign(closes));
}

std::string cell(const std::string& content) {
  return "<mtd style=\"text-align:left\">" + content + "</mtd>";
}

class MathMl final : public Typesetter {
 public:
  explicit MathMl(const NameShown& shown) : shown_(shown) {}

  std::string name(std::string_view name) const override { return shown_(name); }
  std::string digits(std::string_view digits) const override { return element("mn", digits); }
  std::string constant(std::string_view name) const override {
    if (name == "pi") return element("mi", "&#x3C0;");
    return element("msub", "<mi mathvariant=\"normal\">R</mi>" + element("mi", "gas"));
  }
  std::string minus(const std::string& x) const override {
    return element("mrow", "<mo form=\"prefix\">" + std::string(kMinus) + "</mo>" + x);
  }
  std::string times(const std::string& a, Times sign_between, const std::string& b) const override {
    if (sign_between == Times::Dot) return a + sign(kDot) + b;
    // Invisible times has no width of its own; a thin space keeps the factors apart.
    return a + "<mo lspace=\"0\" rspace=\"0.17em\">" + std::string(kInvisibleTimes) + "</mo>" + b;
  }
  std::string between(const std::string& a, Operation operation,
                      const std::string& b) const override {
    if (operation == Operation::And || operation == Operation::Or) {
      return a + "<mo lspace=\"0.4em\" rspace=\"0.4em\">" + std::string(sign_text(operation)) +
             "</mo>" + b;
    }
    return a + sign(sign_text(operation)) + b;
  }
  std::string negation(const std::string& x) const override {
    return "<mo form=\"prefix\" lspace=\"0\" rspace=\"0.4em\">not</mo>" + x;
  }
  std::string fraction(const std::string& above, const std::string& below) const override {
    return element("mfrac", grouped(above) + grouped(below));
  }
  std::string power(const std::string& base, const std::string& exponent) const override {
    if (!is_one("msub", base)) return element("msup", grouped(base) + grouped(exponent));
    // Script above script: as siblings the exponent would stand beside the subscript.
    constexpr std::size_t kTag = std::string_view("<msub>").size();
    const std::string parts = base.substr(kTag, base.size() - 2 * kTag - 1);
    return element("msubsup", parts + grouped(exponent));
  }
  std::string root(const std::string& x) const override { return element("msqrt", x); }
  std::string magnitude(const std::string& x) const override {
    return "<mrow><mo form=\"prefix\">|</mo>" + grouped(x) + "<mo form=\"postfix\">|</mo></mrow>";
  }
  std::string call(Operation function, const std::vector<std::string>& arguments) const override {
    std::string inside;
    for (const std::string& argument : arguments) {
      inside += (inside.empty() ? "" : sign(",")) + grouped(argument);
    }
    return function_name(function) + sign(kFunctionApplication) + brackets(inside);
  }
  std::string brackets(const std::string& x) const override { return fenced("(", x, ")"); }
  std::string indicator(const std::string& x) const override { return fenced("[", x, "]"); }
  std::string cases(const std::vector<Case>& rows) const override {
    std::string table;
    for (const Case& row : rows) {
      const std::string condition = row.condition.empty()
                                        ? element("mtext", "otherwise")
                                        : element("mtext", "if&#xA0;") + row.condition;
      table += element("mtr", cell(row.value) + cell(condition));
    }
    return element("mrow", sign("{") + element("mtable", table));
  }

 private:
  const NameShown& shown_;
};

}  // namespace

std::string mathml_name(std::string_view name) {
  const ShownName shown = split_name(name);
  if (shown.below.empty()) return part(shown.base);
  std::string below;
  for (const std::string& subscript : shown.below) {
    below += (below.empty() ? "" : sign(",")) + part(subscript);
  }
  return element("msub", part(shown.base) + grouped(below));
}

std::string print_mathml(const Expression& expression, const NameShown& shown) {
  return grouped(typeset(expression, MathMl(shown)));
}

}  // namespace gainsay::core
