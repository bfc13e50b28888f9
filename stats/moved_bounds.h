#pragma once

#include "gainsay/estimation/problem.h"
#include "gainsay/stats/limits.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::stats {

/// One end of the range of one unknown.
struct Bound {
  std::size_t unknown = 0;  ///< number in the Problem
  bool lower = false;
};

/// A bound that was moved out because a fit about to be rejected lay on it.
struct MovedBound {
  std::string unknown;
  bool lower = false;
  double stated = 0.0;
  double moved_to = 0.0;
  double V = kNotComputed;  ///< least V found in the wider range
};

/// The bounds that a fit lies on and that may be moved: not those of a hard range, nor one at zero
/// of a rate constant or a start value on a linear scale.
std::vector<Bound> movable_bounds(const estimation::Problem& problem,
                                  const std::vector<double>& values,
                                  const std::vector<bool>& on_bound);

/// The same problem with these bounds moved out: tenfold, or by one width of the range where it is
/// linear.
estimation::Problem moved_out(const estimation::Problem& problem, const std::vector<Bound>& bounds);

/// What moved between the stated problem and the wider one, in order of unknowns.
std::vector<MovedBound> moved_bounds(const estimation::Problem& stated,
                                     const estimation::Problem& wider, double V);

}  // namespace gainsay::stats
