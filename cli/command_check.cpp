#include "gainsay/cli/command_check.h"

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/mechanism_warnings.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/cli/study_summary.h"

#include <nlohmann/json.hpp>

#include <string>
#include <vector>

namespace gainsay::cli {

namespace {

using Json = nlohmann::ordered_json;

Json json_of(const Diagnostic& diagnostic) {
  return {{"file", diagnostic.file},         {"line", diagnostic.line},
          {"column", diagnostic.column},     {"what", diagnostic.what},
          {"expected", diagnostic.expected}, {"to_do", diagnostic.to_do}};
}

Json json_of(const HypothesisSummary& one) {
  return {{"letter", one.letter},
          {"title", one.title},
          {"file", one.file},
          {"base", one.base.empty() ? Json() : Json(one.base)},
          {"species", one.species},
          {"reactions", one.reactions},
          {"conserved", one.conserved},
          {"unknowns",
           {{"kinetic", one.kinetic}, {"initial", one.initial}, {"measurement", one.measurement}}},
          {"data", one.data},
          {"earlier_work", one.priors}};
}

Json json_of(const ExperimentSummary& one) {
  Json readouts = Json::array();
  for (const ReadoutSummary& readout : one.readouts) {
    readouts.push_back(
        {{"readout", readout.name}, {"counted", readout.counted}, {"left_out", readout.left_out}});
  }
  return {{"name", one.name}, {"title", one.title}, {"readings", readouts}};
}

Json json_of(const StudySummary& summary) {
  Json json{
      {"title", summary.title}, {"hypotheses", Json::array()}, {"experiments", Json::array()}};
  for (const HypothesisSummary& one : summary.hypotheses)
    json["hypotheses"].push_back(json_of(one));
  for (const ExperimentSummary& one : summary.experiments) {
    json["experiments"].push_back(json_of(one));
  }
  return json;
}

// Bytes of a study's texts that are not UTF-8 are replaced: JSON knows no others.
std::string written(const Json& json) {
  return json.dump(2, ' ', false, Json::error_handler_t::replace) + "\n";
}

}  // namespace

int run_check(const CheckOptions& options, const Console& console) {
  const StudyReading reading = read_study(options.study, ReadFor::Looking);
  std::vector<Diagnostic> messages = reading.diagnostics;
  if (reading.study) {
    const auto more = as_diagnostics(mechanism_warnings(reading));
    messages.insert(messages.end(), more.begin(), more.end());
    put_in_order(messages);
  }
  const StudySummary summary = reading.study ? summarize(*reading.study) : StudySummary{};
  if (options.json) {
    Json json = reading.study ? json_of(summary) : Json::object();
    json["errors"] = json["warnings"] = Json::array();
    for (const Diagnostic& one : messages) {
      json[one.severity == Severity::Error ? "errors" : "warnings"].push_back(json_of(one));
    }
    console.out << written(json);
  } else if (reading.study) {
    console.out << summary_text(summary);
  }
  print(console.messages, messages, console.colour);
  return reading.study ? kDone : kWrongInput;
}

}  // namespace gainsay::cli
