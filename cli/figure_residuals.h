#pragma once

#include "gainsay/cli/page.h"

namespace gainsay::cli {

/// Standardized residuals, (reading - shown) / sd: a row a hypothesis, a cell a readout, in it the
/// experiments side by side, each evenly spaced and joined in order of time, so that drift shows.
/// What lies beyond the scale stands at its edge as a small triangle.
Markup figure_residuals(const Page& page);

}  // namespace gainsay::cli
