#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/experiment_reader.h"
#include "gainsay/cli/study_files.h"
#include "gainsay/cli/study_top.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// All experiments of a study that could be read.
struct ReadExperiments {
  std::vector<ExperimentReading> experiments;
  bool all_read = true;  ///< false: some file could not be, so that a lack may not be one
};

/// Reads experiments/*.toml, each with its table, and tables that stand alone, in order of name.
/// `knowns` are all names that some file gives as a known.
ReadExperiments read_experiments(StudyFiles& files, const StudyTop& top,
                                 const std::vector<std::string>& knowns, Diagnostics& diagnostics);

}  // namespace gainsay::cli
