#include "gainsay/core/typeset.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/notation.h"
#include "gainsay/core/shown_name.h"

#include <utility>

namespace gainsay::core {
namespace {

/// What meets the eye at the left or right end of a piece.
enum class Edge { Letter, Word, Digit, Bracket, Block };

struct Piece {
  std::string text;
  Binding binding = Binding::Closed;
  Edge begins = Edge::Block;
  Edge ends = Edge::Block;
  bool minus_first = false;
  /// What it is made of, where the piece around it may set that anew: the rows of an `if`, the
  /// arguments of min and max, what a minus stands before, what stands above and below a line.
  std::vector<Case> rows;
  std::vector<std::string> arguments;
  std::vector<Piece> behind_minus;
  std::vector<Piece> above_and_below;
};

bool is_logic(const Piece& x) { return x.binding <= Binding::Comparison && x.rows.empty(); }

/// Whether nothing between two factors would be misread: 2 3, f (x) or a run of words.
Times between_factors(Edge left, Edge right) {
  const bool name_before = left == Edge::Letter || left == Edge::Word;
  if (right == Edge::Digit) return Times::Dot;
  if (left == Edge::Digit && right == Edge::Block) return Times::Dot;
  if (left == Edge::Word && right == Edge::Word) return Times::Dot;
  if (name_before && right == Edge::Bracket) return Times::Dot;
  return Times::Unseen;
}

class Setting {
 public:
  explicit Setting(const Typesetter& target) : target_(target) {}

  Piece operator()(const Expression& node, const std::vector<Piece>& x) const {
    switch (node.operation()) {
      case Operation::Number:
        return number(node.number());
      case Operation::Symbol:
        return name(node.name());
      case Operation::Negate:
        return minus(x[0]);
      case Operation::Add:
        return sum(Operation::Add, x[0], x[1], Binding::Sum);
      case Operation::Subtract:
        return sum(Operation::Subtract, x[0], x[1], Binding::Product);
      case Operation::Multiply:
        return product(x[0], x[1]);
      case Operation::Divide:
        return quotient(x[0], x[1]);
      case Operation::Power:
        return power(x[0], x[1]);
      case Operation::Sqrt:
        return closed(target_.root(as_number(x[0])));
      case Operation::Abs:
        return closed(target_.magnitude(as_number(x[0])));
      case Operation::Min:
      case Operation::Max:
        return extreme(node, x);
      case Operation::Not:
        return {target_.negation(fenced(x[0], Binding::Not)), Binding::Not};
      case Operation::If:
        return cases(x[0], x[1], x[2]);
      default:
        break;
    }
    if (find_function(node.operation()) != nullptr) {
      return call(node.operation(), {as_number(x[0])});
    }
    return logic(*find_infix_sign(node.operation()), x[0], x[1]);
  }

 private:
  static Piece closed(std::string text) { return {std::move(text)}; }
  static Piece without_parts(const Piece& x) {
    return {x.text, x.binding, x.begins, x.ends, x.minus_first};
  }

  Piece call(Operation function, const std::vector<std::string>& arguments) const {
    return {target_.call(function, arguments), Binding::Closed, Edge::Word, Edge::Bracket};
  }

  Piece bracketed(const Piece& x, Binding least) const {
    const bool among_numbers = least >= Binding::Sum;
    return {is_logic(x) && among_numbers ? target_.indicator(x.text) : target_.brackets(x.text),
            Binding::Closed, Edge::Bracket, Edge::Bracket};
  }

  /// The piece, in brackets where it binds less tightly than its place demands.
  Piece placed(const Piece& x, Binding least) const {
    return x.binding < least ? bracketed(x, least) : x;
  }
  /// The same behind a sign, where a minus needs brackets of its own.
  Piece placed_behind(const Piece& x, Binding least) const {
    return x.minus_first ? bracketed(x, Binding::Closed) : placed(x, least);
  }
  std::string fenced(const Piece& x, Binding least) const { return placed(x, least).text; }
  std::string as_number(const Piece& x) const {
    return is_logic(x) ? target_.indicator(x.text) : x.text;
  }

  Piece name(const std::string& name) const {
    const Edge edge = shows_one_letter(name) ? Edge::Letter : Edge::Word;
    return {target_.name(name), Binding::Closed, edge, edge};
  }

