#include "gainsay/cli/table_cells.h"

#include "gainsay/cli/key_check.h"

#include <charconv>
#include <cmath>
#include <string>

namespace gainsay::cli {

namespace {

// Reads all of `text` as a double; a plus sign in front is allowed.
std::optional<double> whole_number_text(std::string_view text) {
  if (text.starts_with('+')) text.remove_prefix(1);
  if (text.starts_with('+') || text.empty()) return std::nullopt;
  double value = 0.0;
  const char* end = text.data() + text.size();
  const auto read = std::from_chars(text.data(), end, value);
  if (read.ec == std::errc::invalid_argument || read.ptr != end) return std::nullopt;
  if (read.ec == std::errc::result_out_of_range) return HUGE_VAL;
  return value;
}

bool has_decimal_comma(std::string text) {
  const std::size_t comma = text.find(',');
  if (comma == std::string::npos) return false;
  text[comma] = '.';
  return whole_number_text(text).has_value();
}

}  // namespace

bool is_missing(const CsvCell& cell) { return cell.text.empty() || cell.text == "NA"; }

std::optional<double> number_in(const CsvTable& table, const CsvCell& cell, std::string_view what,
                                std::string_view of, Diagnostics& diagnostics) {
  const std::string_view text = cell.text;
  const Location at = table.at(cell);
  const std::string named = "the " + std::string(what) + " '" + cell.text + "'" + std::string(of);
  if (const auto value = whole_number_text(text)) {
    if (std::isfinite(*value)) return value;
    diagnostics.error(
        at, {named + " is not finite",
             "a number a double can hold; empty or NA where there is none", "correct it"});
    return std::nullopt;
  }
  if (text.size() > 1 && (text.front() == '<' || text.front() == '>') &&
      whole_number_text(text.substr(1))) {
    say_not_yet(at, text, "leave the field empty, or the row out: its reading is then not used",
                diagnostics);
  } else if (text.size() > 1 && text.back() == '+' &&
             whole_number_text(text.substr(0, text.size() - 1))) {
    say_not_yet(at, text, "give a time a little later", diagnostics);
  } else if (has_decimal_comma(cell.text)) {
    diagnostics.error(at, {named + " has a decimal comma", "a number with a point, as 0.5",
                           "replace the comma by a point"});
  } else {
    diagnostics.error(
        at, {named + " is no number", "a number; empty or NA where there is none", "correct it"});
  }
  return std::nullopt;
}

}  // namespace gainsay::cli
