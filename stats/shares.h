#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/residuals.h"
#include "gainsay/stats/standardized.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::stats {

/// Part of V carried by one readout in one experiment, or by the priors (readout 'earlier work', no
/// experiment). Where sd is fitted, in units of the fitted sd.
struct Share {
  std::string experiment;
  std::string readout;
  std::size_t points = 0;
  double V = 0.0;
};

/// One fitted point as the pages show it.
struct StandardResidual {
  std::size_t experiment = 0;  ///< numbers in the Problem
  std::size_t series = 0;
  std::size_t datum = 0;
  double shown = 0.0;
  double sd = 0.0;
  double r = 0.0;  ///< (observed - shown) / sd
};

/// In order of experiment and series, priors last; they add up to V.
std::vector<Share> shares_of_V(const estimation::Problem& problem, const Standardized& all);

/// In order of experiment, series and datum, without priors.
std::vector<StandardResidual> standard_residuals(const estimation::Problem& problem,
                                                 const Standardized& all,
                                                 const Eigen::VectorXd& shown);

}  // namespace gainsay::stats
