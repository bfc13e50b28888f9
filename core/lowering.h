#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/gradients.h"
#include "gainsay/core/value_list.h"

#include <functional>
#include <map>
#include <optional>
#include <string>
#include <unordered_map>
#include <vector>

namespace gainsay::core {

/// Turns expressions into values of one list.
///
/// A solver may hold a state that has vanished at a slightly negative number, where powers and
/// roots have no value. Their argument a(y) is therefore taken as 0, with derivative 0, down to
/// minus the allowance sum over i of |da/dy_i| guard_i: what the guards of the states amount to
/// there, to first order. Below it is outside the domain. Methods (45).
class Lowering {
 public:
  /// `list` and `gradients` must outlive this.
  Lowering(ValueList& list, Gradients& gradients) : list_(list), gradients_(gradients) {}

  void define(const std::string& name, Value value) { names_[name] = value; }
  void guard(Value state, Value guard) { guards_[state] = guard; }

  /// The value of an expression that outlives this object. A name that was not defined is kept in
  /// unknown_name() and stands for 0.
  Value of(const Expression& expression);
  const std::optional<std::string>& unknown_name() const { return unknown_name_; }

 private:
  Value make(const Expression& expression);
  Value symbol(const std::string& name);
  Value power(Value base, Value exponent);
  Value absolute(Value a);
  Value guarded(Value argument);
  Value negation(Value a) { return list_.make(Code::Equal, a, list_.constant(0.0)); }

  ValueList& list_;
  Gradients& gradients_;
  std::map<std::string, Value, std::less<>> names_;
  std::unordered_map<Value, Value> guards_;
  std::unordered_map<const void*, Value> known_;
  std::optional<std::string> unknown_name_;
};

}  // namespace gainsay::core
