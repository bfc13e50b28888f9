#include "gainsay/cli/figure_residuals.h"

#include "gainsay/cli/fitted_series.h"
#include "gainsay/cli/number_text.h"
#include "gainsay/cli/panel.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

constexpr double kLeastScale = 3.5;  // sd
constexpr double kMostScale = 8.0;
constexpr double kCrowdedFrom = 5.5;
constexpr double kInset = 0.05;  // of an experiment's stretch that stays free at each end

/// The same scale for all hypotheses: what those shown at first need, within bounds.
Scale residual_scale(const std::vector<SeriesPicture>& pictures) {
  double most = kLeastScale;
  for (const SeriesPicture& picture : pictures) {
    for (const FitOfSeries& fit : picture.fits) {
      if (!fit.contender->shown_at_first) continue;
      for (const auto& [number, residual] : fit.residuals) {
        if (std::isfinite(residual.r)) most = std::max(most, 1.1 * std::abs(residual.r));
      }
    }
  }
  most = std::min(most, kMostScale);
  return Scale::exact(-most, most, false);
}

Markup mark_of(double x, double r, const Scale& scale) {
  if (std::abs(r) <= scale.high()) {
    return tag(
        "circle",
        {{"class", "rest"}, {"cx", share_text(x)}, {"cy", from_top(scale.place(r))}, {"r", "2"}},
        {});
  }
  const bool above = r > 0.0;
  return tag(
      "svg", {{"class", "spot"}, {"x", share_text(x)}, {"y", above ? "0" : "100%"}},
      tag("path", {{"class", "beyond"}, {"d", above ? "M-3 6H3L0 0Z" : "M-3-6H3L0 0Z"}}, {}));
}

/// Residuals of one series in the stretch from `left` to `right` of the cell, evenly spaced in
/// order of time.
void draw_series(const FitOfSeries& fit, double left, double right, const Scale& scale,
                 Panel& panel) {
  const double count = static_cast<double>(fit.residuals.size());
  std::vector<Corner> line;
  double place = 0.5;
  for (const auto& [number, residual] : fit.residuals) {
    const double inside = kInset + (1.0 - 2.0 * kInset) * place / count;
    place += 1.0;
    if (!std::isfinite(residual.r)) continue;
    const double x = left + (right - left) * inside;
    line.push_back({x, scale.place(residual.r)});
    panel.marks += mark_of(x, residual.r, scale);
  }
  panel.curves += tag("path", {{"class", "joined"}, {"d", stretched_path(line)}}, {});
}

Markup level(double at, const std::string& kind, const std::string& label) {
  return tag("line",
             {{"class", kind},
              {"x1", "0"},
              {"x2", "100%"},
              {"y1", from_top(at)},
              {"y2", from_top(at)}},
             {}) +
         tag("text", {{"class", "y"}, {"x", "-6"}, {"y", from_top(at)}, {"dy", ".33em"}},
             text(label));
}

/// Lines at 0 and two sd to both sides; where these would crowd, numbers stand at five sd instead.
Markup levels(const Scale& scale) {
  const bool crowded = scale.high() > kCrowdedFrom;
  Markup all = level(scale.place(0.0), "zero", "0");
  for (const double r : {-2.0, 2.0})
    all += level(scale.place(r), "two", crowded ? "" : fixed(r, 0));
  if (!crowded) return all;
  for (const double r : {-5.0, 5.0}) all += level(scale.place(r), "faint", fixed(r, 0));
  return all;
}

Markup experiment_marks(std::size_t number, std::size_t count, std::size_t experiment,
                        const std::string& name) {
  const double left = static_cast<double>(number) / static_cast<double>(count);
  const double middle = (static_cast<double>(number) + 0.5) / static_cast<double>(count);
  Markup marks;
  if (number > 0) {
    marks += tag("line",
                 {{"class", "between"},
                  {"x1", share_text(left)},
                  {"x2", share_text(left)},
                  {"y1", "0"},
                  {"y2", "100%"}},
                 {});
  }
  return marks + tag("text",
                     {{"class", "x"}, {"x", share_text(middle)}, {"y", "100%"}, {"dy", "1.35em"}},
                     tag("title", text(name)) + text(std::to_string(experiment + 1)));
}

