#include "gainsay/cli/key_check.h"

#include "gainsay/core/nearest_name.h"
#include "gainsay/core/parse.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {

namespace {

constexpr double kMostWhole = 9007199254740992.0;  // 2^53: beyond it a double skips whole numbers

bool all_items(const TomlValue& list, bool (*is)(const TomlValue&)) {
  return list.is_list() && std::all_of(list.items.begin(), list.items.end(), is);
}

bool is_finite_number(const TomlValue& value) {
  return value.is_number() && std::isfinite(value.number);
}

bool is_pair(const TomlValue& value) {
  return value.is_list() && value.items.size() == 2 && all_items(value, is_finite_number);
}

std::vector<std::string> keys_of(Section section) {
  std::vector<std::string> names;
  for (const StudyKey& key : all_study_keys()) {
    if (key.section == section && key.name != "*") names.emplace_back(key.name);
  }
  return names;
}

// What a value is that does not fit.
std::string misfit_of(const TomlValue& value, unsigned takes) {
  if (value.is_number() && !std::isfinite(value.number)) return "not finite";
  if (value.is_number() && (takes & kWhole) != 0) return "no whole number from 0 up";
  const bool takes_a_list = (takes & (kTexts | kNumbers | kPairs | kTables)) != 0;
  if (value.is_list() && takes_a_list) return "a list of other things";
  return std::string(words_for(value.kind));
}

std::string list_of(const std::vector<std::string>& names) {
  std::string list;
  for (const std::string& name : names) list += (list.empty() ? "" : ", ") + name;
  return list;
}

}  // namespace

bool fits(const TomlValue& value, unsigned takes) {
  const auto may_be = [&](unsigned bit) { return (takes & bit) != 0; };
  const bool finite = is_finite_number(value);
  if (may_be(kText) && value.is_text()) return true;
  if (may_be(kNumber) && finite) return true;
  if (may_be(kWhole) && finite && value.is_whole && value.number >= 0 &&
      value.number <= kMostWhole) {
    return true;
  }
  if (may_be(kTruth) && value.kind == TomlValue::Kind::Truth) return true;
  const auto is_text = [](const TomlValue& item) { return item.is_text(); };
  const auto is_table = [](const TomlValue& item) { return item.is_table(); };
  if (may_be(kTexts) && all_items(value, is_text)) return true;
  if (may_be(kNumbers) && all_items(value, is_finite_number)) return true;
  if (may_be(kPairs) && all_items(value, is_pair)) return true;
  if (may_be(kTable) && value.is_table()) return true;
  return may_be(kTables) && all_items(value, is_table);
}

CheckedTable::CheckedTable(const TomlValue& table, Section section, Section top,
                           Diagnostics& diagnostics)
    : table_(table), section_(section), top_(top) {
  for (const TomlEntry& entry : table.entries) {
    (passes(entry, diagnostics) ? passed_ : failed_).push_back(&entry);
    if (find_key(section, entry.key) == nullptr) has_unknown_keys_ = true;
  }
}

bool CheckedTable::passes(const TomlEntry& entry, Diagnostics& diagnostics) const {
  const StudyKey* key = find_key(section_, entry.key);
  if (misplaced(entry)) return say_misplaced(entry, diagnostics), false;
  if (key == nullptr) return say_unknown(entry, diagnostics), false;
  if (!key->accepted) {
    say_not_yet(entry.place, entry.key, key->instead, diagnostics);
    return false;
  }
  if (fits(entry.value, key->takes)) return true;
  diagnostics.error(
      entry.value.place,
      {"'" + entry.key + "' is " + misfit_of(entry.value, key->takes), words_for_takes(key->takes),
       "write it as, for example: " + std::string(key->example)});
  return false;
}

