#pragma once

#include <cstddef>
#include <string>
#include <string_view>

namespace gainsay::cli {

/// Columns that a text takes on a terminal: characters, not bytes (wide and combining ones count as
/// one).
std::size_t columns(std::string_view text);

/// At most `width` columns; where it was cut, the last is "…".
std::string cut(std::string_view text, std::size_t width);

/// Cut, then filled with spaces up to `width` columns.
std::string pad(std::string_view text, std::size_t width);

/// Control characters (which could steer a terminal) replaced by "?".
std::string harmless(std::string_view text);

/// Words broken into lines of at most `width` columns, each begun with `indent` spaces.
std::string wrap(std::string_view text, std::size_t width, std::size_t indent);

}  // namespace gainsay::cli
