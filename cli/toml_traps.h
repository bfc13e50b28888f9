#pragma once

#include "gainsay/cli/diagnostics.h"

#include <string_view>

namespace gainsay::cli {

/// What a TOML syntax error most likely means to the author of a study: an inline table over
/// several lines, a name or a text that lacks its quotes, a key that stands twice, a decimal comma,
/// ... `description` is the parser's own.
Message explain_syntax_error(const Location& at, std::string_view description);

}  // namespace gainsay::cli
