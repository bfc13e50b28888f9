#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/core/network.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A warning about one hypothesis, with its place.
struct MechanismWarning {
  std::size_t hypothesis = 0;  ///< number in Study::hypotheses
  core::Warning warning;
  Location place;
};

/// What the mechanisms of a study give rise to: a reactant whose rate does not vanish with it,
/// names that nothing uses, unknowns of a hypothesis that nothing depends on, pairs of hypotheses
/// that are the same system. In order of hypotheses. `reading` holds a study.
std::vector<MechanismWarning> mechanism_warnings(const StudyReading& reading);

/// The same as messages.
std::vector<Diagnostic> as_diagnostics(const std::vector<MechanismWarning>& warnings);

}  // namespace gainsay::cli
