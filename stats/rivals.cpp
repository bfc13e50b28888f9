#include "gainsay/stats/rivals.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace gainsay::stats {
namespace {

/// 2 ln sd over the data whose sd is not fitted.
double logarithms_of_sd(const estimation::Problem& problem, const Standardized& all) {
  double sum = 0.0;
  Eigen::Index i = 0;
  for (const estimation::FittedExperiment& experiment : problem.experiments) {
    for (const estimation::FittedSeries& series : experiment.series) {
      for (const estimation::Datum& datum : series.data) {
        if (!has_unknown_sd(series, datum)) sum += 2.0 * std::log(all.sd[i]);
        ++i;
      }
    }
  }
  return sum;
}

}  // namespace

double minus_two_ln_likelihood(const estimation::Problem& problem, const Standardized& all) {
  double sum = all.V;
  for (const FittedNoise& noise : all.noise) {
    const auto points = static_cast<double>(noise.points);
    sum += points * std::log(noise.sd * noise.sd) - noise.sum_of_squares / (noise.sd * noise.sd);
  }
  if (problem.noise_depends_on_model()) sum += logarithms_of_sd(problem, all);
  return sum;
}

Criteria criteria(double minus_two_ln_L, std::size_t N, std::size_t k, std::size_t fitted_sds) {
  Criteria result;
  const auto data = static_cast<double>(N);
  const double K = static_cast<double>(k + fitted_sds);
  result.K = K;
  result.AIC = minus_two_ln_L + 2.0 * K;
  result.BIC = minus_two_ln_L + K * std::log(data);
  if (fitted_sds > 0 && data > K + 1.0)
    result.AICc = result.AIC + 2.0 * K * (K + 1.0) / (data - K - 1.0);
  return result;
}

std::vector<double> akaike_weights(const std::vector<double>& criterion) {
  double least = std::numeric_limits<double>::infinity();
  for (const double value : criterion)
    if (!std::isnan(value)) least = std::min(least, value);
  std::vector<double> weights;
  double sum = 0.0;
  for (const double value : criterion) {
    weights.push_back(std::exp(-0.5 * (value - least)));
    if (!std::isnan(value)) sum += weights.back();
  }
  for (double& weight : weights) weight /= sum;
  return weights;
}

}  // namespace gainsay::stats