/// The words of a cell for those who do not see it.
std::string alternative(const Contender& contender, const std::string& readout,
                        const std::vector<const SeriesPicture*>& pictures) {
  double most = 0.0;
  for (const SeriesPicture* picture : pictures) {
    for (const FitOfSeries& fit : picture->fits) {
      if (fit.contender != &contender) continue;
      for (const auto& [number, residual] : fit.residuals)
        most = std::fmax(most, std::abs(residual.r));
    }
  }
  return "Residuals of " + contender.letter + " in " + readout + ", the largest " + fixed(most, 1) +
         " sd";
}

Markup cell_of(const Page& page, const Contender& contender, std::size_t readout,
               const std::vector<const SeriesPicture*>& pictures, const Scale& scale) {
  const std::size_t count = pictures.size();
  Panel panel;
  for (std::size_t i = 0; i < count; ++i) {
    const double left = static_cast<double>(i) / static_cast<double>(count);
    const double right = static_cast<double>(i + 1) / static_cast<double>(count);
    for (const FitOfSeries& fit : pictures[i]->fits) {
      if (fit.contender == &contender) draw_series(fit, left, right, scale, panel);
    }
  }
  const std::string name = title_of(page.study().readouts[readout]);
  Markup drawing = levels(scale);
  for (std::size_t i = 0; i < count; ++i) {
    const std::size_t experiment = pictures[i]->experiment;
    drawing +=
        experiment_marks(i, count, experiment, title_of(page.study().experiments[experiment]));
  }
  drawing += tag("svg",
                 {{"class", "square"},
                  {"viewBox", "0 0 1000 1000"},
                  {"preserveAspectRatio", "none"},
                  {"width", "100%"},
                  {"height", "100%"}},
                 panel.curves) +
             panel.marks;
  return tag(
      "figure", {{"class", "panel residuals"}},
      tag("figcaption", text(name)) +
          tag("svg", {{"role", "img"}, {"aria-label", alternative(contender, name, pictures)}},
              drawing));
}

Markup row_of(const Page& page, const Contender& contender,
              const std::vector<SeriesPicture>& pictures, const Scale& scale) {
  Markup cells;
  std::size_t columns = 0;
  for (std::size_t r = 0; r < page.study().readouts.size(); ++r) {
    std::vector<const SeriesPicture*> of_readout;
    for (const SeriesPicture& picture : pictures) {
      if (picture.readout == r) of_readout.push_back(&picture);
    }
    if (of_readout.empty()) continue;
    cells += cell_of(page, contender, r, of_readout, scale);
    ++columns;
  }
  const std::string kind =
      "panels headed columns-" + std::to_string(std::clamp<std::size_t>(columns, 1, 4));
  return tag("div", {{"class", classes(contender)}},
             tag("h3", letter_and_name(contender)) + tag("div", {{"class", kind}}, cells));
}

Markup numbers_behind(const Page& page, const std::vector<SeriesPicture>& pictures) {
  NumberTable numbers;
  numbers.heads = {"readout", "experiment", "time"};
  numbers.words = {true, true, false};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    numbers.heads.push_back(contender.letter);
    numbers.words.push_back(false);
  }
  for (const SeriesPicture& picture : pictures) {
    for (std::size_t i = 0; i < picture.readings.size(); ++i) {
      if (!picture.readings[i].left_out.empty()) continue;
      std::vector<std::string> row = {page.study().readouts[picture.readout].name,
                                      page.study().experiments[picture.experiment].name,
                                      significant(picture.readings[i].time, 4)};
      for (const FitOfSeries& fit : picture.fits) {
        const auto found = fit.residuals.find(i);
        row.push_back(
            fixed(found == fit.residuals.end() ? stats::kNotComputed : found->second.r, 2));
      }
      numbers.rows.push_back(std::move(row));
    }
  }
  return folded("Standardized residuals, in numbers", table(numbers));
}

Markup list_of_experiments(const Page& page) {
  std::string words;
  for (std::size_t e = 0; e < page.study().experiments.size(); ++e) {
    words +=
        (e == 0 ? "" : "; ") + std::to_string(e + 1) + " " + title_of(page.study().experiments[e]);
  }
  return tag("p", {{"class", "aside"}}, text(words + "."));
}

}  // namespace

Markup figure_residuals(const Page& page) {
  const std::vector<SeriesPicture> pictures = series_pictures(page);
  const Scale scale = residual_scale(pictures);
  Markup rows;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome != nullptr) rows += row_of(page, contender, pictures, scale);
  }
  return rows + list_of_experiments(page) + numbers_behind(page, pictures);
}

}  // namespace gainsay::cli
