#pragma once

#include "gainsay/cli/page.h"

#include <cstddef>
#include <map>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A reading as pictures show it.
struct Reading {
  double time = 0.0;
  double value = 0.0;
  double sd = stats::kNotComputed;
  std::string left_out;
};

/// What one hypothesis says about one series.
struct FitOfSeries {
  const Contender* contender = nullptr;
  const estimation::Curve* curve = nullptr;                  ///< null where it has none
  std::map<std::size_t, stats::StandardResidual> residuals;  ///< by number of the reading
};

/// One panel's worth: the readings of one readout in one experiment and all fits to it.
struct SeriesPicture {
  std::size_t readout = 0;  ///< numbers in the study
  std::size_t experiment = 0;
  std::vector<Reading> readings;
  std::vector<FitOfSeries> fits;  ///< in order of the line-up, those that were judged
};

/// Every series that has readings, by readout and then experiment, in order of the study. The sd of
/// a reading is its own; else that of the first hypothesis in the line-up that has one.
std::vector<SeriesPicture> series_pictures(const Page& page);

/// "p0-2": the panel of readout 0 in experiment 2.
std::string panel_id(const SeriesPicture& picture);

std::string title_of(const estimation::Readout& readout);
std::string title_of(const estimation::Experiment& experiment);

}  // namespace gainsay::cli
