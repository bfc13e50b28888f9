#pragma once

#include "gainsay/cli/key_check.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/unknown.h"

#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A number that has a name, with its place.
struct ReadKnown {
  std::string name;
  double value = 0.0;
  Location place;
};

struct ReadUnknown {
  estimation::DeclaredUnknown declared;
  Location place;
};

/// [knowns] of any file; `outer` is its top level.
std::vector<ReadKnown> read_knowns(const CheckedTable& outer, Section top,
                                   Diagnostics& diagnostics);

/// [unknowns] of study.toml or of a hypothesis.
std::vector<ReadUnknown> read_unknowns(const CheckedTable& outer, Section top,
                                       Diagnostics& diagnostics);

/// `{ value, sd }` or `{ between = [...] }` of a start value: the unknown, without its name.
std::optional<estimation::Unknown> read_uncertain_start(const TomlValue& table,
                                                        Diagnostics& diagnostics);

}  // namespace gainsay::cli
