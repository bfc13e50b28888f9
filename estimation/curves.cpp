#include "gainsay/estimation/curves.h"

#include "gainsay/core/integrator.h"
#include "gainsay/core/require.h"
#include "gainsay/estimation/coordinates.h"

#include <algorithm>
#include <cmath>
#include <iterator>
#include <set>
#include <span>

namespace gainsay::estimation {
namespace {

using core::Event;
using core::IntegrationFailure;
using core::Program;
using core::Result;

/// Times of the data, of the events up to the last of them, and even ones that keep clear of both.
std::vector<double> dense_times(const core::Schedule& schedule, std::size_t points) {
  std::set<double> times(schedule.outputs.begin(), schedule.outputs.end());
  const double first = schedule.begins;
  const double last = schedule.outputs.back();
  times.insert(first);
  for (const auto& event : schedule.events)
    if (event.time <= last) times.insert(event.time);
  // Closer than this to a time that must be there, an even one adds nothing but rounding.
  const double clear = 1e-6 * (last - first);
  for (std::size_t i = 1; i + 1 < points; ++i) {
    const double even =
        first + (last - first) * static_cast<double>(i) / static_cast<double>(points - 1);
    const auto next = times.lower_bound(even);
    const bool near_next = next != times.end() && *next - even < clear;
    const bool near_before = next != times.begin() && even - *std::prev(next) < clear;
    if (!near_next && !near_before) times.insert(even);
  }
  return {times.begin(), times.end()};
}

/// Values of a program's unknowns, and the sizes in which its integrator controls them.
struct Own {
  std::vector<double> values;
  std::vector<double> scale;
};

Own own_values(const Problem& problem, const FittedExperiment& experiment,
               const std::vector<double>& values) {
  const Eigen::VectorXd scale = scale_at(problem.unknowns, values);
  Own own;
  for (const std::size_t number : experiment.unknown_numbers) {
    own.values.push_back(values[number]);
    own.scale.push_back(std::abs(scale[static_cast<Eigen::Index>(number)]));
  }
  return own;
}

/// What the readouts show just after events, when inputs and states have jumped.
class Aftermath {
 public:
  Aftermath(const FittedExperiment& experiment, std::span<const double> unknowns)
      : program_(*experiment.program),
        scratch_(program_.make_scratch()),
        unknowns_(unknowns),
        inputs_(experiment.schedule.inputs),
        shown_(program_.readouts()) {
    std::vector<double> guards = experiment.absolute;
    for (double& guard : guards) guard *= core::kGuardInTolerances;
    program_.set_guards(*scratch_, guards);
  }

  /// Events must come in order. False where a readout is not a number there.
  bool after(const Event& event, Eigen::VectorXd states) {
    for (const auto& [input, value] : event.settings) inputs_[input] = value;
    program_.set(*scratch_, unknowns_, inputs_);
    return program_.jump(*scratch_, event.jumps, states.data(), nullptr) &&
           program_.show(*scratch_, event.time, states.data(), nullptr, shown_.data(), nullptr);
  }
  const std::vector<double>& shown() const { return shown_; }

 private:
  const Program& program_;
  Program::ScratchPointer scratch_;
  std::span<const double> unknowns_;
  std::vector<double> inputs_;
  std::vector<double> shown_;
};

std::vector<Curve> empty_curves(const FittedExperiment& experiment) {
  std::vector<Curve> curves;
  for (const auto& series : experiment.series)
    curves.push_back({experiment.name, series.readout, {}, {}});
  return curves;
}

/// Adds one time to every curve; `shown` is what the program's readouts show then.
template <class Shown>
void add(std::vector<Curve>& curves, const FittedExperiment& experiment, double time,
         const Shown& shown) {
  for (std::size_t i = 0; i < curves.size(); ++i) {
    curves[i].times.push_back(time);
    curves[i].shown.push_back(shown[experiment.series[i].data.front().readout]);
  }
}

Result<std::vector<Curve>, IntegrationFailure> curves_of(const Problem& problem,
                                                         const FittedExperiment& experiment,
                                                         const std::vector<double>& values,
                                                         std::size_t points) {
  std::vector<Curve> curves = empty_curves(experiment);
  if (curves.empty()) return curves;
  core::Schedule schedule = experiment.schedule;
  schedule.outputs = dense_times(schedule, points);
  core::Integrator integrator(
      *experiment.program, schedule,
      {.relative = problem.relative_accuracy, .absolute = experiment.absolute});
  const Own own = own_values(problem, experiment, values);
  const auto run = integrator.run(own.values, own.scale, core::Sensitivities::No);
  if (!run) return run.failure();
  const core::Trajectory& trajectory = **run;

  Aftermath aftermath(experiment, own.values);
  auto event = schedule.events.begin();
  for (std::size_t i = 0; i < trajectory.times.size(); ++i) {
    const auto column = static_cast<Eigen::Index>(i);
    const double time = trajectory.times[i];
    add(curves, experiment, time, trajectory.shown.col(column));
    if (event == schedule.events.end() || event->time != time) continue;
    if (!aftermath.after(*event++, trajectory.states.col(column)))
      return IntegrationFailure{IntegrationFailure::Kind::OutsideDomain, time, "",
                                "a readout is not a number just after what happens then"};
    add(curves, experiment, time, aftermath.shown());
  }
  return curves;
}

}  // namespace

Result<std::vector<Curve>, EvaluationFailure> curves(const Problem& problem,
                                                     const std::vector<double>& values,
                                                     std::size_t points) {
  GAINSAY_REQUIRE(values.size() == problem.unknowns.size(), "one value for each unknown");
  std::vector<Curve> all;
  for (const auto& experiment : problem.experiments) {
    auto some = curves_of(problem, experiment, values, points);
    if (!some) return EvaluationFailure{experiment.name, some.failure()};
    std::move(some.value().begin(), some.value().end(), std::back_inserter(all));
  }
  return all;
}

}  // namespace gainsay::estimation
