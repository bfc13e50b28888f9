#include "gainsay/cli/command_judge.h"

#include "gainsay/cli/fitted_toml.h"
#include "gainsay/cli/interruption.h"
#include "gainsay/cli/judging.h"
#include "gainsay/cli/progress.h"
#include "gainsay/cli/report_csv.h"
#include "gainsay/cli/report_html.h"
#include "gainsay/cli/report_json.h"
#include "gainsay/cli/result_files.h"
#include "gainsay/cli/table_text.h"
#include "gainsay/cli/verdict_words.h"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <map>
#include <thread>

namespace gainsay::cli {
namespace {

constexpr std::size_t kWidth = 80;
constexpr std::size_t kNameWidth = 34;  // what 80 columns leave beside figures and the verdict

std::string figure(double value, int digits) {
  return std::isfinite(value) ? fmt::format("{:.{}g}", value, digits) : "-";
}

/// A tail below the smallest double reads as a bound on it.
std::string tail_figure(double p) { return p == 0.0 ? "<1e-300" : figure(p, 2); }

const stats::Limit& deciding(const stats::Verdict& verdict) {
  return verdict.decides == stats::WhichLimit::Full ? verdict.full : verdict.reduced;
}

std::string row(const std::string& letter, const std::string& name, const std::string& misfit,
                const std::string& limit, const std::string& p, const std::string& verdict) {
  return fmt::format("{} {} {:>8} {:>8} {:>8}  {}", pad(letter, 2), pad(name, kNameWidth), misfit,
                     limit, p, verdict);
}

/// The reason goes behind the verdict if there is room, else on the next line.
std::string row_of(const Study& study, const Outcome& outcome) {
  const stats::Verdict& verdict = outcome.judged.verdict;
  const StudyHypothesis& hypothesis = study.hypotheses[outcome.hypothesis];
  const std::string limit = verdict.noise_unknown ? "-" : figure(deciding(verdict).value, 4);
  const std::string reason = harmless(verdict.reason);
  std::string line = row(hypothesis.letter, harmless(hypothesis.mechanism.title),
                         verdict.noise_unknown ? "-" : figure(verdict.V, 4), limit,
                         tail_figure(verdict.p_value), word(verdict.decision));
  if (reason.empty()) return line + "\n";
  const std::string joined = line + ": " + reason;
  if (columns(joined) <= kWidth) return joined + "\n";
  return line + ":\n" + wrap(reason, kWidth, 3);
}

std::map<std::string, std::string> result_texts(const Judgement& judgement) {
  std::map<std::string, std::string> texts = report_csv(judgement);
  texts["report.html"] = report_html(judgement);
  texts["report.json"] = report_json(judgement);
  texts["fitted.toml"] = fitted_toml(judgement);
  return texts;
}

int say_interrupted(const Judgement& judgement, std::size_t of, const Console& console) {
  console.messages << fmt::format(
      "interrupted: {} of {} hypotheses were judged; nothing was written\n",
      judgement.outcomes.size(), of);
  if (!judgement.outcomes.empty()) console.out << verdict_table(judgement);
  return kInterrupted;
}

JudgingObserver watch(Progress& progress, const Study& study) {
  return {.begins =
              [&](std::size_t number, const std::string& title) {
                progress.begin(harmless(title), number, study.hypotheses.size());
              },
          .goes_on = [&](std::size_t done, std::size_t expected,
                         double best) { progress.update(done, expected, best); }};
}

}  // namespace

std::string verdict_table(const Judgement& judgement) {
  std::string table = row("", "mechanism", "misfit", "limit", "p", "verdict") + "\n";
  for (const Outcome& outcome : judgement.outcomes) table += row_of(judgement.study, outcome);
  return table;
}

int run_judge(const JudgeCommandOptions& options, const Console& console) {
  const Interruption interruption;
  const StudyReading reading = read_study(options.study);
  print(console.messages, reading.diagnostics, console.colour);
  if (!reading.study) return kWrongInput;

  Progress progress(console);
  const unsigned cores = std::max(1U, std::thread::hardware_concurrency());
  const JudgingOptions judging{.threads = options.threads == 0 ? cores : options.threads,
                               .seed = options.seed,
                               .budget = options.budget,
                               .stop = interruption.token()};
  const Judgement judgement = judge_study(reading, judging, watch(progress, *reading.study));
  progress.clear();
  if (interruption.happened())
    return say_interrupted(judgement, reading.study->hypotheses.size(), console);

  const auto texts = result_texts(judgement);
  const auto written = write_files(options.study / "results", texts);
  if (!written) {
    print(console.messages,
          {{.what = written.failure().what,
            .expected = written.failure().expected,
            .to_do = written.failure().to_do}},
          console.colour);
    return kWrongInput;
  }
  if (options.json) {
    console.out << texts.at("report.json");
    return kDone;
  }
  console.out << wrap(harmless(judgement.study.title), kWidth, 0) << "\n"
              << verdict_table(judgement) << "\n"
              << wrap(verdict_sentence(judgement), kWidth, 0) << "Report: "
              << (options.study / "results" / "report.html").lexically_normal().generic_string()
              << "\n";
  return kDone;
}

}  // namespace gainsay::cli
