#include "gainsay/core/balance.h"

#include <cmath>
#include <limits>
#include <optional>

namespace gainsay::core {
namespace {

using Sum = std::optional<Expression>;  // none: an empty sum

void add(Sum& sum, double coefficient, const Expression& what) {
  const auto times = [&](double factor) {
    return factor == 1.0 ? what : Expression(factor) * what;
  };
  if (!sum)
    sum = coefficient == -1.0 ? -what : times(coefficient);
  else
    sum = coefficient < 0.0 ? *sum - times(-coefficient) : *sum + times(coefficient);
}

/// `volume` by its compartment's name, or none where it is the number 1.
std::optional<Expression> volume_of(const Hypothesis& hypothesis, const Species& species) {
  const Compartment& compartment = hypothesis.compartments[species.compartment];
  if (compartment.volume.is_number(1.0)) return std::nullopt;
  return Expression::symbol(compartment.name);
}

Expression rate_of_change(const Hypothesis& hypothesis, std::size_t number) {
  const Species& species = hypothesis.species[number];
  if (species.held) return 0.0;
  Sum rates;
  Sum flows;
  for (const double sign : {1.0, -1.0})  // what makes it first, so that few sums begin with a minus
    for (const auto& reaction : hypothesis.reactions)
      if (const double nu = stoichiometric_coefficient(reaction, number); sign * nu > 0.0)
        add(reaction.flow ? flows : rates, nu, Expression::symbol(reaction.name));

  if (const auto volume = volume_of(hypothesis, species)) {
    if (species.amount && rates) rates = *volume * *rates;
    if (!species.amount && flows) flows = *flows / *volume;
  }
  if (rates && flows) return *rates + *flows;
  return rates ? *rates : flows.value_or(0.0);
}

}  // namespace

double stoichiometric_coefficient(const Reaction& reaction, std::size_t species) {
  double made = 0.0;
  double used = 0.0;
  for (const auto& term : reaction.products)
    if (term.species == species) made += term.coefficient;
  for (const auto& term : reaction.reactants)
    if (term.species == species) used += term.coefficient;
  // 0.1 + 0.2 on one side and 0.3 on the other cancel, though not in the last bit.
  constexpr double kRounding = 8.0 * std::numeric_limits<double>::epsilon();
  return std::abs(made - used) <= kRounding * (made + used) ? 0.0 : made - used;
}

std::vector<Expression> balance_by_name(const Hypothesis& hypothesis) {
  std::vector<Expression> rates;
  rates.reserve(hypothesis.species.size());
  for (std::size_t i = 0; i < hypothesis.species.size(); ++i)
    rates.push_back(rate_of_change(hypothesis, i));
  return rates;
}

std::vector<Expression> balance(const Hypothesis& hypothesis) {
  return written_out(balance_by_name(hypothesis), hypothesis);
}

}  // namespace gainsay::core
