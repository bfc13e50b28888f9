#include "gainsay/cli/table_columns.h"

#include "gainsay/cli/key_check.h"
#include "gainsay/core/nearest_name.h"

#include <algorithm>
#include <string_view>

namespace gainsay::cli {

namespace {

std::optional<std::size_t> position(const std::vector<std::string>& names, std::string_view name) {
  const auto found = std::find(names.begin(), names.end(), name);
  if (found == names.end()) return std::nullopt;
  return static_cast<std::size_t>(found - names.begin());
}

// "A, B or C"
std::string listed(const std::vector<std::string>& words) {
  std::string text;
  for (std::size_t i = 0; i < words.size(); ++i) {
    if (i > 0) text += i + 1 == words.size() ? " or " : ", ";
    text += words[i];
  }
  return text;
}

class ColumnReader {
 public:
  ColumnReader(const CsvTable& table, const TableContext& context, Diagnostics& diagnostics)
      : table_(table), context_(context), diagnostics_(diagnostics) {
    tidy_ = has("readout") && has("value");
    values_.resize(context.readouts.size());
    sds_.resize(context.readouts.size());
  }

  std::optional<TableColumns> read() {
    const std::size_t errors = diagnostics_.errors();
    for (std::size_t i = 0; i < table_.header.size(); ++i) {
      if (!say_double(i)) understand(i);
    }
    for (std::size_t r = 0; r < values_.size(); ++r) {
      if (values_[r]) columns_.wide.push_back({r, *values_[r], sds_[r]});
      if (!values_[r] && sds_[r]) say_lone_sd(r);
    }
    if (!has("time") && diagnostics_.errors() == errors) say_no_time();
    if (!tidy_ && columns_.wide.empty() && diagnostics_.errors() == errors) say_no_readout();
    if (diagnostics_.errors() > errors) return std::nullopt;
    return columns_;
  }

 private:
  bool has(std::string_view name) const {
    return std::any_of(table_.header.begin(), table_.header.end(),
                       [&](const CsvCell& cell) { return cell.text == name; });
  }

  bool say_double(std::size_t column) {
    const CsvCell& cell = table_.header[column];
    for (std::size_t before = 0; before < column; ++before) {
      if (table_.header[before].text != cell.text || cell.text.empty()) continue;
      diagnostics_.error(table_.at(cell), {"two columns are headed '" + cell.text + "'",
                                           "each column once", "rename or remove one of the two"});
      return true;
    }
    return false;
  }

  void understand(std::size_t column) {
    const std::string& name = table_.header[column].text;
    const std::vector<std::string> meanings = meanings_of(name);
    if (meanings.size() > 1) {
      error(column, {"the column '" + name + "' may be " + listed(meanings), "one meaning",
                     "rename the column, or what bears its name"});
    } else if (meanings.empty()) {
      say_meaningless(column);
    } else {
      take(column);
    }
  }

  // In words; in the order in which a column's meanings are looked for.
  std::vector<std::string> meanings_of(std::string_view name) const {
    std::vector<std::string> meanings;
    if (name == "time") meanings.emplace_back("the time");
    if (tidy_ && (name == "readout" || name == "value" || name == "sd" || name == "n")) {
      meanings.push_back("the " + std::string(name) + " of a tidy table");
    }
    if (name == "experiment") meanings.emplace_back("the experiment");
    if (name == "replicate") meanings.emplace_back("the number of a replicate");
    if (name == "left_out") meanings.emplace_back("why a row is left out");
    if (!tidy_ && position(context_.readouts, name)) meanings.emplace_back("a readout");
    if (!tidy_ && readout_after("sd ", name)) meanings.emplace_back("the sd of a readout");
    if (!tidy_ && readout_after("n ", name)) meanings.emplace_back("how often a readout was read");
    if (position(context_.inputs, name)) meanings.emplace_back("an input");
    if (position(context_.knowns, name)) meanings.emplace_back("a known");
    if (position(context_.ignored, name)) meanings.emplace_back("ignored");
    return meanings;
  }

  std::optional<std::size_t> readout_after(std::string_view word, std::string_view name) const {
    if (!name.starts_with(word)) return std::nullopt;
    return position(context_.readouts, name.substr(word.size()));
  }

