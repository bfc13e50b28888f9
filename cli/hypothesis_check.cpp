#include "gainsay/cli/hypothesis_check.h"

#include <algorithm>
#include <set>
#include <string>

namespace gainsay::cli {

namespace {

using NameSet = std::set<std::string, std::less<>>;

NameSet own_numbers(const HypothesisReading& reading) {
  NameSet names;
  for (const DeclaredName& name : reading.names) {
    if (name.kind == NameKind::Known || name.kind == NameKind::Unknown) names.insert(name.name);
  }
  return names;
}

// The study's names, save those that the hypothesis gives itself; then its own; then knowns that
// only experiments give.
NameSpace gather_names(const HypothesisReading& reading, const StudyTop& top,
                       const std::vector<ExperimentReading>& experiments,
                       Diagnostics& diagnostics) {
  NameSpace names;
  const NameSet own = own_numbers(reading);
  for (const DeclaredInput& input : top.inputs) {
    names.declare({input.name, NameKind::Input, input.place}, diagnostics);
  }
  for (const ReadKnown& known : top.knowns) {
    if (own.contains(known.name)) continue;
    names.declare({known.name, NameKind::Known, known.place}, diagnostics);
  }
  for (const ReadUnknown& unknown : top.unknowns) {
    const std::string& name = unknown.declared.unknown.name;
    if (own.contains(name)) continue;
    names.declare({name, NameKind::Unknown, unknown.place}, diagnostics);
  }
  for (const DeclaredName& name : reading.names) names.declare(name, diagnostics);
  for (const ExperimentReading& experiment : experiments) {
    for (const ReadKnown& known : experiment.knowns) {
      const DeclaredName* taken = names.find(known.name);
      if (taken == nullptr) {
        names.declare({known.name, NameKind::Known, known.place}, diagnostics);
      } else if (taken->kind != NameKind::Known) {
        diagnostics.error(
            known.place,
            {"'" + known.name + "' is a known here, but " + with_a(taken->kind) + " in " +
                 taken->place.file() + ":" + std::to_string(taken->place.line),
             "a name that is a known everywhere, or that only experiments give",
             "rename one of the two"});
      }
    }
  }
  return names;
}

void fill_mechanism(HypothesisReading& reading, const StudyTop& top) {
  core::Hypothesis& mechanism = reading.hypothesis.mechanism;
  const NameSet own = own_numbers(reading);
  for (const ReadKnown& known : top.knowns) {
    if (!own.contains(known.name)) mechanism.knowns[known.name] = known.value;
  }
  for (const ReadKnown& known : reading.knowns) mechanism.knowns[known.name] = known.value;
  for (const ReadUnknown& unknown : top.unknowns) {
    const std::string& name = unknown.declared.unknown.name;
    if (!own.contains(name)) mechanism.unknowns.push_back(name);
  }
  for (const estimation::DeclaredUnknown& unknown : reading.hypothesis.unknowns) {
    mechanism.unknowns.push_back(unknown.unknown.name);
  }
  for (const DeclaredInput& input : top.inputs) mechanism.inputs.push_back(input.name);
}

// A reaction's name stands for its rate, so circles may run through reactions as well.
bool has_circle(const HypothesisReading& reading, const NameSpace& names,
                Diagnostics& diagnostics) {
  std::vector<core::Definition> meanings = reading.hypothesis.mechanism.definitions;
  for (const core::Reaction& reaction : reading.hypothesis.mechanism.reactions) {
    meanings.push_back({reaction.name, core::net(reaction)});
  }
  const std::vector<std::string> circle = core::circle(meanings);
  if (circle.empty()) return false;
  std::string path;
  for (const std::string& name : circle) path += "'" + name + "' -> ";
  const DeclaredName* first = names.find(circle.front());
  diagnostics.error(
      first->place,
      {"'" + circle.front() + "' leads back to itself: " + path + "'" + circle.front() + "'",
       "names under [where] and rates that do not lean on themselves", "break the circle"});
  return true;
}

bool may_lean(Leans leans, const DeclaredName* name) {
  if (name == nullptr) return true;  // said as an unknown name
  if (name->kind == NameKind::Known || name->kind == NameKind::Unknown) return true;
  return name->kind == NameKind::Input && leans == Leans::OnTheBeginning;
}

}  // namespace

NameSpace check_hypothesis(HypothesisReading& reading, const StudyTop& top,
                           const std::vector<ExperimentReading>& experiments,
                           Diagnostics& diagnostics) {
  NameSpace names = gather_names(reading, top, experiments, diagnostics);
  fill_mechanism(reading, top);
  const std::size_t errors = diagnostics.errors();
  for (const WrittenExpression& written : reading.expressions) {
    check_names(written, names, "", diagnostics);
  }
  if (diagnostics.errors() > errors || has_circle(reading, names, diagnostics)) return names;
  for (const WrittenExpression& written : reading.expressions) {
    check_leaning(written, reading.hypothesis.mechanism, names, "", diagnostics);
  }
  return names;
}

void check_leaning(const WrittenExpression& written, const core::Hypothesis& mechanism,
                   const NameSpace& names, const std::string& where_else,
                   Diagnostics& diagnostics) {
  if (written.leans == Leans::OnAnything) return;
  const bool of_beginning = written.leans == Leans::OnTheBeginning;
  for (const std::string& symbol :
       core::symbols(core::written_out(written.expression, mechanism))) {
    const DeclaredName* name = names.find(symbol);
    if (symbol != "t" && may_lean(written.leans, name)) continue;
    const std::string what =
        name == nullptr ? "time" : "the " + std::string(word_for(name->kind)) + " '" + symbol + "'";
    diagnostics.error(written.place, {written.role + " depends on " + what + where_else,
                                      of_beginning ? "knowns, unknowns and inputs at the beginning"
                                                   : "knowns and unknowns",
                                      "write it without '" + symbol + "'"});
  }
}

}  // namespace gainsay::cli
