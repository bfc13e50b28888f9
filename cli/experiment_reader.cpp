#include "gainsay/cli/experiment_reader.h"

#include "gainsay/cli/course_reader.h"
#include "gainsay/cli/key_check.h"

#include <algorithm>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr Section kTop = Section::Experiment;

class ExperimentReader {
 public:
  ExperimentReader(const TomlValue& document, const std::string& name, const Location& file,
                   Diagnostics& diagnostics)
      : top_(document, kTop, kTop, diagnostics), diagnostics_(diagnostics) {
    reading_.file = file;
    experiment().name = name;
  }

  ExperimentReading read(const StudyTop& study) && {
    experiment().title = top_.text("title").value_or(experiment().name);
    experiment().begins = top_.number("begins").value_or(0.0);
    reading_.data = top_.text("data").value_or("");
    reading_.data_place = top_.has("data") ? top_.value("data")->place : reading_.file;
    reading_.ignored_columns = texts_of(top_, "ignore");
    reading_.knowns = read_knowns(top_, kTop, diagnostics_);
    for (const ReadKnown& known : reading_.knowns) experiment().knowns[known.name] = known.value;
    read_starts();
    if (study.is_understood) {
      experiment().inputs =
          read_courses(top_, study.inputs, experiment().begins, reading_.file, diagnostics_);
    }
    read_doses();
    read_absent();
    return std::move(reading_);
  }

 private:
  estimation::Experiment& experiment() { return reading_.experiment; }

  void read_starts() {
    const auto names = inner_table(top_, "start", Section::Starts, kTop, diagnostics_);
    if (!names) return;
    for (const TomlEntry* entry : names->entries()) {
      reading_.species.push_back({entry->key, entry->place, false});
      estimation::StartValue start;
      start.species = entry->key;
      if (entry->value.is_table()) {
        start.unknown = read_uncertain_start(entry->value, diagnostics_);
        if (start.unknown) {
          start.unknown->name = "start." + entry->key + "[" + experiment().name + "]";
        }
      } else if (auto written = read_expression(entry->value, "the start of '" + entry->key + "'",
                                                Leans::OnTheBeginning, diagnostics_)) {
        start.value = written->expression;
        reading_.expressions.push_back(*std::move(written));
      }
      experiment().starts.push_back(std::move(start));
    }
  }

  void read_doses() {
    const TomlValue* doses = top_.value("doses");
    if (doses == nullptr) return;
    for (const TomlValue& item : doses->items) read_dose(item);
    std::stable_sort(experiment().doses.begin(), experiment().doses.end(),
                     [](const auto& a, const auto& b) { return a.at < b.at; });
  }

  void read_dose(const TomlValue& item) {
    const CheckedTable table(item, Section::Dose, kTop, diagnostics_);
    estimation::Dose dose;
    if (const auto at = table.number("at")) {
      dose.at = *at;
      if (dose.at < experiment().begins) {
        diagnostics_.error(
            table.value("at")->place,
            {"the dose is given before the experiment begins", "a time from the beginning on",
             "correct it; what is there at the beginning belongs under start"});
      }
    } else if (table.lacks("at")) {
      diagnostics_.error(item.place, {"the dose has no time", "at = a time", "add at"});
    }
    if (table.lacks("add") && table.lacks("raise")) {
      diagnostics_.error(item.place, {"the dose adds nothing", "add = { ... } or raise = { ... }",
                                      "say what is added"});
    }
    read_parts(table, "add", dose.add);
    read_parts(table, "raise", dose.raise);
    experiment().doses.push_back(std::move(dose));
  }

  void read_parts(const CheckedTable& dose, std::string_view key,
                  std::vector<std::pair<std::string, core::Expression>>& parts) {
    const auto names = inner_table(dose, key, Section::DoseParts, kTop, diagnostics_);
    if (!names) return;
    for (const TomlEntry* entry : names->entries()) {
      reading_.species.push_back({entry->key, entry->place, false});
      const std::string role = "the dose of '" + entry->key + "'";
      auto written = read_expression(entry->value, role, Leans::OnConstants, diagnostics_);
      if (!written) continue;
      parts.emplace_back(entry->key, written->expression);
      reading_.expressions.push_back(*written);
      reading_.dose_sizes.push_back(*std::move(written));
    }
  }

  void read_absent() {
    const TomlValue* absent = top_.value("absent");
    if (absent == nullptr) return;
    for (const TomlValue& item : absent->items) {
      reading_.species.push_back({item.text, item.place, true});
      experiment().absent.push_back(item.text);
    }
  }

  CheckedTable top_;
  Diagnostics& diagnostics_;
  ExperimentReading reading_;
};

}  // namespace

ExperimentReading read_experiment(const TomlValue& document, const std::string& name,
                                  const Location& file, const StudyTop& top,
                                  Diagnostics& diagnostics) {
  return ExperimentReader(document, name, file, diagnostics).read(top);
}

}  // namespace gainsay::cli