  // A column of one meaning.
  void take(std::size_t column) {
    const std::string& name = table_.header[column].text;
    if (name == "time") {
      columns_.time = column;
    } else if (name == "left_out") {
      columns_.left_out = column;
    } else if (position(context_.ignored, name) || name == "replicate") {
      return;
    } else if (name == "experiment") {
      not_yet(column, "give each experiment a table of its own");
    } else if (position(context_.inputs, name) || position(context_.knowns, name)) {
      not_yet(column, "give it in the experiment's file, under [inputs] or [knowns]");
    } else if (tidy_) {
      take_tidy(column, name);
    } else if (const auto sd = readout_after("sd ", name)) {
      sds_[*sd] = column;
    } else if (readout_after("n ", name)) {
      not_yet(column, "give each reading as a row of its own");
    } else {
      values_[*position(context_.readouts, name)] = column;
    }
  }

  void take_tidy(std::size_t column, std::string_view name) {
    if (name == "n") return not_yet(column, "give each reading as a row of its own");
    (name == "readout" ? columns_.readout
     : name == "value" ? columns_.value
                       : columns_.sd) = column;
  }

  void say_meaningless(std::size_t column) {
    const std::string& name = table_.header[column].text;
    if (name.empty()) {
      return error(column, {"a column has no header", "a header for each column",
                            "name the column, or remove it"});
    }
    if (tidy_ && position(context_.readouts, name)) {
      return error(column, {"'" + name + "' heads a column of its own in a tidy table",
                            "its name in the column readout, its values in the column value",
                            "write the table either tidy or with a column for each readout"});
    }
    if (name.ends_with(')') || name.ends_with(']')) {
      return not_yet(column,
                     "head the column with the name alone; all numbers in one set of units");
    }
    if (name.starts_with("sd") && !tidy_) {
      return error(
          column, {"the column '" + name + "' is the sd of no readout",
                   "sd, a blank, and a readout's name", "head it as \"sd " + any_readout() + "\""});
    }
    std::vector<std::string> known = context_.readouts;
    known.insert(known.end(), {"time", "readout", "value", "left_out", "replicate"});
    const auto nearest = core::nearest_name(name, known);
    error(column,
          {"the column '" + name + "' has no meaning",
           nearest ? "time, a readout, sd NAME, replicate or left_out; nearest: '" + *nearest + "'"
                   : "time, a readout, sd NAME, replicate or left_out",
           "correct the header, or list it under ignore = [\"" + name + "\"]"});
  }

  void say_lone_sd(std::size_t readout) {
    const std::string& name = context_.readouts[readout];
    error(*sds_[readout], {"'" + name + "' has an sd column but no values",
                           "a column headed '" + name + "'", "add it, or remove the sd column"});
  }

  void say_no_time() {
    diagnostics_.error(table_.at(table_.header.front()),
                       {"not yet: a table without a time column is not read by this version",
                        "a column headed 'time'", "add the time of each reading"});
  }

  void say_no_readout() {
    diagnostics_.error(table_.at(table_.header.front()),
                       {"the table has no readout",
                        "a column headed by a readout's name, or "
                        "readout and value",
                        "head a column with '" + any_readout() + "'"});
  }

  std::string any_readout() const {
    return context_.readouts.empty() ? "NAME" : context_.readouts.front();
  }

  void not_yet(std::size_t column, std::string_view instead) {
    say_not_yet(table_.at(table_.header[column]), table_.header[column].text, instead,
                diagnostics_);
  }

  void error(std::size_t column, Message message) {
    diagnostics_.error(table_.at(table_.header[column]), std::move(message));
  }

  const CsvTable& table_;
  const TableContext& context_;
  Diagnostics& diagnostics_;
  bool tidy_ = false;
  TableColumns columns_;
  std::vector<std::optional<std::size_t>> values_;  // column of each readout
  std::vector<std::optional<std::size_t>> sds_;
};

}  // namespace

std::optional<TableColumns> understand_columns(const CsvTable& table, const TableContext& context,
                                               Diagnostics& diagnostics) {
  return ColumnReader(table, context, diagnostics).read();
}

}  // namespace gainsay::cli
