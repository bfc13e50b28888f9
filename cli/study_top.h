#pragma once

#include "gainsay/cli/names.h"
#include "gainsay/cli/readout_reader.h"
#include "gainsay/cli/study.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/cli/unknown_reader.h"

#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// An input as study.toml declares it.
struct DeclaredInput {
  std::string name;
  std::optional<double> otherwise;
  Location place;
};

/// What study.toml says.
struct StudyTop {
  Study study;  ///< title, significance, search, accuracy; the lists are filled later
  std::vector<DeclaredInput> inputs;
  std::vector<ReadKnown> knowns;
  std::vector<ReadUnknown> unknowns;
  std::vector<ReadReadout> readouts;
  std::vector<std::string> ignored_columns;
  Location file;
  bool is_understood = false;  ///< false: TOML could not be read, so nothing is known of its names
};

StudyTop read_study_top(const TomlValue& document, const Location& file, Diagnostics& diagnostics);

/// Texts of a list; empty where there is none.
std::vector<std::string> texts_of(const CheckedTable& table, std::string_view key);

}  // namespace gainsay::cli
