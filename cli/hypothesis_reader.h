#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/names.h"
#include "gainsay/cli/study.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/cli/unknown_reader.h"
#include "gainsay/cli/written_expression.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// A hypothesis as its file gives it (amendments merged), before the study's names are added.
struct HypothesisReading {
  StudyHypothesis hypothesis;
  std::vector<ReadKnown> knowns;
  std::vector<DeclaredName> names;             ///< all that it declares, in order
  std::vector<WrittenExpression> expressions;  ///< all that it holds
  Location title;                              ///< of the title, else of the file
};

/// Reads the merged document of a hypothesis. What cannot be read is said; names stay declared, so
/// that one slip does not give many errors.
HypothesisReading read_hypothesis(const TomlValue& document, const Location& file,
                                  Diagnostics& diagnostics);

}  // namespace gainsay::cli
