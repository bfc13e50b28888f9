#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/residuals.h"

#include <Eigen/Core>

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::stats {

/// Whether the sd of a datum is fitted: its readout's is unknown, and it has none of its own.
bool has_unknown_sd(const estimation::FittedSeries& series, const estimation::Datum& datum);

/// The sd of one readout whose noise is unknown, as the fit estimates it.
struct FittedNoise {
  std::string readout;
  std::size_t points = 0;       ///< N_g
  double sum_of_squares = 0.0;  ///< of shown - observed, in units of the readout squared
  double sd = 0.0;              ///< sqrt(f^2 + sum_of_squares / N_g), f the floor of the likelihood
};

/// An evaluation with every residual in units of its sd, known or fitted.
struct Standardized {
  Eigen::VectorXd r;               ///< N: data, then priors
  Eigen::MatrixXd J;               ///< N x unknowns, search coordinates
  Eigen::VectorXd sd;              ///< of each datum (without priors), in units of its readout
  double V = 0.0;                  ///< sum of r^2
  std::vector<FittedNoise> noise;  ///< of each group of unknown sd
};

Standardized standardized(const estimation::Problem& problem,
                          const estimation::Evaluation& evaluation);

}  // namespace gainsay::stats
