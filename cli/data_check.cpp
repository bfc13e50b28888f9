#include "gainsay/cli/data_check.h"

#include <algorithm>
#include <cmath>
#include <string>

namespace gainsay::cli {

namespace {

// What all experiments hold of one readout.
struct Holdings {
  std::size_t points = 0;
  const ReadPoint* with_sd = nullptr;     // the first fitted one
  const ReadPoint* without_sd = nullptr;  // likewise
};

Holdings holdings_of(std::size_t readout, const StudyParts& parts) {
  Holdings found;
  for (const ExperimentReading& experiment : parts.experiments) {
    for (const ReadSeries& series : experiment.series) {
      if (series.readout != readout) continue;
      for (const ReadPoint& read : series.points) {
        if (!read.point.left_out.empty()) continue;
        ++found.points;
        const ReadPoint*& first = std::isnan(read.point.sd) ? found.without_sd : found.with_sd;
        if (first == nullptr) first = &read;
      }
    }
  }
  return found;
}

std::string place_of(const ReadPoint& point) {
  return point.place.file() + ":" + std::to_string(point.place.line);
}

class DataCheck {
 public:
  DataCheck(const StudyParts& parts, bool judging, Diagnostics& diagnostics)
      : parts_(parts), judging_(judging), diagnostics_(diagnostics) {}

  void check_readout(std::size_t number) {
    const ReadReadout& readout = parts_.top.readouts[number];
    const std::string& name = readout.readout.name;
    const Holdings holdings = holdings_of(number, parts_);
    if (holdings.points == 0 && !parts_.experiments.empty() && !some_table_is_wrong()) {
      diagnostics_.warning(readout.place, {"no experiment has readings of '" + name + "'", "",
                                           "add readings, or remove the readout"});
    }
    if (holdings.without_sd != nullptr && !readout.says_noise) {
      diagnostics_.error(
          readout.place,
          {"how much '" + name + "' scatters is not said, but " + place_of(*holdings.without_sd) +
               " has no sd of its own",
           "noise = { sd = ... } of the readout, or a column 'sd " + name + "' in its tables",
           "add noise = { sd = ..., relative = ... }; if it is not known: noise = { sd = "
           "\"unknown\" }"});
    }
    if (holdings.with_sd != nullptr && readout.sd_of.empty()) {
      ask(readout.place,
          {"what the sds of '" + name + "' belong to is not said (" + place_of(*holdings.with_sd) +
               " has one)",
           "sd_of = \"reading\" where a row is one reading, \"mean\" where it is a mean and its sd "
           "that of the mean",
           "add to readouts." + name + " in study.toml: sd_of = \"mean\""});
    }
    if (holdings.with_sd != nullptr && readout.readout.noise.sd_unknown) {
      diagnostics_.error(
          readout.place,
          {"not yet: an unknown sd beside sds of single points (" + place_of(*holdings.with_sd) +
               ") is not read by this version",
           "noise = { sd = \"unknown\" }, or an sd column", "remove one of the two"});
    }
  }

  void check_experiment(const ExperimentReading& experiment) {
    if (experiment.table_is_wrong) return;
    const bool has_readings = std::any_of(
        experiment.series.begin(), experiment.series.end(), [](const ReadSeries& series) {
          return std::any_of(series.points.begin(), series.points.end(),
                             [](const ReadPoint& read) { return read.point.left_out.empty(); });
        });
    if (has_readings) return;
    diagnostics_.warning(
        experiment.file,
        {"the experiment '" + experiment.experiment.name + "' has no readings that count", "",
         "put its table beside it as " + experiment.experiment.name +
             ".csv, or name it by data = \"...\""});
  }

  // Whether there is anything to look at; says so if not.
  bool has_data() {
    const bool has_any =
        std::any_of(parts_.experiments.begin(), parts_.experiments.end(),
                    [](const ExperimentReading& experiment) { return !experiment.series.empty(); });
    if (parts_.top.readouts.empty()) {
      ask(study(), {"the study has no readouts", "[readouts] in study.toml",
                    "add one, as readouts.glow = { shows = \"A\", noise = { sd = 0.1 } }"});
    } else if (parts_.experiments.empty() && parts_.all_experiments_read) {
      ask(study(), {"the study has no experiments", "experiments/NAME.toml with NAME.csv",
                    "add at least one experiment"});
    } else if (!has_any && !some_table_is_wrong()) {
      ask(study(),
          {"no experiment has readings", "a table beside each experiment", "add readings"});
    } else {
      return true;
    }
    return false;
  }

 private:
  // What judging must be told, and looking may leave open.
  void ask(const Location& at, Message message) {
    if (judging_) {
      diagnostics_.error(at, std::move(message));
    } else {
      diagnostics_.warning(at, std::move(message));
    }
  }

  bool some_table_is_wrong() const {
    return !parts_.all_experiments_read ||
           std::any_of(parts_.experiments.begin(), parts_.experiments.end(),
                       [](const ExperimentReading& one) { return one.table_is_wrong; });
  }

  Location study() const { return parts_.top.file; }

  const StudyParts& parts_;
  bool judging_;
  Diagnostics& diagnostics_;
};

}  // namespace

void check_data(const StudyParts& parts, bool judging, Diagnostics& diagnostics) {
  DataCheck check(parts, judging, diagnostics);
  if (!check.has_data()) return;
  for (std::size_t i = 0; i < parts.top.readouts.size(); ++i) check.check_readout(i);
  for (const ExperimentReading& experiment : parts.experiments) check.check_experiment(experiment);
}

}  // namespace gainsay::cli
