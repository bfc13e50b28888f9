#include "gainsay/cli/study_summary.h"

#include "gainsay/cli/reaction_equation.h"
#include "gainsay/cli/table_text.h"
#include "gainsay/core/network.h"
#include "gainsay/core/print.h"
#include "gainsay/estimation/problem.h"

#include <algorithm>

namespace gainsay::cli {

namespace {

constexpr std::size_t kWidth = 80;
constexpr std::size_t kIndent = 3;
constexpr std::size_t kLabel = 13;

void list_unknowns(const estimation::Problem& problem, HypothesisSummary& summary) {
  for (const estimation::Unknown& unknown : problem.unknowns) {
    switch (unknown.kind) {
      case estimation::UnknownKind::Kinetic:
        summary.kinetic.push_back(unknown.name);
        break;
      case estimation::UnknownKind::Initial:
        summary.initial.push_back(unknown.name);
        break;
      case estimation::UnknownKind::Measurement:
        summary.measurement.push_back(unknown.name);
        break;
    }
  }
  summary.priors = problem.priors();
  summary.data = problem.residuals() - summary.priors;
}

HypothesisSummary summarize(const Study& study, const StudyHypothesis& hypothesis) {
  const core::Hypothesis& mechanism = hypothesis.mechanism;
  HypothesisSummary summary;
  summary.letter = hypothesis.letter;
  summary.title = mechanism.title;
  summary.file = hypothesis.file;
  if (hypothesis.base) summary.base = study.hypotheses[*hypothesis.base].mechanism.title;
  for (const core::Species& species : mechanism.species) summary.species.push_back(species.name);
  for (const core::Reaction& reaction : mechanism.reactions) {
    summary.reactions.push_back(reaction.name + ": " + equation_text(reaction, mechanism));
  }
  for (const core::ConservedSum& sum : core::derive_network(mechanism).conserved) {
    summary.conserved.push_back(sum.text);
  }
  std::vector<estimation::DeclaredUnknown> declared = hypothesis.unknowns;
  declared.insert(declared.end(), study.unknowns.begin(), study.unknowns.end());
  const auto problem = estimation::assemble(mechanism, declared, study.readouts, study.experiments,
                                            {study.relative_accuracy, study.negligible, false});
  if (problem) list_unknowns(*problem, summary);
  return summary;
}

ExperimentSummary summarize(const estimation::Experiment& experiment) {
  ExperimentSummary summary{experiment.name, experiment.title, {}, 0.0, 0.0};
  bool any = false;
  for (const estimation::Series& series : experiment.series) {
    ReadoutSummary readout{series.readout, 0, 0};
    for (const estimation::Point& point : series.points) {
      ++(point.left_out.empty() ? readout.counted : readout.left_out);
      summary.first = any ? std::min(summary.first, point.time) : point.time;
      summary.last = any ? std::max(summary.last, point.time) : point.time;
      any = true;
    }
    summary.readouts.push_back(std::move(readout));
  }
  return summary;
}

std::string joined(const std::vector<std::string>& words, std::string_view by = ", ") {
  std::string text;
  for (const std::string& word : words) {
    if (!text.empty()) text += by;
    text += word;
  }
  return text;
}

// A label and its text; lines that follow are indented to it.
std::string labelled(std::string_view label, std::string_view text) {
  const std::size_t indent = kIndent + kLabel;
  std::string lines = wrap(text, kWidth, indent);
  const std::string head = std::string(kIndent, ' ') + pad(label, kLabel);
  if (lines.size() >= indent) lines.replace(0, indent, head);
  if (!lines.ends_with('\n')) lines += '\n';
  return lines;
}

std::string number_and_noun(std::size_t count, const std::string& one, const std::string& many) {
  return std::to_string(count) + " " + (count == 1 ? one : many);
}

std::string hypothesis_text(const HypothesisSummary& one) {
  std::string text = one.letter + "  " + harmless(one.title) + "  (" + harmless(one.file) + ")\n";
  if (!one.base.empty()) text += labelled("amends", harmless(one.base));
  text += labelled("species", one.species.empty() ? "none" : joined(one.species));
  text += labelled("reactions", one.reactions.empty() ? "none" : joined(one.reactions, "; "));
  if (!one.conserved.empty()) text += labelled("conserved", joined(one.conserved, "; "));
  for (const auto& [kind, names] :
       {std::pair{"kinetic", &one.kinetic}, std::pair{"initial", &one.initial},
        std::pair{"measurement", &one.measurement}}) {
    if (!names->empty()) text += labelled(kind, harmless(joined(*names)));
  }
  std::string counts = number_and_noun(one.data, "reading", "readings");
  if (one.priors > 0) {
    counts += " and " + number_and_noun(one.priors, "value", "values") + " from earlier work";
  }
  return text + labelled("counts", counts + " against " +
                                       number_and_noun(one.unknowns(), "unknown", "unknowns"));
}

std::string experiment_text(const ExperimentSummary& one) {
  std::string text = harmless(one.name);
  if (one.title != one.name) text += "  " + harmless(one.title);
  text += '\n';
  std::vector<std::string> readouts;
  for (const ReadoutSummary& readout : one.readouts) {
    std::string words = harmless(readout.name) + " " + std::to_string(readout.counted);
    if (readout.left_out > 0) words += " (" + std::to_string(readout.left_out) + " left out)";
    readouts.push_back(std::move(words));
  }
  if (readouts.empty()) return text + labelled("readings", "none");
  text += labelled("readings", joined(readouts));
  return text +
         labelled("times", core::print_number(one.first) + " to " + core::print_number(one.last));
}

}  // namespace

StudySummary summarize(const Study& study) {
  StudySummary summary;
  summary.title = study.title;
  for (const StudyHypothesis& hypothesis : study.hypotheses) {
    summary.hypotheses.push_back(summarize(study, hypothesis));
  }
  for (const estimation::Experiment& experiment : study.experiments) {
    summary.experiments.push_back(summarize(experiment));
  }
  return summary;
}

std::string summary_text(const StudySummary& summary) {
  std::string text = harmless(summary.title) + "\n\n";
  text += number_and_noun(summary.hypotheses.size(), "hypothesis", "hypotheses") + "\n";
  for (const HypothesisSummary& one : summary.hypotheses) text += hypothesis_text(one);
  text += "\n" + number_and_noun(summary.experiments.size(), "experiment", "experiments") + "\n";
  for (const ExperimentSummary& one : summary.experiments) text += experiment_text(one);
  return text;
}

}  // namespace gainsay::cli
