#pragma once

#include <fstream>
#include <sstream>
#include <stdexcept>
#include <string>
#include <vector>

namespace gainsay::testing {

/// A table of reference values: lines that begin with `#` say where it comes from, the next one
/// names the columns, all others hold numbers.
struct Table {
  std::vector<std::string> columns;
  std::vector<std::vector<double>> rows;
};

inline Table read_table(const std::string& path) {
  std::ifstream file(path);
  if (!file) throw std::runtime_error("no file " + path);
  Table table;
  for (std::string line; std::getline(file, line);) {
    if (line.starts_with('#')) continue;
    std::vector<std::string> cells;
    std::stringstream stream(line);
    for (std::string cell; std::getline(stream, cell, ',');) cells.push_back(cell);
    if (table.columns.empty()) {
      table.columns = cells;
      continue;
    }
    std::vector<double> row;
    for (const std::string& cell : cells) row.push_back(std::stod(cell));
    if (row.size() != table.columns.size()) throw std::runtime_error("a ragged row in " + path);
    table.rows.push_back(row);
  }
  return table;
}

}  // namespace gainsay::testing