// A key of the file's top level that stands below a header and cannot be meant there: TOML gives it
// to the header above it.
bool CheckedTable::misplaced(const TomlEntry& entry) const {
  if (section_ == top_ || entry.value.has_header) return false;
  const StudyKey* above = find_key(top_, entry.key);
  if (above == nullptr || !fits(entry.value, above->takes)) return false;
  const StudyKey* here = find_key(section_, entry.key);
  if (here == nullptr) return true;
  if (here->name != "*") return false;
  if (!fits(entry.value, here->takes)) return true;
  // A name that the author may have chosen: misplaced if it is no expression, or if nothing in its
  // table belongs here.
  if (entry.value.is_text()) return !core::parse(entry.value.text);
  if (!entry.value.is_table() || here->holds == Section::None || entry.value.entries.empty()) {
    return false;
  }
  return std::none_of(
      entry.value.entries.begin(), entry.value.entries.end(),
      [&](const TomlEntry& inner) { return find_key(here->holds, inner.key) != nullptr; });
}

void CheckedTable::say_misplaced(const TomlEntry& entry, Diagnostics& diagnostics) const {
  const std::string header(words_for(section_).header);
  diagnostics.error(entry.place,
                    {"'" + entry.key + "' stands below " + header + ", so it belongs to it",
                     "'" + entry.key + "' at the top level of the file",
                     "move it above the first [header] of the file"});
}

void CheckedTable::say_unknown(const TomlEntry& entry, Diagnostics& diagnostics) const {
  const std::vector<std::string> names = keys_of(section_);
  const auto nearest = core::nearest_name(entry.key, names);
  const std::string header(words_for(section_).header);
  const std::string where = header == "top"
                                ? "at the top level of " + std::string(words_for(section_).file)
                                : "in " + header;
  diagnostics.error(entry.place,
                    {"unknown key '" + entry.key + "' " + where,
                     nearest ? "a key of this table; nearest: '" + *nearest + "'" : list_of(names),
                     nearest ? "correct the key" : "remove it, or move it where it belongs"});
}

const TomlEntry* CheckedTable::entry(std::string_view key) const {
  const auto found = std::find_if(passed_.begin(), passed_.end(),
                                  [&](const TomlEntry* passed) { return passed->key == key; });
  return found == passed_.end() ? nullptr : *found;
}

const TomlValue* CheckedTable::value(std::string_view key) const {
  const TomlEntry* found = entry(key);
  return found == nullptr ? nullptr : &found->value;
}

std::optional<std::string> CheckedTable::text(std::string_view key) const {
  const TomlValue* found = value(key);
  if (found == nullptr || !found->is_text()) return std::nullopt;
  return found->text;
}

std::optional<double> CheckedTable::number(std::string_view key) const {
  const TomlValue* found = value(key);
  if (found == nullptr || !found->is_number()) return std::nullopt;
  return found->number;
}

bool CheckedTable::truth(std::string_view key) const {
  const TomlValue* found = value(key);
  return found != nullptr && found->truth;
}

std::optional<CheckedTable> inner_table(const CheckedTable& outer, std::string_view key,
                                        Section section, Section top, Diagnostics& diagnostics) {
  const TomlValue* found = outer.value(key);
  if (found == nullptr || !found->is_table()) return std::nullopt;
  return CheckedTable(*found, section, top, diagnostics);
}

void say_not_yet(const Location& at, std::string_view what, std::string_view instead,
                 Diagnostics& diagnostics) {
  diagnostics.error(at, {"not yet: '" + std::string(what) + "' is not read by this version",
                         "what docs/study-files.md lists without 'not yet'", std::string(instead)});
}

bool is_usable_name(const TomlEntry& entry, Diagnostics& diagnostics) {
  if (!core::is_name(entry.key)) {
    diagnostics.error(entry.place,
                      {"'" + entry.key + "' is no name for expressions",
                       "a letter, then letters a-z A-Z, digits and '_'",
                       "choose such a name; shown_as (species) or title (readouts) says what pages "
                       "print"});
    return false;
  }
  if (core::is_reserved(entry.key)) {
    diagnostics.error(
        entry.place,
        {"the name '" + entry.key + "' is reserved",
         "a name other than t, pi, gas_constant, functions and rate laws", "choose another name"});
    return false;
  }
  return true;
}

}  // namespace gainsay::cli
