#pragma once

#include "gainsay/cli/page.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// The mechanism of every hypothesis as a graph, all in one layout: a species is a word, a reaction
/// an arrow that carries its name, an influence a thin line that ends in a small circle with its
/// sign, the outside a short open end. What sets a hypothesis apart from its base is in its hue,
/// and said in words. Where no layout can be had, the reactions are listed instead.
Markup figure_mechanism(const Page& page);

/// "nitrile + 2 water ⇌ amide".
std::string reaction_in_words(const core::Hypothesis& hypothesis, const core::Reaction& reaction);

/// What sets a hypothesis apart from its base: "adds inactivation", "another rate of hydration",
/// "without loss".
std::vector<std::string> differences(const core::Hypothesis& hypothesis,
                                     const core::Hypothesis& base);

}  // namespace gainsay::cli
