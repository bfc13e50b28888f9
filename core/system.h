#pragma once

#include "gainsay/core/expression.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::core {

/// An instantaneous rise of one state by an expression of unknowns and inputs (a dose; an amount
/// added is divided by the volume beforehand where the state is a concentration).
struct Jump {
  std::size_t state = 0;
  Expression rise;
};

/// One hypothesis in one experiment, reduced to what is computed:
///   dy/dt = rates(t, y, p, u),   y(begins) = starts(p, u),   shown = readouts(t, y, p, u).
/// All expressions are in states, unknowns, inputs and t alone (knowns are numbers by now).
struct System {
  std::vector<std::string> states;    ///< n names
  std::vector<std::string> unknowns;  ///< p names: those that this system depends on
  std::vector<std::string> inputs;    ///< names of piecewise constant inputs
  std::vector<Expression> rates;      ///< n
  std::vector<Expression> starts;     ///< n
  std::vector<Jump> jumps;
  std::vector<Expression> readouts;  ///< m
};

}  // namespace gainsay::core
