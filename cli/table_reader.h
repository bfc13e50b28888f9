#pragma once

#include "gainsay/cli/csv_reader.h"
#include "gainsay/cli/table_columns.h"
#include "gainsay/estimation/experiment.h"

#include <cstddef>
#include <vector>

namespace gainsay::cli {

/// A reading with the place of its value.
struct ReadPoint {
  estimation::Point point;
  Location place;
};

/// The readings of one readout, ascending in time, those of one time in order of the table.
struct ReadSeries {
  std::size_t readout = 0;  ///< number in TableContext::readouts
  std::vector<ReadPoint> points;
};

/// The readings of a data table, tidy or wide, in order of the readouts; missing ones and readouts
/// without any are left out. Says every error with its place.
std::vector<ReadSeries> read_table(const CsvTable& table, const TableContext& context,
                                   Diagnostics& diagnostics);

}  // namespace gainsay::cli
