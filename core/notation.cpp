#include "gainsay/core/notation.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <array>
#include <numbers>

namespace gainsay::core {
namespace {

constexpr std::array kInfixSigns{
    InfixSign{"or", Operation::Or, Binding::Or},
    InfixSign{"and", Operation::And, Binding::And},
    InfixSign{"<", Operation::Less, Binding::Comparison},
    InfixSign{"<=", Operation::LessEqual, Binding::Comparison},
    InfixSign{">", Operation::Greater, Binding::Comparison},
    InfixSign{">=", Operation::GreaterEqual, Binding::Comparison},
    InfixSign{"==", Operation::Equal, Binding::Comparison},
    InfixSign{"!=", Operation::NotEqual, Binding::Comparison},
    InfixSign{"+", Operation::Add, Binding::Sum},
    InfixSign{"-", Operation::Subtract, Binding::Sum},
    InfixSign{"*", Operation::Multiply, Binding::Product},
    InfixSign{"/", Operation::Divide, Binding::Product},
    InfixSign{"^", Operation::Power, Binding::Power},
};

constexpr std::array kFunctions{
    Function{"exp", Operation::Exp, "x"},
    Function{"ln", Operation::Ln, "x"},
    Function{"log10", Operation::Log10, "x"},
    Function{"sqrt", Operation::Sqrt, "x"},
    Function{"abs", Operation::Abs, "x"},
    Function{"min", Operation::Min, "a, b, ...", true},
    Function{"max", Operation::Max, "a, b, ...", true},
    Function{"sin", Operation::Sin, "x"},
    Function{"cos", Operation::Cos, "x"},
    Function{"tan", Operation::Tan, "x"},
    Function{"tanh", Operation::Tanh, "x"},
    Function{"if", Operation::If, "condition, a, b"},
};

constexpr std::array kConstants{
    NamedConstant{"pi", std::numbers::pi, "circumference of a circle over its diameter"},
    NamedConstant{"gas_constant", 8.31446261815324, "molar gas constant [J/(mol K)]"},
};

/// The row of a table for which `matches` holds, or null.
template <class Table, class Matches>
auto find_row(const Table& table, Matches matches) -> const typename Table::value_type* {
  const auto found = std::find_if(table.begin(), table.end(), matches);
  return found == table.end() ? nullptr : &*found;
}

}  // namespace

Binding tighter(Binding binding) {
  GAINSAY_REQUIRE(binding != Binding::Closed, "nothing binds tighter than a bracket");
  return static_cast<Binding>(static_cast<int>(binding) + 1);
}

const InfixSign* find_infix_sign(std::string_view text) {
  return find_row(kInfixSigns, [&](const InfixSign& sign) { return sign.text == text; });
}

const InfixSign* find_infix_sign(Operation operation) {
  return find_row(kInfixSigns, [&](const InfixSign& sign) { return sign.operation == operation; });
}

std::span<const Function> all_functions() { return kFunctions; }

const Function* find_function(std::string_view name) {
  return find_row(kFunctions, [&](const Function& function) { return function.name == name; });
}

const Function* find_function(Operation operation) {
  return find_row(kFunctions,
                  [&](const Function& function) { return function.operation == operation; });
}

std::span<const NamedConstant> all_constants() { return kConstants; }

const NamedConstant* find_constant(std::string_view name) {
  return find_row(kConstants, [&](const NamedConstant& constant) { return constant.name == name; });
}

const NamedConstant* find_constant(double value) {
  return find_row(kConstants,
                  [&](const NamedConstant& constant) { return constant.value == value; });
}

}  // namespace gainsay::core
