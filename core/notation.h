#pragma once

#include "gainsay/core/expression.h"

#include <span>
#include <string_view>

namespace gainsay::core {

/// How tightly signs bind, loosest first; a call, a name or a bracket is Closed.
enum class Binding : int { Or, And, Not, Comparison, Sum, Product, Minus, Power, Closed };

/// The next tighter one; requires one that is not Closed.
Binding tighter(Binding binding);

/// A sign that stands between its operands. All group from the left, but comparisons, which do not
/// chain, and the power, which groups from the right.
struct InfixSign {
  std::string_view text;
  Operation operation;
  Binding binding;
};

const InfixSign* find_infix_sign(std::string_view text);
const InfixSign* find_infix_sign(Operation operation);

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
const NamedConstant* find_constant(std::string_view name);
const NamedConstant* find_constant(double value);

}  // namespace gainsay::core
