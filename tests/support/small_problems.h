#pragma once

#include "gainsay/core/program.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/testing/systems.h"

#include <algorithm>
#include <array>
#include <limits>
#include <memory>
#include <set>
#include <stdexcept>
#include <string>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// Readings of one readout (its number in SystemText::readouts): (time, value).
struct SmallSeries {
  std::size_t readout = 0;
  std::vector<std::array<double, 2>> points;
  double sd = std::numeric_limits<double>::quiet_NaN();  ///< of each point; else `noise` holds
  estimation::Noise noise;
};

struct SmallExperiment {
  std::vector<double> inputs;
  std::vector<SmallSeries> series;
};

inline estimation::Unknown unknown(std::string name, double low, double high) {
  return {.name = std::move(name), .low = low, .high = high};
}

inline estimation::Unknown linear_unknown(std::string name, double low, double high) {
  return {.name = std::move(name), .low = low, .high = high, .linear = true};
}

namespace small_problems_detail {

inline core::Schedule schedule_of(const SmallExperiment& experiment) {
  std::set<double> times;
  for (const SmallSeries& series : experiment.series)
    for (const auto& point : series.points) times.insert(point[0]);
  core::Schedule schedule;
  schedule.inputs = experiment.inputs;
  schedule.outputs.assign(times.begin(), times.end());
  return schedule;
}

inline estimation::FittedSeries series_of(const SmallSeries& series, const std::string& name,
                                          const std::vector<double>& outputs) {
  estimation::FittedSeries fitted;
  fitted.readout = name;
  fitted.readout_number = series.readout;
  fitted.noise = series.noise;
  for (const auto& [time, value] : series.points) {
    estimation::Datum datum;
    datum.output = static_cast<std::size_t>(std::lower_bound(outputs.begin(), outputs.end(), time) -
                                            outputs.begin());
    datum.readout = series.readout;
    datum.value = value;
    datum.sd = series.sd;
    datum.point = fitted.data.size();
    fitted.data.push_back(datum);
  }
  return fitted;
}

}  // namespace small_problems_detail

/// A problem of one system in several experiments that differ in inputs and data. `unknowns` are
/// those of the system, in its order. Readouts are named "r0", "r1", ...; one group of unknown
/// noise for each readout that wants it; absolute tolerances are 1e-12.
inline estimation::Problem small_problem(const SystemText& text,
                                         std::vector<estimation::Unknown> unknowns,
                                         const std::vector<SmallExperiment>& experiments,
                                         double relative_accuracy = 1e-10) {
  estimation::Problem problem;
  problem.hypothesis = "small";
  problem.unknowns = std::move(unknowns);
  problem.relative_accuracy = relative_accuracy;
  for (std::size_t r = 0; r < text.readouts.size(); ++r)
    problem.readouts.push_back("r" + std::to_string(r));
  auto compiled = core::Program::compile(read_system(text));
  if (!compiled) throw std::runtime_error(compiled.failure().what);
  const std::shared_ptr<const core::Program> program = std::move(compiled).value();
  for (const SmallExperiment& experiment : experiments) {
    estimation::FittedExperiment fitted;
    fitted.name = "run " + std::to_string(problem.experiments.size());
    fitted.program = program;
    fitted.schedule = small_problems_detail::schedule_of(experiment);
    fitted.absolute.assign(text.states.size(), 1e-12);
    for (std::size_t j = 0; j < text.unknowns.size(); ++j) fitted.unknown_numbers.push_back(j);
    for (const SmallSeries& series : experiment.series) {
      const std::string& name = problem.readouts[series.readout];
      fitted.series.push_back(
          small_problems_detail::series_of(series, name, fitted.schedule.outputs));
      if (!series.noise.sd_unknown) continue;
      auto& groups = problem.noise_groups;
      if (std::find(groups.begin(), groups.end(), name) == groups.end()) groups.push_back(name);
      fitted.series.back().noise_group =
          static_cast<std::size_t>(std::find(groups.begin(), groups.end(), name) - groups.begin());
    }
    problem.experiments.push_back(std::move(fitted));
  }
  return problem;
}

}  // namespace gainsay::testing
