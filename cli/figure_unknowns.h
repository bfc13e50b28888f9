#pragma once

#include "gainsay/cli/page.h"

namespace gainsay::cli {

/// What the data say of each unknown, a table a hypothesis: estimate, linear interval, the interval
/// as a bar inside the range searched, and words. Undetermined ones first.
Markup figure_unknowns(const Page& page);

}  // namespace gainsay::cli
