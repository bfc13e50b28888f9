#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_keys.h"
#include "gainsay/cli/toml_tree.h"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// A table of a study file held against the table of keys: what is unknown, not yet accepted or of
/// another type has been said, and only the rest can be asked for.
class CheckedTable {
 public:
  /// `top` is the section of the file's own top level: a key of it that stands here was most likely
  /// put below a header by mistake, and the message says so. `table` must outlive this.
  CheckedTable(const TomlValue& table, Section section, Section top, Diagnostics& diagnostics);

  const TomlEntry* entry(std::string_view key) const;
  const TomlValue* value(std::string_view key) const;
  bool has(std::string_view key) const { return entry(key) != nullptr; }
  /// Given at all, be it wrong or not yet accepted.
  bool mentions(std::string_view key) const { return table_.find(key) != nullptr; }
  /// Not given, and not by a slip either: no key of the table is unknown.
  bool lacks(std::string_view key) const { return !mentions(key) && !has_unknown_keys_; }

  std::optional<std::string> text(std::string_view key) const;
  std::optional<double> number(std::string_view key) const;
  bool truth(std::string_view key) const;  ///< false if not given

  /// All entries that passed, in order of the text.
  const std::vector<const TomlEntry*>& entries() const { return passed_; }
  /// Those that did not: what they name is still known to be named.
  const std::vector<const TomlEntry*>& failed() const { return failed_; }
  const TomlValue& table() const { return table_; }

 private:
  bool passes(const TomlEntry& entry, Diagnostics& diagnostics) const;
  bool misplaced(const TomlEntry& entry) const;
  void say_misplaced(const TomlEntry& entry, Diagnostics& diagnostics) const;
  void say_unknown(const TomlEntry& entry, Diagnostics& diagnostics) const;

  const TomlValue& table_;
  Section section_;
  Section top_;
  std::vector<const TomlEntry*> passed_;
  std::vector<const TomlEntry*> failed_;
  bool has_unknown_keys_ = false;
};

/// Whether a value is of one of these types.
bool fits(const TomlValue& value, unsigned takes);

/// The table below `key`, checked as the section that this key holds; nothing if it is not there.
std::optional<CheckedTable> inner_table(const CheckedTable& outer, std::string_view key,
                                        Section section, Section top, Diagnostics& diagnostics);

/// Says that a key or what it holds is not yet accepted.
void say_not_yet(const Location& at, std::string_view what, std::string_view instead,
                 Diagnostics& diagnostics);

/// Whether the key of an entry may name something in expressions; says so if not.
bool is_usable_name(const TomlEntry& entry, Diagnostics& diagnostics);

}  // namespace gainsay::cli
