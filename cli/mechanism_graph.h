#pragma once

#include "gainsay/cli/graph_layout.h"
#include "gainsay/cli/page.h"

#include <map>
#include <optional>
#include <string>
#include <tuple>
#include <vector>

namespace gainsay::cli {

/// What a line of the graph stands for.
enum class LineKind { Uses, Makes, Influences };

/// One graph for all hypotheses of a study, so that each thing has the same place in every picture:
/// nodes are species and inputs, reactions, and the outside of a reaction that has only one side.
class MechanismGraph {
 public:
  explicit MechanismGraph(const Page& page);

  /// No value where no layout could be had.
  const std::optional<Layout>& layout() const { return layout_; }
  Spot species(const std::string& name) const { return layout_->nodes.at(species_.at(name)); }
  Spot reaction(const std::string& name) const { return layout_->nodes.at(reactions_.at(name)); }
  /// The path between a reaction and a species; with an empty name of the species, the outside.
  const std::vector<Spot>& line(LineKind kind, const std::string& reaction,
                                const std::string& species) const;

 private:
  using Key = std::tuple<LineKind, std::string, std::string>;
  void take(const core::Hypothesis& hypothesis, const core::Network& network);
  std::size_t node(std::map<std::string, std::size_t>& names, const std::string& name, double width,
                   double height);
  void join(LineKind kind, const std::string& reaction, const std::string& species,
            std::size_t from, std::size_t to);

  void choose_sides(const Layout& first);

  Graph graph_;
  std::map<std::string, std::size_t> species_;
  std::map<std::string, std::size_t> reactions_;
  std::map<std::string, std::size_t> outside_;
  std::map<Key, std::size_t> lines_;
  std::optional<Layout> layout_;
};

/// What pages print for a species or an input.
std::string shown_name(const core::Hypothesis& hypothesis, const std::string& name);

}  // namespace gainsay::cli
