#pragma once

#include <string_view>

namespace gainsay::cli {

/// The report's script: reads numbers at the pointer, opens a panel in large. Without it everything
/// is there and can be ticked.
std::string_view page_script();

}  // namespace gainsay::cli
