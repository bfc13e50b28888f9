#pragma once

#include "gainsay/stats/decide.h"
#include "gainsay/stats/verdict.h"

#include <string>

namespace gainsay::stats {

/// The weightiest reason of a decided verdict, short enough for a line of a table. V is called the
/// misfit, as on every page.
std::string reason_of(const Verdict& verdict, const Conviction& conviction);

}  // namespace gainsay::stats
