#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/hypothesis_reader.h"
#include "gainsay/cli/study_files.h"

#include <vector>

namespace gainsay::cli {

/// All hypotheses of a study that could be read.
struct ReadHypotheses {
  std::vector<HypothesisReading> hypotheses;
  bool all_read = true;  ///< false: some file could not be, so that a lack may not be one
};

/// Reads hypotheses/*.toml in order of file name: follows each `base`, merges amendments, gives
/// letters. A file whose name begins with `_` serves as a base only. A file with a syntax error is
/// said and left out, and so is what amends it.
ReadHypotheses read_hypotheses(StudyFiles& files, Diagnostics& diagnostics);

}  // namespace gainsay::cli
