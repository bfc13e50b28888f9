#include "gainsay/cli/toml_tree.h"

#include "gainsay/cli/toml_traps.h"

#include <toml++/toml.h>

#include <algorithm>
#include <cctype>
#include <tuple>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr std::size_t kMostBytes = 16'000'000;
constexpr std::size_t kMostPartsOfAKey = 100;

using Source = std::shared_ptr<const SourceText>;

Location location(const Source& source, const toml::source_position& position) {
  return {source, position.line, position.column};
}

TomlValue value_of(const toml::node& node, const Source& source);

bool before(const TomlEntry& a, const TomlEntry& b) {
  return std::tie(a.place.line, a.place.column) < std::tie(b.place.line, b.place.column);
}

TomlValue table_of(const toml::table& table, const Source& source) {
  TomlValue value;
  value.kind = TomlValue::Kind::Table;
  for (const auto& [key, node] : table) {
    const Location place = location(source, key.source().begin);
    value.entries.push_back({std::string(key.str()), place, value_of(node, source)});
  }
  std::stable_sort(value.entries.begin(), value.entries.end(), before);
  // A table below a header begins at its bracket.
  const Location begins = location(source, table.source().begin);
  const std::string_view bytes = source->bytes;
  const std::size_t offset = offset_of(bytes, begins.line, begins.column);
  value.has_header = !table.is_inline() && offset < bytes.size() && bytes[offset] == '[';
  return value;
}

TomlValue value_of(const toml::node& node, const Source& source) {
  TomlValue value;
  if (const toml::table* table = node.as_table()) {
    value = table_of(*table, source);
  } else if (const toml::array* array = node.as_array()) {
    value.kind = TomlValue::Kind::List;
    for (const toml::node& item : *array) value.items.push_back(value_of(item, source));
  } else if (const auto* text = node.as_string()) {
    value.kind = TomlValue::Kind::Text;
    value.text = text->get();
  } else if (const auto* whole_number = node.as_integer()) {
    value.kind = TomlValue::Kind::Number;
    value.number = static_cast<double>(whole_number->get());
    value.is_whole = true;
  } else if (const auto* number = node.as_floating_point()) {
    value.kind = TomlValue::Kind::Number;
    value.number = number->get();
  } else if (const auto* truth = node.as_boolean()) {
    value.kind = TomlValue::Kind::Truth;
    value.truth = truth->get();
  } else {
    value.kind = TomlValue::Kind::Moment;
  }
  value.place = location(source, node.source().begin);
  return value;
}

// A key of very many parts would nest tables so deep that taking them down exhausts the stack.
// Returns the offset of the first such key, or npos.
std::size_t deep_key(std::string_view bytes) {
  std::size_t parts = 0;
  char last = '\n';
  bool blank = false;
  for (std::size_t offset = 0; offset < bytes.size(); ++offset) {
    const char c = bytes[offset];
    if (c == ' ' || c == '\t') {
      blank = true;
      continue;
    }
    const bool new_word = blank && c != '.' && last != '.';
    if (new_word || std::string_view("=,[]{}\n").find(c) != std::string_view::npos) parts = 0;
    if (c == '.' && ++parts > kMostPartsOfAKey) return offset;
    last = c;
    blank = false;
  }
  return std::string_view::npos;
}

Location location_of_offset(const Source& source, std::size_t offset) {
  const std::string_view before_it = std::string_view(source->bytes).substr(0, offset);
  const auto lines = static_cast<std::size_t>(std::count(before_it.begin(), before_it.end(), '\n'));
  const std::size_t line_begin = offset_of(source->bytes, lines + 1, 1);
  return {source, lines + 1, count_characters(before_it.substr(line_begin)) + 1};
}

struct Literal {
  std::string_view quotes;  // ", ', """ or '''
  bool has_escapes() const { return quotes.front() == '"'; }
  bool has_lines() const { return quotes.size() == 3; }
};

Literal literal_at(std::string_view bytes, std::size_t offset) {
  for (const std::string_view quotes : {"\"\"\"", "'''"}) {
    if (bytes.substr(offset).starts_with(quotes)) return {quotes};
  }
  return {bytes.substr(offset, 1)};
}

