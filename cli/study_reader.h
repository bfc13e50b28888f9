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
  /// Where each name of a hypothesis is declared, for warnings about it; one for each hypothesis.
  std::vector<std::map<std::string, Location>> places;
};

/// For which a study is read: to be judged, it must say all that a verdict hangs on (what sds
/// belong to, readouts, readings), and it is an error if it does not; to be looked at (check,
/// equations, simulate), that is a warning which asks.
enum class ReadFor { Judging, Looking };

/// Reads study.toml, hypotheses/*.toml, experiments/*.toml and *.csv. Never throws on bad input;
/// also checks that every hypothesis can be put together with the experiments (names, species,
/// knowns), so that a Study that is there can be judged.
StudyReading read_study(const std::filesystem::path& folder, ReadFor what_for = ReadFor::Judging);

}  // namespace gainsay::cli
