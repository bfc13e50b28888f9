#include "gainsay/cli/beginning_check.h"

#include "gainsay/core/print.h"

#include <algorithm>
#include <cmath>
#include <map>
#include <optional>
#include <string>

namespace gainsay::cli {

namespace {

using Values = std::map<std::string, double, std::less<>>;

// A reading printed with up to 15 digits still equals the number it was printed from.
constexpr double kSameNumber = 1e-14;

bool is_same(double a, double b) { return std::abs(a - b) <= kSameNumber * std::abs(b); }

// The value of an expression where it leans on nothing but `values`.
std::optional<double> value_of(const core::Expression& expression, const Values& values) {
  for (const std::string& symbol : core::symbols(expression)) {
    if (!values.contains(symbol)) return std::nullopt;
  }
  return core::evaluate(expression, values);
}

// All that is known at the beginning: knowns, inputs, time, and start values made of these.
Values known_at_beginning(const core::Hypothesis& mechanism,
                          const estimation::Experiment& experiment) {
  Values values = mechanism.knowns;
  for (const auto& [name, value] : experiment.knowns) values[name] = value;
  values["t"] = experiment.begins;
  for (const estimation::InputCourse& course : experiment.inputs) {
    for (const auto& [time, value] : course.steps) {
      if (time <= experiment.begins) values[course.input] = value;
    }
  }
  const Values given = values;
  for (const core::Species& species : mechanism.species) {
    const auto own = std::find_if(
        experiment.starts.begin(), experiment.starts.end(),
        [&](const estimation::StartValue& start) { return start.species == species.name; });
    const bool is_own = own != experiment.starts.end();
    if (is_own && own->unknown) continue;
    const core::Expression& start = is_own ? own->value : species.start;
    if (const auto value = value_of(core::written_out(start, mechanism), given)) {
      values[species.name] = *value;
    }
  }
  return values;
}

// What a readout shows at the beginning, where that follows from known start values alone.
std::optional<double> shown_at_beginning(const estimation::Readout& readout,
                                         const core::Hypothesis& mechanism,
                                         const estimation::Experiment& experiment) {
  using Kind = estimation::Coefficient::Kind;
  if (readout.scale.kind != Kind::Fixed || readout.offset.kind != Kind::Fixed) return std::nullopt;
  const core::Expression shows = core::written_out(readout.shows, mechanism);
  const auto symbols = core::symbols(shows);
  const bool shows_species =
      std::any_of(mechanism.species.begin(), mechanism.species.end(),
                  [&](const core::Species& species) { return symbols.contains(species.name); });
  if (!shows_species) return std::nullopt;
  const auto value = value_of(shows, known_at_beginning(mechanism, experiment));
  if (!value) return std::nullopt;
  return readout.scale.value * *value + readout.offset.value;
}

void check_series(const ReadSeries& series, const ExperimentReading& reading,
                  const StudyParts& parts, Diagnostics& diagnostics) {
  const estimation::Readout& readout = parts.top.readouts[series.readout].readout;
  for (const ReadPoint& read : series.points) {
    if (read.point.time > reading.experiment.begins) return;
    if (!read.point.left_out.empty()) continue;
    for (const HypothesisReading& hypothesis : parts.hypotheses) {
      const auto shown =
          shown_at_beginning(readout, hypothesis.hypothesis.mechanism, reading.experiment);
      if (!shown || !is_same(read.point.value, *shown)) continue;
      diagnostics.warning(read.place,
                          {"the reading of '" + readout.name + "' at the beginning, " +
                               core::print_number(read.point.value) +
                               ", equals the start value that is given: it is no datum",
                           "",
                           "leave it out by a reason in a left_out column, or make the start value "
                           "an unknown"});
      break;
    }
  }
}

}  // namespace

void warn_of_given_readings(const StudyParts& parts, Diagnostics& diagnostics) {
  for (const ExperimentReading& reading : parts.experiments) {
    for (const ReadSeries& series : reading.series) {
      check_series(series, reading, parts, diagnostics);
    }
  }
}

}  // namespace gainsay::cli
