#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/estimation/unknown.h"

#include <cstddef>
#include <limits>
#include <map>
#include <optional>
#include <string>
#include <utility>
#include <vector>

namespace gainsay::estimation {

inline constexpr double kNotGiven = std::numeric_limits<double>::quiet_NaN();

/// One reading.
struct Point {
  double time = 0.0;
  double value = 0.0;
  double sd = kNotGiven;  ///< its own; else the readout's noise holds
  std::string left_out;   ///< the reason, if it is shown but not fitted
  std::size_t line = 0;   ///< line of its table, for messages; 0 if from elsewhere
  bool operator==(const Point&) const = default;
};

/// The readings of one readout in one experiment, ascending in time (replicates beside each other,
/// in order of the table).
struct Series {
  std::string readout;
  std::vector<Point> points;
  bool operator==(const Series&) const = default;
};

/// A start value as an experiment gives it: an expression (a number is one), or an unknown of this
/// experiment
/// (`start.enzyme[run-03]`), with a prior where it was weighed in.
struct StartValue {
  std::string species;
  core::Expression value = 0.0;  ///< used unless `unknown` is set
  std::optional<Unknown> unknown;
};

/// An input over time: `steps` (time, value from then on), ascending; the first at or before the
/// beginning.
struct InputCourse {
  std::string input;
  std::vector<std::pair<double, double>> steps;
};

/// An instantaneous addition.
struct Dose {
  double at = 0.0;
  std::vector<std::pair<std::string, core::Expression>> add;    ///< species, amount
  std::vector<std::pair<std::string, core::Expression>> raise;  ///< species, rise of concentration
};

/// One run at the bench.
struct Experiment {
  std::string name;
  std::string title;
  double begins = 0.0;
  std::map<std::string, double, std::less<>> knowns;  ///< replace the hypothesis'
  std::vector<StartValue> starts;
  std::vector<InputCourse> inputs;
  std::vector<Dose> doses;
  std::vector<std::string> absent;  ///< species that hypotheses may lack
  std::vector<Series> series;
};

}  // namespace gainsay::estimation
