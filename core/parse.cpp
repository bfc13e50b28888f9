#include "gainsay/core/parse.h"

#include "gainsay/core/nearest_name.h"
#include "gainsay/core/notation.h"
#include "gainsay/core/rate_laws.h"
#include "gainsay/core/tokens.h"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cctype>
#include <cstddef>
#include <utility>

namespace gainsay::core {
namespace {

bool is_word_sign(std::string_view name) { return name == "and" || name == "or" || name == "not"; }

/// Names that other notations have, or that this one will have, and what to do about them.
struct OtherFunction {
  std::string_view name;
  std::string_view what;
  std::string_view expected;
  std::string_view to_do;
};
constexpr std::array kOtherFunctions{
    OtherFunction{"log", "'log' does not say which logarithm is meant", "'ln' or 'log10'",
                  "write 'ln' for the natural, 'log10' for the decimal logarithm (ISO 80000-2)"},
    OtherFunction{"pow", "unknown function 'pow'", "a power written with '^'", "write 'a^b'"},
    OtherFunction{"accumulated", "'accumulated' is not yet understood",
                  "an expression without integrals over time",
                  "add a species that the rate in question makes, and show that"},
};

const OtherFunction* find_other_function(std::string_view name) {
  const auto found = std::find_if(kOtherFunctions.begin(), kOtherFunctions.end(),
                                  [&](const OtherFunction& other) { return other.name == name; });
  return found == kOtherFunctions.end() ? nullptr : &*found;
}

std::string quoted(std::string_view text) { return fmt::format("'{}'", text); }

std::string joined(const std::vector<std::string>& words) {
  std::string text;
  for (const std::string& word : words) text += (text.empty() ? "" : ", ") + word;
  return text;
}

/// Carries the first failure out of the descent; never leaves this file.
struct Stop {
  Failure failure;
};

/// Descends by how tightly signs bind (Pratt 1973).
class Parser {
 public:
  Parser(std::vector<Token> tokens, const ParseContext& context)
      : tokens_(std::move(tokens)), context_(context) {}

  Parsed whole() {
    if (here().kind == TokenKind::End) {
      stop("the expression is empty", "a number, a name or '('", "write an expression", here());
    }
    Expression expression = infix(Binding::Or);
    if (here().kind != TokenKind::End) stop_at_leftover();
    return {std::move(expression), std::move(names_)};
  }

 private:
  const Token& here() const { return tokens_[position_]; }
  const Token& next() const { return tokens_[std::min(position_ + 1, tokens_.size() - 1)]; }
  bool at(std::string_view text) const {
    return here().kind != TokenKind::End && here().text == text;
  }
  Token take() { return tokens_[position_++]; }

  [[noreturn]] void stop(std::string what, std::string expected, std::string to_do,
                         const Token& token) const {
    throw Stop{{std::move(what), std::move(expected), std::move(to_do), token.place}};
  }

  /// What binds at least as tightly as `least`.
  Expression infix(Binding least) {
    enter();
    Expression left = prefix(least);
    bool compared = false;
    while (const InfixSign* sign = find_infix_sign(here().text)) {
      if (sign->binding < least) break;
      const Token token = take();
      if (sign->binding == Binding::Comparison && std::exchange(compared, true)) {
        stop("comparisons do not chain", "'and', 'or', or the end of the comparison",
             "write 'a < b and b < c'", token);
      }
      const bool to_the_right = sign->operation == Operation::Power;
      const Binding right = to_the_right ? sign->binding : tighter(sign->binding);
      left = Expression::make(sign->operation, {left, infix(right)});
    }
    --depth_;
    return left;
  }

  void enter() {
    // Far beyond what anybody writes, far below what the stack of a thread holds.
    constexpr int kDeepest = 400;
    if (++depth_ <= kDeepest) return;
    stop("the expression is nested too deeply",
         "at most " + std::to_string(kDeepest) + " levels of brackets and signs",
         "give parts of it names under [where]", here());
  }

  Expression prefix(Binding least) {
    if (at("+")) {
      take();
      return infix(Binding::Minus);
    }
    if (at("-")) {
      take();
      if (here().kind == TokenKind::Number && next().text != "^") return -take().number;
      return -infix(Binding::Minus);
    }
    if (at("not")) {
      const Token token = take();
      if (least > Binding::Not) {
        stop("'not' cannot stand behind a sign that binds tighter", "brackets around it",
             "write '(not a)'", token);
      }
      return Expression::make(Operation::Not, {infix(Binding::Not)});
    }
    return primary();
  }

  Expression primary() {
    const Token token = here();
    if (token.kind == TokenKind::Number) return take().number;
    if (token.kind == TokenKind::Name && !is_word_sign(token.text)) {
      take();
      return at("(") ? call(token) : named(token);
    }
    if (token.text == "(" && token.kind == TokenKind::Sign) {
      take();
      Expression inside = infix(Binding::Or);
      close(token);
      return inside;
    }
    const bool ends = token.kind == TokenKind::End;
    stop(ends ? "the expression ends too early" : quoted(token.text) + " cannot stand here",
         "a number, a name or '('", ends ? "complete the expression" : "put an operand before it",
         token);
  }

  void close(const Token& opened) {
    if (at(")")) {
      take();
      return;
    }
    if (here().kind != TokenKind::End) stop_at_leftover();
    stop("this bracket is never closed", "')' before the end of the expression", "add ')'", opened);
  }

