#include "gainsay/estimation/course.h"
#include "gainsay/estimation/draft.h"
#include "gainsay/estimation/measurement.h"
#include "gainsay/estimation/problem.h"

#include <algorithm>
#include <cmath>
#include <functional>
#include <map>
#include <set>
#include <utility>

namespace gainsay::estimation {
namespace {

using core::Failure;
using core::Result;
using SymbolSet = std::set<std::string, std::less<>>;

/// Declared unknowns, the first of equal names alone.
std::vector<DeclaredUnknown> without_doubles(std::span<const DeclaredUnknown> declared) {
  std::vector<DeclaredUnknown> kept;
  SymbolSet names;
  for (const auto& each : declared)
    if (names.insert(each.unknown.name).second) kept.push_back(each);
  return kept;
}

/// The unknowns that a declaration can become: itself, or one for each experiment.
std::vector<Unknown> instances(const DeclaredUnknown& declared,
                               std::span<const Experiment> experiments) {
  if (!declared.per_experiment) return {declared.unknown};
  std::vector<Unknown> all;
  for (const auto& experiment : experiments) {
    all.push_back(declared.unknown);
    all.back().name = particular(declared.unknown.name, experiment.name);
  }
  return all;
}

std::vector<Unknown> start_unknowns(std::span<const Experiment> experiments) {
  std::vector<Unknown> all;
  for (const auto& experiment : experiments)
    for (const auto& start : experiment.starts)
      if (start.unknown) {
        all.push_back(*start.unknown);
        all.back().name = particular("start." + start.species, experiment.name);
      }
  return all;
}

/// Symbols of the drafts by what they act through; one that acts through several is of the first
/// kind that holds it.
struct Uses {
  SymbolSet rates;
  SymbolSet starts_and_jumps;
  SymbolSet readouts;

  void take(const core::System& system) {
    for (const auto& rate : system.rates) rates.merge(core::symbols(rate));
    for (const auto& start : system.starts) starts_and_jumps.merge(core::symbols(start));
    for (const auto& jump : system.jumps) starts_and_jumps.merge(core::symbols(jump.rise));
    for (const auto& readout : system.readouts) readouts.merge(core::symbols(readout));
  }

