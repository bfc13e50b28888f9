#include "gainsay/cli/course_reader.h"

#include "gainsay/core/nearest_name.h"

#include <algorithm>
#include <string>
#include <utility>

namespace gainsay::cli {

namespace {

using Steps = std::vector<std::pair<double, double>>;

Steps read_steps(const TomlValue& list, const DeclaredInput& input, double begins,
                 Diagnostics& diagnostics) {
  Steps steps;
  for (const TomlValue& pair : list.items) {
    const double time = pair.items[0].number;
    if (!steps.empty() && time <= steps.back().first) {
      diagnostics.error(pair.place, {"the steps of '" + input.name + "' do not ascend in time",
                                     "each step later than the one before",
                                     "put the steps in order, each time once"});
      return steps;
    }
    steps.emplace_back(time, pair.items[1].number);
  }
  if (!steps.empty() && steps.front().first <= begins) return steps;
  if (input.otherwise) {
    steps.insert(steps.begin(), {begins, *input.otherwise});
  } else {
    diagnostics.error(list.place, {"'" + input.name + "' has no value at the beginning",
                                   "a first step at or before the beginning",
                                   "add such a step, or `otherwise` to the input in study.toml"});
  }
  return steps;
}

Steps read_course(const TomlEntry& entry, const DeclaredInput& input, double begins,
                  Diagnostics& diagnostics) {
  if (entry.value.is_number()) return {{begins, entry.value.number}};
  const CheckedTable table(entry.value, Section::Course, Section::Experiment, diagnostics);
  if (const TomlValue* steps = table.value("steps")) {
    return read_steps(*steps, input, begins, diagnostics);
  }
  if (table.entries().size() == entry.value.entries.size()) {
    diagnostics.error(entry.value.place,
                      {"the input '" + entry.key + "' says nothing",
                       "a number, or steps = [[time, value], ...]", "add steps"});
  }
  return {};
}

void say_undeclared(const TomlEntry& entry, const std::vector<DeclaredInput>& inputs,
                    Diagnostics& diagnostics) {
  std::vector<std::string> names;
  for (const DeclaredInput& input : inputs) names.push_back(input.name);
  const auto nearest = core::nearest_name(entry.key, names);
  diagnostics.error(entry.place,
                    {"unknown input '" + entry.key + "'",
                     nearest ? "an input of study.toml; nearest: '" + *nearest + "'"
                             : "an input that study.toml declares",
                     "correct the name, or add '" + entry.key + "' under [inputs] in study.toml"});
}

}  // namespace

std::vector<estimation::InputCourse> read_courses(const CheckedTable& experiment,
                                                  const std::vector<DeclaredInput>& inputs,
                                                  double begins, const Location& file,
                                                  Diagnostics& diagnostics) {
  const auto given =
      inner_table(experiment, "inputs", Section::Courses, Section::Experiment, diagnostics);
  std::vector<estimation::InputCourse> courses;
  for (const DeclaredInput& input : inputs) {
    const TomlEntry* entry = given ? given->entry(input.name) : nullptr;
    if (entry != nullptr) {
      courses.push_back({input.name, read_course(*entry, input, begins, diagnostics)});
    } else if (input.otherwise) {
      courses.push_back({input.name, {{begins, *input.otherwise}}});
    } else if (!given || !given->mentions(input.name)) {
      diagnostics.error(given ? given->table().place : file,
                        {"the experiment does not say what the input '" + input.name + "' was",
                         "a number or steps under [inputs], or `otherwise` in study.toml",
                         "add inputs." + input.name + " = a number"});
    }
  }
  if (!given) return courses;
  for (const TomlEntry* entry : given->entries()) {
    const bool declared =
        std::any_of(inputs.begin(), inputs.end(),
                    [&](const DeclaredInput& input) { return input.name == entry->key; });
    if (!declared) say_undeclared(*entry, inputs, diagnostics);
  }
  return courses;
}

}  // namespace gainsay::cli
