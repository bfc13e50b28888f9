#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/weighing.h"

#include <cstddef>
#include <optional>
#include <vector>

namespace gainsay::estimation {

/// One datum with all that weighing it takes.
struct DataRow {
  std::size_t number = 0;   ///< of its residual
  std::size_t output = 0;   ///< of the experiment's schedule
  std::size_t readout = 0;  ///< of the experiment's program
  double time = 0.0;
  double observed = 0.0;
  Scatter scatter;            ///< where its noise is known
  double tempering = 0.0;     ///< variance that a tempered stage adds: (0.1 max|z|)^2 of its series
  double readout_size = 1.0;  ///< largest |value| of its readout in all experiments, 1 if 0
  std::optional<std::size_t> group;  ///< of unknown noise

  /// As a stage that tempers sees it: unknown noise is taken as none beside the tempering.
  Scatter tempered() const;
};

/// The data of one experiment in order of time (equal times: of residual).
struct ExperimentRows {
  std::vector<DataRow> rows;
  double begins = 0.0;
  double last = 0.0;  ///< time of its last datum

  /// How many rows lie within a share of the time up to the last datum.
  std::size_t within(double horizon) const;
};

/// The data of a problem, experiment by experiment.
std::vector<ExperimentRows> data_rows(const Problem& problem);

/// Its groups of unknown noise, with sums of squares at 0.
std::vector<NoiseGroup> noise_groups(const Problem& problem);

}  // namespace gainsay::estimation
