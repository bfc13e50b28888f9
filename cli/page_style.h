#pragma once

#include "gainsay/cli/page.h"

#include <string>

namespace gainsay::cli {

/// The style sheet of the report, whole: palette, type, sections, pictures, phone, print, and the
/// rules that show what is ticked. No style stands in an attribute.
std::string page_style(const Page& page);

}  // namespace gainsay::cli
