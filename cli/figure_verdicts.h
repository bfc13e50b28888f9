#pragma once

#include "gainsay/cli/page.h"

namespace gainsay::cli {

/// Every hypothesis against its limit: a table whose middle column is drawn. A bar runs from the
/// limit that decides to the misfit, ends in the shape of the verdict, and carries ticks where the
/// other limits stand. With unknown noise the bar shows alpha / P instead.
Markup figure_verdicts(const Page& page);

}  // namespace gainsay::cli