struct Step {
  std::size_t written = 1;  // bytes of the literal
  std::size_t meant = 1;    // bytes of the value
};

std::size_t utf8_length(unsigned long character) {
  if (character < 0x80) return 1;
  if (character < 0x800) return 2;
  return character < 0x10000 ? 3 : 4;
}

// What stands at `offset` of a literal: an escape, the end of a line, or one byte as it is.
Step step_at(std::string_view bytes, std::size_t offset, const Literal& literal) {
  if (bytes.substr(offset).starts_with("\r\n")) return {2, 1};
  if (!literal.has_escapes() || bytes[offset] != '\\' || offset + 1 >= bytes.size()) return {1, 1};
  const char kind = bytes[offset + 1];
  if (kind == 'u' || kind == 'U') {
    const std::size_t digits = kind == 'u' ? 4 : 8;
    const std::string hexadecimal(bytes.substr(offset + 2, digits));
    return {2 + digits, utf8_length(std::strtoul(hexadecimal.c_str(), nullptr, 16))};
  }
  if (std::isspace(static_cast<unsigned char>(kind)) == 0) return {2, 1};
  // A backslash at the end of a line: blanks and lines up to the next character are left out.
  std::size_t end = offset + 1;
  while (end < bytes.size() && std::isspace(static_cast<unsigned char>(bytes[end])) != 0) ++end;
  return {end - offset, 0};
}

}  // namespace

const TomlEntry* TomlValue::find(std::string_view key) const {
  const auto found = std::find_if(entries.begin(), entries.end(),
                                  [&](const TomlEntry& entry) { return entry.key == key; });
  return found == entries.end() ? nullptr : &*found;
}

TomlEntry* TomlValue::find(std::string_view key) {
  return const_cast<TomlEntry*>(std::as_const(*this).find(key));
}

std::optional<TomlValue> read_toml(std::shared_ptr<const SourceText> source,
                                   Diagnostics& diagnostics) {
  if (source->bytes.size() > kMostBytes) {
    diagnostics.error(whole(source), {"the file is larger than 16 MB", "a study file in TOML",
                                      "put data into a CSV table"});
    return std::nullopt;
  }
  if (const std::size_t deep = deep_key(source->bytes); deep != std::string_view::npos) {
    diagnostics.error(location_of_offset(source, deep),
                      {"a key of more than 100 parts", "a few names joined by '.'",
                       "shorten the key; a text with many points needs blanks between them"});
    return std::nullopt;
  }
  try {
    const toml::table table = toml::parse(std::string_view(source->bytes));
    TomlValue value = table_of(table, source);
    value.place = {source, 1, 1};
    return value;
  } catch (const toml::parse_error& problem) {
    const Location at = location(source, problem.source().begin);
    diagnostics.error(at, explain_syntax_error(at, problem.description()));
    return std::nullopt;
  }
}

Location place_in(const TomlValue& text, std::size_t offset) {
  if (!text.is_text() || !text.place.source) return text.place;
  const std::string_view bytes = text.place.source->bytes;
  std::size_t at = offset_of(bytes, text.place.line, text.place.column);
  if (at >= bytes.size()) return text.place;
  const Literal literal = literal_at(bytes, at);
  at += literal.quotes.size();
  if (literal.has_lines() && bytes.substr(at).starts_with("\r\n")) at += 2;
  if (literal.has_lines() && bytes.substr(at).starts_with('\n')) at += 1;
  for (std::size_t meant = 0; at < bytes.size();) {
    const Step step = step_at(bytes, at, literal);
    if (meant + step.meant > offset) break;
    at += step.written;
    meant += step.meant;
  }
  return location_of_offset(text.place.source, std::min(at, bytes.size()));
}

std::string_view words_for(TomlValue::Kind kind) {
  switch (kind) {
    case TomlValue::Kind::Text:
      return "a text";
    case TomlValue::Kind::Number:
      return "a number";
    case TomlValue::Kind::Truth:
      return "true or false";
    case TomlValue::Kind::Moment:
      return "a date or time";
    case TomlValue::Kind::List:
      return "a list";
    case TomlValue::Kind::Table:
      break;
  }
  return "a table";
}

}  // namespace gainsay::cli
