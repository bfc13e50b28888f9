#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

struct Spot {
  double x = 0.0;
  double y = 0.0;  ///< downwards, as pictures count
  bool operator==(const Spot&) const = default;
};

/// A graph to be laid out: nodes of given size, directed lines between them.
struct Graph {
  enum class Side { Any, Left, Right, Top, Bottom };
  struct Node {
    double width = 0.0;  ///< in pixels of the picture
    double height = 0.0;
  };
  struct Line {
    std::size_t from = 0;
    std::size_t to = 0;
    bool ranks = true;        ///< whether it takes part in ordering from left to right
    Side leaves = Side::Any;  ///< where it touches its ends
    Side enters = Side::Any;
  };
  std::vector<Node> nodes;
  std::vector<Line> lines;
};

struct Layout {
  double width = 0.0;
  double height = 0.0;
  std::vector<Spot> nodes;               ///< middles
  std::vector<std::vector<Spot>> lines;  ///< Bezier curves: a point, then three for each piece
};

/// Positions by Graphviz' engine dot (Gansner, Koutsofios, North & Vo 1993), from left to right. No
/// value where its plug-in cannot be loaded or gives up: the caller then lists instead of drawing.
/// Not to be called from two threads at once.
std::optional<Layout> lay_out(const Graph& graph);

}  // namespace gainsay::cli
