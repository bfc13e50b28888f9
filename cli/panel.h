#pragma once

#include "gainsay/cli/markup.h"
#include "gainsay/cli/scale.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// One small picture with two axes. It has no size of its own: across, all is in shares of the
/// width, so that letters stay upright and lines thin at any size; curves lie in a square of 1000 x
/// 1000 that is stretched over it.
struct Panel {
  std::string id;       ///< of the figure, for the script
  std::string caption;  ///< head of its column
  std::string alternative;
  Scale x = Scale::exact(0, 1, false);
  Scale y = Scale::exact(0, 1, false);
  std::string x_unit;  ///< written beside the last number
  Markup curves;       ///< in the stretched square
  Markup marks;        ///< in shares
};

Markup figure(const Panel& panel);

struct Corner {
  double x = 0.0;  ///< shares of width and height, y from the lower edge
  double y = 0.0;
};

/// The `d` of a path through these points in the stretched square; points that lie within
/// `kCurveTolerance` of a line through their neighbours are left out (Ramer 1972; Douglas & Peucker
/// 1973), points that are no numbers interrupt it.
inline constexpr double kCurveTolerance = 0.6;  ///< of 1000: a third of a line's width
std::string stretched_path(const std::vector<Corner>& points);

/// Places for labels wanted at shares `wanted` of a height, the earlier ones first: each as near to
/// where it is wanted as those before it leave room, at least `apart` from each other, within 0 to
/// 1 as long as there is room.
std::vector<double> pulled_apart(const std::vector<double>& wanted, double apart);

/// A share of the height counted from the upper edge, as SVG wants it.
std::string from_top(double share_from_below);

}  // namespace gainsay::cli
