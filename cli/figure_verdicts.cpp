#include "gainsay/cli/figure_verdicts.h"

#include "gainsay/cli/number_text.h"
#include "gainsay/cli/scale.h"
#include "gainsay/cli/verdict_words.h"

#include <algorithm>
#include <cmath>
#include <optional>

namespace gainsay::cli {
namespace {

constexpr double kLeft = 0.03;  // shares of the column that stay free, for shapes at the ends
constexpr double kRight = 0.96;
constexpr double kLogarithmicFrom = 4.0;  // a farthest rival beyond this many limits

/// Takes distances (1 is the limit) to shares of the column.
struct BarAxis {
  Scale scale;
  double at(double distance) const {
    return kLeft + (kRight - kLeft) * std::clamp(scale.place(distance), 0.0, 1.0);
  }
};

std::vector<double> other_limits(const stats::Verdict& verdict) {
  std::vector<double> ratios;
  if (verdict.noise_unknown) return ratios;
  for (const stats::Limit* limit : {&verdict.full, &verdict.reduced}) {
    const double ratio = limit->value / deciding_limit(verdict).value;
    if (limit != &deciding_limit(verdict) && std::isfinite(ratio)) ratios.push_back(ratio);
  }
  return ratios;
}

BarAxis bar_axis(const Page& page) {
  double low = 0.9;
  double high = 1.1;
  bool noise_unknown = false;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const stats::Verdict& verdict = contender.outcome->judged.verdict;
    noise_unknown = noise_unknown || verdict.noise_unknown;
    std::vector<double> all = other_limits(verdict);
    all.push_back(distance(verdict));
    for (const double ratio : all) {
      if (!std::isfinite(ratio) || ratio <= 0.0) continue;
      low = std::min(low, ratio);
      high = std::max(high, ratio);
    }
  }
  const bool logarithmic = noise_unknown || high > kLogarithmicFrom;
  return {Scale::exact(low, high, logarithmic)};
}

/// A point of the drawing's own units at a share of the width, in the middle of the row.
Markup at_share(double share, const Markup& drawing) {
  return tag("svg", {{"x", share_text(share)}, {"y", "50%"}, {"class", "spot"}}, drawing);
}

Markup end_shape(const Contender& contender) {
  Markup shape =
      tag("circle", {{"class", not_rejected(contender) ? "full" : "ring"}, {"r", "5"}}, {});
  if (undecided(contender)) {
    shape += tag("path", {{"class", "full"}, {"d", "M0-5A5 5 0 0 0 0 5Z"}}, {});
  }
  return shape;
}

Markup bar(const Contender& contender, const BarAxis& axis) {
  Markup drawing = tag("line",
                       {{"class", "limit"},
                        {"x1", share_text(axis.at(1.0))},
                        {"x2", share_text(axis.at(1.0))},
                        {"y1", "0"},
                        {"y2", "100%"}},
                       {});
  if (contender.outcome == nullptr) return drawing;
  const stats::Verdict& verdict = contender.outcome->judged.verdict;
  for (const double ratio : other_limits(verdict)) {
    drawing += at_share(axis.at(ratio), tag("path", {{"class", "other"}, {"d", "M0-7V7"}}, {}));
  }
  const double away = distance(verdict);
  if (std::isnan(away)) return drawing;
  const double end = axis.at(away);
  drawing += tag("line",
                 {{"class", "bar"},
                  {"x1", share_text(axis.at(1.0))},
                  {"x2", share_text(end)},
                  {"y1", "50%"},
                  {"y2", "50%"}},
                 {});
  return drawing + at_share(end, end_shape(contender));
}

std::string described(const Contender& contender) {
  if (contender.outcome == nullptr) return contender.letter + " was not judged";
  const stats::Verdict& verdict = contender.outcome->judged.verdict;
  const double away = distance(verdict);
  if (std::isnan(away)) return contender.letter + ": " + verdict_word(contender);
  return contender.letter + ": " + verdict_word(contender) + ", " + significant(away, 3) +
         (verdict.noise_unknown ? " times alpha / P" : " times its limit");
}

Markup cell(const std::string& kind, const std::string& head, const Markup& content) {
  return tag("td", {{"role", "cell"}, {"class", kind}, {"data-head", head}}, content);
}

Markup row(const Contender& contender, const BarAxis& axis) {
  Markup heading = tag("span", {{"class", "who"}}, letter_and_name(contender));
  std::string misfit = significant(stats::kNotComputed, 1);
  std::string limit = misfit;
  std::string p_value = misfit;
  if (contender.outcome != nullptr) {
    const stats::Verdict& verdict = contender.outcome->judged.verdict;
    if (!verdict.reason.empty()) {
      heading += tag("span", {{"class", "reason"}}, text(with_raised_powers(verdict.reason)));
    }
    if (!verdict.noise_unknown) {
      misfit = significant(verdict.V, 4);
      limit = significant(deciding_limit(verdict).value, 4);
    }
    p_value = p_text(verdict.p_value);
  }
  const Markup drawing =
      tag("svg", {{"role", "img"}, {"aria-label", described(contender)}}, bar(contender, axis));
  return tag("tr", {{"role", "row"}, {"class", "h" + std::to_string(contender.hue)}},
             tag("th", {{"role", "rowheader"}, {"scope", "row"}}, heading) +
                 cell("drawn", "", drawing) + cell("n", "misfit", text(misfit)) +
                 cell("n", "limit", text(limit)) + cell("n", "P", text(p_value)) +
                 cell("word", "", verdict_shape(contender) + text(verdict_word(contender))));
}

std::string tick_label(double ratio, bool noise_unknown) {
  if (noise_unknown) {
    return ratio < 1.0 ? "α · " + short_number(1.0 / ratio, 2) : "α / " + short_number(ratio, 2);
  }
  return short_number(ratio, 2) + " ×";
}

Markup axis_row(const BarAxis& axis, bool noise_unknown) {
  Markup labels =
      tag("text", {{"x", share_text(axis.at(1.0))}, {"y", "13"}, {"text-anchor", "middle"}},
          text(noise_unknown ? "α" : "limit"));
  double last = axis.at(1.0);
  constexpr double kApart = 0.14;  // of the width: labels do not touch
  std::vector<Tick> ticks = axis.scale.ticks(axis.scale.is_logarithmic() ? 5 : 3);
  for (const Tick& tick : ticks) {
    const double at = axis.at(tick.value);
    if (tick.value <= 1.0 || at - last < kApart || at > kRight) continue;
    labels += tag("text", {{"x", share_text(at)}, {"y", "13"}, {"text-anchor", "middle"}},
                  text(tick_label(tick.value, noise_unknown)));
    last = at;
  }
  return tag("tr", {{"role", "row"}, {"class", "axis"}},
             tag("td", {{"role", "cell"}}, {}) +
                 tag("td", {{"role", "cell"}, {"class", "drawn"}},
                     tag("svg", {{"aria-hidden", "true"}}, labels)) +
                 tag("td", {{"role", "cell"}, {"colspan", "4"}}, {}));
}

Markup head_row() {
  Markup heads = tag("th", {{"role", "columnheader"}, {"scope", "col"}}, text("hypothesis")) +
                 tag("th", {{"role", "columnheader"}, {"scope", "col"}, {"class", "drawn"}},
                     text("against its limit"));
  for (const char* head : {"misfit", "limit", "P"}) {
    heads += tag("th", {{"role", "columnheader"}, {"scope", "col"}, {"class", "n"}}, text(head));
  }
  heads += tag("th", {{"role", "columnheader"}, {"scope", "col"}}, text("verdict"));
  return tag("tr", {{"role", "row"}}, heads);
}

}  // namespace

Markup figure_verdicts(const Page& page) {
  const BarAxis axis = bar_axis(page);
  bool noise_unknown = false;
  Markup rows;
  for (const Contender& contender : page.contenders) {
    rows += row(contender, axis);
    noise_unknown = noise_unknown || (contender.outcome != nullptr &&
                                      contender.outcome->judged.verdict.noise_unknown);
  }
  return tag("table", {{"class", "verdicts"}, {"role", "table"}},
             tag("thead", {{"role", "rowgroup"}}, head_row()) +
                 tag("tbody", {{"role", "rowgroup"}}, rows + axis_row(axis, noise_unknown)));
}

}  // namespace gainsay::cli
