#include "gainsay/cli/panel.h"

#include "gainsay/cli/number_text.h"

#include <algorithm>
#include <cmath>
#include <optional>

namespace gainsay::cli {
namespace {

constexpr double kSide = 1000.0;
constexpr double kFarOutside = 3.0;  // shares beyond the edges at which curves are cut

Corner in_square(const Corner& point) {
  const auto near = [](double share) { return std::clamp(share, -kFarOutside, 1.0 + kFarOutside); };
  return {kSide * near(point.x), kSide * (1.0 - near(point.y))};
}

double distance_to_chord(const Corner& point, const Corner& from, const Corner& to) {
  const double dx = to.x - from.x;
  const double dy = to.y - from.y;
  const double length = std::hypot(dx, dy);
  if (length == 0.0) return std::hypot(point.x - from.x, point.y - from.y);
  return std::abs(dx * (point.y - from.y) - dy * (point.x - from.x)) / length;
}

/// Keeps the ends of points[first..last] and, where the farthest point between them is too far from
/// the chord, that point and what the two halves keep.
void keep(const std::vector<Corner>& points, std::size_t first, std::size_t last,
          std::vector<bool>& kept) {
  kept[first] = kept[last] = true;
  std::size_t farthest = first;
  double most = kCurveTolerance;
  for (std::size_t i = first + 1; i < last; ++i) {
    const double away = distance_to_chord(points[i], points[first], points[last]);
    if (away > most) {
      most = away;
      farthest = i;
    }
  }
  if (farthest == first) return;
  keep(points, first, farthest, kept);
  keep(points, farthest, last, kept);
}

std::string path_of_stretch(const std::vector<Corner>& points) {
  if (points.size() < 2) return {};
  std::vector<bool> kept(points.size(), false);
  keep(points, 0, points.size() - 1, kept);
  std::string d;
  for (std::size_t i = 0; i < points.size(); ++i) {
    if (!kept[i]) continue;
    const auto whole = [](double v) { return std::to_string(std::lround(v)); };
    d += (i == 0 ? "M" : "L") + whole(points[i].x) + " " + whole(points[i].y);
  }
  return d;
}

Markup rule(const std::string& kind, double x1, double x2, double y1, double y2) {
  return tag("line",
             {{"class", kind},
              {"x1", share_text(x1)},
              {"x2", share_text(x2)},
              {"y1", from_top(y1)},
              {"y2", from_top(y2)}},
             {});
}

Markup axes(const Panel& panel) {
  Markup drawing;
  for (const Tick& tick : panel.y.ticks(3)) {
    drawing += rule("grid", 0.0, 1.0, tick.at, tick.at);
    drawing += tag("text", {{"class", "y"}, {"x", "-6"}, {"y", from_top(tick.at)}, {"dy", ".33em"}},
                   text(tick.label));
  }
  const std::vector<Tick> ticks = panel.x.ticks(4);
  for (std::size_t i = 0; i < ticks.size(); ++i) {
    const bool last = i + 1 == ticks.size();
    const std::string unit = last && !panel.x_unit.empty() ? "\u202f" + panel.x_unit : "";
    drawing += tag(
        "text", {{"class", "x"}, {"x", share_text(ticks[i].at)}, {"y", "100%"}, {"dy", "1.35em"}},
        text(ticks[i].label + unit));
  }
  return drawing + rule("base", 0.0, 1.0, 0.0, 0.0);
}

}  // namespace

std::string from_top(double share_from_below) { return share_text(1.0 - share_from_below); }

Markup figure(const Panel& panel) {
  const Markup square = tag("svg",
                            {{"class", "square"},
                             {"viewBox", "0 0 1000 1000"},
                             {"preserveAspectRatio", "none"},
                             {"width", "100%"},
                             {"height", "100%"}},
                            panel.curves);
  const Markup drawing = tag("svg", {{"role", "img"}, {"aria-label", panel.alternative}},
                             axes(panel) + square + panel.marks);
  return tag("figure", {{"class", "panel"}, {"id", panel.id}},
             tag("figcaption", text(panel.caption)) + drawing);
}

std::string stretched_path(const std::vector<Corner>& points) {
  std::string d;
  std::vector<Corner> stretch;
  for (const Corner& point : points) {
    if (std::isfinite(point.x) && std::isfinite(point.y)) {
      stretch.push_back(in_square(point));
    } else {
      d += path_of_stretch(stretch);
      stretch.clear();
    }
  }
  return d + path_of_stretch(stretch);
}

std::vector<double> pulled_apart(const std::vector<double>& wanted, double apart) {
  std::vector<double> placed;
  for (const double want : wanted) {
    const double middle = std::clamp(want, 0.0, 1.0);
    // The best free place is the wanted one, or just beside one that is taken.
    std::vector<double> candidates = {middle};
    for (const double taken : placed) {
      candidates.push_back(taken + apart);
      candidates.push_back(taken - apart);
    }
    std::optional<double> best;
    for (const double candidate : candidates) {
      const bool inside = candidate >= -1e-9 && candidate <= 1.0 + 1e-9;
      const bool free = std::all_of(placed.begin(), placed.end(), [&](double taken) {
        return std::abs(taken - candidate) >= apart - 1e-9;
      });
      if (!inside || !free) continue;
      if (!best || std::abs(candidate - middle) < std::abs(*best - middle)) best = candidate;
    }
    placed.push_back(best.value_or(middle));
  }
  return placed;
}

}  // namespace gainsay::cli
