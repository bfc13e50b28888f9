#include "gainsay/cli/figure_mechanism.h"

#include "gainsay/cli/mechanism_graph.h"
#include "gainsay/cli/number_text.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

constexpr double kFree = 8.0;  // around the drawing
constexpr double kArrow = 7.0;
constexpr double kRadius = 5.5;      // of the circle that ends an influence
constexpr double kWideFrom = 430.0;  // pixels: from here on one picture takes a row

const core::Reaction* find_reaction(const core::Hypothesis& hypothesis, const std::string& name) {
  for (const core::Reaction& reaction : hypothesis.reactions) {
    if (reaction.name == name) return &reaction;
  }
  return nullptr;
}

bool same_sides(const core::Reaction& a, const core::Hypothesis& of_a, const core::Reaction& b,
                const core::Hypothesis& of_b) {
  return reaction_in_words(of_a, a) == reaction_in_words(of_b, b);
}

bool same_rate(const core::Reaction& a, const core::Hypothesis& of_a, const core::Reaction& b,
               const core::Hypothesis& of_b) {
  return a.flow == b.flow &&
         core::written_out(core::net(a), of_a) == core::written_out(core::net(b), of_b);
}

/// What a hypothesis is compared with; null where it has no base that was judged.
struct Base {
  const core::Hypothesis* hypothesis = nullptr;
  const core::Network* network = nullptr;
  std::string letter;
};

Base base_of(const Page& page, const Contender& contender) {
  if (!contender.hypothesis->base) return {};
  const StudyHypothesis& base = page.study().hypotheses.at(*contender.hypothesis->base);
  for (const Outcome& outcome : page.judgement.outcomes) {
    if (outcome.hypothesis == *contender.hypothesis->base) {
      return {&base.mechanism, &outcome.network, base.letter};
    }
  }
  return {};
}

bool sets_apart(const core::Reaction& reaction, const core::Hypothesis& of, const Base& base) {
  if (base.hypothesis == nullptr) return false;
  const core::Reaction* there = find_reaction(*base.hypothesis, reaction.name);
  return there == nullptr || !same_sides(reaction, of, *there, *base.hypothesis) ||
         !same_rate(reaction, of, *there, *base.hypothesis);
}

bool sets_apart(const core::Influence& influence, const core::Hypothesis& of, const Base& base) {
  if (base.hypothesis == nullptr) return false;
  const std::string& reaction = of.reactions[influence.reaction].name;
  return std::none_of(base.network->influences.begin(), base.network->influences.end(),
                      [&](const core::Influence& there) {
                        return there.by == influence.by && there.sign == influence.sign &&
                               base.hypothesis->reactions[there.reaction].name == reaction;
                      });
}

std::string pair_text(const Spot& spot) { return coordinate(spot.x) + " " + coordinate(spot.y); }

std::string bezier(const std::vector<Spot>& path) {
  std::string d;
  for (std::size_t i = 0; i < path.size(); ++i) {
    d += (i == 0 ? "M" : i % 3 == 1 ? "C" : " ") + pair_text(path[i]);
  }
  return d;
}

/// Unit vector along the end of a path.
Spot direction(const std::vector<Spot>& path) {
  const Spot& end = path.back();
  for (std::size_t i = path.size() - 1; i-- > 0;) {
    const double dx = end.x - path[i].x;
    const double dy = end.y - path[i].y;
    const double length = std::hypot(dx, dy);
    if (length > 1e-6) return {dx / length, dy / length};
  }
  return {1.0, 0.0};
}

Spot along(const Spot& from, const Spot& way, double length) {
  return {from.x + way.x * length, from.y + way.y * length};
}

/// The path without its last `length` pixels, which an arrow or a circle takes.
std::vector<Spot> shortened(std::vector<Spot> path, double length) {
  path.back() = along(path.back(), direction(path), -length);
  return path;
}

Markup arrow_head(const std::vector<Spot>& path) {
  const Spot way = direction(path);
  const Spot back = along(path.back(), way, -kArrow);
  const Spot side = {-way.y * 0.42 * kArrow, way.x * 0.42 * kArrow};
  const std::string d = "M" + pair_text(path.back()) + "L" +
                        pair_text({back.x + side.x, back.y + side.y}) + "L" +
                        pair_text({back.x - side.x, back.y - side.y}) + "Z";
  return tag("path", {{"class", "head"}, {"d", d}}, {});
}

