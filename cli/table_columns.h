#pragma once

#include "gainsay/cli/csv_reader.h"

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// What a table's columns may mean, beside the words that mean the same in every study.
struct TableContext {
  std::vector<std::string> readouts;
  std::vector<std::string> inputs;
  std::vector<std::string> knowns;
  std::vector<std::string> ignored;  ///< listed under `ignore`
  double begins = 0.0;               ///< time at which the experiment begins
};

/// The columns of one readout in a wide table.
struct ReadoutColumns {
  std::size_t readout = 0;  ///< number in TableContext::readouts
  std::size_t value = 0;    ///< number of the column
  std::optional<std::size_t> sd;
};

/// Which column is what.
struct TableColumns {
  std::size_t time = 0;
  std::optional<std::size_t> left_out;
  std::vector<ReadoutColumns> wide;    ///< of a wide table, in order of the readouts
  std::optional<std::size_t> readout;  ///< of a tidy table
  std::optional<std::size_t> value;
  std::optional<std::size_t> sd;
  bool is_tidy() const { return readout && value; }
};

/// Understands a header: tidy if it has `readout` and `value`, else wide. Says every column that
/// has no meaning, two, or one that is not yet read; returns nothing then.
std::optional<TableColumns> understand_columns(const CsvTable& table, const TableContext& context,
                                               Diagnostics& diagnostics);

}  // namespace gainsay::cli
