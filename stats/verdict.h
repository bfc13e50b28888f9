#pragma once

#include "gainsay/stats/dependence.h"
#include "gainsay/stats/intervals.h"
#include "gainsay/stats/limits.h"
#include "gainsay/stats/moved_bounds.h"
#include "gainsay/stats/order.h"
#include "gainsay/stats/shares.h"
#include "gainsay/stats/standardized.h"

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::stats {

enum class Decision { Rejected, NotRejected, Undecided };

/// What a decision rests on.
enum class Ground {
  MisfitAboveLimit,       ///< rejected
  ResidualsInOrder,       ///< rejected
  NothingSpeaksAgainst,   ///< not rejected
  CannotBeIntegrated,     ///< undecided, as are all below: no start could be integrated
  ReadoutsDepend,         ///< linearly, and their shared noise is not stated
  NoFreedom,              ///< N <= k: cannot be tested
  NothingToTest,          ///< the noise is unknown and order cannot count
  NoConvergence,          ///< no descent converged and none came below the limit
  TooFewStarts,           ///< something speaks against, but the search is not convincing
  MisfitTooNearLimit,     ///< by the accuracy of the integration
  FailsAtTighterControl,  ///< so that this accuracy is not known
  OrderTooNearShare       ///< by the count of draws
};

/// Everything about one hypothesis that its data say.
struct Verdict {
  Decision decision = Decision::Undecided;
  Ground ground = Ground::CannotBeIntegrated;
  std::string reason;                  ///< weightiest, short: one line of a table
  std::vector<std::string> sentences;  ///< why, in full sentences
  bool only_within_range = false;      ///< rejected, but not with the bounds of `moved` moved out
  bool range_untried = false;          ///< the budget ended before they were searched thoroughly

  double V = kNotComputed;          ///< at the best fit; where sd is fitted, in units of that sd
  double V_tighter = kNotComputed;  ///< V of the deciding limit at tolerances 100 times tighter
  std::size_t N = 0;
  std::size_t k = 0;
  double alpha = 0.05;
  double share_of_V = 0.8;  ///< of alpha; 1 where order cannot count, 0 where noise is unknown
  double share_of_order = 0.2;
  WhichLimit decides = WhichLimit::Reduced;
  Limit full;
  Limit reduced;
  OrderTest order;
  double p_value = kNotComputed;  ///< min(1, P_V / share, P_order / share)
  double departure_sd =
      kNotComputed;  ///< 'all N points off by so many sd' caught nine times in ten
  bool noise_unknown = false;
  std::optional<Dependence> dependence;

  std::vector<FittedNoise> fitted_noise;  ///< of each readout whose sd is unknown
  std::vector<Share> shares;
  std::vector<StandardResidual> residuals;
  std::vector<Interval> intervals;
  std::vector<MovedBound> moved;

  double minus_two_ln_L = kNotComputed;
  double K = 0.0;  ///< k + fitted sds
  double AIC = kNotComputed;
  double AICc = kNotComputed;  ///< where sd is fitted
  double BIC = kNotComputed;

  const Limit& deciding_limit() const;
  bool V_counts() const { return share_of_V > 0.0; }
  bool order_counts() const { return share_of_order > 0.0; }
  /// |V - limit| is at most what tighter tolerances change V by, or that is not known.
  bool V_too_near_limit() const;
  /// V passes the deciding limit, and not by the integration's error alone.
  bool V_speaks_against() const;
  /// P of order is at most its share of alpha, and not by the luck of the draws alone.
  bool order_speaks_against() const;
};

/// Akaike weights among those not rejected (AICc where sd is fitted), in the order given
/// (akaike_weights in rivals.h). Meaningful only on equal data and noise; NaN for those that are
/// rejected or without a fit.
std::vector<double> weights(const std::vector<const Verdict*>& verdicts);

}  // namespace gainsay::stats
