#include "gainsay/cli/mechanism_graph.h"

#include <set>

namespace gainsay::cli {
namespace {

// Pixels a letter takes at most in the pictures' type, and what stays free around a word.
constexpr double kSpeciesLetter = 8.2;
constexpr double kReactionLetter = 6.6;
constexpr double kAround = 10.0;
constexpr double kSpeciesHeight = 24.0;
constexpr double kReactionHeight = 20.0;
constexpr double kOutsideSize = 8.0;

std::size_t letters(const std::string& words) {
  std::size_t count = 0;
  for (const char c : words) count += (static_cast<unsigned char>(c) & 0xc0) != 0x80 ? 1 : 0;
  return count;
}

double width_of(const std::string& words, double letter) {
  return kAround + letter * static_cast<double>(letters(words));
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
    return node(species_, name, width_of(shown_name(hypothesis, name), kSpeciesLetter),
                kSpeciesHeight);
  };
  for (const core::Species& species : hypothesis.species) species_node(species.name);
  for (const core::Reaction& reaction : hypothesis.reactions) {
    const std::string& name = reaction.name;
    const std::size_t middle =
        node(reactions_, name, width_of(name, kReactionLetter), kReactionHeight);
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
