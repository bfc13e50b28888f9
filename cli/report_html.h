#pragma once

#include "gainsay/cli/judgement.h"

#include <string>

namespace gainsay::cli {

/// The report: one page that stands alone (no request leaves it), for screen, phone and paper. It
/// computes nothing and knows no clock: equal judgements give equal bytes.
std::string report_html(const Judgement& judgement);

}  // namespace gainsay::cli