Markup line(const std::vector<Spot>& path, bool arrow_at_end, bool arrow_at_start) {
  if (path.size() < 4) return {};
  std::vector<Spot> drawn = path;
  Markup heads;
  if (arrow_at_end) {
    heads += arrow_head(drawn);
    drawn = shortened(drawn, 0.8 * kArrow);
  }
  if (arrow_at_start) {
    std::reverse(drawn.begin(), drawn.end());
    heads += arrow_head(drawn);
    drawn = shortened(drawn, 0.8 * kArrow);
  }
  return tag("path", {{"class", "way"}, {"d", bezier(drawn)}}, {}) + heads;
}

Markup coefficient(double value, const Spot& at) {
  if (value == 1.0) return {};
  return tag("text", {{"class", "count"}, {"x", coordinate(at.x)}, {"y", coordinate(at.y - 5.0)}},
             text(short_number(value, 3)));
}

Markup reaction_drawing(const MechanismGraph& graph, const core::Hypothesis& of,
                        const core::Reaction& reaction, bool own) {
  Markup drawing;
  const auto draw = [&](LineKind kind, const std::string& species, double count) {
    const std::vector<Spot>& path = graph.line(kind, reaction.name, species);
    const bool outside = species.empty();
    const bool makes = kind == LineKind::Makes;
    // A step back ends at what the step forward begins with.
    drawing += line(path, makes, !makes && reaction.reversible && !outside);
    if (path.size() >= 4) {
      drawing += coefficient(count, along(makes ? path.back() : path.front(), direction(path),
                                          makes ? -1.6 * kArrow : 1.6 * kArrow));
    }
  };
  for (const core::Term& term : reaction.reactants) {
    draw(LineKind::Uses, of.species[term.species].name, term.coefficient);
  }
  for (const core::Term& term : reaction.products) {
    draw(LineKind::Makes, of.species[term.species].name, term.coefficient);
  }
  if (reaction.reactants.empty()) draw(LineKind::Uses, "", 1.0);
  if (reaction.products.empty()) draw(LineKind::Makes, "", 1.0);
  const Spot at = graph.reaction(reaction.name);
  drawing +=
      tag("text",
          {{"class", "step"}, {"x", coordinate(at.x)}, {"y", coordinate(at.y)}, {"dy", ".34em"}},
          text(reaction.name));
  return tag("g", {{"class", own ? "reaction own" : "reaction"}}, drawing);
}

const char* sign_path(core::Sign sign) {
  switch (sign) {
    case core::Sign::Raises:
      return "M-3 0H3M0-3V3";
    case core::Sign::Lowers:
      return "M-3 0H3";
    case core::Sign::Either:
      break;
  }
  return "M-2.6-1.2H2.6M0-3.8V1.4M-2.6 3.2H2.6";
}

Markup influence_drawing(const MechanismGraph& graph, const core::Hypothesis& of,
                         const core::Influence& influence, bool own) {
  const std::vector<Spot>& path =
      graph.line(LineKind::Influences, of.reactions[influence.reaction].name, influence.by);
  if (path.size() < 4) return {};
  const Spot middle = along(path.back(), direction(path), -kRadius);
  const Markup circle = tag("circle", {{"r", coordinate(kRadius)}}, {}) +
                        tag("path", {{"d", sign_path(influence.sign)}}, {});
  return tag("g", {{"class", own ? "influence own" : "influence"}},
             tag("path", {{"class", "way"}, {"d", bezier(shortened(path, 2.0 * kRadius))}}, {}) +
                 tag("g", {{"transform", "translate(" + pair_text(middle) + ")"}}, circle));
}

Markup word(const MechanismGraph& graph, const core::Hypothesis& of, const std::string& name,
            const std::string& kind) {
  const Spot at = graph.species(name);
  return tag("text",
             {{"class", kind}, {"x", coordinate(at.x)}, {"y", coordinate(at.y)}, {"dy", ".34em"}},
             text(shown_name(of, name)));
}

Markup drawing_of(const MechanismGraph& graph, const Contender& contender, const Base& base) {
  const core::Hypothesis& of = contender.hypothesis->mechanism;
  const core::Network& network = contender.outcome->network;
  Markup drawing;
  std::string influences;
  for (const core::Influence& influence : network.influences) {
    drawing += influence_drawing(graph, of, influence, sets_apart(influence, of, base));
    if (core::find_species(of, influence.by)) continue;
    drawing += word(graph, of, influence.by, "input");
  }
  for (const core::Reaction& reaction : of.reactions) {
    drawing += reaction_drawing(graph, of, reaction, sets_apart(reaction, of, base));
  }
  for (const core::Species& species : of.species)
    drawing += word(graph, of, species.name, "species");
  const Layout& layout = *graph.layout();
  const std::string width = coordinate(layout.width + 2.0 * kFree);
  const std::string height = coordinate(layout.height + 2.0 * kFree);
  return tag(
      "svg",
      {{"role", "img"},
       {"aria-label", "Mechanism " + contender.letter + ": its reactions are listed below"},
       {"viewBox", coordinate(-kFree) + " " + coordinate(-kFree) + " " + width + " " + height},
       {"width", width},
       {"height", height}},
      drawing);
}

