#include "gainsay/cli/mechanism_warnings.h"

#include "gainsay/core/same_system.h"
#include "gainsay/estimation/problem.h"

#include <memory>
#include <utility>

namespace gainsay::cli {

namespace {

void add_names(const core::Expression& expression, std::vector<std::string>& names) {
  for (const std::string& symbol : core::symbols(expression)) names.push_back(symbol);
}

// Names that readouts, start values and doses use.
std::vector<std::string> names_used_elsewhere(const Study& study) {
  std::vector<std::string> names;
  for (const estimation::Readout& readout : study.readouts) add_names(readout.shows, names);
  for (const estimation::Experiment& experiment : study.experiments) {
    for (const estimation::StartValue& start : experiment.starts) add_names(start.value, names);
    for (const estimation::Dose& dose : experiment.doses) {
      for (const auto& [species, size] : dose.add) add_names(size, names);
      for (const auto& [species, size] : dose.raise) add_names(size, names);
    }
  }
  return names;
}

// Unknowns that the hypothesis declares itself and that nothing depends on.
std::vector<core::Warning> unused_unknowns(const Study& study, const StudyHypothesis& hypothesis) {
  std::vector<core::Warning> warnings;
  std::vector<estimation::DeclaredUnknown> declared = hypothesis.unknowns;
  declared.insert(declared.end(), study.unknowns.begin(), study.unknowns.end());
  const auto problem =
      estimation::assemble(hypothesis.mechanism, declared, study.readouts, study.experiments,
                           {study.relative_accuracy, study.negligible, true});
  if (!problem) return warnings;
  for (const std::string& name : problem->unused) {
    warnings.push_back(
        {"nothing depends on the unknown '" + name + "'", "use it, or leave it out", name});
  }
  return warnings;
}

Location place_of(const StudyReading& reading, std::size_t hypothesis, const std::string& name) {
  const auto& places = reading.places[hypothesis];
  const auto found = places.find(name);
  if (found != places.end()) return found->second;
  const std::string& file = reading.study->hypotheses[hypothesis].file;
  return whole(std::make_shared<const SourceText>(SourceText{file, ""}));
}

}  // namespace

std::vector<MechanismWarning> mechanism_warnings(const StudyReading& reading) {
  const Study& study = *reading.study;
  const std::vector<std::string> elsewhere = names_used_elsewhere(study);
  std::vector<core::Expression> shown;
  for (const estimation::Readout& readout : study.readouts) shown.push_back(readout.shows);
  std::vector<MechanismWarning> all;
  for (std::size_t h = 0; h < study.hypotheses.size(); ++h) {
    const core::Hypothesis& mechanism = study.hypotheses[h].mechanism;
    auto warnings = core::warnings(mechanism, core::derive_network(mechanism), elsewhere);
    for (core::Warning& unused : unused_unknowns(study, study.hypotheses[h])) {
      warnings.push_back(std::move(unused));
    }
    for (std::size_t other = 0; other < h; ++other) {
      const core::Hypothesis& rival = study.hypotheses[other].mechanism;
      if (!core::same_system(rival, mechanism, shown)) continue;
      warnings.push_back({"'" + mechanism.title + "' is the same system as '" + rival.title +
                              "': no data can tell them apart",
                          "correct one of the two, or remove it", ""});
    }
    for (core::Warning& warning : warnings) {
      const Location place = place_of(reading, h, warning.about);
      all.push_back({h, std::move(warning), place});
    }
  }
  return all;
}

std::vector<Diagnostic> as_diagnostics(const std::vector<MechanismWarning>& warnings) {
  Diagnostics diagnostics;
  for (const MechanismWarning& one : warnings) {
    diagnostics.warning(one.place, {one.warning.what, "", one.warning.to_do});
  }
  return diagnostics.collected();
}

}  // namespace gainsay::cli
