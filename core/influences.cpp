#include "gainsay/core/influences.h"

#include "gainsay/core/derive.h"
#include "gainsay/core/sample.h"

#include <algorithm>
#include <cmath>
#include <string>

namespace gainsay::core {
namespace {

constexpr std::uint64_t kPoints = 48;
// An elasticity d ln v / d ln x below this is rounding, or so far in saturation that other points
// show the sign better.
constexpr double kLeastElasticity = 1e-9;

std::optional<Sign> agreed(std::optional<Sign> a, std::optional<Sign> b) {
  if (!a || !b) return a ? a : b;
  return *a == *b ? *a : Sign::Either;
}

bool is_turned_over(const Reaction& reaction, std::size_t species) {
  const auto holds = [&](const std::vector<Term>& side) {
    return std::any_of(side.begin(), side.end(),
                       [&](const Term& term) { return term.species == species; });
  };
  return holds(reaction.reactants) || (reaction.reversible && holds(reaction.products));
}

/// On a reaction's way forward and its way back, where both are written.
std::optional<Sign> effect_on(const Reaction& reaction, const std::vector<Expression>& ways,
                              const std::string& name, const Hypothesis& hypothesis) {
  const bool either_way = reaction.reversible && !reaction.back;
  std::optional<Sign> sign;
  for (const auto& way : ways)
    if (depends_on(way, name)) sign = agreed(sign, effect(way, name, hypothesis, either_way));
  return sign;
}

}  // namespace

std::optional<Sign> effect(const Expression& rate, std::string_view symbol,
                           const Hypothesis& hypothesis, bool either_way) {
  const Expression slope = derivative(rate, symbol);
  auto names = symbols(rate);
  names.merge(symbols(slope));
  std::optional<Sign> sign;
  for (std::uint64_t number = 0; number < kPoints; ++number) {
    const Point point = sample_point(names, hypothesis.knowns, number);
    const double v = evaluate(rate, point);
    const double change = evaluate(slope, point) * point.find(symbol)->second;
    if (!std::isfinite(v) || !std::isfinite(change)) continue;
    if (std::abs(change) <= kLeastElasticity * std::abs(v)) continue;
    const bool raises = (either_way && v < 0.0) ? change < 0.0 : change > 0.0;
    sign = agreed(sign, raises ? Sign::Raises : Sign::Lowers);
  }
  return sign;
}

std::vector<Influence> find_influences(const Hypothesis& hypothesis) {
  std::vector<Influence> influences;
  for (std::size_t r = 0; r < hypothesis.reactions.size(); ++r) {
    const Reaction& reaction = hypothesis.reactions[r];
    std::vector<Expression> ways{reaction.forward};
    if (reaction.back) ways.push_back(*reaction.back);
    ways = written_out(ways, hypothesis);
    const auto take = [&](const std::string& name) {
      if (const auto sign = effect_on(reaction, ways, name, hypothesis))
        influences.push_back({name, r, *sign});
    };
    for (std::size_t i = 0; i < hypothesis.species.size(); ++i)
      if (!is_turned_over(reaction, i)) take(hypothesis.species[i].name);
    for (const auto& input : hypothesis.inputs) take(input);
  }
  return influences;
}

}  // namespace gainsay::core
