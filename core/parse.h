#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/result.h"
#include "gainsay/core/tokens.h"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// A name as it stands in a text.
struct NamedPlace {
  std::string name;
  Place place;
};

struct Parsed {
  Expression expression;
  std::vector<NamedPlace>
      names;  ///< every symbol as written, in order of the text ("t" and "pi" not among them)
};

/// What an expression may lean on beside its text.
struct ParseContext {
  /// The product of the reaction's own side with coefficients as powers: what `mass_action(k)`
  /// multiplies k by. Without it `mass_action` is an error that says where it may stand.
  std::optional<Expression> mass_action_side;
};

/// Infix mathematics to expression (grammar: docs/study-files.md, "Expressions"). `^` binds to the
/// right and before a minus on its left; comparisons do not chain; rate laws are written out into
/// their formulas; `pi` and `gas_constant` become numbers. Names are not checked against anything:
/// see `names`. Fails at the first error with its place.
Result<Parsed> parse(std::string_view text, const ParseContext& context = {});

/// True for functions, constants, `t` and rate laws: what a user's name must not be.
bool is_reserved(std::string_view name);

}  // namespace gainsay::core
