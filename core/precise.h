#pragma once

#include "gainsay/core/expression.h"

#include <boost/multiprecision/cpp_dec_float.hpp>

#include <functional>
#include <map>
#include <string>

namespace gainsay::core {

/// A number of 50 decimal digits, for checks that rounding must not decide.
using Precise = boost::multiprecision::cpp_dec_float_50;
using PrecisePoint = std::map<std::string, Precise, std::less<>>;

/// The decimal number that a double was written as: 0.1 is 1/10 exactly.
Precise as_written(double value);

/// Value in 50 digits; every symbol must be given ("t" included). Numbers are taken as written.
/// Not finite where a function is left or a divisor is 0.
Precise evaluate_precisely(const Expression& expression, const PrecisePoint& values);

}  // namespace gainsay::core