  std::optional<UnknownKind> kind_of(const std::string& name) const {
    if (rates.contains(name)) return UnknownKind::Kinetic;
    if (starts_and_jumps.contains(name)) return UnknownKind::Initial;
    if (readouts.contains(name)) return UnknownKind::Measurement;
    return std::nullopt;
  }
};

void list_unknowns(Problem& problem, const Ground& ground, const Uses& uses) {
  const auto take = [&](Unknown unknown) {
    const auto kind = uses.kind_of(unknown.name);
    if (!kind) return false;
    unknown.kind = *kind;
    problem.unknowns.push_back(std::move(unknown));
    return true;
  };
  for (const auto& declared : ground.declared) {
    bool used = false;
    for (auto& unknown : instances(declared, ground.experiments)) used |= take(std::move(unknown));
    if (!used && declared.own) problem.unused.push_back(declared.unknown.name);
  }
  for (auto& unknown : start_unknowns(ground.experiments)) take(std::move(unknown));
  for (auto& unknown : measurement_unknowns(ground.readouts, ground.experiments))
    take(std::move(unknown));
}

/// One group for each unknown sd that data without an sd of their own depend on; named after the
/// readout that it is an unknown of.
void group_noise(Problem& problem, std::vector<FittedSeries>& all) {
  for (auto& series : all) {
    const bool lacks_sd = std::any_of(series.data.begin(), series.data.end(),
                                      [](const Datum& datum) { return std::isnan(datum.sd); });
    if (!series.noise.sd_unknown || !lacks_sd) continue;
    auto& groups = problem.noise_groups;
    const std::string& owner = series.noise.same_as.empty() ? series.readout : series.noise.same_as;
    const auto group = std::find(groups.begin(), groups.end(), owner);
    series.noise_group = static_cast<std::size_t>(group - groups.begin());
    if (group == groups.end()) groups.push_back(owner);
  }
}

void number_unknowns(FittedExperiment& fitted, core::System& system, const Problem& problem) {
  Uses uses;
  uses.take(system);
  for (std::size_t i = 0; i < problem.unknowns.size(); ++i)
    if (uses.kind_of(problem.unknowns[i].name)) {
      system.unknowns.push_back(problem.unknowns[i].name);
      fitted.unknown_numbers.push_back(i);
    }
}

void find_linear_unknowns(FittedExperiment& fitted, const Draft& draft, const Ground& ground,
                          const Problem& problem) {
  const auto number_of = [&](const std::optional<std::string>& name) {
    const auto found = std::find_if(problem.unknowns.begin(), problem.unknowns.end(),
                                    [&](const Unknown& unknown) { return unknown.name == name; });
    return name && found != problem.unknowns.end()
               ? std::optional(static_cast<std::size_t>(found - problem.unknowns.begin()))
               : std::nullopt;
  };
  for (std::size_t i = 0; i < draft.shown.size(); ++i) {
    const Readout& readout = ground.readouts[draft.shown[i]];
    const auto scale = number_of(scale_name(readout, fitted.name));
    const auto offset = number_of(offset_name(readout, fitted.name));
    if (scale || offset) fitted.linear.push_back({scale, offset, i});
  }
}

/// Each datum's place among the outputs; `times` are those of all data in their order.
void number_outputs(FittedExperiment& fitted, const std::vector<double>& times) {
  const auto& outputs = fitted.schedule.outputs;
  auto time = times.begin();
  for (auto& series : fitted.series)
    for (auto& datum : series.data)
      datum.output = static_cast<std::size_t>(
          std::lower_bound(outputs.begin(), outputs.end(), *time++) - outputs.begin());
}

Result<FittedExperiment> finish(Draft draft, const Ground& ground, Problem& problem,
                                const AssemblyOptions& options) {
  FittedExperiment fitted;
  fitted.name = draft.experiment->name;
  number_unknowns(fitted, draft.system, problem);
  find_linear_unknowns(fitted, draft, ground, problem);
  fitted.absolute = absolute_tolerances(ground.hypothesis, draft.system, problem.unknowns,
                                        draft.readings, options.negligible);
  fitted.schedule = schedule(*draft.experiment, draft.system.inputs, draft.jumps, draft.times);
  fitted.series = std::move(draft.series);
  number_outputs(fitted, draft.times);
  group_noise(problem, fitted.series);
  auto program = core::Program::compile(draft.system);
  if (!program) {
    Failure failure = program.failure();
    failure.what = "hypothesis '" + ground.hypothesis.title + "' with experiment '" + fitted.name +
                   "': " + failure.what;
    return failure;
  }
  fitted.program = std::move(program).value();
  return fitted;
}

}  // namespace

Result<Problem> assemble(const core::Hypothesis& hypothesis,
                         std::span<const DeclaredUnknown> declared,
                         std::span<const Readout> readouts, std::span<const Experiment> experiments,
                         const AssemblyOptions& options) {
  const std::vector<DeclaredUnknown> distinct = without_doubles(declared);
  const Ground ground = make_ground(hypothesis, distinct, readouts, experiments);

  std::vector<Draft> drafts;
  Uses uses;
  for (const auto& experiment : experiments) {
    if (!options.to_simulate && !has_data(experiment)) continue;
    auto made = draft(ground, experiment, options.to_simulate);
    if (!made) return made.failure();
    uses.take(made->system);
    drafts.push_back(std::move(made).value());
  }

  Problem problem;
  problem.hypothesis = hypothesis.title;
  problem.relative_accuracy = options.relative_accuracy;
  for (const auto& readout : readouts) problem.readouts.push_back(readout.name);
  list_unknowns(problem, ground, uses);
  for (auto& each : drafts) {
    auto fitted = finish(std::move(each), ground, problem, options);
    if (!fitted) return fitted.failure();
    problem.experiments.push_back(std::move(fitted).value());
  }
  return problem;
}

}  // namespace gainsay::estimation
