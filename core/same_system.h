#pragma once

#include "gainsay/core/hypothesis.h"

#include <span>

namespace gainsay::core {

/// Whether two hypotheses are the same system of equations: equal derivatives, starts and values of
/// `shown` (what readouts show) for species of the same names, unknowns of the same names. Tested
/// at keyed random points in 50 digits, in the sense of identity testing: Schwartz (1980).
bool same_system(const Hypothesis& a, const Hypothesis& b, std::span<const Expression> shown = {});

}  // namespace gainsay::core
