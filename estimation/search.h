#pragma once

#include "gainsay/estimation/fit.h"
#include "gainsay/estimation/optima.h"
#include "gainsay/estimation/problem.h"

#include <cstddef>
#include <cstdint>
#include <functional>
#include <optional>
#include <stop_token>
#include <string>
#include <vector>

namespace gainsay::estimation {

struct Descent {
  Fit fit;
  std::optional<std::uint64_t>
      start_number;  ///< of a random start; none for a first guess or a warmed one
};

struct SearchPlan {
  std::size_t least_starts = 12;  ///< random starts always made
  std::size_t starts_for_rejection = 59;
  std::optional<std::size_t> fixed;  ///< `descents = n`; 0: first guesses alone
  long budget = 20000;               ///< integrations for each experiment
  std::uint64_t seed = 1;
  unsigned threads = 1;
  std::stop_token stop;
};

/// Says, from all descents settled so far (in order of number), whether more random starts are
/// needed: a rejection hangs on them. Asked after each descent from `least_starts` on.
using NeedsMore = std::function<bool(const Fit& best, std::size_t random_starts)>;

struct SearchResult {
  std::vector<Descent> descents;  ///< first guesses, then random starts in order of number
  std::vector<Optimum> optima;    ///< best first
  Fit best;  ///< converged fits before others, then least objective, then least number
  std::size_t random_starts = 0;    ///< that could be integrated
  std::size_t replaced_starts = 0;  ///< that could not
  long integrations = 0;
  bool out_of_budget = false;
  bool interrupted = false;
};

/// Told after each settled descent; `expected` is how many there will be if nothing changes.
using SearchObserver = std::function<void(std::size_t done, std::size_t expected, double best_V)>;

/// Many descents, on all threads; bit-identical for any number of them: descents are numbered and
/// settled in order of number, and every rule reads what is settled. Methods (24), (25). First
/// guesses come first (the middle of the box where there are none and no random start is wanted),
/// then random starts. The descent with which the budget (times the number of experiments) is used
/// up is the last one; an interruption keeps what is settled.
SearchResult search(const Problem& problem, const SearchPlan& plan, const NeedsMore& needs_more,
                    const SearchObserver& observer = {});

}  // namespace gainsay::estimation
