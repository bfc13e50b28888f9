#pragma once

#include "gainsay/cli/judgement.h"

#include <map>
#include <string>

namespace gainsay::cli {

/// The judgement as tables, by file name: verdicts.csv (a row a hypothesis), unknowns.csv (a row an
/// unknown of a hypothesis), residuals.csv (a row a fitted reading of a hypothesis). RFC 4180,
/// UTF-8, lines ended by a line feed; what was not computed is empty; numbers read back as the same
/// doubles.
std::map<std::string, std::string> report_csv(const Judgement& judgement);

}  // namespace gainsay::cli
