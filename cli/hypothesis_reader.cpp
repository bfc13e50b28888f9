#include "gainsay/cli/hypothesis_reader.h"

#include "gainsay/cli/key_check.h"
#include "gainsay/cli/reaction_reader.h"
#include "gainsay/core/nearest_name.h"

#include <filesystem>
#include <optional>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr Section kTop = Section::Hypothesis;

// The parts of a hypothesis, read in the order in which they lean on each other.
class HypothesisReader {
 public:
  HypothesisReader(const TomlValue& document, const Location& file, Diagnostics& diagnostics)
      : top_(document, kTop, kTop, diagnostics), diagnostics_(diagnostics) {
    reading_.title = file;
    reading_.hypothesis.file = file.file();
  }

  HypothesisReading read() && {
    read_title();
    read_compartments();
    read_species();
    read_definitions();
    read_reactions();
    reading_.knowns = read_knowns(top_, kTop, diagnostics_);
    for (const ReadKnown& known : reading_.knowns)
      declare(known.name, NameKind::Known, known.place);
    for (const ReadUnknown& unknown : read_unknowns(top_, kTop, diagnostics_)) {
      reading_.hypothesis.unknowns.push_back(unknown.declared);
      reading_.hypothesis.unknowns.back().own = true;
      declare(unknown.declared.unknown.name, NameKind::Unknown, unknown.place);
    }
    return std::move(reading_);
  }

 private:
  core::Hypothesis& mechanism() { return reading_.hypothesis.mechanism; }

  void declare(const std::string& name, NameKind kind, const Location& place) {
    reading_.names.push_back({name, kind, place});
  }

  // What was said to be wrong still names something.
  void declare_failed(const CheckedTable& names, NameKind kind) {
    for (const TomlEntry* entry : names.failed()) declare(entry->key, kind, entry->place);
  }

  // Reads a text or number of a table as an expression and keeps it for the check of names.
  std::optional<core::Expression> expression(const TomlValue& value, std::string role,
                                             Leans leans) {
    auto written = read_expression(value, std::move(role), leans, diagnostics_);
    if (!written) return std::nullopt;
    core::Expression result = written->expression;
    reading_.expressions.push_back(*std::move(written));
    return result;
  }

  void read_title() {
    const std::string stem = std::filesystem::path(reading_.hypothesis.file).stem().string();
    mechanism().title = top_.text("title").value_or(stem);
    if (const TomlEntry* title = top_.entry("title")) reading_.title = title->place;
    if (!mechanism().title.empty()) return;
    diagnostics_.error(reading_.title, {"the title is empty", "a title that tells hypotheses apart",
                                        "write one, or leave the key out"});
  }

  void read_compartments() {
    const auto names = inner_table(top_, "compartments", Section::Compartments, kTop, diagnostics_);
    if (names) {
      for (const TomlEntry* entry : names->entries()) read_compartment(*entry);
      declare_failed(*names, NameKind::Compartment);
    }
    if (mechanism().compartments.empty()) mechanism().compartments.push_back({"", 1.0});
  }

  void read_compartment(const TomlEntry& entry) {
    if (!is_usable_name(entry, diagnostics_)) return;
    const CheckedTable table(entry.value, Section::Compartment, kTop, diagnostics_);
    core::Compartment compartment{entry.key, 1.0};
    if (const TomlValue* volume = table.value("volume")) {
      const std::string role = "the volume of '" + entry.key + "'";
      compartment.volume = expression(*volume, role, Leans::OnConstants).value_or(1.0);
      if (compartment.volume.is_number() && !(compartment.volume.number() > 0.0)) {
        diagnostics_.error(volume->place,
                           {role + " is not above 0", "a volume above 0", "correct it"});
      }
    }
    declare(entry.key, NameKind::Compartment, entry.place);
    mechanism().compartments.push_back(std::move(compartment));
  }

