#include "gainsay/cli/unknown_reader.h"

#include <algorithm>

namespace gainsay::cli {

namespace {

// A start value that was weighed in lies within so many sd of what the balance showed.
constexpr double kWeighedWithin = 5.0;

bool read_range(const TomlValue& between, bool linear, estimation::Unknown& unknown,
                Diagnostics& diagnostics) {
  if (between.items.size() != 2) {
    diagnostics.error(between.place,
                      {"a range of " + std::to_string(between.items.size()) +
                           (between.items.size() == 1 ? " number" : " numbers"),
                       "two numbers: lower end, upper end", "write it as [0.01, 10]"});
    return false;
  }
  unknown.low = between.items[0].number;
  unknown.high = between.items[1].number;
  if (!(unknown.low < unknown.high)) {
    diagnostics.error(between.place,
                      {"the range ends where it begins, or before",
                       "a lower end below the upper end", "exchange or correct the two numbers"});
    return false;
  }
  if (!linear && unknown.low <= 0.0) {
    diagnostics.error(
        between.items[0].place,
        {"the range is searched in its logarithm, but begins at 0 or below", "a lower end above 0",
         "raise it, or write { between = [...], linear = true }"});
    return false;
  }
  return true;
}

std::optional<estimation::Prior> read_prior(const TomlValue& value, Section top,
                                            Diagnostics& diagnostics) {
  const CheckedTable table(value, Section::Prior, top, diagnostics);
  const auto estimate = table.number("value");
  const auto sd = table.number("sd");
  const auto geometric = table.number("geometric_sd");
  const bool has_one = sd.has_value() != geometric.has_value();
  if (!estimate || !has_one) {
    diagnostics.error(value.place, {"the prior lacks its value or its scatter, or has two scatters",
                                    "value, and either sd or geometric_sd",
                                    "write it as { value = 2, sd = 0.3 }"});
    return std::nullopt;
  }
  const bool scatters = sd ? *sd > 0.0 : *geometric > 1.0;
  if (!scatters || (geometric && *estimate <= 0.0)) {
    diagnostics.error(value.place, {"the prior does not scatter, or has no logarithm",
                                    "sd above 0; or geometric_sd above 1 and value above 0",
                                    "correct the prior"});
    return std::nullopt;
  }
  return estimation::Prior{*estimate, sd, geometric};
}

void read_first(const CheckedTable& table, estimation::Unknown& unknown, Diagnostics& diagnostics) {
  const TomlValue* first = table.value("first");
  if (first == nullptr) return;
  const std::vector<TomlValue> one = {*first};
  for (const TomlValue& guess : first->is_list() ? first->items : one) {
    if (guess.number >= unknown.low && guess.number <= unknown.high) {
      unknown.first.push_back(guess.number);
      continue;
    }
    diagnostics.error(guess.place, {"a first guess lies outside the range",
                                    "a number within the range", "correct the guess or the range"});
  }
}

void read_per(const CheckedTable& table, estimation::DeclaredUnknown& declared,
              Diagnostics& diagnostics) {
  const auto per = table.text("per");
  if (!per) return;
  declared.per_experiment = *per == "experiment";
  if (declared.per_experiment) return;
  diagnostics.error(
      table.value("per")->place,
      {"not yet: per = \"" + *per + "\" is not read by this version", "\"experiment\"",
       "use per = \"experiment\", or one experiment for each value of the label"});
}

void read_table(const TomlValue& value, Section top, estimation::DeclaredUnknown& declared,
                Diagnostics& diagnostics) {
  const CheckedTable table(value, Section::Unknown, top, diagnostics);
  if (table.lacks("between")) {
    diagnostics.error(value.place, {"the unknown has no range", "between = [lower, upper]",
                                    "add between; a number that is given belongs under [knowns]"});
  }
  if (!table.has("between")) return;
  estimation::Unknown& unknown = declared.unknown;
  unknown.linear = table.truth("linear");
  unknown.hard = table.truth("hard");
  unknown.unit = table.text("unit").value_or("");
  read_per(table, declared, diagnostics);
  if (!read_range(*table.value("between"), unknown.linear, unknown, diagnostics)) return;
  if (const TomlValue* prior = table.value("prior")) {
    unknown.prior = read_prior(*prior, top, diagnostics);
  }
  read_first(table, unknown, diagnostics);
}

// `value` and `sd` as weighed in: one more measurement, searched on a linear scale nearby.
bool read_weighed(const CheckedTable& table, estimation::Unknown& unknown,
                  Diagnostics& diagnostics) {
  const double value = *table.number("value");
  const auto sd = table.number("sd");
  if (!sd || !(*sd > 0.0) || value < 0.0) {
    diagnostics.error(table.value("value")->place,
                      {"a start value as weighed in needs a value from 0 up and an sd above 0",
                       "{ value = 1.0, sd = 0.05 }",
                       "add or correct sd; a value that is known exactly is a plain number"});
    return false;
  }
  unknown.low = std::max(0.0, value - kWeighedWithin * *sd);
  unknown.high = value + kWeighedWithin * *sd;
  unknown.prior = estimation::Prior{value, *sd, std::nullopt};
  return true;
}

}  // namespace

std::vector<ReadKnown> read_knowns(const CheckedTable& outer, Section top,
                                   Diagnostics& diagnostics) {
  std::vector<ReadKnown> knowns;
  const auto names = inner_table(outer, "knowns", Section::Knowns, top, diagnostics);
  if (!names) return knowns;
  for (const TomlEntry* entry : names->entries()) {
    if (!is_usable_name(*entry, diagnostics)) continue;
    if (entry->value.is_number()) {
      knowns.push_back({entry->key, entry->value.number, entry->place});
      continue;
    }
    const CheckedTable table(entry->value, Section::Known, top, diagnostics);
    if (const auto value = table.number("value")) {
      knowns.push_back({entry->key, *value, entry->place});
      continue;
    }
    if (table.lacks("value")) {
      diagnostics.error(entry->value.place, {"the known '" + entry->key + "' has no value",
                                             "value = a number", "add value"});
    }
    knowns.push_back({entry->key, 0.0, entry->place});  // so that its name stays known
  }
  for (const TomlEntry* entry : names->failed()) {
    knowns.push_back({entry->key, 0.0, entry->place});
  }
  return knowns;
}

std::vector<ReadUnknown> read_unknowns(const CheckedTable& outer, Section top,
                                       Diagnostics& diagnostics) {
  std::vector<ReadUnknown> unknowns;
  const auto names = inner_table(outer, "unknowns", Section::Unknowns, top, diagnostics);
  if (!names) return unknowns;
  for (const TomlEntry* entry : names->entries()) {
    if (!is_usable_name(*entry, diagnostics)) continue;
    ReadUnknown read;
    read.place = entry->place;
    read.declared.unknown.name = entry->key;
    if (entry->value.is_list()) {
      read_range(entry->value, false, read.declared.unknown, diagnostics);
    } else {
      read_table(entry->value, top, read.declared, diagnostics);
    }
    unknowns.push_back(std::move(read));  // with an error, too: its name stays known
  }
  for (const TomlEntry* entry : names->failed()) {
    unknowns.emplace_back().place = entry->place;
    unknowns.back().declared.unknown.name = entry->key;
  }
  return unknowns;
}

std::optional<estimation::Unknown> read_uncertain_start(const TomlValue& value,
                                                        Diagnostics& diagnostics) {
  const CheckedTable table(value, Section::Start, Section::Experiment, diagnostics);
  const bool weighed = table.has("value");
  const bool ranged = table.has("between");
  if (!weighed && !ranged) {
    diagnostics.error(value.place, {"the start value has neither value nor range",
                                    "{ value, sd } or { between = [lower, upper] }",
                                    "add one of the two; a start value that is known exactly is a "
                                    "plain number"});
    return std::nullopt;
  }
  estimation::Unknown unknown;
  unknown.kind = estimation::UnknownKind::Initial;
  unknown.hard = table.truth("hard");
  unknown.unit = table.text("unit").value_or("");
  if (weighed && !read_weighed(table, unknown, diagnostics)) return std::nullopt;
  unknown.linear = weighed || table.truth("linear");
  if (ranged && !read_range(*table.value("between"), unknown.linear, unknown, diagnostics)) {
    return std::nullopt;
  }
  read_first(table, unknown, diagnostics);
  if (weighed && unknown.first.empty() && unknown.prior->value >= unknown.low &&
      unknown.prior->value <= unknown.high) {
    unknown.first.push_back(unknown.prior->value);
  }
  return unknown;
}

}  // namespace gainsay::cli
