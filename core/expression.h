#pragma once

#include <cstddef>
#include <cstdint>
#include <functional>
#include <map>
#include <memory>
#include <set>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// What a node of an expression does with its operands (count in brackets).
enum class Operation : std::uint8_t {
  Number,    // [0] a value
  Symbol,    // [0] a name; time is the symbol "t"
  Negate,    // [1]
  Add,       // [2]
  Subtract,  // [2]
  Multiply,  // [2]
  Divide,    // [2]
  Power,     // [2]
  Exp,
  Ln,
  Log10,
  Sqrt,
  Abs,
  Sin,
  Cos,
  Tan,
  Tanh,  // [1]
  Min,
  Max,  // [2]
  Less,
  LessEqual,
  Greater,
  GreaterEqual,
  Equal,
  NotEqual,  // [2] true is 1, false is 0
  And,
  Or,
  Not,  // [2] [2] [1] anything but 0 is true
  If    // [3] condition, value where true, value where false
};

/// How many operands it takes: the counts in brackets above.
std::size_t operand_count(Operation operation);

/// An immutable expression; a cheap handle to a shared node. Keeps the form in which it was written
/// (no hidden simplification), so that it can be shown to its author as such.
class Expression {
 public:
  Expression(double number);  // NOLINT(google-explicit-constructor): numbers are expressions
  Expression() : Expression(0.0) {}
  static Expression symbol(std::string name);
  static Expression make(Operation operation, std::vector<Expression> operands);

  Operation operation() const;
  double number() const;            ///< requires Operation::Number
  const std::string& name() const;  ///< requires Operation::Symbol
  std::span<const Expression> operands() const;
  std::size_t hash() const;  ///< of structure; equal expressions have equal hashes
  bool is_number() const { return operation() == Operation::Number; }
  bool is_number(double value) const { return is_number() && number() == value; }
  const void* identity() const { return node_.get(); }  ///< equal for handles to one node

  /// Structural equality.
  friend bool operator==(const Expression& a, const Expression& b);

 private:
  struct Node;
  explicit Expression(std::shared_ptr<const Node> node);
  std::shared_ptr<const Node> node_;
};

Expression operator-(const Expression& a);
Expression operator+(const Expression& a, const Expression& b);
Expression operator-(const Expression& a, const Expression& b);
Expression operator*(const Expression& a, const Expression& b);
Expression operator/(const Expression& a, const Expression& b);
Expression pow(const Expression& base, const Expression& exponent);

/// The node with other operands; the node itself where they are the same, so that sharing is kept.
Expression with_operands(const Expression& node, std::vector<Expression> operands);

/// Each symbol found in `replacements` replaced by its expression (once: replacements are not
/// searched again).
Expression substitute(const Expression& expression,
                      const std::map<std::string, Expression, std::less<>>& replacements);

/// All symbols that occur, "t" included.
std::set<std::string, std::less<>> symbols(const Expression& expression);
bool depends_on(const Expression& expression, std::string_view symbol);

/// Value in plain double arithmetic, by walking the graph; every symbol must be given ("t"
/// included). Slow and simple: the reference for the compiled program, and for constants.
double evaluate(const Expression& expression,
                const std::map<std::string, double, std::less<>>& values);

}  // namespace gainsay::core
