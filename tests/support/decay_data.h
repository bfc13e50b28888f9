#pragma once

#include "gainsay/estimation/starts.h"
#include "gainsay/testing/small_problems.h"

#include <cmath>
#include <cstdint>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// A -> B -> with known solution (Bateman 1910), seen in both: what fits of known outcome are made
/// of. A = a0 exp(-k1 t), B = a0 k1 / (k2 - k1) (exp(-k1 t) - exp(-k2 t)).
struct TwoSteps {
  static SystemText text() {
    return {.states = {{"A", "-k1 * A", "a0"}, {"B", "k1 * A - k2 * B", "0"}},
            .unknowns = {"k1", "k2", "a0"},
            .readouts = {"A", "B"}};
  }
  static std::vector<estimation::Unknown> unknowns() {
    return {unknown("k1", 1e-3, 1e3), unknown("k2", 1e-3, 1e3), unknown("a0", 1e-2, 1e2)};
  }
  static double A(const std::vector<double>& p, double t) { return p[2] * std::exp(-p[0] * t); }
  static double B(const std::vector<double>& p, double t) {
    return p[2] * p[0] / (p[1] - p[0]) * (std::exp(-p[0] * t) - std::exp(-p[1] * t));
  }

  inline static const std::vector<double> kTruth = {0.8, 0.3, 5.0};

  /// Both readouts at ten times, with normal noise of variance (constant sd)^2 + (relative f)^2.
  static std::vector<SmallExperiment> runs(estimation::Noise noise, double constant,
                                           double relative, std::uint64_t number) {
    estimation::Draws draws(17, 0, number);
    std::vector<SmallSeries> both(2);
    for (std::size_t r = 0; r < 2; ++r) {
      both[r].readout = r;
      both[r].noise = noise;
      for (int i = 1; i <= 10; ++i) {
        const double t = 0.6 * i;
        const double f = r == 0 ? A(kTruth, t) : B(kTruth, t);
        both[r].points.push_back({t, f + std::hypot(constant, relative * f) * draws.normal()});
      }
    }
    return {{{}, both}};
  }

  static estimation::Problem problem(estimation::Noise noise, double constant, double relative,
                                     std::uint64_t number = 0, double relative_accuracy = 1e-10) {
    return small_problem(text(), unknowns(), runs(noise, constant, relative, number),
                         relative_accuracy);
  }

  /// Sum over the data of `share(f, z, readout)`, from the closed form: nothing is integrated.
  template <class Share>
  static double sum(const estimation::Problem& problem, const Eigen::VectorXd& log_values,
                    Share share) {
    const std::vector<double> p = {std::exp(log_values[0]), std::exp(log_values[1]),
                                   std::exp(log_values[2])};
    double total = 0.0;
    for (const estimation::FittedExperiment& experiment : problem.experiments) {
      for (const estimation::FittedSeries& series : experiment.series) {
        for (const estimation::Datum& datum : series.data) {
          const double t = experiment.schedule.outputs[datum.output];
          const double f = series.readout_number == 0 ? A(p, t) : B(p, t);
          total += share(f, datum.value, series.readout_number);
        }
      }
    }
    return total;
  }
};

}  // namespace gainsay::testing
