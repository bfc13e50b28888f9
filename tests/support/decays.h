#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/starts.h"
#include "gainsay/testing/bench.h"

#include <cmath>
#include <cstdint>
#include <string>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// Readings of A = exp(-k t) decaying from `start`, with normal noise: the same for equal (seed,
/// number) in every run.
struct SimulatedDecay {
  double start = 10.0;
  double k = 0.3;
  double sd = 0.2;
  std::size_t points = 12;
  double last_time = 11.0;
  std::uint64_t seed = 1;

  std::vector<std::pair<double, double>> readings(std::uint64_t number) const {
    estimation::Draws draws(seed, 1234, number);
    std::vector<std::pair<double, double>> all;
    for (std::size_t i = 0; i < points; ++i) {
      const double t = last_time * static_cast<double>(i + 1) / static_cast<double>(points);
      all.emplace_back(t, start * std::exp(-k * t) + sd * draws.normal());
    }
    return all;
  }
};

/// The truth: A is lost by first order.
inline core::Hypothesis first_order() {
  return Mechanism("first order")
      .species("A", "a0")
      .rate("loss", {{"A", 1}}, {}, "k * A")
      .unknowns({"k", "a0"});
}

/// A rival: the loss does not slow down as A is used up (but stops smoothly at its end).
inline core::Hypothesis zeroth_order() {
  return Mechanism("zeroth order")
      .species("A", "a0")
      .rate("loss", {{"A", 1}}, {}, "k * A / (A + 0.01)")
      .unknowns({"k", "a0"});
}

inline std::vector<estimation::DeclaredUnknown> wide_ranges() {
  return {between("k", 1e-3, 1e2), between("a0", 0.1, 1000)};
}

inline estimation::Problem problem_of(const core::Hypothesis& hypothesis,
                                      const std::vector<estimation::DeclaredUnknown>& unknowns,
                                      const std::vector<estimation::Readout>& readouts,
                                      const std::vector<estimation::Experiment>& experiments) {
  auto made = estimation::assemble(hypothesis, unknowns, readouts, experiments, {});
  if (made) return std::move(made).value();
  ADD_FAILURE() << made.failure().what;
  return {};
}

/// A hypothesis against one simulated decay, its sd known.
inline estimation::Problem against_decay(const core::Hypothesis& hypothesis,
                                         const SimulatedDecay& decay = {},
                                         std::uint64_t number = 0) {
  return problem_of(hypothesis, wide_ranges(), {shows("signal", "A", decay.sd)},
                    {Bench("run-01").data("signal", decay.readings(number))});
}

}  // namespace gainsay::testing
