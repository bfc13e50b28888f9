#pragma once

#include "gainsay/core/expression.h"

namespace gainsay::core {

/// The same function in fewer operations: numbers folded, 0 and 1 removed, double minus undone,
/// equal powers gathered where that is exact. Never changes the value where the original is
/// defined, except in the last bits.
Expression simplify(const Expression& expression);

}  // namespace gainsay::core
