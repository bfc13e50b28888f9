#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study.h"

#include <filesystem>
#include <map>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A study folder read whole: every error of every file at once.
struct StudyReading {
  std::optional<Study> study;           ///< absent if there is an error
  std::vector<Diagnostic> diagnostics;  ///< errors and warnings, in order
  std::map<std::string, std::string>
      texts;  ///< bytes of every file read, by name relative to the study
};

/// Reads study.toml, hypotheses/*.toml, experiments/*.toml and *.csv. Never throws on bad input;
/// also checks that every hypothesis can be put together with the experiments (names, species,
/// knowns), so that a Study that is there can be judged.
StudyReading read_study(const std::filesystem::path& folder);

}  // namespace gainsay::cli
