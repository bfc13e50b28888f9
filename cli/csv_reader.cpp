#include "gainsay/cli/csv_reader.h"

#include <string_view>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr std::size_t kMostBytes = 64'000'000;
constexpr std::string_view kByteOrderMark = "\xEF\xBB\xBF";

// Walks through the text once, character by character.
class CsvReader {
 public:
  CsvReader(std::shared_ptr<const SourceText> source, Diagnostics& diagnostics)
      : source_(std::move(source)), bytes_(source_->bytes), diagnostics_(diagnostics) {
    if (bytes_.starts_with(kByteOrderMark)) at_ = kByteOrderMark.size();
  }

  std::vector<CsvRow> read() {
    std::vector<CsvRow> rows;
    while (at_ < bytes_.size()) {
      CsvRow row = read_row();
      const bool is_empty = row.size() == 1 && row.front().text.empty();
      if (!is_empty) rows.push_back(std::move(row));
    }
    return rows;
  }

 private:
  CsvRow read_row() {
    CsvRow row;
    while (true) {
      row.push_back(read_cell());
      if (at_ < bytes_.size() && bytes_[at_] == ',') {
        step();
        continue;
      }
      if (at_ < bytes_.size()) end_line();
      return row;
    }
  }

  CsvCell read_cell() {
    while (at_blank()) step();
    CsvCell cell{"", line_, column_};
    if (at_ < bytes_.size() && bytes_[at_] == '"') {
      read_quoted(cell);
    } else {
      read_plain(cell);
    }
    return cell;
  }

  void read_plain(CsvCell& cell) {
    while (at_ < bytes_.size() && bytes_[at_] != ',' && !at_line_end()) {
      if (bytes_[at_] == '"') {
        error({"a quote stands within a field that is not quoted",
               "quotes around the whole field, doubled within it", "write \"5 \"\" pipe\""});
      }
      take(cell);
    }
    while (cell.text.ends_with(' ') || cell.text.ends_with('\t')) cell.text.pop_back();
  }

  void read_quoted(CsvCell& cell) {
    const Location opened{source_, line_, column_};
    step();
    while (at_ < bytes_.size()) {
      if (bytes_[at_] != '"') {
        take(cell);
      } else if (at_ + 1 < bytes_.size() && bytes_[at_ + 1] == '"') {
        step();
        take(cell);
      } else {
        step();
        return skip_to_end_of_cell();
      }
    }
    diagnostics_.error(opened, {"this quoted field is never closed", "a closing quote",
                                "close the quote, or remove it"});
  }

  void skip_to_end_of_cell() {
    while (at_blank()) step();
    if (at_ == bytes_.size() || bytes_[at_] == ',' || at_line_end()) return;
    error({"something stands behind a closing quote", "a comma or the end of the line",
           "put the whole field in quotes, quotes within it doubled"});
    while (at_ < bytes_.size() && bytes_[at_] != ',' && !at_line_end()) step();
  }

  // Takes one character into the cell, saying what is wrong with it.
  void take(CsvCell& cell) {
    const std::size_t length = character_length(bytes_, at_);
    const auto first = static_cast<unsigned char>(bytes_[at_]);
    if (first == 0) {
      error({"a NUL byte stands in the table", "text in UTF-8",
             "save the table as CSV in UTF-8 (UTF-16 has such bytes)"});
    } else if (length == 1 && first >= 0x80) {
      error({"the table is not UTF-8 here", "text in UTF-8", "save the table as CSV in UTF-8"});
    } else if (first == '\r' && !at_line_end()) {
      error({"a carriage return stands without a line feed", "lines ended by CR LF or LF",
             "save the table with such line ends"});
    }
    cell.text.append(bytes_.substr(at_, length));
    step();
  }

  void step() {
    if (bytes_[at_] == '\n') {
      ++line_;
      column_ = 0;
    }
    at_ += character_length(bytes_, at_);
    ++column_;
  }

  void end_line() {
    if (bytes_[at_] == '\r') ++at_;
    step();
  }

  bool at_blank() const {
    return at_ < bytes_.size() && (bytes_[at_] == ' ' || bytes_[at_] == '\t');
  }
  bool at_line_end() const { return bytes_[at_] == '\n' || bytes_.substr(at_).starts_with("\r\n"); }

  void error(Message message) { diagnostics_.error({source_, line_, column_}, std::move(message)); }

  std::shared_ptr<const SourceText> source_;
  std::string_view bytes_;
  Diagnostics& diagnostics_;
  std::size_t at_ = 0;
  std::size_t line_ = 1;
  std::size_t column_ = 1;
};

// A table whose fields are not separated by commas is one column to RFC 4180.
bool say_other_separator(const CsvTable& table, Diagnostics& diagnostics) {
  if (table.header.size() != 1) return false;
  for (const auto& [sign, name] : {std::pair{';', "semicolons"}, std::pair{'\t', "tabs"}}) {
    if (table.header.front().text.find(sign) == std::string::npos) continue;
    diagnostics.error(
        table.at(table.header.front()),
        {std::string("the fields are separated by ") + name,
         "commas between fields, points in numbers", "save the table as comma-separated values"});
    return true;
  }
  return false;
}

void say_ragged(const CsvTable& table, Diagnostics& diagnostics) {
  const std::size_t wanted = table.header.size();
  for (const CsvRow& row : table.rows) {
    if (row.size() == wanted) continue;
    const CsvCell& where = row.size() > wanted ? row[wanted] : row.back();
    diagnostics.error(table.at(where),
                      {"this row has " + std::to_string(row.size()) +
                           (row.size() == 1 ? " field, the header " : " fields, the header ") +
                           std::to_string(wanted),
                       "as many fields as the header has",
                       "leave a field that is missing empty between its commas; put a field that "
                       "holds a comma in quotes"});
  }
}

}  // namespace

std::optional<CsvTable> read_csv(std::shared_ptr<const SourceText> source,
                                 Diagnostics& diagnostics) {
  if (source->bytes.size() > kMostBytes) {
    diagnostics.error(whole(source), {"the table is larger than 64 MB", "a table of readings",
                                      "leave out columns and rows that are not fitted"});
    return std::nullopt;
  }
  const std::size_t errors = diagnostics.errors();
  CsvTable table{source, {}, CsvReader(source, diagnostics).read()};
  if (table.rows.empty()) {
    if (diagnostics.errors() == errors) {
      diagnostics.error({source, 1, 1}, {"the table is empty", "a header and rows",
                                         "begin with a header, as: time,glow"});
    }
    return std::nullopt;
  }
  table.header = std::move(table.rows.front());
  table.rows.erase(table.rows.begin());
  if (!say_other_separator(table, diagnostics)) say_ragged(table, diagnostics);
  if (diagnostics.errors() > errors) return std::nullopt;
  return table;
}

}  // namespace gainsay::cli
