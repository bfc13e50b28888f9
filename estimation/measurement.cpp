#include "gainsay/estimation/measurement.h"

#include "gainsay/estimation/names.h"

#include <algorithm>
#include <cmath>

namespace gainsay::estimation {
namespace {

using core::Expression;

constexpr double kScaleRange = 1e6;    // times m, to either side of it
constexpr double kOffsetRange = 10.0;  // times m

std::optional<std::string> name_of(const char* what, const Coefficient& coefficient,
                                   const Readout& readout, std::string_view experiment) {
  const std::string shared = std::string(what) + "." + readout.name;
  switch (coefficient.kind) {
    case Coefficient::Kind::Fixed:
      return std::nullopt;
    case Coefficient::Kind::Unknown:
      return shared;
    case Coefficient::Kind::PerExperiment:
      return particular(shared, experiment);
  }
  return std::nullopt;
}

Unknown scale_unknown(std::string name, const Readout& readout, double m) {
  Unknown scale;
  scale.name = std::move(name);
  scale.low = readout.is_signed ? -kScaleRange * m : m / kScaleRange;
  scale.high = kScaleRange * m;
  scale.linear = readout.is_signed;
  scale.kind = UnknownKind::Measurement;
  return scale;
}

Unknown offset_unknown(std::string name, double m) {
  Unknown offset;
  offset.name = std::move(name);
  offset.low = -kOffsetRange * m;
  offset.high = kOffsetRange * m;
  offset.linear = true;
  offset.kind = UnknownKind::Measurement;
  return offset;
}

/// Adds the unknown that `make` makes of each distinct name that the experiments give it.
template <class NameIn, class Make>
void add_each(std::vector<Unknown>& unknowns, std::span<const Experiment> experiments,
              const NameIn& name_in, const Make& make) {
  std::vector<std::string> made;
  for (const auto& experiment : experiments) {
    const std::optional<std::string> name = name_in(experiment.name);
    if (!name || std::find(made.begin(), made.end(), *name) != made.end()) continue;
    made.push_back(*name);
    unknowns.push_back(make(*name));
  }
}

}  // namespace

std::optional<std::string> scale_name(const Readout& readout, std::string_view experiment) {
  return name_of("scale", readout.scale, readout, experiment);
}

std::optional<std::string> offset_name(const Readout& readout, std::string_view experiment) {
  return name_of("offset", readout.offset, readout, experiment);
}

Expression measurement(const Readout& readout, const Expression& shows,
                       std::string_view experiment) {
  const auto scale = scale_name(readout, experiment);
  const auto offset = offset_name(readout, experiment);
  Expression shown = shows;
  if (scale)
    shown = Expression::symbol(*scale) * shown;
  else if (readout.scale.value != 1.0)
    shown = Expression(readout.scale.value) * shown;
  if (offset)
    shown = shown + Expression::symbol(*offset);
  else if (readout.offset.value != 0.0)
    shown = shown + Expression(readout.offset.value);
  return shown;
}

double largest_reading(const Readout& readout, std::span<const Experiment> experiments) {
  double largest = 0.0;
  for (const auto& experiment : experiments)
    for (const auto& series : experiment.series)
      if (series.readout == readout.name)
        for (const auto& point : series.points)
          if (point.left_out.empty()) largest = std::max(largest, std::abs(point.value));
  return largest > 0.0 ? largest : 1.0;
}

std::vector<Unknown> measurement_unknowns(std::span<const Readout> readouts,
                                          std::span<const Experiment> experiments) {
  std::vector<Unknown> unknowns;
  for (const auto& readout : readouts) {
    const double m = largest_reading(readout, experiments);
    add_each(
        unknowns, experiments, [&](const auto& name) { return scale_name(readout, name); },
        [&](std::string name) { return scale_unknown(std::move(name), readout, m); });
    add_each(
        unknowns, experiments, [&](const auto& name) { return offset_name(readout, name); },
        [&](std::string name) { return offset_unknown(std::move(name), m); });
  }
  return unknowns;
}

}  // namespace gainsay::estimation
