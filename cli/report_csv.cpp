#include "gainsay/cli/report_csv.h"

#include "gainsay/cli/contenders.h"
#include "gainsay/cli/csv_text.h"
#include "gainsay/cli/page.h"
#include "gainsay/core/print.h"

#include <cmath>
#include <vector>

namespace gainsay::cli {
namespace {

std::string number(double value) {
  return std::isfinite(value) ? core::print_number(value) : std::string();
}

std::string verdicts_csv(const Page& page) {
  std::string out = csv_line({"letter",         "name",      "file",    "verdict",    "reason",
                              "misfit",         "N",         "k",       "full limit", "full P",
                              "reduced limit",  "reduced P", "order T", "order P",    "P",
                              "departure (sd)", "AIC",       "AICc",    "BIC",        "weight"});
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const stats::Verdict& v = contender.outcome->judged.verdict;
    out += csv_line({contender.letter,
                     contender.name,
                     contender.hypothesis->file,
                     verdict_word(contender),
                     v.reason,
                     number(v.V),
                     std::to_string(v.N),
                     std::to_string(v.k),
                     number(v.full.value),
                     number(v.full.p_value),
                     number(v.reduced.value),
                     number(v.reduced.p_value),
                     number(v.order.T),
                     number(v.order.p_value),
                     number(v.p_value),
                     number(v.departure_sd),
                     number(v.AIC),
                     number(v.AICc),
                     number(v.BIC),
                     number(contender.outcome->weight)});
  }
  return out;
}

std::string unknowns_csv(const Page& page) {
  std::string out =
      csv_line({"letter", "unknown", "unit", "estimate", "low", "high", "standard error",
                "determined", "on bound", "searched from", "searched to", "words"});
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    for (const stats::Interval& interval : contender.outcome->judged.verdict.intervals) {
      estimation::Unknown searched;
      searched.low = searched.high = stats::kNotComputed;
      for (const estimation::Unknown& unknown : contender.outcome->problem->unknowns) {
        if (unknown.name == interval.unknown) searched = unknown;
      }
      out += csv_line({contender.letter, interval.unknown, searched.unit, number(interval.estimate),
                       number(interval.low), number(interval.high), number(interval.standard_error),
                       interval.determined ? "yes" : "no", interval.on_bound ? "yes" : "no",
                       number(searched.low), number(searched.high), interval.words});
    }
  }
  return out;
}

std::string residuals_csv(const Page& page) {
  std::string out =
      csv_line({"letter", "experiment", "readout", "time", "reading", "shown", "sd", "residual"});
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const Outcome& outcome = *contender.outcome;
    for (const stats::StandardResidual& residual : outcome.judged.verdict.residuals) {
      const estimation::FittedExperiment& run =
          outcome.problem->experiments.at(residual.experiment);
      const estimation::FittedSeries& series = run.series.at(residual.series);
      const estimation::Datum& datum = series.data.at(residual.datum);
      out += csv_line({contender.letter, run.name, series.readout,
                       number(run.schedule.outputs.at(datum.output)), number(datum.value),
                       number(residual.shown), number(residual.sd), number(residual.r)});
    }
  }
  return out;
}

}  // namespace

std::map<std::string, std::string> report_csv(const Judgement& judgement) {
  const Page page(judgement);
  return {{"verdicts.csv", verdicts_csv(page)},
          {"unknowns.csv", unknowns_csv(page)},
          {"residuals.csv", residuals_csv(page)}};
}

}  // namespace gainsay::cli
