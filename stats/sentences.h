#pragma once

#include "gainsay/stats/decide.h"
#include "gainsay/stats/verdict.h"

#include <string>
#include <vector>

namespace gainsay::stats {

/// Why a verdict is what it is, in full sentences: what the decision rests on first, then what each
/// test says, the search, the bounds moved out, what would have gone unseen, and which unknowns the
/// data leave free. V is called the misfit, as on every page.
std::vector<std::string> sentences_of(const Verdict& verdict, const Conviction& conviction);

}  // namespace gainsay::stats
