#include "gainsay/cli/judging.h"

#include "gainsay/cli/libraries.h"
#include "gainsay/cli/sha256.h"
#include "gainsay/core/version.h"
#include "gainsay/estimation/problem.h"

#include <fmt/format.h>

#include <algorithm>

namespace gainsay::cli {
namespace {

constexpr std::size_t kCurvePoints = 160;

/// A hypothesis' own unknowns first: they replace the study's of equal names.
std::vector<estimation::DeclaredUnknown> declared(const Study& study,
                                                  const StudyHypothesis& hypothesis) {
  std::vector<estimation::DeclaredUnknown> all = hypothesis.unknowns;
  all.insert(all.end(), study.unknowns.begin(), study.unknowns.end());
  return all;
}

stats::JudgeOptions judge_options(const Study& study, const JudgingOptions& options) {
  stats::JudgeOptions judge;
  judge.alpha = study.significance;
  judge.decides = study.decides;
  judge.until_convincing = !study.descents.has_value();
  judge.plan.fixed = study.descents;
  judge.plan.budget = study.budget;
  judge.plan.seed = study.seed;
  judge.plan.threads = options.threads;
  judge.plan.stop = options.stop;
  return judge;
}

std::optional<Outcome> judge_one(const Study& study, std::size_t number,
                                 const JudgingOptions& options, const JudgingObserver& observer) {
  const StudyHypothesis& hypothesis = study.hypotheses[number];
  auto problem = assemble_problem(study, number);
  GAINSAY_REQUIRE(problem, "a study that was read without errors can be put together");
  Outcome outcome;
  outcome.hypothesis = number;
  outcome.problem = std::make_shared<const estimation::Problem>(std::move(problem).value());
  outcome.network = core::derive_network(hypothesis.mechanism);
  if (observer.begins) observer.begins(number, hypothesis.mechanism.title);
  outcome.judged = stats::judge(*outcome.problem, judge_options(study, options), observer.goes_on);
  if (options.stop.stop_requested()) return std::nullopt;
  if (!outcome.judged.search.best.values.empty()) {
    auto curves =
        estimation::curves(*outcome.problem, outcome.judged.search.best.values, kCurvePoints);
    if (curves) outcome.curves = std::move(curves).value();
  }
  return outcome;
}

void weigh(std::vector<Outcome>& outcomes) {
  std::vector<const stats::Verdict*> verdicts;
  for (const Outcome& outcome : outcomes) verdicts.push_back(&outcome.judged.verdict);
  const std::vector<double> weights = stats::weights(verdicts);
  for (std::size_t i = 0; i < outcomes.size(); ++i) outcomes[i].weight = weights[i];
}

}  // namespace

core::Result<estimation::Problem> assemble_problem(const Study& study, std::size_t hypothesis,
                                                   Purpose purpose) {
  const StudyHypothesis& chosen = study.hypotheses[hypothesis];
  const estimation::AssemblyOptions options{.relative_accuracy = study.relative_accuracy,
                                            .negligible = study.negligible,
                                            .to_simulate = purpose == Purpose::Simulate};
  return estimation::assemble(chosen.mechanism, declared(study, chosen), study.readouts,
                              study.experiments, options);
}

Judgement judge_study(const StudyReading& reading, const JudgingOptions& options,
                      const JudgingObserver& observer) {
  GAINSAY_REQUIRE(reading.study, "judged is a study that was read without errors");
  Judgement judgement;
  judgement.study = *reading.study;
  if (options.seed) judgement.study.seed = *options.seed;
  if (options.budget) judgement.study.budget = *options.budget;
  judgement.version = core::version();
  judgement.libraries = libraries();
  for (const Diagnostic& diagnostic : reading.diagnostics) {
    judgement.warnings.push_back({.what = fmt::format("{}: {}", diagnostic.file, diagnostic.what),
                                  .to_do = diagnostic.to_do,
                                  .about = {}});
  }
  for (const auto& [file, text] : reading.texts)
    judgement.fingerprints.push_back({file, sha256_hex(text)});

  for (std::size_t i = 0; i < judgement.study.hypotheses.size(); ++i) {
    if (options.stop.stop_requested()) break;
    auto outcome = judge_one(judgement.study, i, options, observer);
    if (outcome) judgement.outcomes.push_back(std::move(*outcome));
  }
  weigh(judgement.outcomes);
  return judgement;
}

std::string word(stats::Decision decision) {
  switch (decision) {
    case stats::Decision::Rejected:
      return "rejected";
    case stats::Decision::NotRejected:
      return "not rejected";
    case stats::Decision::Undecided:
      return "undecided";
  }
  return "undecided";
}

}  // namespace gainsay::cli
