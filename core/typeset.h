#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/print.h"

#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// What may stand between two factors.
enum class Times { Unseen, Dot };

/// One row of a definition by cases; no condition: otherwise.
struct Case {
  std::string value;
  std::string condition;
};

/// A language that mathematics is set in. Every piece handed in is finished text of that language.
class Typesetter {
 public:
  virtual ~Typesetter() = default;
  virtual std::string name(std::string_view name) const = 0;
  virtual std::string digits(std::string_view digits) const = 0;  ///< "0.25", without sign
  virtual std::string constant(std::string_view name) const = 0;  ///< "pi", "gas_constant"
  virtual std::string minus(const std::string& x) const = 0;
  virtual std::string times(const std::string& a, Times sign, const std::string& b) const = 0;
  /// `sign` is one of Add, Subtract, the comparisons, And, Or.
  virtual std::string between(const std::string& a, Operation sign, const std::string& b) const = 0;
  virtual std::string negation(const std::string& x) const = 0;  ///< not x
  virtual std::string fraction(const std::string& above, const std::string& below) const = 0;
  virtual std::string power(const std::string& base, const std::string& exponent) const = 0;
  virtual std::string root(const std::string& x) const = 0;
  virtual std::string magnitude(const std::string& x) const = 0;  ///< |x|
  virtual std::string call(Operation function, const std::vector<std::string>& arguments) const = 0;
  virtual std::string brackets(const std::string& x) const = 0;
  /// 1 where x holds, else 0, as a factor: [x] (Iverson 1962; Knuth 1992).
  virtual std::string indicator(const std::string& x) const = 0;
  virtual std::string cases(const std::vector<Case>& rows) const = 0;
};

/// Sets an expression with the fewest brackets that mathematics needs: quotients as fractions,
/// products without a sign where that reads well, `if` as cases, a comparison among numbers as an
/// indicator.
std::string typeset(const Expression& expression, const Typesetter& typesetter);

}  // namespace gainsay::core
