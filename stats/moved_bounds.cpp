#include "gainsay/stats/moved_bounds.h"

#include "gainsay/core/require.h"

#include <algorithm>

namespace gainsay::stats {
namespace {

constexpr double kTenfold = 10.0;

bool on_lower(const estimation::Unknown& unknown, double value) {
  return value - unknown.low < unknown.high - value;
}

/// A rate constant or a start value is never below zero.
bool ends_at_zero(const estimation::Unknown& unknown) {
  return unknown.linear && unknown.low >= 0.0 &&
         unknown.kind != estimation::UnknownKind::Measurement;
}

bool may_move(const estimation::Unknown& unknown, bool lower) {
  return !unknown.hard && !(lower && ends_at_zero(unknown) && unknown.low == 0.0);
}

double lower_end(const estimation::Unknown& unknown) {
  if (!unknown.linear) return unknown.low / kTenfold;
  const double moved = unknown.low - (unknown.high - unknown.low);
  return ends_at_zero(unknown) ? std::max(moved, 0.0) : moved;
}

double upper_end(const estimation::Unknown& unknown) {
  return unknown.linear ? unknown.high + (unknown.high - unknown.low) : unknown.high * kTenfold;
}

}  // namespace

std::vector<Bound> movable_bounds(const estimation::Problem& problem,
                                  const std::vector<double>& values,
                                  const std::vector<bool>& on_bound) {
  GAINSAY_REQUIRE(values.size() == problem.unknowns.size() && on_bound.size() == values.size(),
                  "a value and a bound for each unknown");
  std::vector<Bound> bounds;
  for (std::size_t u = 0; u < values.size(); ++u) {
    if (!on_bound[u]) continue;
    const bool lower = on_lower(problem.unknowns[u], values[u]);
    if (may_move(problem.unknowns[u], lower)) bounds.push_back({u, lower});
  }
  return bounds;
}

estimation::Problem moved_out(const estimation::Problem& problem,
                              const std::vector<Bound>& bounds) {
  estimation::Problem wider = problem;
  for (const Bound& bound : bounds) {
    const estimation::Unknown& unknown = wider.unknowns[bound.unknown];
    const double low = bound.lower ? lower_end(unknown) : unknown.low;
    const double high = bound.lower ? unknown.high : upper_end(unknown);
    wider = estimation::with_range(wider, bound.unknown, low, high);
  }
  return wider;
}

std::vector<MovedBound> moved_bounds(const estimation::Problem& stated,
                                     const estimation::Problem& wider, double V) {
  std::vector<MovedBound> moved;
  for (std::size_t u = 0; u < stated.unknowns.size(); ++u) {
    const estimation::Unknown& before = stated.unknowns[u];
    const estimation::Unknown& after = wider.unknowns[u];
    if (after.low < before.low) moved.push_back({before.name, true, before.low, after.low, V});
    if (after.high > before.high) moved.push_back({before.name, false, before.high, after.high, V});
  }
  return moved;
}

}  // namespace gainsay::stats
