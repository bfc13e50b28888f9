#pragma once

#include "gainsay/core/rate_laws.h"

#include <string>

namespace gainsay::cli {

/// Every rate law in one line of at most 80 columns.
std::string list_of_laws();

/// One law: call, formula, arguments, where it holds, source.
std::string explanation(const core::RateLaw& law);

/// One law, or all of them, as JSON; the formula also in LaTeX.
std::string law_as_json(const core::RateLaw& law);
std::string laws_as_json();

/// One law as a section of Markdown, and docs/rate-laws.md, which holds them all.
std::string law_as_markdown(const core::RateLaw& law);
std::string rate_laws_page();

}  // namespace gainsay::cli