  void read_species() {
    const auto names = inner_table(top_, "species", Section::SpeciesNames, kTop, diagnostics_);
    if (!names) return;
    for (const TomlEntry* entry : names->entries()) {
      if (is_usable_name(*entry, diagnostics_)) read_one_species(*entry);
    }
    declare_failed(*names, NameKind::Species);
    for (const TomlEntry* entry : names->failed()) {
      mechanism().species.emplace_back().name = entry->key;
    }
  }

  void read_one_species(const TomlEntry& entry) {
    const CheckedTable table(entry.value, Section::Species, kTop, diagnostics_);
    core::Species species;
    species.name = entry.key;
    species.shown_as = table.text("shown_as").value_or(entry.key);
    species.amount = table.truth("amount");
    species.held = table.truth("held");
    species.compartment = compartment_of(entry, table, species.amount);
    if (const TomlValue* start = table.value("start")) {
      species.start = expression(*start, "the start of '" + entry.key + "'", Leans::OnTheBeginning)
                          .value_or(0.0);
    }
    if (const auto negligible = table.number("negligible")) {
      species.negligible = negligible;
      if (!(*negligible > 0.0)) {
        diagnostics_.error(table.value("negligible")->place,
                           {"'negligible' is not above 0", "a number above 0", "correct it"});
      }
    }
    declare(entry.key, NameKind::Species, entry.place);
    mechanism().species.push_back(std::move(species));
  }

  std::size_t compartment_of(const TomlEntry& entry, const CheckedTable& table, bool amount) {
    const std::vector<core::Compartment>& all = mechanism().compartments;
    std::vector<std::string> names;
    for (const core::Compartment& compartment : all) names.push_back(compartment.name);
    if (const auto in = table.text("in")) {
      for (std::size_t i = 0; i < all.size(); ++i) {
        if (!in->empty() && all[i].name == *in) return i;
      }
      const auto nearest = core::nearest_name(*in, names);
      diagnostics_.error(table.value("in")->place,
                         {"unknown compartment '" + *in + "' of '" + entry.key + "'",
                          nearest ? "a name under [compartments]; nearest: '" + *nearest + "'"
                                  : "a name under [compartments]",
                          "correct the name, or add it under [compartments]"});
    } else if (all.size() > 1 && !amount && !table.mentions("in")) {
      diagnostics_.error(entry.place,
                         {"there are several compartments and '" + entry.key + "' is in none",
                          "in = \"" + names.front() + "\", or another of them",
                          "say where it is; a species that is an amount needs none"});
    }
    return 0;
  }

  void read_definitions() {
    const auto names = inner_table(top_, "where", Section::Where, kTop, diagnostics_);
    if (!names) return;
    for (const TomlEntry* entry : names->entries()) {
      if (!is_usable_name(*entry, diagnostics_)) continue;
      const std::string role = "'" + entry->key + "' under [where]";
      const auto meaning = expression(entry->value, role, Leans::OnAnything);
      declare(entry->key, NameKind::Definition, entry->place);
      mechanism().definitions.push_back({entry->key, meaning.value_or(0.0)});
    }
    declare_failed(*names, NameKind::Definition);
  }

  void read_reactions() {
    const auto names = inner_table(top_, "reactions", Section::Reactions, kTop, diagnostics_);
    if (!names) return;
    for (const TomlEntry* entry : names->entries()) {
      if (!is_usable_name(*entry, diagnostics_)) continue;
      declare(entry->key, NameKind::Reaction, entry->place);
      auto reaction = read_reaction(*entry, mechanism(), reading_.expressions, diagnostics_);
      if (reaction) mechanism().reactions.push_back(*std::move(reaction));
    }
    declare_failed(*names, NameKind::Reaction);
  }

  CheckedTable top_;
  Diagnostics& diagnostics_;
  HypothesisReading reading_;
};

}  // namespace

HypothesisReading read_hypothesis(const TomlValue& document, const Location& file,
                                  Diagnostics& diagnostics) {
  return HypothesisReader(document, file, diagnostics).read();
}

}  // namespace gainsay::cli
