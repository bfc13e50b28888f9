#include "gainsay/cli/figure_unknowns.h"

#include "gainsay/cli/number_text.h"
#include "gainsay/cli/scale.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

struct Row {
  stats::Interval interval;
  const estimation::Unknown* unknown = nullptr;
};

bool out_of_order(const Row& row) { return !row.interval.determined || row.interval.on_bound; }

std::vector<Row> rows_of(const Outcome& outcome) {
  std::vector<Row> rows;
  if (outcome.problem == nullptr) return rows;
  for (const stats::Interval& interval : outcome.judged.verdict.intervals) {
    const auto& unknowns = outcome.problem->unknowns;
    const auto found =
        std::find_if(unknowns.begin(), unknowns.end(),
                     [&](const estimation::Unknown& u) { return u.name == interval.unknown; });
    rows.push_back({interval, found == unknowns.end() ? nullptr : &*found});
  }
  std::stable_sort(rows.begin(), rows.end(),
                   [](const Row& a, const Row& b) { return out_of_order(a) > out_of_order(b); });
  return rows;
}

Markup span(const std::string& kind, double from, double to) {
  return tag("line",
             {{"class", kind},
              {"x1", share_text(std::clamp(from, 0.0, 1.0))},
              {"x2", share_text(std::clamp(to, 0.0, 1.0))},
              {"y1", "50%"},
              {"y2", "50%"}},
             {});
}

/// The range searched as a thin line, the interval as a thick one, the estimate as a dot.
Markup bar_of(const Row& row) {
  const estimation::Unknown& unknown = *row.unknown;
  const Scale scale = Scale::exact(unknown.low, unknown.high, !unknown.linear);
  Markup bar = span("range", 0.0, 1.0);
  const stats::Interval& interval = row.interval;
  if (interval.determined && std::isfinite(interval.low) && std::isfinite(interval.high)) {
    bar += span("interval", scale.place(interval.low), scale.place(interval.high));
  }
  if (std::isfinite(interval.estimate)) {
    bar += tag("circle",
               {{"class", interval.determined ? "full" : "ring"},
                {"cx", share_text(std::clamp(scale.place(interval.estimate), 0.0, 1.0))},
                {"cy", "50%"},
                {"r", "3.2"}},
               {});
  }
  return tag("svg", {{"role", "img"}, {"aria-label", interval.unknown + " in the range searched"}},
             bar);
}

std::string interval_text(const stats::Interval& interval) {
  if (!interval.determined || !std::isfinite(interval.low) || !std::isfinite(interval.high)) {
    return significant(stats::kNotComputed, 1);
  }
  return significant(interval.low, 3) + " to " + significant(interval.high, 3);
}

std::string words_of(const stats::Interval& interval) {
  if (!interval.words.empty()) return interval.words;
  if (!interval.determined) return "not determined by these data";
  return interval.on_bound ? "on the edge of its range" : "";
}

Markup cell(const std::string& kind, const std::string& words) {
  return tag("td", {{"class", kind}}, text(words));
}

Markup table_row(const Row& row) {
  const stats::Interval& interval = row.interval;
  Markup name = text(interval.unknown);
  std::string low = "";
  std::string high = "";
  Markup bar;
  if (row.unknown != nullptr) {
    low = short_number(row.unknown->low, 2);
    high = short_number(row.unknown->high, 2);
    bar = bar_of(row);
    if (!row.unknown->unit.empty()) {
      name += tag("span", {{"class", "unit"}}, text(" " + row.unknown->unit));
    }
  }
  return tag("tr", tag("th", {{"scope", "row"}}, name) +
                       cell("n", significant(interval.estimate, 4)) +
                       cell("n interval", interval_text(interval)) + cell("n edge", low) +
                       tag("td", {{"class", "drawn"}}, bar) + cell("edge", high) +
                       cell("words", words_of(interval)));
}

Markup heads() {
  Markup cells;
  for (const auto& [words, kind] :
       {std::pair{"unknown", ""}, std::pair{"estimate", "n"},
        std::pair{"linear interval", "n interval"}, std::pair{"from", "n edge"},
        std::pair{"range searched", "drawn"}, std::pair{"to", "edge"}, std::pair{"", "words"}}) {
    cells += tag("th", {{"scope", "col"}, {"class", kind}}, text(words));
  }
  return tag("thead", tag("tr", cells));
}

}  // namespace

Markup figure_unknowns(const Page& page) {
  Markup tables;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    Markup rows;
    for (const Row& row : rows_of(*contender.outcome)) rows += table_row(row);
    if (rows.empty()) continue;
    tables +=
        tag("div", {{"class", "unknowns " + classes(contender)}},
            tag("h3", letter_and_name(contender)) + tag("table", heads() + tag("tbody", rows)));
  }
  return tables;
}

}  // namespace gainsay::cli
