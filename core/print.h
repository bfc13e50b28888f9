#pragma once

#include "gainsay/core/expression.h"

#include <functional>
#include <string>
#include <string_view>

namespace gainsay::core {

/// Fewest digits that read back as the same double, independent of locale: 0.001, 250000, 1e-7.
std::string print_number(double value);

/// As a user would write it, with the fewest brackets; parse(print(e)) == e.
std::string print_text(const Expression& expression);

/// How a name is shown in mathematics (already escaped for the target language); the default splits
/// trailing digits and parts after `_` off as subscripts and sets Greek letter names as letters.
using NameShown = std::function<std::string(std::string_view name)>;
std::string latex_name(std::string_view name);
std::string mathml_name(std::string_view name);

std::string print_latex(const Expression& expression, const NameShown& shown = latex_name);
/// MathML Core without the outer <math> element (W3C MathML Core).
std::string print_mathml(const Expression& expression, const NameShown& shown = mathml_name);

}  // namespace gainsay::core
