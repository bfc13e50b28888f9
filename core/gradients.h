#pragma once

#include "gainsay/core/value_list.h"

#include <cstddef>
#include <unordered_map>
#include <utility>
#include <vector>

namespace gainsay::core {

/// Derivatives of one value by the variables it depends on: (variable, derivative), ascending in
/// variable; what is absent is zero.
using Gradient = std::vector<std::pair<Value, Value>>;

/// Exact derivatives within a ValueList by the chain rule, forward from the variables, so that they
/// share every value they can with what they are derivatives of. Methods (42)-(44).
class Gradients {
 public:
  /// `list` must outlive this; derivatives are added to it.
  explicit Gradients(ValueList& list) : list_(list) {}

  /// Declares a variable of the list as one to derive by; to be called before anything that
  /// depends on it is asked for.
  void derive_by(Value variable);
  const Gradient& of(Value value);

 private:
  using Slopes = std::vector<std::pair<Value, Value>>;  // (operand, derivative by it)
  Slopes slopes(Value value);
  Slopes slopes_of_product(Value value);
  Gradient through_slopes(Value value);
  Gradient through_branches(Value value);

  ValueList& list_;
  std::unordered_map<Value, Gradient> known_;
};

}  // namespace gainsay::core
