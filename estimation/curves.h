#pragma once

#include "gainsay/core/result.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/residuals.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// A fitted curve: what one readout of one experiment shows over time.
struct Curve {
  std::string experiment;
  std::string readout;
  std::vector<double> times;
  std::vector<double> shown;
};

/// Curves of every fitted series at `values` (natural units), at `points` even times from the
/// beginning to the last datum and at each datum; just after each event a second value at its time,
/// so that jumps show.
core::Result<std::vector<Curve>, EvaluationFailure> curves(const Problem& problem,
                                                           const std::vector<double>& values,
                                                           std::size_t points);

}  // namespace gainsay::estimation
