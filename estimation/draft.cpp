#include "gainsay/estimation/draft.h"

#include "gainsay/core/balance.h"
#include "gainsay/core/simplify.h"
#include "gainsay/estimation/course.h"
#include "gainsay/estimation/measurement.h"

#include <algorithm>
#include <cmath>
#include <optional>
#include <set>
#include <string>

namespace gainsay::estimation {
namespace {

using core::Expression;
using core::Failure;
using core::Result;
using Trouble = std::optional<Failure>;  // none: all is well

bool is_fitted(const Point& point) { return point.left_out.empty(); }

/// Turns one experiment into a Draft, part by part; each part says what is in its way.
class Drafting {
 public:
  Drafting(const Ground& ground, const Experiment& experiment)
      : ground_(ground),
        hypothesis_(ground.hypothesis),
        experiment_(experiment),
        names_(ground.hypothesis, ground.declared, ground.experiments, experiment) {
    draft_.experiment = &experiment;
  }

  Result<Draft> draft(bool all_readouts) {
    if (auto trouble = take_rates()) return *trouble;
    if (auto trouble = take_starts()) return *trouble;
    if (auto trouble = take_doses()) return *trouble;
    if (auto trouble = take_readouts(all_readouts)) return *trouble;
    for (const auto& series : experiment_.series)
      if (auto trouble = take_data(series, !all_readouts)) return *trouble;
    list_inputs();
    return std::move(draft_);
  }

 private:
  Trouble take_rates() {
    for (std::size_t i = 0; i < hypothesis_.species.size(); ++i) {
      const auto& name = hypothesis_.species[i].name;
      auto rate = names_.over_time(ground_.rates[i], "the rate of change of '" + name + "'");
      if (!rate) return rate.failure();
      draft_.system.states.push_back(name);
      draft_.system.rates.push_back(std::move(rate).value());
    }
    return std::nullopt;
  }

  /// The experiment's starts before the hypothesis', these before 0.
  Trouble take_starts() {
    for (const auto& start : experiment_.starts)
      if (auto trouble = require_species(start.species, "a start value")) return trouble;
    for (const auto& species : hypothesis_.species) {
      const auto given =
          std::find_if(experiment_.starts.begin(), experiment_.starts.end(),
                       [&](const StartValue& start) { return start.species == species.name; });
      if (given != experiment_.starts.end() && given->unknown) {
        draft_.system.starts.push_back(
            Expression::symbol(particular("start." + species.name, experiment_.name)));
        continue;
      }
      const Expression& written = given != experiment_.starts.end() ? given->value : species.start;
      auto value = names_.at_time(core::written_out(written, hypothesis_), experiment_.begins,
                                  "the start value of '" + species.name + "'");
      if (!value) return value.failure();
      draft_.system.starts.push_back(std::move(value).value());
    }
    return std::nullopt;
  }

  Trouble take_doses() {
    for (const auto& dose : experiment_.doses) {
      if (dose.at < experiment_.begins)
        return names_.failure("a dose comes before the beginning",
                              "doses at or after the beginning of the experiment",
                              "correct 'at', or let the experiment begin earlier");
      for (const auto& [species, amount] : dose.add)
        if (auto trouble = take_dose(dose.at, species, amount, true)) return trouble;
      for (const auto& [species, rise] : dose.raise)
        if (auto trouble = take_dose(dose.at, species, rise, false)) return trouble;
    }
    return std::nullopt;
  }

  /// An addition in the unit of the state: an amount through the volume where the state is a
  /// concentration, and the reverse. Methods (5).
  Trouble take_dose(double at, const std::string& name, const Expression& size, bool is_amount) {
    if (auto trouble = require_species(name, "a dose")) return trouble;
    const auto number = core::find_species(hypothesis_, name);
    if (!number) return std::nullopt;
    const core::Species& species = hypothesis_.species[*number];
    if (species.held)
      return names_.failure(
          "a dose goes to '" + name + "', which this hypothesis holds at its start",
          "doses of species that change", "drop 'held' or the dose");
    const Expression& volume = hypothesis_.compartments[species.compartment].volume;
    Expression rise = size;
    if (is_amount && !species.amount) rise = size / volume;
    if (!is_amount && species.amount) rise = size * volume;
    auto resolved =
        names_.at_time(core::written_out(rise, hypothesis_), at, "the dose of '" + name + "'");
    if (!resolved) return resolved.failure();
    if (resolved->is_number(0.0)) return std::nullopt;
    draft_.jumps.emplace_back(at, draft_.system.jumps.size());
    draft_.system.jumps.push_back({*number, std::move(resolved).value()});
    return std::nullopt;
  }

  Trouble take_readouts(bool all) {
    for (std::size_t i = 0; i < ground_.readouts.size(); ++i)
      if (all || shows_data_of(ground_.readouts[i])) draft_.shown.push_back(i);
    for (const std::size_t number : draft_.shown) {
      const Readout& readout = ground_.readouts[number];
      auto shows = names_.over_time(ground_.shows[number], "the readout '" + readout.name + "'");
      if (!shows) return shows.failure();
      draft_.system.readouts.push_back(
          core::simplify(measurement(readout, *shows, experiment_.name)));
    }
    return std::nullopt;
  }

  bool shows_data_of(const Readout& readout) const {
    return std::any_of(experiment_.series.begin(), experiment_.series.end(), [&](const auto& each) {
      return each.readout == readout.name &&
             std::any_of(each.points.begin(), each.points.end(), is_fitted);
    });
  }

