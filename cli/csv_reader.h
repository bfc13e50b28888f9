#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/source_text.h"

#include <cstddef>
#include <memory>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// One field of a table, blanks around it removed unless it is quoted, with its place.
struct CsvCell {
  std::string text;
  std::size_t line = 0;    ///< from 1
  std::size_t column = 0;  ///< in characters, from 1
};

using CsvRow = std::vector<CsvCell>;

/// A table of equally long rows; the first is the header.
struct CsvTable {
  std::shared_ptr<const SourceText> source;
  CsvRow header;
  std::vector<CsvRow> rows;

  Location at(const CsvCell& cell) const { return {source, cell.line, cell.column}; }
};

/// Reads comma-separated values (RFC 4180): UTF-8, a byte-order mark allowed, lines ended by CR LF
/// or LF, fields with commas, quotes or line ends in double quotes. Empty lines are skipped. Says
/// every error with its place; nothing is returned if there is one.
std::optional<CsvTable> read_csv(std::shared_ptr<const SourceText> source,
                                 Diagnostics& diagnostics);

}  // namespace gainsay::cli
