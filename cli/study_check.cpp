#include "gainsay/cli/study_check.h"

#include "gainsay/cli/hypothesis_check.h"
#include "gainsay/core/nearest_name.h"

#include <algorithm>
#include <map>
#include <set>
#include <string>

namespace gainsay::cli {

namespace {

std::string title_of(const HypothesisReading& reading) {
  return "'" + reading.hypothesis.mechanism.title + "'";
}

// " for hypothesis 'two'": said where others do not share the trouble.
std::string only_for(const StudyParts& parts, const std::vector<std::size_t>& troubled) {
  if (troubled.size() == parts.hypotheses.size()) return "";
  std::string text = troubled.size() == 1 ? " for hypothesis " : " for hypotheses ";
  for (std::size_t i = 0; i < troubled.size(); ++i) {
    if (i > 0) text += i + 1 == troubled.size() ? " and " : ", ";
    text += title_of(parts.hypotheses[troubled[i]]);
  }
  return text;
}

// An expression that all hypotheses share: its names must mean something in each of them.
void check_shared(const WrittenExpression& written, const StudyParts& parts,
                  Diagnostics& diagnostics) {
  std::set<std::string> said;
  for (const NameInText& used : written.names) {
    std::vector<std::size_t> lacking;
    for (std::size_t h = 0; h < parts.names.size(); ++h) {
      if (!parts.names[h].holds(used.name)) lacking.push_back(h);
    }
    if (lacking.empty()) continue;
    WrittenExpression one = written;
    one.names = {used};
    check_names(one, parts.names[lacking.front()], only_for(parts, lacking), diagnostics);
    said.insert(used.name);
  }
  if (!said.empty()) return;
  for (std::size_t h = 0; h < parts.names.size(); ++h) {
    check_leaning(written, parts.hypotheses[h].hypothesis.mechanism, parts.names[h], "",
                  diagnostics);
  }
}

bool is_listed_absent(const ExperimentReading& experiment, const std::string& name) {
  const auto& absent = experiment.experiment.absent;
  return std::find(absent.begin(), absent.end(), name) != absent.end();
}

void check_species(const NamedSpecies& species, const ExperimentReading& experiment,
                   const StudyParts& parts, Diagnostics& diagnostics) {
  std::vector<std::size_t> lacking;
  std::set<std::string> known;
  for (std::size_t h = 0; h < parts.hypotheses.size(); ++h) {
    const core::Hypothesis& mechanism = parts.hypotheses[h].hypothesis.mechanism;
    if (!core::find_species(mechanism, species.name)) lacking.push_back(h);
    for (const core::Species& one : mechanism.species) known.insert(one.name);
  }
  const bool in_none = lacking.size() == parts.hypotheses.size();
  if (lacking.empty() || (!in_none && is_listed_absent(experiment, species.name))) return;
  const auto nearest =
      core::nearest_name(species.name, std::vector<std::string>(known.begin(), known.end()));
  if (in_none) {
    diagnostics.error(species.place,
                      {"unknown species '" + species.name + "'",
                       nearest ? "a species of the hypotheses; nearest: '" + *nearest + "'"
                               : "a species of the hypotheses",
                       "correct the name, or add it under [species] of a hypothesis"});
  } else {
    diagnostics.error(species.place,
                      {"the species '" + species.name + "' is not there" + only_for(parts, lacking),
                       "a species of every hypothesis, or one listed as absent",
                       "add: absent = [\"" + species.name + "\"], if that is meant"});
  }
}

// Doses of a size that is fitted come later.
void refuse_unknown_doses(const ExperimentReading& experiment, const StudyParts& parts,
                          Diagnostics& diagnostics) {
  for (const WrittenExpression& size : experiment.dose_sizes) {
    for (const NameInText& used : size.names) {
      for (const NameSpace& names : parts.names) {
        const DeclaredName* name = names.find(used.name);
        if (name == nullptr || name->kind != NameKind::Unknown) continue;
        diagnostics.error(
            used.place,
            {"not yet: a dose of unknown size ('" + used.name + "') is not read by this version",
             "a number, or an expression of knowns", "give the size as a number"});
        break;
      }
    }
  }
}

bool uses(const std::vector<WrittenExpression>& expressions, const std::string& name) {
  return std::any_of(expressions.begin(), expressions.end(), [&](const WrittenExpression& one) {
    return std::any_of(one.names.begin(), one.names.end(),
                       [&](const NameInText& used) { return used.name == name; });
  });
}

bool is_used(const std::string& name, const StudyParts& parts) {
  const auto in = [&](const auto& holders) {
    return std::any_of(holders.begin(), holders.end(),
                       [&](const auto& holder) { return uses(holder.expressions, name); });
  };
  if (in(parts.hypotheses) || in(parts.experiments)) return true;
  return std::any_of(parts.top.readouts.begin(), parts.top.readouts.end(),
                     [&](const ReadReadout& readout) { return uses({readout.shows}, name); });
}

void check_knowns(const StudyParts& parts, Diagnostics& diagnostics) {
  for (const ExperimentReading& experiment : parts.experiments) {
    for (const ReadKnown& known : experiment.knowns) {
      if (!parts.all_names_known || is_used(known.name, parts)) continue;
      diagnostics.error(known.place,
                        {"nothing uses the known '" + known.name + "'",
                         "a known that some expression uses", "correct its name, or remove it"});
    }
  }
  // A name that only experiments give must be given by each.
  std::map<std::string, std::string> given_by;
  for (const ExperimentReading& experiment : parts.experiments) {
    for (const ReadKnown& known : experiment.knowns) {
      given_by.try_emplace(known.name, experiment.file.file());
    }
  }
  for (const auto& [name, file] : given_by) {
    const bool by_all_hypotheses = std::all_of(
        parts.hypotheses.begin(), parts.hypotheses.end(), [&](const HypothesisReading& reading) {
          return reading.hypothesis.mechanism.knowns.contains(name);
        });
    if (by_all_hypotheses || !is_used(name, parts)) continue;
    for (const ExperimentReading& experiment : parts.experiments) {
      if (experiment.experiment.knowns.contains(name)) continue;
      diagnostics.error(
          experiment.file,
          {"the experiment does not give the known '" + name + "', which " + file + " gives",
           "a value in study.toml, or in every experiment", "add: knowns." + name + " = a number"});
    }
  }
}

void warn_of_unused(const StudyParts& parts, Diagnostics& diagnostics) {
  for (const ReadKnown& known : parts.top.knowns) {
    if (is_used(known.name, parts)) continue;
    diagnostics.warning(known.place, {"nothing uses the known '" + known.name + "'", "",
                                      "correct its name, or remove it"});
  }
  for (const ReadUnknown& unknown : parts.top.unknowns) {
    const std::string& name = unknown.declared.unknown.name;
    if (is_used(name, parts)) continue;
    diagnostics.warning(unknown.place, {"nothing uses the unknown '" + name + "'", "",
                                        "correct its name, or remove it"});
  }
  for (const DeclaredInput& input : parts.top.inputs) {
    if (is_used(input.name, parts)) continue;
    diagnostics.warning(input.place, {"nothing uses the input '" + input.name + "'", "",
                                      "correct its name, or remove it"});
  }
}

}  // namespace

void check_parts(const StudyParts& parts, Diagnostics& diagnostics) {
  if (parts.hypotheses.empty()) return;
  for (const ReadReadout& readout : parts.top.readouts) {
    check_shared(readout.shows, parts, diagnostics);
  }
  for (const ExperimentReading& experiment : parts.experiments) {
    for (const NamedSpecies& species : experiment.species) {
      check_species(species, experiment, parts, diagnostics);
    }
    for (const WrittenExpression& written : experiment.expressions) {
      check_shared(written, parts, diagnostics);
    }
    refuse_unknown_doses(experiment, parts, diagnostics);
  }
  check_knowns(parts, diagnostics);
  if (!diagnostics.has_errors()) warn_of_unused(parts, diagnostics);
}

}  // namespace gainsay::cli
