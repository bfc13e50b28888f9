#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/source_text.h"

#include <cstddef>
#include <memory>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

struct TomlEntry;

/// A value of a TOML 1.0 document with its place, as plain values. Entries of tables stand in the
/// order of the text.
struct TomlValue {
  enum class Kind { Text, Number, Truth, Moment, List, Table };
  Kind kind = Kind::Table;
  std::string text;       ///< of a Text, escapes resolved; of a Moment (date or time), nothing
  double number = 0.0;    ///< of a Number
  bool is_whole = false;  ///< a Number written without point and exponent
  bool truth = false;
  std::vector<TomlValue> items;    ///< of a List
  std::vector<TomlEntry> entries;  ///< of a Table
  bool has_header = false;         ///< a Table below [x] or [[x]], not written as { ... } or x.y =
  Location place;

  bool is_text() const { return kind == Kind::Text; }
  bool is_number() const { return kind == Kind::Number; }
  bool is_list() const { return kind == Kind::List; }
  bool is_table() const { return kind == Kind::Table; }

  /// The entry of a table, or null.
  const TomlEntry* find(std::string_view key) const;
  TomlEntry* find(std::string_view key);
};

struct TomlEntry {
  std::string key;
  Location place;  ///< of the key
  TomlValue value;
};

/// Reads a document; on a syntax error says so and returns nothing.
std::optional<TomlValue> read_toml(std::shared_ptr<const SourceText> source,
                                   Diagnostics& diagnostics);

/// The place in the file of the character at `offset` (bytes) of a text value: counts the opening
/// quotes, escapes and lines of the literal as it is written.
Location place_in(const TomlValue& text, std::size_t offset);

/// "a text", "a number", "a list", ... for messages.
std::string_view words_for(TomlValue::Kind kind);

}  // namespace gainsay::cli
