#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/core/expression.h"
#include "gainsay/core/parse.h"

#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// What an expression may lean on.
enum class Leans {
  OnAnything,
  OnConstants,    ///< knowns and unknowns, and what [where] makes of them
  OnTheBeginning  ///< these, and inputs (at the beginning)
};

struct NameInText {
  std::string name;
  Location place;
};

/// An expression as a study file holds it, with the places of its names.
struct WrittenExpression {
  core::Expression expression;
  std::vector<NameInText> names;
  std::string role;  ///< "the rate of 'hydration'", for messages
  Leans leans = Leans::OnAnything;
  Location place;
};

/// Reads a text or a number as an expression; says what is wrong with it.
std::optional<WrittenExpression> read_expression(const TomlValue& value, std::string role,
                                                 Leans leans, Diagnostics& diagnostics,
                                                 const core::ParseContext& context = {});

}  // namespace gainsay::cli
