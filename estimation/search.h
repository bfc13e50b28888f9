#pragma once

#include "gainsay/estimation/fit.h"
#include "gainsay/estimation/problem.h"

#include <cstddef>
#include <cstdint>
#include <functional>
#include <optional>
#include <stop_token>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// Descents that ended alike: V within 0.01 and every prediction within 0.1 sd.
struct Optimum {
  std::size_t best_descent = 0;  ///< number in SearchResult::descents
  std::size_t found = 0;         ///< how many random starts ended here
};

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
/// needed: a rejection hangs on them. Asked after each descent.
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

using SearchObserver = std::function<void(std::size_t done, std::size_t expected, double best_V)>;

/// Many descents, on all threads; bit-identical for any number of them.
SearchResult search(const Problem& problem, const SearchPlan& plan, const NeedsMore& needs_more,
                    const SearchObserver& observer = {});

}  // namespace gainsay::estimation
