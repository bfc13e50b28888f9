#include "gainsay/cli/figure_fits.h"

#include "gainsay/cli/fitted_series.h"
#include "gainsay/cli/number_text.h"
#include "gainsay/cli/panel.h"

#include <nlohmann/json.hpp>

#include <algorithm>
#include <cmath>
#include <set>

namespace gainsay::cli {
namespace {

constexpr double kLeastShareOfRow = 0.25;  // a panel that fills less of a common scale gets its own
constexpr double kLetterHeight = 0.095;    // of a panel: 11 of its 118 pixels
constexpr std::size_t kMostColumns = 4;
constexpr std::size_t kOpenBoxes = 6;

struct Range {
  double low = std::numeric_limits<double>::infinity();
  double high = -std::numeric_limits<double>::infinity();
  void take(double value) {
    if (!std::isfinite(value)) return;
    low = std::min(low, value);
    high = std::max(high, value);
  }
  bool empty() const { return low > high; }
};

/// Readings with their sd bars, and the curves that are shown at first; on a logarithmic axis what
/// is above zero.
Range range_of(const SeriesPicture& picture, bool logarithmic) {
  Range range;
  const auto take = [&](double value) {
    if (!logarithmic || value > 0.0) range.take(value);
  };
  for (const Reading& reading : picture.readings) {
    take(reading.value);
    if (!std::isfinite(reading.sd)) continue;
    take(reading.value + reading.sd);
    if (!logarithmic) take(reading.value - reading.sd);
  }
  for (const FitOfSeries& fit : picture.fits) {
    if (fit.curve == nullptr || !fit.contender->shown_at_first) continue;
    // A curve that falls by orders of magnitude would flatten the readings of a logarithmic panel.
    if (logarithmic) continue;
    for (const double value : fit.curve->shown) take(value);
  }
  return range;
}

double extent(const Range& range, bool logarithmic) {
  return logarithmic ? std::log(range.high / range.low) : range.high - range.low;
}

struct RowScales {
  std::vector<Scale> scales;  // one a picture
  bool differ = false;
};

Scale scale_for(const Range& range, bool logarithmic) {
  if (range.empty()) return Scale::exact(logarithmic ? 0.1 : 0.0, 1.0, logarithmic);
  return logarithmic ? Scale::logarithmic(range.low, range.high)
                     : Scale::linear(range.low, range.high);
}

RowScales scales_of_row(const std::vector<const SeriesPicture*>& row, bool logarithmic) {
  Range all;
  std::vector<Range> ranges;
  for (const SeriesPicture* picture : row) {
    ranges.push_back(range_of(*picture, logarithmic));
    all.take(ranges.back().low);
    all.take(ranges.back().high);
  }
  RowScales scales;
  for (const Range& range : ranges) {
    scales.differ =
        scales.differ || (!range.empty() &&
                          extent(range, logarithmic) < kLeastShareOfRow * extent(all, logarithmic));
  }
  for (const Range& range : ranges) {
    scales.scales.push_back(scale_for(scales.differ ? range : all, logarithmic));
  }
  return scales;
}

Scale time_scale(const Page& page, std::size_t experiment) {
  Range range;
  const estimation::Experiment& run = page.study().experiments[experiment];
  range.take(run.begins);
  for (const estimation::Series& series : run.series) {
    for (const estimation::Point& point : series.points) range.take(point.time);
  }
  if (range.low == range.high) range.high = range.low + 1.0;
  return Scale::exact(range.low, range.high, false);
}

Markup mark_of(const Reading& reading, const Panel& panel) {
  const std::string x = share_text(panel.x.place(reading.time));
  if (!panel.y.can_show(reading.value)) {
    return tag("svg", {{"class", "spot"}, {"x", x}, {"y", "100%"}},
               tag("path", {{"class", "below"}, {"d", "M-3.5-7H3.5L0-1Z"}},
                   tag("title", text("at or below zero: " + significant(reading.value, 3)))));
  }
  const double y = panel.y.place(reading.value);
  Markup mark;
  if (std::isfinite(reading.sd) && reading.left_out.empty()) {
    const double low = std::max(0.0, panel.y.place(reading.value - reading.sd));
    const double high = panel.y.place(reading.value + reading.sd);
    mark += tag(
        "line",
        {{"class", "sd"}, {"x1", x}, {"x2", x}, {"y1", from_top(low)}, {"y2", from_top(high)}}, {});
  }
  if (reading.left_out.empty()) {
    return mark +
           tag("circle", {{"class", "reading"}, {"cx", x}, {"cy", from_top(y)}, {"r", "2.1"}}, {});
  }
  return mark + tag("svg", {{"class", "spot"}, {"x", x}, {"y", from_top(y)}},
                    tag("path", {{"class", "left-out"}, {"d", "M-3-3L3 3M-3 3L3-3"}},
                        tag("title", text("left out: " + reading.left_out))));
}

std::vector<Corner> corners(const estimation::Curve& curve, const Panel& panel) {
  std::vector<Corner> corners;
  for (std::size_t i = 0; i < curve.times.size(); ++i) {
    corners.push_back({panel.x.place(curve.times[i]), panel.y.place(curve.shown[i])});
  }
  return corners;
}

/// Letters at the right edge, each joined to the end of its curve by a short line.
Markup end_letters(const std::vector<const Contender*>& who, const std::vector<double>& ends) {
  const std::vector<double> places = pulled_apart(ends, kLetterHeight);
  Markup leaders;
  Markup letters;
  for (std::size_t i = 0; i < who.size(); ++i) {
    const auto y = [](double share) { return coordinate(100.0 * (1.0 - share)); };
    leaders += tag("path",
                   {{"class", "leader " + classes(*who[i])},
                    {"d", "M0 " + y(std::clamp(ends[i], 0.0, 1.0)) + "L8 " + y(places[i])}},
                   {});
    letters += tag("text",
                   {{"class", "end " + classes(*who[i])},
                    {"x", "100%"},
                    {"dx", "10"},
                    {"y", from_top(places[i])},
                    {"dy", ".36em"}},
                   text(who[i]->letter));
  }
  return tag("svg",
             {{"class", "leaders"},
              {"x", "100%"},
              {"width", "8"},
              {"height", "100%"},
              {"viewBox", "0 0 8 100"},
              {"preserveAspectRatio", "none"}},
             leaders) +
         letters;
}

std::string alternative(const Page& page, const SeriesPicture& picture) {
  std::string letters;
  for (const FitOfSeries& fit : picture.fits) {
    if (fit.curve != nullptr) letters += (letters.empty() ? "" : ", ") + fit.contender->letter;
  }
  return title_of(page.study().readouts[picture.readout]) + " in " +
         title_of(page.study().experiments[picture.experiment]) + ": " +
         counted(picture.readings.size(), "reading", "readings") + " and the fits of " + letters +
         "; the numbers stand in the table below";
}

Markup panel_of(const Page& page, const SeriesPicture& picture, const Scale& y) {
  Panel panel;
  panel.id = panel_id(picture);
  panel.caption = title_of(page.study().experiments[picture.experiment]);
  panel.alternative = alternative(page, picture);
  panel.x = time_scale(page, picture.experiment);
  panel.y = y;
  panel.x_unit = page.study().time_unit;
  std::vector<const Contender*> who;
  std::vector<double> ends;
  for (const FitOfSeries& fit : picture.fits) {
    if (fit.curve == nullptr || fit.curve->times.empty()) continue;
    const std::vector<Corner> line = corners(*fit.curve, panel);
    // The first in the line-up lies on top.
    panel.curves =
        tag("path", {{"class", "curve " + classes(*fit.contender)}, {"d", stretched_path(line)}},
            {}) +
        panel.curves;
    who.push_back(fit.contender);
    ends.push_back(line.back().y);
  }
  for (const Reading& reading : picture.readings) panel.marks += mark_of(reading, panel);
  panel.marks += end_letters(who, ends);
  return figure(panel);
}

Markup row_head(const estimation::Readout& readout, bool scales_differ, bool below) {
  Markup head = tag("b", text(title_of(readout)));
  std::string rest;
  const auto add = [&](const std::string& words) { rest += ", " + words; };
  if (!readout.unit.empty()) add(readout.unit);
  if (readout.logarithmic_axis)
    add(below ? "log; readings at or below zero at the lower edge" : "log");
  if (scales_differ) add("scales differ");
  return tag("h3", head + text(rest));
}

std::size_t columns_for(std::size_t experiments) {
  if (experiments <= kMostColumns) return experiments;
  return experiments % 3 == 0 && experiments % 4 != 0 ? 3 : kMostColumns;
}

Markup row_of(const Page& page, std::size_t readout, const std::vector<SeriesPicture>& pictures,
              bool first) {
  std::vector<const SeriesPicture*> row;
  for (const SeriesPicture& picture : pictures) {
    if (picture.readout == readout) row.push_back(&picture);
  }
  const estimation::Readout& shown = page.study().readouts[readout];
  const RowScales scales = scales_of_row(row, shown.logarithmic_axis);
  const std::size_t experiments = page.study().experiments.size();
  const std::size_t columns = columns_for(experiments);
  const bool one_band = columns == experiments;
  Markup panels;
  std::size_t next = 0;
  for (std::size_t i = 0; i < row.size(); ++i) {
    // A gap keeps the columns where an experiment has no such readings.
    for (; one_band && next < row[i]->experiment; ++next) {
      panels += tag("div", {{"class", "gap"}}, {});
    }
    panels += panel_of(page, *row[i], scales.scales[i]);
    next = row[i]->experiment + 1;
  }
  const std::string kind =
      "panels columns-" + std::to_string(columns) + (first || !one_band ? " headed" : "");
  const bool below =
      shown.logarithmic_axis &&
      std::any_of(row.begin(), row.end(), [](const SeriesPicture* picture) {
        return std::any_of(picture->readings.begin(), picture->readings.end(),
                           [](const Reading& reading) { return reading.value <= 0.0; });
      });
  return row_head(shown, scales.differ, below) + tag("div", {{"class", kind}}, panels);
}

Markup left_out_list(const std::vector<SeriesPicture>& pictures) {
  std::set<std::string> reasons;
  std::size_t points = 0;
  for (const SeriesPicture& picture : pictures) {
    for (const Reading& reading : picture.readings) {
      if (reading.left_out.empty()) continue;
      ++points;
      reasons.insert(reading.left_out);
    }
  }
  if (points == 0) return {};
  std::string words = "Crosses: " + counted(points, "reading", "readings") + " left out (";
  for (const std::string& reason : reasons) {
    words += (reason == *reasons.begin() ? "" : "; ") + reason;
  }
  return tag("p", {{"class", "aside"}}, text(words + ")."));
}

Markup numbers_behind(const Page& page, const std::vector<SeriesPicture>& pictures) {
  NumberTable numbers;
  numbers.heads = {"readout", "experiment", "time", "reading", "sd"};
  numbers.words = {true, true, false, false, false};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    numbers.heads.push_back(contender.letter + " shows");
    numbers.words.push_back(false);
  }
  numbers.heads.push_back("left out");
  numbers.words.push_back(true);
  for (const SeriesPicture& picture : pictures) {
    for (std::size_t i = 0; i < picture.readings.size(); ++i) {
      const Reading& reading = picture.readings[i];
      std::vector<std::string> row = {page.study().readouts[picture.readout].name,
                                      page.study().experiments[picture.experiment].name,
                                      significant(reading.time, 4), significant(reading.value, 4),
                                      significant(reading.sd, 3)};
      for (const FitOfSeries& fit : picture.fits) {
        const auto found = fit.residuals.find(i);
        row.push_back(significant(
            found == fit.residuals.end() ? stats::kNotComputed : found->second.shown, 4));
      }
      row.push_back(reading.left_out);
      numbers.rows.push_back(std::move(row));
    }
  }
  return folded("Readings and what each hypothesis shows, in numbers", table(numbers));
}

Markup box_of(const Contender& contender) {
  const std::string id = "tick-" + contender.letter;
  const Markup box =
      contender.shown_at_first
          ? void_tag("input",
                     {{"type", "checkbox"}, {"id", id}, {"checked", ""}, {"autocomplete", "off"}})
          : void_tag("input", {{"type", "checkbox"}, {"id", id}, {"autocomplete", "off"}});
  return tag("label", {{"class", "h" + std::to_string(contender.hue)}},
             box + Markup::raw(" ") + letter_and_name(contender));
}

}  // namespace

