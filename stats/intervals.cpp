#include "gainsay/stats/intervals.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/stats/tails.h"

#include <cmath>

namespace gainsay::stats {
namespace {

constexpr double kTail = 0.025;  // on each side
constexpr double kMovesAlong = 1e-3;

double quantile(const IntervalLaw& law) {
  return std::isfinite(law.freedom) ? student_t_quantile(kTail, law.freedom)
                                    : normal_quantile(kTail);
}

/// How far unknown number i of the free ones moves along unit directions that the data leave free.
double along_free_directions(const FreeColumns& free, Eigen::Index i) {
  return free.W.row(i).tail(free.W.cols() - static_cast<Eigen::Index>(free.rank)).norm();
}

/// Standard error in search coordinates.
double standard_error(const FreeColumns& free, Eigen::Index i, double variance) {
  const auto rank = static_cast<Eigen::Index>(free.rank);
  const auto scaled =
      free.W.row(i).head(rank).transpose().cwiseQuotient(free.singular_values.head(rank));
  return std::sqrt(variance) * scaled.norm();
}

std::string words_for(bool low_missing, bool high_missing) {
  if (low_missing && high_missing) return "no end within its range";
  if (low_missing) return "no lower end";
  return high_missing ? "no upper end" : "";
}

void set_ends(Interval& interval, const estimation::Unknown& unknown, double half_width) {
  const double estimate[] = {interval.estimate};
  const std::span<const estimation::Unknown> one(&unknown, 1);
  const Eigen::VectorXd x = estimation::to_coordinates(one, estimate);
  const Eigen::VectorXd step = Eigen::VectorXd::Constant(1, half_width);
  const double low = estimation::from_coordinates(one, x - step)[0];
  const double high = estimation::from_coordinates(one, x + step)[0];
  if (low >= unknown.low) interval.low = low;
  if (high <= unknown.high) interval.high = high;
  interval.words = words_for(std::isnan(interval.low), std::isnan(interval.high));
}

}  // namespace

std::vector<Interval> linear_intervals(std::span<const estimation::Unknown> unknowns,
                                       std::span<const double> values,
                                       const std::vector<bool>& on_bound, const FreeColumns& free,
                                       const IntervalLaw& law) {
  GAINSAY_REQUIRE(values.size() == unknowns.size() && on_bound.size() == unknowns.size(),
                  "a value and a bound for each unknown");
  const Eigen::VectorXd dp_dx = estimation::scale_at(unknowns, values);
  std::vector<Interval> intervals(unknowns.size());
  for (std::size_t u = 0; u < unknowns.size(); ++u) {
    intervals[u].unknown = unknowns[u].name;
    intervals[u].estimate = values[u];
    intervals[u].on_bound = on_bound[u];
    if (!on_bound[u]) continue;
    const bool lower = values[u] - unknowns[u].low < unknowns[u].high - values[u];
    intervals[u].words = lower ? "on its lower bound" : "on its upper bound";
  }
  for (std::size_t i = 0; i < free.unknowns.size(); ++i) {
    const std::size_t u = free.unknowns[i];
    const auto row = static_cast<Eigen::Index>(i);
    Interval& interval = intervals[u];
    interval.determined = along_free_directions(free, row) <= kMovesAlong;
    if (!interval.determined) {
      interval.words = "not determined by these data";
      continue;
    }
    const double error = standard_error(free, row, law.variance);
    interval.standard_error = error * dp_dx[static_cast<Eigen::Index>(u)];
    set_ends(interval, unknowns[u], quantile(law) * error);
  }
  return intervals;
}

}  // namespace gainsay::stats
