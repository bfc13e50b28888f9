#pragma once

#include "gainsay/estimation/unknown.h"
#include "gainsay/stats/free_columns.h"
#include "gainsay/stats/limits.h"

#include <limits>
#include <span>
#include <string>
#include <vector>

namespace gainsay::stats {

/// Linear 95 % interval of one unknown at the best fit, in natural units; Methods (68).
struct Interval {
  std::string unknown;
  double estimate = kNotComputed;
  double low = kNotComputed;             ///< NaN where that end lies beyond the range searched
  double high = kNotComputed;            ///< likewise
  double standard_error = kNotComputed;  ///< natural units: that of x times dp/dx
  bool determined = false;               ///< false: the data leave it free, no interval
  bool on_bound = false;
  std::string words;  ///< "on its lower bound", "not determined by these data", "no upper end"
};

/// The law of the estimates around the truth: normal where the sds are known; by Student's t with
/// N - k degrees where they are fitted, the variance then being N / (N - k) of that by the fitted
/// sds.
struct IntervalLaw {
  double freedom = std::numeric_limits<double>::infinity();
  double variance = 1.0;
};

/// x +- quantile times standard error in search coordinates x, taken back to natural units. The
/// covariance of x is variance (J'J)^-1 over the free columns, by their singular values above the
/// cut. An unknown that moves along a direction below the cut (by more than a thousandth of it) is
/// not determined. `values` are natural, one for each unknown; ends beyond the range searched are
/// said in words.
std::vector<Interval> linear_intervals(std::span<const estimation::Unknown> unknowns,
                                       std::span<const double> values,
                                       const std::vector<bool>& on_bound, const FreeColumns& free,
                                       const IntervalLaw& law);

}  // namespace gainsay::stats
