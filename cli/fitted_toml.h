#pragma once

#include "gainsay/cli/judgement.h"

#include <string>

namespace gainsay::cli {

/// The best fit of every hypothesis judged as TOML: one [[fits]] with its letter, name, file,
/// verdict and misfit, and the fitted values by name under [fits.values]. Numbers read back as the
/// same doubles. A hypothesis without any fit is left out.
std::string fitted_toml(const Judgement& judgement);

/// A basic string of TOML 1.0, quoted and escaped.
std::string toml_string(const std::string& words);

/// A float of TOML 1.0: always with a point or an exponent; inf and nan as TOML writes them.
std::string toml_float(double value);

}  // namespace gainsay::cli
