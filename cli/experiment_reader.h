#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_top.h"
#include "gainsay/cli/table_reader.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/cli/unknown_reader.h"
#include "gainsay/cli/written_expression.h"
#include "gainsay/estimation/experiment.h"

#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A species that an experiment names: in `start`, a dose or `absent`.
struct NamedSpecies {
  std::string name;
  Location place;
  bool is_absent = false;
};

/// An experiment as its file gives it, before its table is read.
struct ExperimentReading {
  estimation::Experiment experiment;
  std::vector<ReadKnown> knowns;
  std::vector<NamedSpecies> species;
  std::vector<WrittenExpression> expressions;  ///< start values and doses
  std::vector<WrittenExpression> dose_sizes;   ///< those of doses again
  std::vector<std::string> ignored_columns;
  std::string data;  ///< path of its table, relative to its file; empty: the default
  Location data_place;
  Location file;
  std::vector<ReadSeries> series;  ///< filled from the table
  bool table_is_wrong = false;     ///< was said: that it lacks readings says nothing
};

/// Reads an experiment's document. `name` is its stem.
ExperimentReading read_experiment(const TomlValue& document, const std::string& name,
                                  const Location& file, const StudyTop& top,
                                  Diagnostics& diagnostics);

}  // namespace gainsay::cli
