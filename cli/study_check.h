#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/experiment_reader.h"
#include "gainsay/cli/hypothesis_reader.h"
#include "gainsay/cli/names.h"
#include "gainsay/cli/study_top.h"

#include <vector>

namespace gainsay::cli {

/// All parts of a study that were read, and the names of each hypothesis.
struct StudyParts {
  StudyTop top;
  std::vector<HypothesisReading> hypotheses;
  std::vector<NameSpace> names;  ///< one for each hypothesis
  std::vector<ExperimentReading> experiments;
  bool all_experiments_read = true;
  bool all_names_known = true;  ///< no error in study.toml or a hypothesis hides a use of a name
};

/// Says what does not fit between the parts: names in readouts and experiments that hypotheses
/// lack, species that they lack and that are not listed as absent, knowns that some experiments do
/// not give or that nothing uses.
void check_parts(const StudyParts& parts, Diagnostics& diagnostics);

}  // namespace gainsay::cli
