#include "gainsay/stats/standardized.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <cmath>
#include <functional>

namespace gainsay::stats {
namespace {

constexpr double kFloor = 1e-6;  // of the readout's largest |value|: the likelihood's floor of sd

/// Hands on each datum of unknown noise: its number among the residuals, its group, its value.
void each_of_unknown_noise(
    const estimation::Problem& problem,
    const std::function<void(Eigen::Index, std::size_t, double value)>& take) {
  Eigen::Index i = 0;
  for (const estimation::FittedExperiment& experiment : problem.experiments) {
    for (const estimation::FittedSeries& series : experiment.series) {
      for (const estimation::Datum& datum : series.data) {
        if (has_unknown_sd(series, datum)) take(i, series.noise_group, datum.value);
        ++i;
      }
    }
  }
}

std::vector<FittedNoise> fitted_noise(const estimation::Problem& problem,
                                      const Eigen::VectorXd& r) {
  std::vector<FittedNoise> noise(problem.noise_groups.size());
  std::vector<double> largest(noise.size(), 0.0);
  each_of_unknown_noise(problem, [&](Eigen::Index i, std::size_t group, double value) {
    ++noise[group].points;
    noise[group].sum_of_squares += r[i] * r[i];
    largest[group] = std::max(largest[group], std::abs(value));
  });
  for (std::size_t group = 0; group < noise.size(); ++group) {
    noise[group].readout = problem.noise_groups[group];
    const double floor = kFloor * (largest[group] > 0.0 ? largest[group] : 1.0);
    noise[group].sd = std::sqrt(floor * floor + noise[group].sum_of_squares /
                                                    static_cast<double>(noise[group].points));
  }
  return noise;
}

}  // namespace

bool has_unknown_sd(const estimation::FittedSeries& series, const estimation::Datum& datum) {
  return series.noise.sd_unknown && std::isnan(datum.sd);
}

Standardized standardized(const estimation::Problem& problem,
                          const estimation::Evaluation& evaluation) {
  GAINSAY_REQUIRE(static_cast<std::size_t>(evaluation.r.size()) == problem.residuals(),
                  "an evaluation has all residuals");
  Standardized all{evaluation.r, evaluation.J, evaluation.sd, 0.0,
                   fitted_noise(problem, evaluation.r)};
  each_of_unknown_noise(problem, [&](Eigen::Index i, std::size_t group, double) {
    const double sd = all.noise[group].sd;
    all.sd[i] = sd;
    all.r[i] /= sd;
    if (all.J.size() > 0) all.J.row(i) /= sd;
  });
  all.V = all.r.squaredNorm();
  return all;
}

}  // namespace gainsay::stats
