#pragma once

#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// A cell as RFC 4180 wants it: quoted where it holds a comma, a quote or a line break.
std::string csv_cell(std::string_view text);

/// Cells joined by commas, ended by a line feed.
std::string csv_line(const std::vector<std::string>& cells);

}  // namespace gainsay::cli
