#pragma once

#include "gainsay/estimation/residuals.h"

#include <Eigen/Core>

#include <cstddef>
#include <limits>
#include <stop_token>
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
  Eigen::VectorXd shown;       ///< modelled values of the data
  Eigen::VectorXd sd;          ///< of each datum: as used, or as estimated where unknown
  Stopped stopped = Stopped::NeverRun;
  std::string why = "no fit was run";
  long evaluations = 0;
  long jacobians = 0;
  long integrations = 0;

  bool ended() const { return shown.size() > 0; }  ///< somewhere that can be evaluated
};

/// How a descent is run.
struct DescentPlan {
  /// Straight to the last stage, for starts that are near already; scales and offsets stay.
  bool polish_only = false;
  /// Sets scales and offsets by regression on the start's own trajectory (else they stay).
  bool regress = true;
  /// Keeps those that have a first guess when the others are set.
  bool keep_guessed = false;
  long integrations_at_most = std::numeric_limits<long>::max();
  std::stop_token stop;
};

/// One descent from a point inside the box: the approach in stages, then the finish
/// (docs/methods.md, "Descent"). `stopped` is the word of the finish: of Ceres, or of the region of
/// trust where sds depend on the modelled value.
Fit descend(Evaluator& evaluator, const Eigen::VectorXd& start, const DescentPlan& plan = {});

/// The least V itself near `from`, by its own descent: differs from `descend` where sds depend on
/// the modelled value, whose likelihood is no function of V. Objective and V of the fit are V.
/// Requires noise that is known.
Fit least_V(Evaluator& evaluator, const Eigen::VectorXd& from, const DescentPlan& plan = {});

}  // namespace gainsay::estimation
