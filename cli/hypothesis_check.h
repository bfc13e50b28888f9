#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/experiment_reader.h"
#include "gainsay/cli/hypothesis_reader.h"
#include "gainsay/cli/names.h"
#include "gainsay/cli/study_top.h"

#include <vector>

namespace gainsay::cli {

/// Joins a hypothesis with what study and experiments add to its names (knowns, unknowns, inputs),
/// fills these into its mechanism, and says: names that stand for two things, unknown names,
/// circles under [where] and among reactions, volumes and start values that lean on what changes.
NameSpace check_hypothesis(HypothesisReading& reading, const StudyTop& top,
                           const std::vector<ExperimentReading>& experiments,
                           Diagnostics& diagnostics);

/// Says where an expression leans on what it must not, following [where] and reactions.
/// `where_else` as in check_names.
void check_leaning(const WrittenExpression& written, const core::Hypothesis& mechanism,
                   const NameSpace& names, const std::string& where_else, Diagnostics& diagnostics);

}  // namespace gainsay::cli
