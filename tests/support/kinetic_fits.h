#pragma once

#include "gainsay/core/parse.h"
#include "gainsay/core/program.h"
#include "gainsay/estimation/problem.h"

#include <Eigen/Core>
#include <nlohmann/json.hpp>

#include <algorithm>
#include <array>
#include <cmath>
#include <fstream>
#include <set>
#include <stdexcept>
#include <string>
#include <vector>

namespace gainsay::testing {

/// One of the fits under tests/fits: a kinetic model with simulated data, wide ranges and twenty
/// common starts (tests/fits/README.md).
struct KineticFit {
  std::string name;
  double best_known_V = 0.0;
  double V_at_truth = 0.0;
  std::vector<double> truth;
  estimation::Problem problem;
  std::vector<Eigen::VectorXd> starts;  ///< natural logarithms
};

enum class Ranges { Plain, Shifted };

inline constexpr std::array kKineticFits = {"revnet", "polym",   "ring6",
                                            "oreg",   "ferment", "toggle"};

namespace kinetic_fits_detail {

using nlohmann::json;

inline core::Expression expression(const json& text) {
  auto parsed = core::parse(text.get<std::string>());
  if (!parsed) throw std::runtime_error(text.get<std::string>() + ": " + parsed.failure().what);
  return parsed->expression;
}

inline std::vector<std::string> names(const json& list) {
  std::vector<std::string> all;
  for (const json& item : list)
    all.push_back(item.is_string() ? item.get<std::string>() : item.at("name").get<std::string>());
  return all;
}

/// The unknowns that occur anywhere in the system, in the order given.
inline std::vector<std::string> occurring(const core::System& system,
                                          const std::vector<std::string>& candidates) {
  std::set<std::string, std::less<>> found;
  for (const auto* list : {&system.rates, &system.starts, &system.readouts})
    for (const core::Expression& item : *list) found.merge(core::symbols(item));
  std::vector<std::string> all;
  std::copy_if(candidates.begin(), candidates.end(), std::back_inserter(all),
               [&](const std::string& name) { return found.contains(name); });
  return all;
}

inline core::System system_of(const json& fit, const json& experiment) {
  core::System system;
  system.states = names(fit.at("states"));
  system.inputs = names(fit.at("inputs"));
  for (const json& state : fit.at("states")) {
    system.rates.push_back(expression(state.at("rate")));
    system.starts.push_back(expression(state.at("start")));
  }
  for (const json& series : experiment.at("series")) {
    for (const json& readout : fit.at("readouts")) {
      if (readout.at("name") == series.at("readout"))
        system.readouts.push_back(expression(readout.at("shows")));
    }
  }
  system.unknowns = occurring(system, names(fit.at("unknowns")));
  return system;
}

inline core::Schedule schedule_of(const json& experiment) {
  core::Schedule schedule;
  const json& segments = experiment.at("segments");
  schedule.begins = segments.at(0).at("from");
  schedule.inputs = segments.at(0).at("inputs").get<std::vector<double>>();
  for (std::size_t s = 1; s < segments.size(); ++s) {
    core::Event event;
    event.time = segments[s].at("from");
    const json& inputs = segments[s].at("inputs");
    for (std::size_t i = 0; i < inputs.size(); ++i) event.settings.emplace_back(i, inputs[i]);
    schedule.events.push_back(event);
  }
  std::set<double> times;
  for (const json& series : experiment.at("series"))
    for (const json& point : series.at("points")) times.insert(point.at(0).get<double>());
  schedule.outputs.assign(times.begin(), times.end());
  return schedule;
}

inline estimation::FittedExperiment experiment_of(const json& fit, const json& experiment) {
  estimation::FittedExperiment fitted;
  auto program = core::Program::compile(system_of(fit, experiment));
  if (!program) throw std::runtime_error(program.failure().what);
  fitted.program = std::move(program).value();
  fitted.schedule = schedule_of(experiment);
  for (const json& state : fit.at("states"))
    fitted.absolute.push_back(1e-8 * state.at("size").get<double>());
  const std::vector<std::string> unknowns = names(fit.at("unknowns"));
  for (const std::string& name : fitted.program->system().unknowns) {
    fitted.unknown_numbers.push_back(static_cast<std::size_t>(
        std::find(unknowns.begin(), unknowns.end(), name) - unknowns.begin()));
  }
  const std::vector<std::string> readouts = names(fit.at("readouts"));
  for (const json& listed : experiment.at("series")) {
    estimation::FittedSeries series;
    series.readout = listed.at("readout");
    series.readout_number = static_cast<std::size_t>(
        std::find(readouts.begin(), readouts.end(), series.readout) - readouts.begin());
    for (const json& point : listed.at("points")) {
      estimation::Datum datum;
      const std::vector<double>& outputs = fitted.schedule.outputs;
      datum.output = static_cast<std::size_t>(
          std::lower_bound(outputs.begin(), outputs.end(), point.at(0).get<double>()) -
          outputs.begin());
      datum.readout = fitted.series.size();
      datum.value = point.at(1);
      datum.sd = point.at(2);
      series.data.push_back(datum);
    }
    fitted.series.push_back(std::move(series));
  }
  return fitted;
}

}  // namespace kinetic_fits_detail

/// Reads one fit. "Shifted" ranges have the same width in logarithms, with the truth at 15 or 85 %
/// of it; starts move along.
inline KineticFit kinetic_fit(const std::string& name, Ranges ranges) {
  using namespace kinetic_fits_detail;
  std::ifstream file(std::string(GAINSAY_SOURCE_DIR) + "/tests/fits/" + name + ".json");
  const json fit = json::parse(file);
  KineticFit made;
  made.name = name;
  made.best_known_V = fit.at("best_known_V");
  made.V_at_truth = fit.at("V_at_truth");
  made.problem.hypothesis = fit.at("title");
  made.problem.readouts = names(fit.at("readouts"));
  std::vector<double> moves;
  for (const json& listed : fit.at("unknowns")) {
    const json& range = listed.at(ranges == Ranges::Plain ? "range" : "shifted");
    estimation::Unknown unknown;
    unknown.name = listed.at("name");
    unknown.low = range.at(0);
    unknown.high = range.at(1);
    moves.push_back(std::log(unknown.low / listed.at("range").at(0).get<double>()));
    made.truth.push_back(listed.at("truth"));
    made.problem.unknowns.push_back(unknown);
  }
  for (const json& experiment : fit.at("experiments"))
    made.problem.experiments.push_back(experiment_of(fit, experiment));
  for (const json& start : fit.at("log_starts")) {
    Eigen::VectorXd x(static_cast<Eigen::Index>(start.size()));
    for (std::size_t i = 0; i < start.size(); ++i)
      x[static_cast<Eigen::Index>(i)] = start[i].get<double>() + moves[i];
    made.starts.push_back(x);
  }
  return made;
}

}  // namespace gainsay::testing