Markup tick_boxes(const Page& page) {
  Markup open;
  Markup rest;
  for (std::size_t i = 0; i < page.contenders.size(); ++i) {
    if (page.contenders[i].outcome == nullptr) continue;
    (i < kOpenBoxes ? open : rest) += box_of(page.contenders[i]);
  }
  if (!rest.empty()) open += folded("further hypotheses", rest);
  return tag("fieldset", {{"class", "ticks"}},
             tag("legend", {{"class", "unseen"}}, text("hypotheses shown in the pictures")) + open);
}

Markup figure_fits(const Page& page) {
  const std::vector<SeriesPicture> pictures = series_pictures(page);
  Markup rows;
  bool first = true;
  for (std::size_t r = 0; r < page.study().readouts.size(); ++r) {
    const bool any = std::any_of(pictures.begin(), pictures.end(),
                                 [&](const SeriesPicture& p) { return p.readout == r; });
    if (!any) continue;
    rows += row_of(page, r, pictures, first);
    first = false;
  }
  return rows + left_out_list(pictures) + numbers_behind(page, pictures);
}

std::string panel_numbers(const Page& page) {
  nlohmann::ordered_json panels = nlohmann::ordered_json::object();
  for (const SeriesPicture& picture : series_pictures(page)) {
    nlohmann::ordered_json numbers;
    for (std::size_t i = 0; i < picture.readings.size(); ++i) {
      const Reading& reading = picture.readings[i];
      if (!reading.left_out.empty()) continue;
      numbers["t"].push_back(significant(reading.time, 4));
      numbers["v"].push_back(significant(reading.value, 4));
      numbers["sd"].push_back(significant(reading.sd, 2));
      for (const FitOfSeries& fit : picture.fits) {
        const auto found = fit.residuals.find(i);
        const bool none = found == fit.residuals.end();
        numbers["shown"][fit.contender->letter].push_back(
            none ? ""
                 : significant(found->second.shown, 4) + " (" + fixed(found->second.r, 1) + " sd)");
      }
    }
    numbers["unit"] = page.study().readouts[picture.readout].unit;
    numbers["time"] = page.study().time_unit;
    panels[panel_id(picture)] = std::move(numbers);
  }
  return panels.dump();
}

}  // namespace gainsay::cli
