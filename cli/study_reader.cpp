#include "gainsay/cli/study_reader.h"

#include "gainsay/cli/beginning_check.h"
#include "gainsay/cli/data_check.h"
#include "gainsay/cli/experiment_files.h"
#include "gainsay/cli/hypothesis_check.h"
#include "gainsay/cli/hypothesis_files.h"
#include "gainsay/cli/study_check.h"
#include "gainsay/cli/study_files.h"
#include "gainsay/cli/study_top.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/estimation/problem.h"

#include <memory>
#include <utility>

namespace gainsay::cli {

namespace {

Location location_of(const std::string& file) {
  return whole(std::make_shared<const SourceText>(SourceText{file, ""}));
}

StudyTop read_top(StudyFiles& files, Diagnostics& diagnostics) {
  std::string why;
  const auto source = files.read("study.toml", why);
  StudyTop top;
  if (source == nullptr) {
    top.file = location_of("study.toml");
    diagnostics.error(top.file, {"'" + files.folder().generic_string() + "' holds no study: " + why,
                                 "a folder with study.toml, hypotheses/ and experiments/",
                                 "name the folder of a study, or make one: gainsay new FOLDER"});
    return top;
  }
  top.file = whole(source);
  if (const auto document = read_toml(source, diagnostics)) {
    top = read_study_top(*document, whole(source), diagnostics);
  }
  return top;
}

std::vector<std::string> names_of_knowns(const StudyParts& parts) {
  std::vector<std::string> names;
  for (const ReadKnown& known : parts.top.knowns) names.push_back(known.name);
  for (const HypothesisReading& reading : parts.hypotheses) {
    for (const ReadKnown& known : reading.knowns) names.push_back(known.name);
  }
  return names;
}

estimation::Experiment with_series(ExperimentReading& reading, const StudyTop& top) {
  estimation::Experiment experiment = std::move(reading.experiment);
  for (const ReadSeries& series : reading.series) {
    estimation::Series kept{top.readouts[series.readout].readout.name, {}};
    for (const ReadPoint& read : series.points) kept.points.push_back(read.point);
    experiment.series.push_back(std::move(kept));
  }
  return experiment;
}

std::string name_of(const std::filesystem::path& folder) {
  std::error_code error;
  std::filesystem::path whole_path = std::filesystem::weakly_canonical(folder, error);
  if (whole_path.filename().empty()) whole_path = whole_path.parent_path();
  return whole_path.filename().string();
}

Study make_study(const std::filesystem::path& folder, StudyParts parts) {
  Study study = std::move(parts.top.study);
  study.folder = folder;
  if (study.title.empty()) study.title = name_of(folder);
  for (const DeclaredInput& input : parts.top.inputs) study.inputs.push_back(input.name);
  for (const ReadUnknown& unknown : parts.top.unknowns) study.unknowns.push_back(unknown.declared);
  for (const ReadReadout& readout : parts.top.readouts) study.readouts.push_back(readout.readout);
  for (HypothesisReading& reading : parts.hypotheses) {
    study.hypotheses.push_back(std::move(reading.hypothesis));
  }
  for (ExperimentReading& reading : parts.experiments) {
    study.experiments.push_back(with_series(reading, parts.top));
  }
  return study;
}

// What the checks of names cannot see is found by putting each hypothesis together.
void try_assembly(const Study& study, Diagnostics& diagnostics) {
  for (const StudyHypothesis& hypothesis : study.hypotheses) {
    std::vector<estimation::DeclaredUnknown> declared = hypothesis.unknowns;
    declared.insert(declared.end(), study.unknowns.begin(), study.unknowns.end());
    const auto problem =
        estimation::assemble(hypothesis.mechanism, declared, study.readouts, study.experiments,
                             {study.relative_accuracy, study.negligible, false});
    if (problem) continue;
    const core::Failure& failure = problem.failure();
    diagnostics.error(location_of(hypothesis.file),
                      {failure.what, failure.expected, failure.to_do});
  }
}

std::vector<std::map<std::string, Location>> places_of(const StudyParts& parts) {
  std::vector<std::map<std::string, Location>> places;
  for (const HypothesisReading& reading : parts.hypotheses) {
    std::map<std::string, Location>& of_names = places.emplace_back();
    for (const DeclaredName& name : reading.names) of_names.emplace(name.name, name.place);
  }
  return places;
}

void read_parts(StudyFiles& files, StudyParts& parts, ReadFor what_for, Diagnostics& diagnostics) {
  ReadHypotheses read = read_hypotheses(files, diagnostics);
  parts.hypotheses = std::move(read.hypotheses);
  if (parts.hypotheses.empty() && read.all_read) {
    diagnostics.error(parts.top.file,
                      {"the study has no hypotheses", "at least one file hypotheses/NAME.toml",
                       "add one; a file whose name begins with '_' is a base only"});
  }
  parts.all_names_known = !diagnostics.has_errors();
  ReadExperiments runs = read_experiments(files, parts.top, names_of_knowns(parts), diagnostics);
  parts.experiments = std::move(runs.experiments);
  parts.all_experiments_read = runs.all_read;
  if (!parts.top.is_understood) return;  // whatever names a file uses may stand in study.toml
  const std::size_t errors = diagnostics.errors();
  for (HypothesisReading& hypothesis : parts.hypotheses) {
    parts.names.push_back(check_hypothesis(hypothesis, parts.top, parts.experiments, diagnostics));
  }
  if (diagnostics.errors() > errors) parts.all_names_known = false;
  check_parts(parts, diagnostics);
  check_data(parts, what_for == ReadFor::Judging, diagnostics);
}

}  // namespace

StudyReading read_study(const std::filesystem::path& folder, ReadFor what_for) {
  StudyFiles files(folder);
  Diagnostics diagnostics;
  StudyReading reading;
  StudyParts parts;
  parts.top = read_top(files, diagnostics);
  if (files.exists("study.toml")) read_parts(files, parts, what_for, diagnostics);
  reading.places = places_of(parts);
  if (!diagnostics.has_errors()) {
    warn_of_given_readings(parts, diagnostics);
    reading.study = make_study(folder, std::move(parts));
    try_assembly(*reading.study, diagnostics);
    if (diagnostics.has_errors()) reading.study.reset();
  }
  reading.diagnostics = diagnostics.collected();
  reading.texts = files.texts();
  return reading;
}

}  // namespace gainsay::cli
