#pragma once

#include <cstddef>
#include <cstdint>
#include <span>
#include <unordered_map>
#include <vector>

namespace gainsay::core {

/// What one value of a ValueList is computed by, from operands a, b, c.
enum class Code : std::uint8_t {
  Constant,    // number
  Variable,    // handed in
  Negate,      // -a
  Inverse,     // 1 / a
  Add,         // a + b
  Subtract,    // a - b
  Multiply,    // a b
  Power,       // a^b, a not negative
  PowerSlope,  // d(a^b)/da = b c / a with c = a^b; at a = 0: 1 if b = 1, else 0
  PowerLog,    // b ln a; at a = 0: 0 (d(a^h)/dh with b = a^h)
  Exp,
  Ln,
  Log10,
  Sqrt,
  Sin,
  Cos,
  Tan,
  Tanh,
  Less,       // a < b
  LessEqual,  // a <= b
  Equal,      // a = b
  And,
  Or,
  Select,   // a ? b : c
  Guarded,  // a if a >= 0; 0 if a >= -b; else not a number
};
inline constexpr std::size_t kCodes = static_cast<std::size_t>(Code::Guarded) + 1;

/// The value of `code` at its operands (those beyond its count are ignored). Truth is 1 or 0; what
/// is not a number makes everything that is decided by it not a number (Kleene's three-valued
/// logic, 1952), so that an argument outside a function's domain is never lost in a comparison,
/// while the branch of Select that is not taken may be anything.
double compute(Code code, double a, double b, double c);
std::size_t operand_count(Code code);

/// Number of a value in a ValueList.
using Value = std::uint32_t;

/// What a value depends on at the most: on nothing, on what is set once for a run (unknowns,
/// inputs, guards), or on what moves (time, states).
enum class Level : std::uint8_t { Fixed, Set, Moving };

/// Expressions as one list of values, each computed from earlier ones, common ones once. The
/// making functions return an earlier value where the same was asked for before, fold constants,
/// and simplify where that leaves the value as it is: zeros and ones drop out, minus signs move
/// outward until they meet a sum.
class ValueList {
 public:
  struct Entry {
    Code code = Code::Constant;
    Level level = Level::Fixed;
    Value a = 0, b = 0, c = 0;
    double number = 0.0;  ///< of a constant
  };

  Value constant(double number);
  Value variable(Level level);  ///< a new one

  Value negate(Value a);
  Value inverse(Value a);
  Value add(Value a, Value b);
  Value subtract(Value a, Value b);
  Value multiply(Value a, Value b);
  Value divide(Value a, Value b);             ///< a times the inverse of b
  Value whole_power(Value a, long exponent);  ///< by multiplications
  Value select(Value condition, Value yes, Value no);
  Value make(Code code, Value a, Value b = 0, Value c = 0);  ///< any other code

  const Entry& operator[](Value value) const { return entries_[value]; }
  std::size_t size() const { return entries_.size(); }
  bool is_constant(Value value) const { return entries_[value].code == Code::Constant; }
  bool is_constant(Value value, double number) const;
  /// The operands of a value, none for constants and variables.
  std::vector<Value> operands(Value value) const;

 private:
  struct Same {
    bool operator()(const Entry& x, const Entry& y) const;
  };
  struct Hash {
    std::size_t operator()(const Entry& entry) const;
  };
  Value keep(const Entry& entry);
  bool is(Code code, Value value) const { return entries_[value].code == code; }

  std::vector<Entry> entries_;
  std::unordered_map<Entry, Value, Hash, Same> known_;
};

}  // namespace gainsay::core
