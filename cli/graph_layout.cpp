#include "gainsay/cli/graph_layout.h"

#include <graphviz/gvc.h>

#include <charconv>
#include <memory>
#include <string>

namespace gainsay::cli {
namespace {

constexpr double kPointsPerInch = 72.0;

struct FreeContext {
  void operator()(GVC_t* context) const { gvFreeContext(context); }
};

struct CloseGraph {
  void operator()(Agraph_t* graph) const { agclose(graph); }
};

/// Graphviz takes text that it may write to.
void set(void* object, const std::string& key, std::string value) {
  std::string name = key;
  std::string none;
  agsafeset(object, name.data(), value.data(), none.data());
}

std::string inches(double pixels) {
  char buffer[40];
  const auto end = std::to_chars(buffer, buffer + sizeof buffer, pixels / kPointsPerInch,
                                 std::chars_format::fixed, 4)
                       .ptr;
  return {buffer, end};
}

std::vector<Agnode_t*> add_nodes(Agraph_t* drawn, const Graph& graph) {
  std::vector<Agnode_t*> nodes;
  for (std::size_t i = 0; i < graph.nodes.size(); ++i) {
    std::string name = "n" + std::to_string(i);
    Agnode_t* node = agnode(drawn, name.data(), 1);
    set(node, "shape", "box");
    set(node, "fixedsize", "true");  // so that no font is measured
    set(node, "label", "");
    set(node, "width", inches(graph.nodes[i].width));
    set(node, "height", inches(graph.nodes[i].height));
    nodes.push_back(node);
  }
  return nodes;
}

const char* compass(Graph::Side side) {
  switch (side) {
    case Graph::Side::Left:
      return "w";
    case Graph::Side::Right:
      return "e";
    case Graph::Side::Top:
      return "n";
    case Graph::Side::Bottom:
      return "s";
    case Graph::Side::Any:
      break;
  }
  return "";
}

std::vector<Agedge_t*> add_lines(Agraph_t* drawn, const Graph& graph,
                                 const std::vector<Agnode_t*>& nodes) {
  std::vector<Agedge_t*> edges;
  for (std::size_t i = 0; i < graph.lines.size(); ++i) {
    std::string name = "l" + std::to_string(i);
    const Graph::Line& line = graph.lines[i];
    Agedge_t* edge = agedge(drawn, nodes.at(line.from), nodes.at(line.to), name.data(), 1);
    set(edge, "arrowhead", "none");
    if (!line.ranks) set(edge, "constraint", "false");
    if (line.leaves != Graph::Side::Any) set(edge, "tailport", compass(line.leaves));
    if (line.enters != Graph::Side::Any) set(edge, "headport", compass(line.enters));
    edges.push_back(edge);
  }
  return edges;
}

std::vector<Spot> path_of(Agedge_t* edge, double height) {
  std::vector<Spot> path;
  const splines* drawn = ED_spl(edge);
  if (drawn == nullptr) return path;
  for (std::size_t k = 0; k < static_cast<std::size_t>(drawn->size); ++k) {
    const bezier& piece = drawn->list[k];
    for (std::size_t i = 0; i < static_cast<std::size_t>(piece.size); ++i) {
      path.push_back({piece.list[i].x, height - piece.list[i].y});
    }
  }
  return path;
}

}  // namespace

std::optional<Layout> lay_out(const Graph& graph) {
  if (graph.nodes.empty()) return std::nullopt;
  agseterr(AGMAX);  // failures come back as values: nothing is printed
  const std::unique_ptr<GVC_t, FreeContext> context(gvContext());
  std::string name = "mechanism";
  const std::unique_ptr<Agraph_t, CloseGraph> drawn(agopen(name.data(), Agdirected, nullptr));
  if (context == nullptr || drawn == nullptr) return std::nullopt;
  set(drawn.get(), "rankdir", "LR");
  set(drawn.get(), "nodesep", "0.42");
  set(drawn.get(), "ranksep", "0.5");
  set(drawn.get(), "splines", "true");
  const std::vector<Agnode_t*> nodes = add_nodes(drawn.get(), graph);
  const std::vector<Agedge_t*> edges = add_lines(drawn.get(), graph, nodes);
  if (gvLayout(context.get(), drawn.get(), "dot") != 0) return std::nullopt;
  Layout layout;
  layout.width = GD_bb(drawn.get()).UR.x;
  layout.height = GD_bb(drawn.get()).UR.y;
  for (Agnode_t* node : nodes) {
    layout.nodes.push_back({ND_coord(node).x, layout.height - ND_coord(node).y});
  }
  for (Agedge_t* edge : edges) layout.lines.push_back(path_of(edge, layout.height));
  gvFreeLayout(context.get(), drawn.get());
  return layout;
}

}  // namespace gainsay::cli
