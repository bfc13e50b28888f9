#pragma once

#include "gainsay/estimation/landscape.h"

#include <Eigen/Core>

#include <limits>
#include <optional>

namespace gainsay::estimation {

/// The box that a descent stays in.
struct Box {
  Eigen::VectorXd low;
  Eigen::VectorXd high;
};

struct RegionPlan {
  double enough = 0.01;  ///< eps: gains below it end the descent, in units of the objective
  int models = 200;      ///< local models (Jacobians) at most
  Eigen::VectorXd unit;  ///< of each coordinate: the region is |p_i| <= D unit_i
};

struct RegionEnd {
  enum class Why {
    Settled,       ///< neither a gain nor the promise of one is left
    Stuck,         ///< too many steps in a row were rejected
    NoModelsLeft,  ///< the plan's number of them was used up
    Closed,        ///< the landscape was closed
    BadStart       ///< the first point cannot be evaluated
  };
  Why why = Why::BadStart;
  Eigen::VectorXd x;
  std::optional<LocalModel> here;  ///< at x; none after a bad start
  int models = 0;                  ///< used
};

/// What the local model at x promises of the best step inside the box, without a region.
double promise(const LocalModel& here, const Eigen::VectorXd& x, const Box& box);

/// A descent in a region of trust whose steps are solved inside the box: Methods (16), (17), (18).
/// `from` lies in the box.
RegionEnd descend_in_region(Landscape& landscape, const Box& box, const Eigen::VectorXd& from,
                            const RegionPlan& plan);

}  // namespace gainsay::estimation
