#include "gainsay/cli/table_reader.h"

#include "gainsay/cli/table_cells.h"
#include "gainsay/core/nearest_name.h"
#include "gainsay/core/print.h"

#include <algorithm>
#include <optional>
#include <string>
#include <utility>

namespace gainsay::cli {

namespace {

class RowReader {
 public:
  RowReader(const CsvTable& table, const TableContext& context, const TableColumns& columns,
            Diagnostics& diagnostics)
      : table_(table),
        context_(context),
        columns_(columns),
        diagnostics_(diagnostics),
        series_(context.readouts.size()) {}

  std::vector<ReadSeries> read() && {
    for (const CsvRow& row : table_.rows) {
      if (std::all_of(row.begin(), row.end(), is_missing)) continue;
      if (columns_.is_tidy()) {
        read_tidy(row);
      } else {
        read_wide(row);
      }
    }
    for (std::size_t i = 0; i < series_.size(); ++i) {
      series_[i].readout = i;
      std::stable_sort(
          series_[i].points.begin(), series_[i].points.end(),
          [](const ReadPoint& a, const ReadPoint& b) { return a.point.time < b.point.time; });
    }
    std::erase_if(series_, [](const ReadSeries& series) { return series.points.empty(); });
    return std::move(series_);
  }

 private:
  void read_tidy(const CsvRow& row) {
    const auto time = read_time(row);
    const auto readout = read_readout(row[*columns_.readout]);
    if (time && readout) add(row, *time, *readout, *columns_.value, columns_.sd);
  }

  void read_wide(const CsvRow& row) {
    const auto time = read_time(row);
    if (!time) return;
    for (const ReadoutColumns& columns : columns_.wide) {
      add(row, *time, columns.readout, columns.value, columns.sd);
    }
  }

  std::optional<double> read_time(const CsvRow& row) {
    const CsvCell& cell = row[columns_.time];
    if (is_missing(cell)) {
      diagnostics_.error(table_.at(cell), {"this row has no time", "the time of the reading",
                                           "give the time, or remove the row"});
      return std::nullopt;
    }
    const auto time = number_in(table_, cell, "time", "", diagnostics_);
    if (time && *time < context_.begins) {
      diagnostics_.error(table_.at(cell),
                         {"the time " + cell.text + " is before the experiment begins, at " +
                              core::print_number(context_.begins),
                          "times from the beginning on",
                          "correct it, or say in the experiment: begins = " + cell.text});
      return std::nullopt;
    }
    return time;
  }

  std::optional<std::size_t> read_readout(const CsvCell& cell) {
    const auto& names = context_.readouts;
    const auto found = std::find(names.begin(), names.end(), cell.text);
    if (found != names.end()) return static_cast<std::size_t>(found - names.begin());
    const auto nearest = core::nearest_name(cell.text, names);
    diagnostics_.error(table_.at(cell),
                       {"unknown readout '" + cell.text + "'",
                        nearest ? "a name under [readouts]; nearest: '" + *nearest + "'"
                                : "a name under [readouts]",
                        "correct the name, or add it under [readouts] in study.toml"});
    return std::nullopt;
  }

  void add(const CsvRow& row, double time, std::size_t readout, std::size_t value_column,
           std::optional<std::size_t> sd_column) {
    const CsvCell& cell = row[value_column];
    if (is_missing(cell)) return;
    const std::string of = " of '" + context_.readouts[readout] + "'";
    const auto value = number_in(table_, cell, "value", of, diagnostics_);
    if (!value) return;
    estimation::Point point;
    point.time = time;
    point.value = *value;
    point.line = cell.line;
    if (columns_.left_out) point.left_out = row[*columns_.left_out].text;
    if (sd_column) read_sd(row[*sd_column], of, point);
    series_[readout].points.push_back({std::move(point), table_.at(cell)});
  }

  void read_sd(const CsvCell& cell, const std::string& of, estimation::Point& point) {
    if (is_missing(cell)) return;
    const auto sd = number_in(table_, cell, "sd", of, diagnostics_);
    if (!sd) return;
    point.sd = *sd;
    if (*sd > 0.0) return;
    diagnostics_.error(table_.at(cell), {"the sd" + of + " is not above 0", "a number above 0",
                                         "correct it, or leave it empty where the readout's noise "
                                         "holds"});
  }

  const CsvTable& table_;
  const TableContext& context_;
  const TableColumns& columns_;
  Diagnostics& diagnostics_;
  std::vector<ReadSeries> series_;
};

}  // namespace

std::vector<ReadSeries> read_table(const CsvTable& table, const TableContext& context,
                                   Diagnostics& diagnostics) {
  const std::size_t errors = diagnostics.errors();
  const auto columns = understand_columns(table, context, diagnostics);
  if (!columns) return {};
  auto series = RowReader(table, context, *columns, diagnostics).read();
  if (series.empty() && diagnostics.errors() == errors) {
    diagnostics.error({table.source, 1, 1}, {"the table holds no reading", "rows with values",
                                             "add readings, or remove the table"});
  }
  return series;
}

}  // namespace gainsay::cli
