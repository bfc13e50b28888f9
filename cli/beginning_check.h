#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_check.h"

namespace gainsay::cli {

/// Warns where a reading at the beginning of its experiment equals what its readout shows of start
/// values that are known: it repeats what was given, is no datum, and belongs under `left_out`.
/// Requires parts without errors.
void warn_of_given_readings(const StudyParts& parts, Diagnostics& diagnostics);

}  // namespace gainsay::cli
