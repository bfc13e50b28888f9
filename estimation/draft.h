#pragma once

#include "gainsay/core/hypothesis.h"
#include "gainsay/core/result.h"
#include "gainsay/core/system.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/names.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/readout.h"
#include "gainsay/estimation/tolerances.h"
#include "gainsay/estimation/unknown.h"

#include <cstddef>
#include <span>
#include <utility>
#include <vector>

namespace gainsay::estimation {

/// What is the same for all experiments of one hypothesis.
struct Ground {
  const core::Hypothesis& hypothesis;
  std::span<const DeclaredUnknown> declared;
  std::span<const Readout> readouts;
  std::span<const Experiment> experiments;
  std::vector<core::Expression> rates;  ///< of the species, written out
  std::vector<core::Expression> shows;  ///< of the readouts, written out
};

Ground make_ground(const core::Hypothesis& hypothesis, std::span<const DeclaredUnknown> declared,
                   std::span<const Readout> readouts, std::span<const Experiment> experiments);

/// One experiment on its way into a Problem: its equations with names resolved and its data, but
/// unknowns not yet numbered and nothing compiled.
struct Draft {
  const Experiment* experiment = nullptr;
  core::System system;                                ///< `unknowns` still empty
  std::vector<std::pair<double, std::size_t>> jumps;  ///< (time, number of System::jumps)
  std::vector<std::size_t> shown;    ///< number in Ground::readouts of each System::readouts
  std::vector<FittedSeries> series;  ///< `output` of each datum still 0
  std::vector<double> times;         ///< of the data of all series, in their order
  std::vector<Reading> readings;     ///< sizes that set the tolerances
};

/// Whether any point of the experiment is fitted.
bool has_data(const Experiment& experiment);

/// Fails as `assemble` does. With `all_readouts`, for simulating, the system shows every readout in
/// its order, and readings need no sd.
core::Result<Draft> draft(const Ground& ground, const Experiment& experiment, bool all_readouts);

}  // namespace gainsay::estimation
