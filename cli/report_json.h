#pragma once

#include "gainsay/cli/judgement.h"

#include <string>

namespace gainsay::cli {

/// The judgement as JSON, for machines: verdicts with every test and limit, fitted values with
/// their intervals, residuals, shares, the search, versions and fingerprints. What was not computed
/// is null. Numbers read back as the same doubles; keys keep their order; indented by two.
std::string report_json(const Judgement& judgement);

}  // namespace gainsay::cli
