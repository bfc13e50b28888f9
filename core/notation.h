#pragma once

#include "gainsay/core/expression.h"

#include <span>
#include <string_view>

namespace gainsay::core {

/// A function as it is called in expressions.
struct Function {
  std::string_view name;
  Operation operation;
  std::string_view arguments;  ///< as shown in messages: "condition, a, b"
  bool takes_more = false;     ///< further arguments are folded in from the left: min, max
};

/// The table that the parser, the printers and the reserved names are made from.
std::span<const Function> all_functions();
const Function* find_function(std::string_view name);
const Function* find_function(Operation operation);

/// A number that has a name in expressions.
struct NamedConstant {
  std::string_view name;
  double value;
  std::string_view meaning;
};

/// `pi`, and `gas_constant` [J/(mol K)], exact in the SI of 2019 (CODATA 2018: Tiesinga et al.
/// 2021).
std::span<const NamedConstant> all_constants();

}  // namespace gainsay::core
