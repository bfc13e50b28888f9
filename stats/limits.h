#pragma once

#include <cstddef>
#include <limits>
#include <optional>
#include <string>

namespace gainsay::stats {

inline constexpr double kNotComputed = std::numeric_limits<double>::quiet_NaN();

enum class WhichLimit { Full, Reduced };

/// One limit for V: the 1 - level quantile of chi-square with `freedom` degrees, and the upper tail
/// at V. V passes the limit exactly where the tail is below the level.
struct Limit {
  double V =
      kNotComputed;  ///< the V that is asked: the least one (full), that of the fit (reduced)
  double value = kNotComputed;
  double freedom = 0.0;
  double p_value = kNotComputed;
  std::string not_offered;  ///< why, where it is not

  bool offered() const { return not_offered.empty(); }
  bool passed() const { return offered() && V > value; }
};

/// The full limit: chi-square with N degrees, Methods (61). Needs no linearisation and no count of
/// unknowns: the least V cannot exceed V at the truth, which has this law if the truth lies within
/// the ranges. Requires N > 0, 0 < level < 1.
Limit full_limit(double least_V, std::size_t N, double level);

/// The reduced limit: chi-square with N - k degrees, k the rank of the weighted sensitivities over
/// the free unknowns (free_columns.h), Methods (62). Linear near the optimum (Seber & Wild 1989).
/// Not offered where N <= k.
Limit reduced_limit(double V, std::size_t N, std::size_t k, double level);

/// Which one decides: what the study says, else the reduced limit where N >= 12 and N >= 3 k (there
/// its size was at most 0.068 at alpha 0.05 in simulations), else the full one.
WhichLimit which_decides(std::optional<WhichLimit> stated, std::size_t N, std::size_t k);

}  // namespace gainsay::stats
