#pragma once

#include "gainsay/core/hypothesis.h"

#include <cstddef>
#include <optional>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// What something does to the rate of a reaction when there is more of it.
enum class Sign { Raises, Lowers, Either };

/// A species or input that appears in a reaction's rate without being one of its reactants
/// (products of a reversible reaction count as reactants of its way back).
struct Influence {
  std::string by;  ///< species or input
  std::size_t reaction = 0;
  Sign sign = Sign::Either;
  bool operator==(const Influence&) const = default;
};

/// The sign of the derivative of `rate` (written out) by a symbol, found at sampled positive points
/// (knowns at their values); none where it is zero at all of them. With `either_way` a negative
/// rate is the way back, and what matters is whether its size rises. Methods (7).
std::optional<Sign> effect(const Expression& rate, std::string_view symbol,
                           const Hypothesis& hypothesis, bool either_way);

/// All influences, in order of reactions, then species, then inputs.
std::vector<Influence> find_influences(const Hypothesis& hypothesis);

}  // namespace gainsay::core
