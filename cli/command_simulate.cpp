#include "gainsay/cli/command_simulate.h"

#include "gainsay/cli/csv_text.h"
#include "gainsay/cli/find.h"
#include "gainsay/cli/judging.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/core/integrator.h"
#include "gainsay/core/nearest_name.h"
#include "gainsay/core/print.h"
#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/problem.h"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <algorithm>
#include <charconv>
#include <cmath>
#include <set>

namespace gainsay::cli {
namespace {

constexpr double kStepsUnlessSaid = 100.0;
constexpr double kMostTimes = 1e6;

template <class T>
using Result = core::Result<T>;
using core::Failure;

/// The times to write: even ones up to --until, or those of the experiment's data.
Result<std::vector<double>> times_to_write(const SimulateOptions& options,
                                           const estimation::Experiment& experiment) {
  if (options.every && !options.until) {
    return Failure{.what = "--every is given without --until",
                   .expected = "both, or neither",
                   .to_do = "add --until T",
                   .place = {}};
  }
  if (options.until) {
    const double length = *options.until - experiment.begins;
    const double every = options.every.value_or(length / kStepsUnlessSaid);
    if (!(length > 0.0) || !(every > 0.0) || !std::isfinite(length) ||
        length / every > kMostTimes) {
      return Failure{.what = fmt::format("no times between {} and --until {} in steps of {}",
                                         experiment.begins, *options.until, every),
                     .expected = "an end after the beginning, and at most a million steps",
                     .to_do = "correct --until or --every",
                     .place = {}};
    }
    std::vector<double> times;
    const auto steps = static_cast<std::size_t>(std::floor(length / every * (1.0 + 1e-12)));
    for (std::size_t i = 0; i <= steps; ++i)
      times.push_back(experiment.begins + static_cast<double>(i) * every);
    return times;
  }
  std::set<double> times;
  for (const estimation::Series& series : experiment.series) {
    for (const estimation::Point& point : series.points) times.insert(point.time);
  }
  if (times.empty()) {
    return Failure{.what = "no times to write",
                   .expected = "--until, or an experiment with data",
                   .to_do = "add --until T, or --experiment E",
                   .place = {}};
  }
  return std::vector<double>(times.begin(), times.end());
}

Result<std::vector<double>> values_of(const estimation::Problem& problem,
                                      const std::map<std::string, double>& given) {
  std::vector<std::string> names, missing;
  std::vector<double> values;
  for (const estimation::Unknown& unknown : problem.unknowns) {
    names.push_back(unknown.name);
    const auto set = given.find(unknown.name);
    if (set != given.end()) {
      values.push_back(set->second);
    } else if (!unknown.first.empty()) {
      values.push_back(unknown.first.front());
    } else {
      missing.push_back(unknown.name);
    }
  }
  for (const auto& [name, value] : given) {
    if (std::ranges::count(names, name) != 0) continue;
    const auto nearest = core::nearest_name(name, names);
    return Failure{.what = fmt::format("--set names '{}', which is no unknown here", name),
                   .expected = nearest ? fmt::format("perhaps '{}'", *nearest)
                                       : fmt::format("one of {}", fmt::join(names, ", ")),
                   .to_do = "correct the name, or leave it out",
                   .place = {}};
  }
  if (!missing.empty()) {
    return Failure{.what = fmt::format("no value for {}", fmt::join(missing, ", ")),
                   .expected = "a value by --set, or a first guess (`first`) in the study",
                   .to_do = fmt::format("add --set {}=VALUE", fmt::join(missing, "=VALUE --set ")),
                   .place = {}};
  }
  return values;
}

std::string head_line(const core::System& system, const Study& study, bool sensitivities) {
  std::vector<std::string> cells = {"time"};
  cells.insert(cells.end(), system.states.begin(), system.states.end());
  for (std::size_t i = 0; i < system.readouts.size(); ++i) cells.push_back(study.readouts[i].name);
  if (sensitivities) {
    for (const std::string& state : system.states) {
      for (const std::string& unknown : system.unknowns)
        cells.push_back(fmt::format("d {} / d {}", state, unknown));
    }
  }
  return csv_line(cells);
}

std::string curve_table(const core::Trajectory& trajectory, const core::System& system,
                        const Study& study, bool sensitivities) {
  std::string text = head_line(system, study, sensitivities);
  std::vector<std::string> cells;
  for (std::size_t i = 0; i < trajectory.times.size(); ++i) {
    const auto column = static_cast<Eigen::Index>(i);
    cells = {core::print_number(trajectory.times[i])};
    for (const double y : trajectory.states.col(column)) cells.push_back(core::print_number(y));
    for (const double shown : trajectory.shown.col(column))
      cells.push_back(core::print_number(shown));
    if (sensitivities) {
      for (const auto& row : trajectory.dstates_dp[i].rowwise()) {
        for (const double derivative : row) cells.push_back(core::print_number(derivative));
      }
    }
    text += csv_line(cells);
  }
  return text;
}

Result<std::string> simulate(const SimulateOptions& options, const Study& study) {
  const auto hypothesis = find_hypothesis(study, options.hypothesis);
  if (!hypothesis) return hypothesis.failure();
  const estimation::Experiment* chosen = nullptr;
  if (options.experiment) {
    const auto experiment = find_experiment(study, *options.experiment);
    if (!experiment) return experiment.failure();
    chosen = &study.experiments[*experiment];
  }
  const auto times =
      times_to_write(options, chosen != nullptr ? *chosen : estimation::Experiment{});
  if (!times) return times.failure();

  Study alone = study;
  alone.experiments = {chosen != nullptr ? *chosen : estimation::Experiment{}};
  const auto problem = assemble_problem(alone, *hypothesis, Purpose::Simulate);
  if (!problem) return problem.failure();
  const auto values = values_of(*problem, options.values);
  if (!values) return values.failure();

  const estimation::FittedExperiment& run = problem->experiments.front();
  core::Schedule schedule = run.schedule;
  schedule.outputs = *times;
  core::Integrator integrator(*run.program, std::move(schedule),
                              {.relative = problem->relative_accuracy, .absolute = run.absolute});
  const Eigen::VectorXd scale = estimation::scale_at(problem->unknowns, *values);
  std::vector<double> own_values, own_scale;
  for (const std::size_t number : run.unknown_numbers) {
    own_values.push_back((*values)[number]);
    own_scale.push_back(std::abs(scale[static_cast<Eigen::Index>(number)]));
  }
  const auto sensitivities =
      options.sensitivities ? core::Sensitivities::Yes : core::Sensitivities::No;
  const auto trajectory = integrator.run(own_values, own_scale, sensitivities);
  if (!trajectory) {
    return Failure{.what = fmt::format("cannot be integrated with these values: {}",
                                       trajectory.failure().words),
                   .expected = "values under which the system has a solution up to the last time",
                   .to_do = "change the values given by --set, or end earlier (--until)",
                   .place = {}};
  }
  return curve_table(**trajectory, run.program->system(), study, options.sensitivities);
}

}  // namespace

core::Result<std::map<std::string, double>> read_settings(
    const std::vector<std::string>& settings) {
  std::map<std::string, double> values;
  for (const std::string& setting : settings) {
    const std::size_t sign = setting.find('=');
    double value = 0.0;
    const char* end = setting.data() + setting.size();
    const char* begin = sign == std::string::npos ? end : setting.data() + sign + 1;
    const auto [stop, error] = std::from_chars(begin, end, value);
    if (sign == 0 || begin == end || error != std::errc{} || stop != end || !std::isfinite(value)) {
      return Failure{.what = fmt::format("--set is given '{}'", setting),
                     .expected = "NAME=VALUE with a number, such as k=0.2",
                     .to_do = "correct it",
                     .place = {}};
    }
    if (!values.emplace(setting.substr(0, sign), value).second) {
      return Failure{.what = fmt::format("--set gives '{}' twice", setting.substr(0, sign)),
                     .expected = "one value for each unknown",
                     .to_do = "leave one out",
                     .place = {}};
    }
  }
  return values;
}

int run_simulate(const SimulateOptions& options, const Console& console) {
  const StudyReading reading = read_study(options.study, ReadFor::Looking);
  print(console.messages, reading.diagnostics, console.colour);
  if (!reading.study) return kWrongInput;
  const auto table = simulate(options, *reading.study);
  if (!table) {
    print_failure(console, table.failure());
    return kWrongInput;
  }
  console.out << *table;
  return kDone;
}

}  // namespace gainsay::cli
