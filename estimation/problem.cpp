#include "gainsay/estimation/problem.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <cmath>

namespace gainsay::estimation {

std::size_t Problem::residuals() const {
  std::size_t count = priors();
  for (const auto& experiment : experiments)
    for (const auto& series : experiment.series) count += series.data.size();
  return count;
}

std::size_t Problem::priors() const {
  return static_cast<std::size_t>(
      std::count_if(unknowns.begin(), unknowns.end(),
                    [](const Unknown& unknown) { return unknown.prior.has_value(); }));
}

bool Problem::noise_depends_on_model() const {
  return std::any_of(experiments.begin(), experiments.end(), [](const auto& experiment) {
    return std::any_of(
        experiment.series.begin(), experiment.series.end(), [](const FittedSeries& series) {
          return series.noise.depends_on_model() &&
                 std::any_of(series.data.begin(), series.data.end(),
                             [](const Datum& datum) { return std::isnan(datum.sd); });
        });
  });
}

Problem with_range(const Problem& problem, std::size_t unknown, double low, double high) {
  GAINSAY_REQUIRE(unknown < problem.unknowns.size() && low < high,
                  "an unknown of the problem gets a range that is not empty");
  Problem moved = problem;
  moved.unknowns[unknown].low = low;
  moved.unknowns[unknown].high = high;
  return moved;
}

}  // namespace gainsay::estimation
