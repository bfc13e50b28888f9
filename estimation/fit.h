#pragma once

#include "gainsay/estimation/residuals.h"

#include <Eigen/Core>

#include <cstddef>
#include <limits>
#include <string>
#include <vector>

namespace gainsay::estimation {

enum class Stopped {
  NeverRun,
  Converged,        ///< the finish says so
  NotConverged,     ///< the finish ended for another reason: see `why`
  CannotIntegrate,  ///< the start cannot be integrated: it is replaced by the next
  OutOfBudget,
  Interrupted
};

/// The end of one descent.
struct Fit {
  Eigen::VectorXd x;           ///< search coordinates
  std::vector<double> values;  ///< natural units
  double V = std::numeric_limits<double>::quiet_NaN();
  double objective = std::numeric_limits<double>::quiet_NaN();
  std::vector<bool> on_bound;  ///< within 1e-6 of the width, gradient pointing outward
  Stopped stopped = Stopped::NeverRun;
  std::string why = "no fit was run";
  long evaluations = 0;
  long jacobians = 0;
  long integrations = 0;
};

/// One descent from x (inside the box): the approach in stages, then the finish (docs/methods.md,
/// "Descent"). `polish_only` goes straight to the last stage (for warm starts).
Fit descend(Evaluator& evaluator, const Eigen::VectorXd& start, bool polish_only = false,
            long integrations_at_most = std::numeric_limits<long>::max());

}  // namespace gainsay::estimation
