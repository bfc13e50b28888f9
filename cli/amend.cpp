#include "gainsay/cli/amend.h"

#include "gainsay/core/nearest_name.h"

#include <algorithm>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

namespace {

void erase(TomlValue& table, std::string_view key) {
  std::erase_if(table.entries, [&](const TomlEntry& entry) { return entry.key == key; });
}

std::vector<std::string> parts_of(std::string_view path) {
  std::vector<std::string> parts(1);
  for (const char c : path) {
    if (c == '.') {
      parts.emplace_back();
    } else {
      parts.back() += c;
    }
  }
  return parts;
}

void remove_path(TomlValue& document, const TomlValue& path, Diagnostics& diagnostics) {
  const std::vector<std::string> parts = parts_of(path.text);
  TomlValue* table = &document;
  for (std::size_t i = 0; i < parts.size(); ++i) {
    TomlEntry* found = table->is_table() ? table->find(parts[i]) : nullptr;
    if (found == nullptr) {
      std::vector<std::string> keys;
      for (const TomlEntry& entry : table->entries) keys.push_back(entry.key);
      const auto nearest = core::nearest_name(parts[i], keys);
      diagnostics.error(path.place, {"the base has no '" + path.text + "' to remove",
                                     nearest ? "a path of the base; nearest to '" + parts[i] +
                                                   "': '" + *nearest + "'"
                                             : "a path of the base, as \"reactions.loss\"",
                                     "correct the path, or leave it out"});
      return;
    }
    if (i + 1 == parts.size()) return erase(*table, parts.back());
    table = &found->value;
  }
}

void merge(TomlValue& into, const TomlValue& from) {
  for (const TomlEntry& entry : from.entries) {
    TomlEntry* inherited = into.find(entry.key);
    if (inherited == nullptr) {
      into.entries.push_back(entry);
    } else if (inherited->value.is_table() && entry.value.is_table()) {
      merge(inherited->value, entry.value);
    } else {
      *inherited = entry;
    }
  }
}

// An amendment that gives a reaction's flow takes its rate away, and the reverse.
void drop_other_form(TomlValue& inherited, const TomlValue& amendment) {
  TomlEntry* reactions = inherited.find("reactions");
  const TomlEntry* amendments = amendment.find("reactions");
  if (reactions == nullptr || amendments == nullptr) return;
  for (const TomlEntry& entry : amendments->value.entries) {
    TomlEntry* reaction = reactions->value.find(entry.key);
    if (reaction == nullptr) continue;
    if (entry.value.find("flow") != nullptr) erase(reaction->value, "rate");
    if (entry.value.find("rate") != nullptr) erase(reaction->value, "flow");
  }
}

}  // namespace

TomlValue amended(const TomlValue& base, const TomlValue& amendment, Diagnostics& diagnostics) {
  TomlValue document = base;
  for (const std::string_view own : {"title", "base", "remove"}) erase(document, own);
  if (const TomlEntry* remove = amendment.find("remove"); remove != nullptr) {
    for (const TomlValue& path : remove->value.items) {
      if (path.is_text()) remove_path(document, path, diagnostics);
    }
  }
  drop_other_form(document, amendment);
  merge(document, amendment);
  document.place = amendment.place;
  return document;
}

}  // namespace gainsay::cli
