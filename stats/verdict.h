#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/search.h"
#include "gainsay/stats/limits.h"
#include "gainsay/stats/order.h"

#include <cstddef>
#include <cstdint>
#include <functional>
#include <optional>
#include <stop_token>
#include <string>
#include <vector>

namespace gainsay::stats {

enum class Decision { Rejected, NotRejected, Undecided };
/// Part of V (or, noise unknown, of the sum of squares) carried by one series, or by the priors
/// ('earlier work').
struct Share {
  std::string experiment;
  std::string readout;
  std::size_t points = 0;
  double V = 0.0;
};

/// One fitted point as the pages show it.
struct StandardResidual {
  std::size_t experiment = 0;  ///< numbers in the Problem
  std::size_t series = 0;
  std::size_t datum = 0;
  double shown = 0.0;
  double sd = 0.0;
  double r = 0.0;  ///< (observed - shown) / sd
};

/// Linear interval of one unknown at the best fit: x +- t or z times its standard error in search
/// coordinates, back in natural units; Methods, "Linear intervals".
struct Interval {
  std::string unknown;
  double estimate = kNotComputed;
  double low = kNotComputed;
  double high = kNotComputed;
  double standard_error = kNotComputed;  ///< natural units (delta method)
  bool determined = false;               ///< false: the data leave it free, no interval
  bool on_bound = false;
  std::string words;  ///< "on its lower bound", "not determined by these data"
};

/// A bound that was moved out because a fit about to be rejected lay on it.
struct MovedBound {
  std::string unknown;
  bool lower = false;
  double stated = 0.0;
  double moved_to = 0.0;
  double V = kNotComputed;  ///< least V found in the wider range
};

/// Everything about one hypothesis that its data say.
struct Verdict {
  Decision decision = Decision::Undecided;
  std::string reason;                  ///< weightiest, short: one line of a table
  std::vector<std::string> sentences;  ///< why, in full sentences
  bool only_within_range = false;      ///< 'rejected only within the range of ...'

  double V = kNotComputed;
  double V_tighter = kNotComputed;  ///< at tolerances 100 times tighter
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

  std::vector<Share> shares;
  std::vector<StandardResidual> residuals;
  std::vector<Interval> intervals;
  std::vector<MovedBound> moved;

  double minus_two_ln_L = kNotComputed;
  double K = 0.0;  ///< k + fitted sds
  double AIC = kNotComputed;
  double AICc = kNotComputed;  ///< where sd is fitted
  double BIC = kNotComputed;
};

struct JudgeOptions {
  double alpha = 0.05;
  std::optional<WhichLimit> decides;  ///< what the study says
  estimation::SearchPlan plan;
  bool until_convincing = true;
};

struct Judged {
  estimation::SearchResult search;
  Verdict verdict;
};

/// Searches, tests and decides one hypothesis. Depends on the problem, the options and nothing
/// else.
Judged judge(const estimation::Problem& problem, const JudgeOptions& options,
             const estimation::SearchObserver& observer = {});

/// Akaike weights among those not rejected (AICc where sd is fitted), in the order given; Burnham &
/// Anderson (2002). Meaningful only on equal data and noise; NaN for those that are rejected or
/// undecided without a fit.
std::vector<double> weights(const std::vector<const Verdict*>& verdicts);

}  // namespace gainsay::stats
