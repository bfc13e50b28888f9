#pragma once

#include <string>
#include <string_view>

namespace gainsay::cli {

/// The manual page in the man macros of roff, from the table of options.
std::string manual_page();

/// The completion script of "bash", "zsh" or "fish", from the table of options.
std::string completion_script(std::string_view shell);

}  // namespace gainsay::cli
