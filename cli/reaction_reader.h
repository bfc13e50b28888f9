#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/cli/written_expression.h"
#include "gainsay/core/hypothesis.h"

#include <optional>
#include <vector>

namespace gainsay::cli {

/// Reads one entry of [reactions] against the compartments and species read before it: equation,
/// `rate` or `flow`, `back`. Its expressions are added to `expressions`. `rate` may stand where all
/// species of the equation are concentrations in one compartment; else it must be `flow`.
std::optional<core::Reaction> read_reaction(const TomlEntry& entry,
                                            const core::Hypothesis& mechanism,
                                            std::vector<WrittenExpression>& expressions,
                                            Diagnostics& diagnostics);

}  // namespace gainsay::cli
