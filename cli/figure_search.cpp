#include "gainsay/cli/figure_search.h"

#include "gainsay/cli/number_text.h"
#include "gainsay/cli/panel.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

constexpr double kLogarithmicFrom = 20.0;  // worst end / best end

/// What a descent lowers and pages show: the misfit; with unknown noise, where that tells nothing,
/// -2 ln L.
double end_of(const estimation::Fit& fit, bool noise_unknown) {
  return noise_unknown ? fit.objective : fit.V;
}

std::vector<double> ends_best_first(const Outcome& outcome) {
  std::vector<double> ends;
  for (const estimation::Descent& descent : outcome.judged.search.descents) {
    const double end = end_of(descent.fit, outcome.judged.verdict.noise_unknown);
    if (std::isfinite(end)) ends.push_back(end);
  }
  std::sort(ends.begin(), ends.end());
  return ends;
}

double limit_of(const Outcome& outcome) {
  return outcome.judged.verdict.noise_unknown ? stats::kNotComputed
                                              : deciding_limit(outcome.judged.verdict).value;
}

Scale end_scale(const std::vector<double>& ends, double limit) {
  double low = ends.front();
  double high = ends.back();
  if (std::isfinite(limit)) {
    low = std::min(low, limit);
    high = std::max(high, limit);
  }
  return low > 0.0 && high > kLogarithmicFrom * low ? Scale::logarithmic(low, high)
                                                    : Scale::linear(low, high);
}

Markup limit_line(double limit, const Scale& y) {
  if (!std::isfinite(limit)) return {};
  const std::string at = from_top(y.place(limit));
  return tag("line", {{"class", "limit"}, {"x1", "0"}, {"x2", "100%"}, {"y1", at}, {"y2", at}},
             {}) +
         tag("text", {{"class", "limit"}, {"x", "100%"}, {"y", at}, {"dy", "-.4em"}},
             text("limit"));
}

Markup picture(const Contender& contender) {
  const std::vector<double> ends = ends_best_first(*contender.outcome);
  if (ends.empty()) return paragraph("No start could be brought to an end.");
  const bool noise_unknown = contender.outcome->judged.verdict.noise_unknown;
  const double limit = limit_of(*contender.outcome);
  Panel panel;
  panel.id = "search-" + contender.letter;
  panel.caption = noise_unknown ? "\u22122 ln L of every start, best first"
                                : "misfit of every start, best first";
  panel.alternative = "Ends of " + counted(ends.size(), "start", "starts") + " of " +
                      contender.letter + ", from " + significant(ends.front(), 4) + " to " +
                      significant(ends.back(), 4);
  panel.x = Scale::exact(0.0, static_cast<double>(ends.size()) + 1.0, false);
  panel.y = end_scale(ends, limit);
  panel.marks = limit_line(limit, panel.y);
  for (std::size_t i = 0; i < ends.size(); ++i) {
    panel.marks += tag("circle",
                       {{"class", "rest"},
                        {"cx", share_text(panel.x.place(static_cast<double>(i + 1)))},
                        {"cy", from_top(panel.y.place(ends[i]))},
                        {"r", "1.8"}},
                       {});
  }
  return figure(panel);
}

const estimation::Fit& fit_of(const Outcome& outcome, const estimation::Optimum& optimum) {
  return outcome.judged.search.descents.at(optimum.best_descent).fit;
}

/// A second optimum below the limit: the hypothesis fits in two ways.
bool fits_in_two_ways(const Outcome& outcome) {
  const auto& optima = outcome.judged.search.optima;
  const double limit = limit_of(outcome);
  return optima.size() > 1 && std::isfinite(limit) && fit_of(outcome, optima[1]).V <= limit;
}

std::string words_of(const Outcome& outcome) {
  const estimation::SearchResult& search = outcome.judged.search;
  std::string words = capitalized(counted(search.random_starts, "random start", "random starts"));
  if (search.replaced_starts > 0) {
    words += " (" + counted(search.replaced_starts, "further one", "further ones") +
             " could not be integrated)";
  }
  words += ", " + counted(search.optima.size(), "distinct optimum", "distinct optima");
  if (!search.optima.empty()) {
    words += "; the best was found " +
             (search.optima[0].found == 1 ? "once" : counted(search.optima[0].found, "", "times"));
  }
  words += ".";
  if (search.out_of_budget) words += " The budget of integrations ended first.";
  if (search.interrupted) words += " The search was interrupted.";
  if (fits_in_two_ways(outcome)) {
    words += " A second optimum also lies below the limit: the hypothesis fits in two ways.";
  }
  return words;
}

/// Both ways in which a hypothesis fits, unknown by unknown.
Markup two_ways(const Outcome& outcome) {
  if (!fits_in_two_ways(outcome) || outcome.problem == nullptr) return {};
  const auto& optima = outcome.judged.search.optima;
  const estimation::Fit& first = fit_of(outcome, optima[0]);
  const estimation::Fit& second = fit_of(outcome, optima[1]);
  NumberTable numbers;
  numbers.heads = {"unknown", "misfit " + significant(first.V, 4),
                   "misfit " + significant(second.V, 4)};
  numbers.words = {true, false, false};
  for (std::size_t i = 0; i < outcome.problem->unknowns.size(); ++i) {
    numbers.rows.push_back({outcome.problem->unknowns[i].name, significant(first.values.at(i), 4),
                            significant(second.values.at(i), 4)});
  }
  return table(numbers);
}

Markup numbers_behind(const Page& page) {
  NumberTable numbers;
  numbers.heads = {"hypothesis", "optimum",     "misfit", "\u22122 ln L, up to a constant",
                   "found",      "why it ended"};
  numbers.words = {true, false, false, false, false, true};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const auto& optima = contender.outcome->judged.search.optima;
    for (std::size_t i = 0; i < optima.size(); ++i) {
      const estimation::Fit& fit = fit_of(*contender.outcome, optima[i]);
      numbers.rows.push_back({contender.letter, std::to_string(i + 1), significant(fit.V, 6),
                              significant(fit.objective, 6), std::to_string(optima[i].found),
                              fit.why});
    }
  }
  return folded("Distinct optima and how often each was found, in numbers", table(numbers));
}

}  // namespace

Markup figure_search(const Page& page) {
  Markup all;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    all += tag("div", {{"class", "search " + classes(contender)}},
               tag("h3", letter_and_name(contender)) + picture(contender) +
                   paragraph(words_of(*contender.outcome)) + two_ways(*contender.outcome));
  }
  return tag("div", {{"class", "searches"}}, all) + numbers_behind(page);
}

}  // namespace gainsay::cli
