#pragma once

#include "gainsay/cli/page.h"

namespace gainsay::cli {

/// Why each rejected hypothesis fails, and why undecided ones are undecided, in sentences.
Markup reasons(const Page& page);

/// The equations of each hypothesis.
Markup equations(const Page& page);

/// Verdicts, models compared and shares of the misfit, in numbers.
Markup tables(const Page& page);

/// Method, cautions, versions and fingerprints.
Markup method(const Page& page);

}  // namespace gainsay::cli
