#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_check.h"

namespace gainsay::cli {

/// Says which readings cannot be weighed: neither an sd of their own nor a noise of their readout;
/// and, as errors or (where `judging` is false) warnings, what judging needs to be told: whether
/// sds belong to readings or means, data at all.
void check_data(const StudyParts& parts, bool judging, Diagnostics& diagnostics);

}  // namespace gainsay::cli
