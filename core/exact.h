#pragma once

#include "gainsay/core/expression.h"

#include <optional>
#include <span>

namespace gainsay::core {

/// The value of an operation on finite numbers where double arithmetic gives it without rounding;
/// nothing where it rounds, overflows or is not defined. So 1 / 4 has one, 1 / 3 has none. Errors
/// of rounding are found by the error-free transformations of Moller (1965) and Dekker (1971).
std::optional<double> exact_value(Operation operation, std::span<const double> operands);

}  // namespace gainsay::core