  Expression named(const Token& token) {
    if (token.text == "t") return Expression::symbol("t");
    if (const NamedConstant* constant = find_constant(token.text)) return constant->value;
    if (const OtherFunction* other = find_other_function(token.text)) stop_at(*other, token);
    if (const std::string arguments = arguments_of(token.text); !arguments.empty()) {
      const std::string call = fmt::format("{}({})", token.text, arguments);
      stop(quoted(token.text) + " is a function", call, "give its arguments in brackets", token);
    }
    names_.push_back({std::string(token.text), token.place});
    return Expression::symbol(std::string(token.text));
  }

  /// "x", "S, Vmax, Km"; empty if there is no such function or rate law.
  static std::string arguments_of(std::string_view name) {
    if (const Function* function = find_function(name)) return std::string(function->arguments);
    if (const RateLaw* law = find_rate_law(name)) return joined(law->arguments);
    return "";
  }

  Expression call(const Token& name) {
    if (arguments_of(name.text).empty()) stop_at_unknown_function(name);
    const std::vector<Expression> arguments = bracketed_arguments();
    if (const Function* function = find_function(name.text)) {
      return applied(*function, arguments, name);
    }
    const RateLaw& law = *find_rate_law(name.text);
    if (arguments.size() != law.arguments.size()) {
      stop_at_count(name, std::to_string(law.arguments.size()), arguments.size());
    }
    return law.takes_side ? times_side(arguments.front(), name) : write_out(law, arguments);
  }

  std::vector<Expression> bracketed_arguments() {
    const Token opened = take();
    std::vector<Expression> arguments;
    if (!at(")")) {
      arguments.push_back(infix(Binding::Or));
      while (at(",")) {
        take();
        arguments.push_back(infix(Binding::Or));
      }
    }
    close(opened);
    return arguments;
  }

  Expression applied(const Function& function, const std::vector<Expression>& arguments,
                     const Token& name) const {
    const std::size_t least = operand_count(function.operation);
    if (arguments.size() < least || (arguments.size() > least && !function.takes_more)) {
      stop_at_count(name, std::to_string(least) + (function.takes_more ? " or more" : ""),
                    arguments.size());
    }
    if (!function.takes_more) return Expression::make(function.operation, arguments);
    Expression result = arguments.front();
    for (std::size_t i = 1; i < arguments.size(); ++i) {
      result = Expression::make(function.operation, {result, arguments[i]});
    }
    return result;
  }

  Expression times_side(const Expression& constant, const Token& name) const {
    if (!context_.mass_action_side) {
      stop(quoted(name.text) + " cannot stand here", "the 'rate' or 'back' of a reaction",
           "write the product of the concentrations out", name);
    }
    const Expression& side = *context_.mass_action_side;
    return side.is_number(1.0) ? constant : constant * side;
  }

  [[noreturn]] void stop_at(const OtherFunction& other, const Token& token) const {
    stop(std::string(other.what), std::string(other.expected), std::string(other.to_do), token);
  }

  [[noreturn]] void stop_at_count(const Token& name, const std::string& takes,
                                  std::size_t given) const {
    stop(fmt::format("'{}' takes {} argument{}, not {}", name.text, takes, takes == "1" ? "" : "s",
                     given),
         fmt::format("{}({})", name.text, arguments_of(name.text)),
         "give one for each, in this order", name);
  }

  [[noreturn]] void stop_at_unknown_function(const Token& name) const {
    if (const OtherFunction* other = find_other_function(name.text)) stop_at(*other, name);
    const std::string product = fmt::format("write '{} * (' if a product is meant", name.text);
    if (name.text == "t" || find_constant(name.text) != nullptr) {
      stop(quoted(name.text) + " is no function", "a sign between it and the bracket", product,
           name);
    }
    std::vector<std::string> known;
    for (const Function& function : all_functions()) known.emplace_back(function.name);
    for (const RateLaw& law : all_rate_laws()) known.push_back(law.name);
    std::string expected = "a function or a rate law";
    if (const auto nearest = nearest_name(name.text, known)) {
      expected += "; nearest known name: " + quoted(*nearest);
    }
    stop("unknown function " + quoted(name.text), std::move(expected),
         "correct the name; " + product, name);
  }

  [[noreturn]] void stop_at_leftover() const {
    const Token& token = here();
    const Token& before = tokens_[position_ - 1];
    if (token.text == ")") {
      stop("this bracket was never opened", "an expression with '(' for every ')'",
           "remove it, or add '('", token);
    }
    if (token.text == ",") {
      stop("a comma stands outside the arguments of a function", "a sign such as + or *",
           "write the decimal sign of a number as a point", token);
    }
    std::string word(token.text);
    std::transform(word.begin(), word.end(), word.begin(),
                   [](unsigned char c) { return static_cast<char>(std::tolower(c)); });
    if (is_word_sign(word) && word != token.text) {
      stop("unknown sign " + quoted(token.text), quoted(word), "write it in small letters", token);
    }
    const std::string between = fmt::format("{} * {}", before.text, token.text);
    stop("a sign is missing before " + quoted(token.text), "a sign such as + or *",
         fmt::format("write '{}' if a product is meant", between), token);
  }

  std::vector<Token> tokens_;
  const ParseContext& context_;
  std::size_t position_ = 0;
  int depth_ = 0;
  std::vector<NamedPlace> names_;
};

}  // namespace

Result<Parsed> parse(std::string_view text, const ParseContext& context) {
  Result<std::vector<Token>> tokens = cut_into_tokens(text);
  if (!tokens) return tokens.failure();
  try {
    return Parser(std::move(*tokens), context).whole();
  } catch (Stop& stop) {
    return std::move(stop.failure);
  }
}

bool is_reserved(std::string_view name) {
  return name == "t" || is_word_sign(name) || find_constant(name) != nullptr ||
         find_function(name) != nullptr || find_rate_law(name) != nullptr ||
         find_other_function(name) != nullptr;
}

}  // namespace gainsay::core
