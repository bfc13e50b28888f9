#pragma once

#include "gainsay/cli/console.h"
#include "gainsay/cli/judgement.h"

#include <cstdint>
#include <filesystem>
#include <optional>
#include <string>

namespace gainsay::cli {

struct JudgeCommandOptions {
  std::filesystem::path study = ".";
  unsigned threads = 0;  ///< 0: all cores
  std::optional<std::uint64_t> seed;
  std::optional<long> budget;
  bool json = false;  ///< the JSON of results/ on `out` in place of the table
};

/// Judges a study and writes its `results`. Statuses: 0 done, 2 the study is wrong or cannot be
/// written to, 3 interrupted.
int run_judge(const JudgeCommandOptions& options, const Console& console);

/// The table of verdicts, 80 columns: letter, name, misfit, limit, p, verdict and weightiest
/// reason.
std::string verdict_table(const Judgement& judgement);

}  // namespace gainsay::cli
