#pragma once

#include "gainsay/stats/verdict.h"

#include <cstddef>

namespace gainsay::stats {

/// How the search ended, as far as a verdict hangs on it.
struct Conviction {
  std::size_t random_starts = 0;          ///< that could be integrated
  std::size_t starts_for_rejection = 59;  ///< see chance_of_a_miss
  bool integrated = false;                ///< some start could be
  bool converged = false;                 ///< the fit that is judged
  bool out_of_budget = false;
  bool interrupted = false;

  bool convincing() const { return random_starts >= starts_for_rejection; }
};

struct Decided {
  Decision decision = Decision::Undecided;
  Ground ground = Ground::CannotBeIntegrated;
};

/// Rejected where a test speaks against the hypothesis at a fit that converged, after a search that
/// convinces; not rejected where no test does; undecided in the cases of Ground. Reads the tests of
/// `verdict`, not its decision.
Decided decide(const Verdict& verdict, const Conviction& conviction);

/// None of n random starts got below the limit: with 95 % confidence a further one would with
/// probability below 1 - 0.05^(1/n); Methods (73).
double chance_of_a_miss(std::size_t random_starts);

}  // namespace gainsay::stats
