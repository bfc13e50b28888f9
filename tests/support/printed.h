#pragma once

#include <cmath>
#include <cstdlib>
#include <string>

namespace gainsay::testing {

/// Whether `found` rounds to the number as printed: at most half a unit of its last digit away.
inline bool rounds_to(const std::string& printed, double found) {
  const std::size_t exponent = printed.find_first_of("eE");
  const std::string digits = printed.substr(0, exponent);
  const std::size_t point = digits.find('.');
  const int decimals = point == std::string::npos ? 0 : static_cast<int>(digits.size() - point - 1);
  const int power = exponent == std::string::npos ? 0 : std::atoi(printed.c_str() + exponent + 1);
  const double last = std::pow(10.0, power - decimals);
  return std::abs(found - std::strtod(printed.c_str(), nullptr)) <= 0.5 * last * (1.0 + 1e-9);
}

}  // namespace gainsay::testing
