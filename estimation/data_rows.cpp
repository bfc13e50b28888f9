#include "gainsay/estimation/data_rows.h"

#include <algorithm>
#include <cmath>

namespace gainsay::estimation {
namespace {

/// Least sd of a readout, as a share of its largest |value|.
constexpr double kLeastSd = 1e-6;
/// What a tempered stage adds to the sd, as a share of the largest |value| of the series.
constexpr double kTempering = 0.1;

double square(double x) { return x * x; }

double largest(const FittedSeries& series) {
  double size = 0.0;
  for (const Datum& datum : series.data) size = std::max(size, std::fabs(datum.value));
  return size;
}

/// Largest |value| of each readout of the problem; 1 where all are 0 or there are none.
std::vector<double> readout_sizes(const Problem& problem) {
  std::vector<double> sizes(problem.readouts.size(), 0.0);
  for (const FittedExperiment& experiment : problem.experiments) {
    for (const FittedSeries& series : experiment.series) {
      double& size = sizes.at(series.readout_number);
      size = std::max(size, largest(series));
    }
  }
  std::replace(sizes.begin(), sizes.end(), 0.0, 1.0);
  return sizes;
}

bool has_unknown_sd(const FittedSeries& series, const Datum& datum) {
  return std::isnan(datum.sd) && series.noise.sd_unknown;
}

DataRow row_of(const FittedSeries& series, const Datum& datum, double readout_size) {
  DataRow row;
  row.output = datum.output;
  row.readout = datum.readout;
  row.observed = datum.value;
  row.readout_size = readout_size;
  const double size = largest(series);
  row.tempering = square(kTempering * (size > 0.0 ? size : readout_size));
  if (has_unknown_sd(series, datum)) {
    row.group = series.noise_group;
  } else if (!std::isnan(datum.sd)) {
    row.scatter.constant = square(datum.sd);
  } else {
    row.scatter.constant = square(series.noise.sd.value_or(0.0));
    row.scatter.relative_squared = square(series.noise.relative.value_or(0.0));
    // Only a purely proportional sd can vanish.
    if (row.scatter.constant == 0.0) row.scatter.floor = square(kLeastSd * readout_size);
  }
  return row;
}

}  // namespace

Scatter DataRow::tempered() const {
  Scatter wider = scatter;
  wider.constant += tempering;
  return wider;
}

std::size_t ExperimentRows::within(double horizon) const {
  const double end = begins + horizon * (last - begins);
  if (horizon >= 1.0) return rows.size();
  return static_cast<std::size_t>(
      std::upper_bound(rows.begin(), rows.end(), end,
                       [](double time, const DataRow& row) { return time < row.time; }) -
      rows.begin());
}

std::vector<ExperimentRows> data_rows(const Problem& problem) {
  const std::vector<double> sizes = readout_sizes(problem);
  std::vector<ExperimentRows> all;
  std::size_t number = 0;
  for (const FittedExperiment& experiment : problem.experiments) {
    ExperimentRows table;
    table.begins = table.last = experiment.schedule.begins;
    for (const FittedSeries& series : experiment.series) {
      for (const Datum& datum : series.data) {
        DataRow row = row_of(series, datum, sizes.at(series.readout_number));
        row.number = number++;
        row.time = experiment.schedule.outputs.at(datum.output);
        table.last = std::max(table.last, row.time);
        table.rows.push_back(row);
      }
    }
    std::stable_sort(table.rows.begin(), table.rows.end(),
                     [](const DataRow& a, const DataRow& b) { return a.output < b.output; });
    all.push_back(std::move(table));
  }
  return all;
}

std::vector<NoiseGroup> noise_groups(const Problem& problem) {
  const std::vector<double> sizes = readout_sizes(problem);
  std::vector<NoiseGroup> groups(problem.noise_groups.size());
  for (const FittedExperiment& experiment : problem.experiments) {
    for (const FittedSeries& series : experiment.series) {
      for (const Datum& datum : series.data) {
        if (!has_unknown_sd(series, datum)) continue;
        NoiseGroup& group = groups.at(series.noise_group);
        ++group.count;
        group.floor = kLeastSd * sizes.at(series.readout_number);
      }
    }
  }
  return groups;
}

}  // namespace gainsay::estimation
