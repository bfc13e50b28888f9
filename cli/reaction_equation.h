#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/hypothesis.h"
#include "gainsay/core/place.h"
#include "gainsay/core/result.h"

#include <functional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// One side's part: a positive coefficient and the name of a species. A species that stands twice
/// on a side is one part.
struct EquationPart {
  double coefficient = 1.0;
  std::string species;
  core::Place place;  ///< of the name
  bool operator==(const EquationPart&) const = default;
};

/// "2 A + B -> C", as written.
struct ReactionEquation {
  std::vector<EquationPart> left;
  std::vector<EquationPart> right;
  bool reversible = false;
};

/// Sides are parts joined by `+`, each `name`, `2 name` or `2name`, coefficients plain decimals; an
/// empty side is the outside; the arrow is `->` or `→`, `<->` or `⇌`. Fails with the place.
core::Result<ReactionEquation> read_equation(std::string_view text);

/// The product of a side's species with coefficients as powers; 1 for an empty side.
core::Expression mass_action_side(const std::vector<EquationPart>& side);

/// What a reaction of a mechanism turns into what; places are empty.
ReactionEquation equation_of(const core::Reaction& reaction, const core::Hypothesis& hypothesis);

/// "2 A + B -> C" with an arrow of one's own; `shown` says how a species is printed.
std::string equation_text(const ReactionEquation& equation, std::string_view arrow,
                          const std::function<std::string(std::string_view)>& shown);

/// A reaction's equation as its author would write it: "2 A + B -> C", "A <-> B", "-> A".
std::string equation_text(const core::Reaction& reaction, const core::Hypothesis& hypothesis);

}  // namespace gainsay::cli