  Trouble take_data(const Series& series, bool needs_sd) {
    FittedSeries fitted;
    fitted.readout = series.readout;
    const auto shown = std::find_if(draft_.shown.begin(), draft_.shown.end(), [&](std::size_t i) {
      return ground_.readouts[i].name == series.readout;
    });
    if (shown == draft_.shown.end())
      return std::any_of(series.points.begin(), series.points.end(), is_fitted)
                 ? Trouble(names_.failure(
                       "there are data of '" + series.readout + "', which is no readout",
                       "a readout of study.toml", "add '" + series.readout + "' under [readouts]"))
                 : std::nullopt;
    fitted.readout_number = *shown;
    const Readout& readout = ground_.readouts[*shown];
    fitted.noise = readout.noise;
    const auto in_program = static_cast<std::size_t>(shown - draft_.shown.begin());
    for (std::size_t i = 0; i < series.points.size(); ++i) {
      const Point& point = series.points[i];
      if (!is_fitted(point)) continue;
      if (auto trouble = require_usable(point, readout, needs_sd)) return trouble;
      fitted.data.push_back({0, in_program, point.value, resolved_sd(point, readout.noise), i});
      draft_.times.push_back(point.time);
    }
    if (fitted.data.empty()) return std::nullopt;
    take_sizes(fitted, readout);
    draft_.series.push_back(std::move(fitted));
    return std::nullopt;
  }

  Trouble require_usable(const Point& point, const Readout& readout, bool needs_sd) const {
    if (point.time < experiment_.begins)
      return names_.failure("a reading of '" + readout.name + "' comes before the beginning",
                            "readings at or after the beginning of the experiment",
                            "leave it out, or let the experiment begin earlier");
    const bool noise_is_zero = !readout.noise.sd_unknown && readout.noise.sd.value_or(0.0) == 0.0 &&
                               readout.noise.relative.value_or(0.0) == 0.0;
    if (needs_sd && (std::isnan(point.sd) ? noise_is_zero : point.sd <= 0.0))
      return names_.failure("a reading of '" + readout.name + "' has no sd",
                            "an sd above 0 beside each reading, or 'noise' for the readout",
                            "add 'noise = { sd = ... }' to the readout, or a column 'sd " +
                                readout.name + "' to its table");
    return std::nullopt;
  }

  /// The point's own sd alone, else the constant part of the noise where that is all.
  static double resolved_sd(const Point& point, const Noise& noise) {
    if (!std::isnan(point.sd)) return point.sd;
    return noise.sd_unknown || noise.depends_on_model() ? kNotGiven : noise.sd.value_or(kNotGiven);
  }

  /// Readings of a species, with a scale that is known, tell how large it gets.
  void take_sizes(const FittedSeries& fitted, const Readout& readout) {
    if (readout.scale.kind != Coefficient::Kind::Fixed ||
        readout.offset.kind != Coefficient::Kind::Fixed || readout.scale.value == 0.0)
      return;
    const auto shows = names_.over_time(ground_.shows[fitted.readout_number], "");
    const auto kind = shows ? kind_shown(*shows, hypothesis_) : std::nullopt;
    if (!kind) return;
    for (const auto& datum : fitted.data)
      draft_.readings.push_back(
          {*kind, (datum.value - readout.offset.value) / readout.scale.value});
  }

  Trouble require_species(const std::string& name, const std::string& what) const {
    if (core::find_species(hypothesis_, name)) return std::nullopt;
    const auto& absent = experiment_.absent;
    if (std::find(absent.begin(), absent.end(), name) != absent.end()) return std::nullopt;
    return names_.failure(
        what + " is given for '" + name + "', which the hypothesis lacks",
        "a species of the hypothesis",
        "add 'absent = [\"" + name +
            "\"]' to the experiment if hypotheses may lack it, or correct the name");
  }

  /// Inputs that change and that something depends on, in order of the hypothesis.
  void list_inputs() {
    std::set<std::string, std::less<>> used;
    for (const auto* expressions : {&draft_.system.rates, &draft_.system.readouts})
      for (const auto& expression : *expressions) used.merge(core::symbols(expression));
    for (const auto& input : hypothesis_.inputs)
      if (used.contains(input)) draft_.system.inputs.push_back(input);
  }

  const Ground& ground_;
  const core::Hypothesis& hypothesis_;
  const Experiment& experiment_;
  Names names_;
  Draft draft_;
};

}  // namespace

Ground make_ground(const core::Hypothesis& hypothesis, std::span<const DeclaredUnknown> declared,
                   std::span<const Readout> readouts, std::span<const Experiment> experiments) {
  std::vector<Expression> shows;
  for (const auto& readout : readouts) shows.push_back(readout.shows);
  return {hypothesis,
          declared,
          readouts,
          experiments,
          core::balance(hypothesis),
          core::written_out(shows, hypothesis)};
}

bool has_data(const Experiment& experiment) {
  return std::any_of(experiment.series.begin(), experiment.series.end(), [](const auto& series) {
    return std::any_of(series.points.begin(), series.points.end(), is_fitted);
  });
}

Result<Draft> draft(const Ground& ground, const Experiment& experiment, bool all_readouts) {
  return Drafting(ground, experiment).draft(all_readouts);
}

}  // namespace gainsay::estimation
