#pragma once

#include "gainsay/cli/csv_reader.h"

#include <optional>
#include <string_view>

namespace gainsay::cli {

/// Empty, or `NA`.
bool is_missing(const CsvCell& cell);

/// The number in a cell that is not missing; says what is wrong with another. Messages call it by
/// `what` and `of`: "time" and "", "value" and " of 'glow'".
std::optional<double> number_in(const CsvTable& table, const CsvCell& cell, std::string_view what,
                                std::string_view of, Diagnostics& diagnostics);

}  // namespace gainsay::cli
