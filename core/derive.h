#pragma once

#include "gainsay/core/expression.h"

#include <string_view>

namespace gainsay::core {

/// The exact derivative by one symbol, simplified. Piecewise functions (abs, min, max, if,
/// comparisons) are derived branch by branch; at a switch the derivative is that of the branch
/// taken. Exact also where that is awkward: d(x^h)/dh = x^h ln(x) is not defined at x = 0.
Expression derivative(const Expression& expression, std::string_view symbol);

}  // namespace gainsay::core
