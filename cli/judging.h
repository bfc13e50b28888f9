#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/judgement.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/cli/verdict_words.h"

#include <cstddef>
#include <functional>
#include <optional>
#include <stop_token>
#include <string>

namespace gainsay::cli {

struct JudgingOptions {
  unsigned threads = 1;
  std::optional<std::uint64_t> seed;  ///< replace the study's
  std::optional<long> budget;
  std::stop_token stop;
};

/// Told how the work goes: which hypothesis, how many starts are done of how many expected, the
/// least misfit so far.
struct JudgingObserver {
  std::function<void(std::size_t hypothesis, const std::string& title)> begins;
  std::function<void(std::size_t done, std::size_t expected, double best_V)> goes_on;
};

/// For which a problem is put together: to simulate, every readout is shown and experiments need no
/// data.
enum class Purpose { Judge, Simulate };

/// One hypothesis of a study put together with all its experiments.
core::Result<estimation::Problem> assemble_problem(const Study& study, std::size_t hypothesis,
                                                   Purpose purpose = Purpose::Judge);

/// Judges every hypothesis of a study, in order, each for itself. Stopped early, the outcomes are
/// those that were finished. `reading` holds a study without errors.
Judgement judge_study(const StudyReading& reading, const JudgingOptions& options,
                      const JudgingObserver& observer);

/// "rejected", "not rejected", "undecided".
std::string word(stats::Decision decision);

}  // namespace gainsay::cli
