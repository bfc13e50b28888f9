#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/search.h"
#include "gainsay/stats/limits.h"
#include "gainsay/stats/verdict.h"

#include <optional>

namespace gainsay::stats {

struct JudgeOptions {
  double alpha = 0.05;
  std::optional<WhichLimit> decides;  ///< what the study says
  estimation::SearchPlan plan;
  bool until_convincing = true;  ///< more random starts while a rejection hangs on them
};

struct Judged {
  /// Within the stated ranges; its best fit is the one that the verdict is about. That is a fit
  /// that did not converge only where none converged, or where it alone came below the limit.
  estimation::SearchResult search;
  Verdict verdict;
};

/// Searches, tests and decides one hypothesis (docs/verdict.md). Depends on the problem, the
/// options and nothing else; the same on any number of threads. Where the fit of a hypothesis to be
/// rejected lies on a bound that may move, the bounds are moved out up to three times and searched
/// with fresh random starts, out of what is left of the budget.
Judged judge(const estimation::Problem& problem, const JudgeOptions& options,
             const estimation::SearchObserver& observer = {});

}  // namespace gainsay::stats
