#include "gainsay/core/notation.h"

#include <algorithm>
#include <array>
#include <numbers>

namespace gainsay::core {

std::span<const Function> all_functions() {
  static constexpr std::array kFunctions{
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
  return kFunctions;
}

const Function* find_function(std::string_view name) {
  const std::span<const Function> all = all_functions();
  const auto found = std::find_if(all.begin(), all.end(),
                                  [&](const Function& function) { return function.name == name; });
  return found == all.end() ? nullptr : &*found;
}

const Function* find_function(Operation operation) {
  const std::span<const Function> all = all_functions();
  const auto found = std::find_if(all.begin(), all.end(), [&](const Function& function) {
    return function.operation == operation;
  });
  return found == all.end() ? nullptr : &*found;
}

std::span<const NamedConstant> all_constants() {
  static constexpr std::array kConstants{
      NamedConstant{"pi", std::numbers::pi, "circumference of a circle over its diameter"},
      NamedConstant{"gas_constant", 8.31446261815324, "molar gas constant [J/(mol K)]"},
  };
  return kConstants;
}

}  // namespace gainsay::core
