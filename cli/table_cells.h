#pragma once

#include "gainsay/cli/csv_reader.h"

#include <optional>
#include <string_view>

namespace gainsay::cli {

/// Empty, or `NA`.
bool is_missing(const CsvCell& cell);

/// The number in a cell that is not missing; says what is wrong with another. `what` names it in
/// messages: "time", "value of 'glow'", "sd of 'glow'".
std::optional<double> number_in(const CsvTable& table, const CsvCell& cell, std::string_view what,
                                Diagnostics& diagnostics);

}  // namespace gainsay::cli
