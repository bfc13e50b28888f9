#include "gainsay/cli/report_json.h"

#include "gainsay/cli/contenders.h"
#include "gainsay/cli/verdict_words.h"

#include <nlohmann/json.hpp>

#include <cmath>

namespace gainsay::cli {
namespace {

using Json = nlohmann::ordered_json;

/// Null where there is no number: JSON has neither NaN nor infinity.
Json number(double value) { return std::isfinite(value) ? Json(value) : Json(nullptr); }

Json words_or_null(const std::string& words) { return words.empty() ? Json(nullptr) : Json(words); }

std::string decision_word(stats::Decision decision) {
  switch (decision) {
    case stats::Decision::Rejected:
      return "rejected";
    case stats::Decision::NotRejected:
      return "not rejected";
    case stats::Decision::Undecided:
      break;
  }
  return "undecided";
}

Json limit_json(const stats::Limit& limit) {
  return {{"misfit", number(limit.V)},
          {"value", number(limit.value)},
          {"degrees_of_freedom", number(limit.freedom)},
          {"p_value", number(limit.p_value)},
          {"not_offered", words_or_null(limit.not_offered)}};
}

Json order_json(const stats::OrderTest& order) {
  return {{"T", number(order.T)},
          {"p_value", number(order.p_value)},
          {"draws", order.draws},
          {"runs_p_value", number(order.runs_p)},
          {"ljung_box_p_value", number(order.ljung_box_p)},
          {"not_counted", words_or_null(order.not_counted)}};
}

Json tests_json(const stats::Verdict& verdict) {
  return {{"misfit", number(verdict.V)},
          {"misfit_at_tighter_tolerances", number(verdict.V_tighter)},
          {"N", verdict.N},
          {"k", verdict.k},
          {"alpha", verdict.alpha},
          {"share_of_misfit", verdict.share_of_V},
          {"share_of_order", verdict.share_of_order},
          {"decides", verdict.noise_unknown ? "order" : limit_word(verdict.decides)},
          {"full_limit", limit_json(verdict.full)},
          {"reduced_limit", limit_json(verdict.reduced)},
          {"order", order_json(verdict.order)},
          {"p_value", number(verdict.p_value)},
          {"departure_sd", number(verdict.departure_sd)},
          {"noise_unknown", verdict.noise_unknown},
          {"only_within_range", verdict.only_within_range}};
}

Json unknowns_json(const Outcome& outcome) {
  Json unknowns = Json::array();
  for (const stats::Interval& interval : outcome.judged.verdict.intervals) {
    Json unknown = {{"name", interval.unknown},
                    {"estimate", number(interval.estimate)},
                    {"low", number(interval.low)},
                    {"high", number(interval.high)},
                    {"standard_error", number(interval.standard_error)},
                    {"determined", interval.determined},
                    {"on_bound", interval.on_bound},
                    {"words", interval.words}};
    for (const estimation::Unknown& searched : outcome.problem->unknowns) {
      if (searched.name != interval.unknown) continue;
      unknown["unit"] = searched.unit;
      unknown["searched"] = {searched.low, searched.high};
      unknown["scale"] = searched.linear ? "linear" : "logarithmic";
    }
    unknowns.push_back(std::move(unknown));
  }
  return unknowns;
}

Json shares_json(const stats::Verdict& verdict) {
  Json shares = Json::array();
  for (const stats::Share& share : verdict.shares) {
    shares.push_back({{"experiment", share.experiment},
                      {"readout", share.readout},
                      {"points", share.points},
                      {"misfit", number(share.V)}});
  }
  return shares;
}

Json residuals_json(const Outcome& outcome) {
  Json residuals = Json::array();
  for (const stats::StandardResidual& residual : outcome.judged.verdict.residuals) {
    const estimation::FittedExperiment& run = outcome.problem->experiments.at(residual.experiment);
    const estimation::FittedSeries& series = run.series.at(residual.series);
    const estimation::Datum& datum = series.data.at(residual.datum);
    residuals.push_back({{"experiment", run.name},
                         {"readout", series.readout},
                         {"point", datum.point},
                         {"reading", number(datum.value)},
                         {"shown", number(residual.shown)},
                         {"sd", number(residual.sd)},
                         {"residual", number(residual.r)}});
  }
  return residuals;
}

Json search_json(const estimation::SearchResult& search) {
  Json optima = Json::array();
  for (const estimation::Optimum& optimum : search.optima) {
    const estimation::Fit& fit = search.descents.at(optimum.best_descent).fit;
    optima.push_back({{"misfit", number(fit.V)},
                      {"objective", number(fit.objective)},
                      {"found", optimum.found},
                      {"why_it_ended", fit.why}});
  }
  return {{"random_starts", search.random_starts}, {"replaced_starts", search.replaced_starts},
          {"integrations", search.integrations},   {"out_of_budget", search.out_of_budget},
          {"interrupted", search.interrupted},     {"optima", std::move(optima)}};
}

Json moved_json(const stats::Verdict& verdict) {
  Json moved = Json::array();
  for (const stats::MovedBound& bound : verdict.moved) {
    moved.push_back({{"unknown", bound.unknown},
                     {"end", bound.lower ? "low" : "high"},
                     {"stated", bound.stated},
                     {"moved_to", bound.moved_to},
                     {"misfit", number(bound.V)}});
  }
  return moved;
}

Json compared_json(const Outcome& outcome) {
  const stats::Verdict& verdict = outcome.judged.verdict;
  return {{"minus_two_ln_L", number(verdict.minus_two_ln_L)},
          {"K", verdict.K},
          {"AIC", number(verdict.AIC)},
          {"AICc", number(verdict.AICc)},
          {"BIC", number(verdict.BIC)},
          {"weight", number(outcome.weight)}};
}

Json hypothesis_json(const Study& study, const Outcome& outcome) {
  const StudyHypothesis& hypothesis = study.hypotheses.at(outcome.hypothesis);
  const stats::Verdict& verdict = outcome.judged.verdict;
  return {{"letter", hypothesis.letter},
          {"name", hypothesis.mechanism.title},
          {"file", hypothesis.file},
          {"verdict", decision_word(verdict.decision)},
          {"reason", verdict.reason},
          {"sentences", verdict.sentences},
          {"tests", tests_json(verdict)},
          {"compared", compared_json(outcome)},
          {"unknowns", unknowns_json(outcome)},
          {"moved_bounds", moved_json(verdict)},
          {"shares", shares_json(verdict)},
          {"search", search_json(outcome.judged.search)},
          {"residuals", residuals_json(outcome)}};
}

}  // namespace

std::string report_json(const Judgement& judgement) {
  Json hypotheses = Json::array();
  for (const Outcome& outcome : judgement.outcomes) {
    hypotheses.push_back(hypothesis_json(judgement.study, outcome));
  }
  Json warnings = Json::array();
  for (const core::Warning& warning : judgement.warnings) warnings.push_back(warning.what);
  Json fingerprints = Json::object();
  for (const Fingerprint& print : judgement.fingerprints) fingerprints[print.file] = print.sha256;
  const Json all = {{"study", judgement.study.title},
                    {"sentence", verdict_sentence(judgement)},
                    {"facts", facts(judgement)},
                    {"caution", caution()},
                    {"significance", judgement.study.significance},
                    {"look", "this look alone"},
                    {"hypotheses", std::move(hypotheses)},
                    {"warnings", std::move(warnings)},
                    {"seed", judgement.study.seed},
                    {"gainsay", judgement.version},
                    {"libraries", judgement.libraries},
                    {"fingerprints", std::move(fingerprints)}};
  // Names come from files: bytes that are no UTF-8 are replaced rather than refused.
  return all.dump(2, ' ', false, Json::error_handler_t::replace) + "\n";
}

}  // namespace gainsay::cli
