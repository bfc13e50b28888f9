#include "gainsay/cli/mechanism_graph.h"

#include <set>
#include <string_view>

namespace gainsay::cli {
namespace {

// Sizes of the pictures' type in pixels, and what stays free around a word.
constexpr double kSpeciesType = 13.5;
constexpr double kReactionType = 11.0;
constexpr double kAround = 9.0;
constexpr double kLevel = 12.0;  // closer than this in height, an influence arches over
constexpr double kSpeciesHeight = 24.0;
constexpr double kReactionHeight = 20.0;
constexpr double kOutsideSize = 8.0;

/// Widths of letters in a humanist sans, in parts of its size; the reader's type may differ a
/// little.
double letter_width(char c) {
  if (std::string_view("ijlI.,:;'|!").find(c) != std::string_view::npos) return 0.27;
  if (std::string_view("frt()[] -*").find(c) != std::string_view::npos) return 0.37;
  if (std::string_view("mwMW@%").find(c) != std::string_view::npos) return 0.9;
  return c >= 'A' && c <= 'Z' ? 0.65 : 0.58;
}

double width_of(const std::string& words, double type) {
  double width = 0.0;
  for (const char c : words) {
    const bool continues = (static_cast<unsigned char>(c) & 0xc0) == 0x80;  // of one UTF-8 letter
    if (!continues) width += type * letter_width(c);
  }
  return kAround + width;
}

}  // namespace

std::string shown_name(const core::Hypothesis& hypothesis, const std::string& name) {
  for (const core::Species& species : hypothesis.species) {
    if (species.name == name && !species.shown_as.empty()) return species.shown_as;
  }
  return name;
}

MechanismGraph::MechanismGraph(const Page& page) {
  for (const Outcome& outcome : page.judgement.outcomes) {
    take(page.study().hypotheses[outcome.hypothesis].mechanism, outcome.network);
  }
  layout_ = lay_out(graph_);
  if (!layout_) return;
  choose_sides(*layout_);
  layout_ = lay_out(graph_);
}

/// Now that it is known where things lie: reactions run from the right side of a word to the left
/// of the next, influences leave and enter above or below.
void MechanismGraph::choose_sides(const Layout& first) {
  using Side = Graph::Side;
  for (const auto& [key, number] : lines_) {
    Graph::Line& line = graph_.lines[number];
    const Spot from = first.nodes[line.from];
    const Spot to = first.nodes[line.to];
    if (std::get<LineKind>(key) == LineKind::Influences) {
      const bool from_below = from.y > to.y + kLevel;
      const bool from_above = from.y < to.y - kLevel;
      line.leaves = from_above ? Side::Bottom : Side::Top;
      line.enters = from_below ? Side::Bottom : Side::Top;
    } else if (from.x < to.x) {
      line.leaves = Side::Right;
      line.enters = Side::Left;
    }
  }
}

std::size_t MechanismGraph::node(std::map<std::string, std::size_t>& names, const std::string& name,
                                 double width, double height) {
  const auto [at, is_new] = names.emplace(name, graph_.nodes.size());
  if (is_new) graph_.nodes.push_back({width, height});
  return at->second;
}

void MechanismGraph::join(LineKind kind, const std::string& reaction, const std::string& species,
                          std::size_t from, std::size_t to) {
  const auto [at, is_new] = lines_.emplace(Key{kind, reaction, species}, graph_.lines.size());
  if (is_new) graph_.lines.push_back({from, to, kind != LineKind::Influences});
}

void MechanismGraph::take(const core::Hypothesis& hypothesis, const core::Network& network) {
  std::set<std::string> moved;  // species that some reaction makes or uses
  const auto species_node = [&](const std::string& name) {
    return node(species_, name, width_of(shown_name(hypothesis, name), kSpeciesType),
                kSpeciesHeight);
  };
  for (const core::Species& species : hypothesis.species) species_node(species.name);
  for (const core::Reaction& reaction : hypothesis.reactions) {
    const std::string& name = reaction.name;
    const std::size_t middle =
        node(reactions_, name, width_of(name, kReactionType), kReactionHeight);
    for (const core::Term& term : reaction.reactants) {
      const std::string& species = hypothesis.species[term.species].name;
      join(LineKind::Uses, name, species, species_node(species), middle);
      moved.insert(species);
    }
    for (const core::Term& term : reaction.products) {
      const std::string& species = hypothesis.species[term.species].name;
      join(LineKind::Makes, name, species, middle, species_node(species));
      moved.insert(species);
    }
    if (reaction.reactants.empty()) {
      join(LineKind::Uses, name, "", node(outside_, name + " from", kOutsideSize, kOutsideSize),
           middle);
    }
    if (reaction.products.empty()) {
      join(LineKind::Makes, name, "", middle,
           node(outside_, name + " to", kOutsideSize, kOutsideSize));
    }
  }
  for (const core::Influence& influence : network.influences) {
    const std::string& reaction = hypothesis.reactions.at(influence.reaction).name;
    join(LineKind::Influences, reaction, influence.by, species_node(influence.by),
         reactions_.at(reaction));
    // What is only an influence would float: it is ordered before the step that it acts on.
    if (!moved.contains(influence.by)) {
      graph_.lines[lines_.at({LineKind::Influences, reaction, influence.by})].ranks = true;
    }
  }
}

const std::vector<Spot>& MechanismGraph::line(LineKind kind, const std::string& reaction,
                                              const std::string& species) const {
  return layout_->lines.at(lines_.at({kind, reaction, species}));
}

}  // namespace gainsay::cli