  Piece number(double value) const {
    if (const NamedConstant* constant = find_constant(value)) {
      return {target_.constant(constant->name), Binding::Closed, Edge::Letter, Edge::Letter};
    }
    std::string digits = print_number(value);
    if (digits.front() == '-') return minus(number(-value));
    const std::size_t e = digits.find('e');
    if (e == std::string::npos) {
      return {target_.digits(digits), Binding::Closed, Edge::Digit, Edge::Digit};
    }
    return scientific(digits.substr(0, e), digits.substr(e + 1));
  }

  Piece scientific(const std::string& digits, const std::string& exponent) const {
    const bool negative = exponent.front() == '-';
    const std::string size = target_.digits(exponent.substr(negative ? 1 : 0));
    const std::string power =
        target_.power(target_.digits("10"), negative ? target_.minus(size) : size);
    if (digits == "1") return {power, Binding::Power, Edge::Digit, Edge::Digit};
    return {target_.times(target_.digits(digits), Times::Dot, power), Binding::Product, Edge::Digit,
            Edge::Digit};
  }

  Piece minus(const Piece& x) const {
    const Piece inside = placed_behind(x, Binding::Product);
    Piece piece{target_.minus(inside.text), Binding::Minus, Edge::Block, inside.ends, true};
    piece.behind_minus = {inside};
    return piece;
  }

  Piece sum(Operation sign, const Piece& a, const Piece& b, Binding least_behind) const {
    const Piece left = placed(a, Binding::Sum);
    const Piece right = placed_behind(b, least_behind);
    return {target_.between(left.text, sign, right.text), Binding::Sum, left.begins, right.ends,
            left.minus_first};
  }

  Piece product(const Piece& a, const Piece& b) const {
    const Piece left = placed(a, Binding::Product);
    const Piece right = placed_behind(b, Binding::Product);
    const Times sign = between_factors(left.ends, right.begins);
    return {target_.times(left.text, sign, right.text), Binding::Product, left.begins, right.ends,
            left.minus_first};
  }

  /// A minus goes before the line, and a / b / c stands on one line: a / (b c).
  Piece quotient(const Piece& a, const Piece& b) const {
    if (!a.behind_minus.empty()) return minus(quotient(a.behind_minus.front(), b));
    if (!a.above_and_below.empty()) {
      return quotient(a.above_and_below[0], product(a.above_and_below[1], b));
    }
    Piece piece{target_.fraction(as_number(a), as_number(b)), Binding::Minus};
    piece.above_and_below = {without_parts(a), without_parts(b)};
    return piece;
  }

  Piece power(const Piece& a, const Piece& b) const {
    const Piece base = placed(a, Binding::Closed);
    return {target_.power(base.text, as_number(b)), Binding::Power, base.begins, base.ends};
  }

  Piece logic(const InfixSign& sign, const Piece& a, const Piece& b) const {
    const Binding least = tighter(sign.binding);
    const Binding least_left = sign.binding == Binding::Comparison ? least : sign.binding;
    return {target_.between(fenced(a, least_left), sign.operation, fenced(b, least)), sign.binding};
  }

  Piece extreme(const Expression& node, const std::vector<Piece>& x) const {
    std::vector<std::string> arguments;
    for (std::size_t i = 0; i < x.size(); ++i) {
      if (node.operands()[i].operation() == node.operation()) {
        arguments.insert(arguments.end(), x[i].arguments.begin(), x[i].arguments.end());
      } else {
        arguments.push_back(as_number(x[i]));
      }
    }
    Piece piece = call(node.operation(), arguments);
    piece.arguments = std::move(arguments);
    return piece;
  }

  Piece cases(const Piece& condition, const Piece& where_true, const Piece& where_false) const {
    std::vector<Case> rows{{as_number(where_true), condition.text}};
    if (where_false.rows.empty()) {
      rows.push_back({as_number(where_false), ""});
    } else {
      rows.insert(rows.end(), where_false.rows.begin(), where_false.rows.end());
    }
    Piece piece{target_.cases(rows), Binding::Or};
    piece.rows = std::move(rows);
    return piece;
  }

  const Typesetter& target_;
};

}  // namespace

std::string typeset(const Expression& expression, const Typesetter& typesetter) {
  return fold<Piece>(expression, Setting(typesetter)).text;
}

}  // namespace gainsay::core
