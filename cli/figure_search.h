#pragma once

#include "gainsay/cli/page.h"

namespace gainsay::cli {

/// Was the search thorough: for each hypothesis the ends of all starts, best first, against the
/// limit, and in words how many distinct optima there are and how often each was found.
Markup figure_search(const Page& page);

}  // namespace gainsay::cli
