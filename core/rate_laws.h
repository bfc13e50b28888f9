#pragma once

#include "gainsay/core/expression.h"

#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// A rate law under its published name, its arguments in the order substrates, products, effectors,
/// constants.
struct RateLaw {
  std::string name;                    ///< as written in expressions: `michaelis_menten`
  std::string title;                   ///< in words
  std::vector<std::string> arguments;  ///< names used in `formula`
  std::vector<std::string> meanings;   ///< one for each argument, with its dimension
  std::string formula;                 ///< in the arguments, as a user would write it
  std::string source;                  ///< publication
  std::string limits;                  ///< where it holds
  /// The law is multiplied by the equation's own side (mass_action): `formula` then only shows it.
  bool takes_side = false;
};

/// The table that the parser, `gainsay laws` and docs/rate-laws.md are made from.
std::span<const RateLaw> all_rate_laws();
const RateLaw* find_rate_law(std::string_view name);

/// The law's formula with these arguments in place; requires the right count, and a law that does
/// not take the equation's side.
Expression write_out(const RateLaw& law, const std::vector<Expression>& arguments);

}  // namespace gainsay::core