std::string sign_word(core::Sign sign) {
  if (sign == core::Sign::Either) return "acts on";
  return sign == core::Sign::Raises ? "speeds" : "slows";
}

NumberTable reactions_in_words(const Contender& contender) {
  const core::Hypothesis& of = contender.hypothesis->mechanism;
  NumberTable list;
  list.heads = {"reaction", "what it does", "what acts on it"};
  list.words = {true, true, true};
  for (std::size_t i = 0; i < of.reactions.size(); ++i) {
    std::string acting;
    for (const core::Influence& influence : contender.outcome->network.influences) {
      if (influence.reaction != i) continue;
      acting += (acting.empty() ? "" : ", ") + shown_name(of, influence.by) + " " +
                sign_word(influence.sign) + " it";
    }
    list.rows.push_back({of.reactions[i].name, reaction_in_words(of, of.reactions[i]), acting});
  }
  return list;
}

std::string apart_words(const Contender& contender, const Base& base) {
  if (base.hypothesis == nullptr) return {};
  const std::vector<std::string> all =
      differences(contender.hypothesis->mechanism, *base.hypothesis);
  if (all.empty()) return "The reactions of " + base.letter + ".";
  std::string words = "As " + base.letter + ", but ";
  for (std::size_t i = 0; i < all.size(); ++i) {
    words += (i == 0 ? "" : i + 1 == all.size() ? " and " : ", ") + all[i];
  }
  return words + ".";
}

std::string side_in_words(const core::Hypothesis& hypothesis, const std::vector<core::Term>& side) {
  std::string words;
  for (const core::Term& term : side) {
    if (!words.empty()) words += " + ";
    if (term.coefficient != 1.0) words += short_number(term.coefficient, 3) + " ";
    words += shown_name(hypothesis, hypothesis.species.at(term.species).name);
  }
  return words;
}

}  // namespace

std::string reaction_in_words(const core::Hypothesis& hypothesis, const core::Reaction& reaction) {
  const std::string left = side_in_words(hypothesis, reaction.reactants);
  const std::string right = side_in_words(hypothesis, reaction.products);
  return (left.empty() ? "" : left + " ") + (reaction.reversible ? "⇌" : "→") +
         (right.empty() ? "" : " " + right);
}

std::vector<std::string> differences(const core::Hypothesis& hypothesis,
                                     const core::Hypothesis& base) {
  std::vector<std::string> all;
  for (const core::Reaction& reaction : hypothesis.reactions) {
    const core::Reaction* there = find_reaction(base, reaction.name);
    if (there == nullptr) {
      all.push_back("with " + reaction.name);
    } else if (!same_sides(reaction, hypothesis, *there, base)) {
      all.push_back(reaction.name + " is " + reaction_in_words(hypothesis, reaction));
    } else if (!same_rate(reaction, hypothesis, *there, base)) {
      all.push_back("with another rate of " + reaction.name);
    }
  }
  for (const core::Reaction& reaction : base.reactions) {
    if (find_reaction(hypothesis, reaction.name) == nullptr)
      all.push_back("without " + reaction.name);
  }
  return all;
}

Markup figure_mechanism(const Page& page) {
  const MechanismGraph graph(page);
  Markup all;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const Base base = base_of(page, contender);
    Markup content = tag("h3", letter_and_name(contender));
    const std::string apart = apart_words(contender, base);
    const NumberTable list = reactions_in_words(contender);
    if (graph.layout()) content += drawing_of(graph, contender, base);
    if (!apart.empty()) content += tag("p", {{"class", "aside"}}, text(apart));
    content += graph.layout()
                   ? folded("Reactions of " + contender.letter + ", in words", table(list))
                   : table(list);
    all += tag("div", {{"class", "mechanism " + classes(contender)}}, content);
  }
  const bool wide = !graph.layout() || graph.layout()->width > kWideFrom;
  return tag("div", {{"class", wide ? "mechanisms one" : "mechanisms two"}}, all);
}

}  // namespace gainsay::cli
