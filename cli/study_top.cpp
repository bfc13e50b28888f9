#include "gainsay/cli/study_top.h"

namespace gainsay::cli {

namespace {

constexpr Section kTop = Section::Study;
constexpr double kLeastRelative = 1e-13;  // below it rounding of doubles shows in the integration
constexpr double kMostRelative = 1e-2;

void read_significance(const CheckedTable& top, Study& study, Diagnostics& diagnostics) {
  const auto significance = top.number("significance");
  if (!significance) return;
  study.significance = *significance;
  if (*significance > 0.0 && *significance < 1.0) return;
  diagnostics.error(top.value("significance")->place,
                    {"the significance is no probability between 0 and 1",
                     "a number above 0 and below 1", "write 0.05 for five in a hundred"});
}

void read_decides(const CheckedTable& top, Study& study, Diagnostics& diagnostics) {
  const auto decides = top.text("decides");
  if (!decides) return;
  if (*decides == "full") {
    study.decides = stats::WhichLimit::Full;
  } else if (*decides == "reduced") {
    study.decides = stats::WhichLimit::Reduced;
  } else if (*decides == "simulated") {
    say_not_yet(top.value("decides")->place, "decides = \"simulated\"",
                "write \"full\" or \"reduced\", or leave it out", diagnostics);
  } else {
    diagnostics.error(top.value("decides")->place,
                      {"'" + *decides + "' is no limit", "\"full\" or \"reduced\"",
                       "write one of these, or leave it out"});
  }
}

std::vector<DeclaredInput> read_inputs(const CheckedTable& top, Diagnostics& diagnostics) {
  std::vector<DeclaredInput> inputs;
  const auto names = inner_table(top, "inputs", Section::Inputs, kTop, diagnostics);
  if (!names) return inputs;
  for (const TomlEntry* entry : names->entries()) {
    if (!is_usable_name(*entry, diagnostics)) continue;
    const CheckedTable table(entry->value, Section::Input, kTop, diagnostics);
    inputs.push_back({entry->key, table.number("otherwise"), entry->place});
  }
  for (const TomlEntry* entry : names->failed()) inputs.push_back({entry->key, 0.0, entry->place});
  return inputs;
}

void read_descents(const CheckedTable& search, Study& study, Diagnostics& diagnostics) {
  const TomlValue* descents = search.value("descents");
  if (descents == nullptr) return;
  if (descents->is_number()) {
    study.descents = static_cast<std::size_t>(descents->number);
  } else if (descents->text != "until convincing") {
    diagnostics.error(descents->place, {"'" + descents->text + "' is no number of descents",
                                        "a whole number or \"until convincing\"", "correct it"});
  }
}

void read_search(const CheckedTable& top, Study& study, Diagnostics& diagnostics) {
  const auto search = inner_table(top, "search", Section::Search, kTop, diagnostics);
  if (!search) return;
  read_descents(*search, study, diagnostics);
  if (const auto budget = search->number("budget")) {
    study.budget = static_cast<long>(*budget);
    if (study.budget == 0) {
      diagnostics.error(search->value("budget")->place,
                        {"a budget of 0 integrations fits nothing", "a whole number above 0",
                         "correct it, or leave it out for 20000"});
    }
  }
  if (const auto seed = search->number("seed")) study.seed = static_cast<std::uint64_t>(*seed);
}

void read_accuracy(const CheckedTable& top, Study& study, Diagnostics& diagnostics) {
  const auto accuracy = inner_table(top, "accuracy", Section::Accuracy, kTop, diagnostics);
  if (!accuracy) return;
  if (const auto relative = accuracy->number("relative")) {
    study.relative_accuracy = *relative;
    if (*relative < kLeastRelative || *relative > kMostRelative) {
      diagnostics.error(accuracy->value("relative")->place,
                        {"the relative accuracy is out of reach or too coarse",
                         "a number from 1e-13 to 0.01", "write 1e-6, or leave it out"});
    }
  }
  if (const auto negligible = accuracy->number("negligible")) {
    study.negligible = *negligible;
    if (!(*negligible > 0.0 && *negligible < 1.0)) {
      diagnostics.error(accuracy->value("negligible")->place,
                        {"'negligible' is no part of a whole", "a number above 0 and below 1",
                         "write 1e-8, or leave it out"});
    }
  }
}

}  // namespace

StudyTop read_study_top(const TomlValue& document, const Location& file, Diagnostics& diagnostics) {
  StudyTop read;
  read.file = file;
  read.is_understood = true;
  const CheckedTable top(document, kTop, kTop, diagnostics);
  read.study.title = top.text("title").value_or("");
  read_significance(top, read.study, diagnostics);
  read_decides(top, read.study, diagnostics);
  read.inputs = read_inputs(top, diagnostics);
  read.knowns = read_knowns(top, kTop, diagnostics);
  read.unknowns = read_unknowns(top, kTop, diagnostics);
  read.readouts = read_readouts(top, diagnostics);
  read_search(top, read.study, diagnostics);
  read_accuracy(top, read.study, diagnostics);
  read.ignored_columns = texts_of(top, "ignore");
  return read;
}

std::vector<std::string> texts_of(const CheckedTable& table, std::string_view key) {
  std::vector<std::string> texts;
  if (const TomlValue* list = table.value(key)) {
    for (const TomlValue& item : list->items) texts.push_back(item.text);
  }
  return texts;
}

}  // namespace gainsay::cli
