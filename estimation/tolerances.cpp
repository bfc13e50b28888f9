#include "gainsay/estimation/tolerances.h"

#include "gainsay/core/fold.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <functional>
#include <map>

namespace gainsay::estimation {
namespace {

using core::Expression;
using core::Operation;

std::size_t index_of(Kind kind) { return static_cast<std::size_t>(kind); }

}  // namespace

Kind kind_of(const core::Species& species) {
  return species.amount ? Kind::Amount : Kind::Concentration;
}

std::optional<Kind> kind_shown(const Expression& shows, const core::Hypothesis& hypothesis) {
  using Shown = std::optional<Kind>;
  return core::fold<Shown>(
      shows, [&](const Expression& node, const std::vector<Shown>& of) -> Shown {
        const auto operands = node.operands();
        switch (node.operation()) {
          case Operation::Symbol:
            if (const auto species = core::find_species(hypothesis, node.name()))
              return kind_of(hypothesis.species[*species]);
            return std::nullopt;
          case Operation::Negate:
            return of[0];
          case Operation::Add:
          case Operation::Subtract:
            return of[0] == of[1] ? of[0] : std::nullopt;
          case Operation::Multiply:
            if (operands[0].is_number()) return of[1];
            return operands[1].is_number() ? of[0] : std::nullopt;
          case Operation::Divide:
            return operands[1].is_number() ? of[0] : std::nullopt;
          default:
            return std::nullopt;
        }
      });
}

double expected_value(const Unknown& unknown) {
  if (unknown.prior) return unknown.prior->value;
  if (!unknown.first.empty()) return unknown.first.front();
  return unknown.linear ? (unknown.low + unknown.high) / 2.0
                        : std::sqrt(unknown.low) * std::sqrt(unknown.high);
}

std::vector<double> absolute_tolerances(const core::Hypothesis& hypothesis,
                                        const core::System& system,
                                        std::span<const Unknown> unknowns,
                                        std::span<const Reading> readings, double negligible) {
  std::map<std::string, double, std::less<>> values;
  for (const auto& unknown : unknowns) values.emplace(unknown.name, expected_value(unknown));

  std::array<double, 2> largest{0.0, 0.0};
  const auto take = [&](Kind kind, double size) {
    double& most = largest[index_of(kind)];
    if (std::isfinite(size)) most = std::max(most, std::abs(size));
  };
  for (std::size_t i = 0; i < hypothesis.species.size(); ++i)
    take(kind_of(hypothesis.species[i]), core::evaluate(system.starts[i], values));
  for (const auto& jump : system.jumps)
    take(kind_of(hypothesis.species[jump.state]), core::evaluate(jump.rise, values));
  for (const auto& reading : readings) take(reading.kind, reading.size);

  std::vector<double> tolerances;
  tolerances.reserve(hypothesis.species.size());
  for (const auto& species : hypothesis.species) {
    const double size = largest[index_of(kind_of(species))];
    tolerances.push_back(species.negligible.value_or(negligible * (size > 0.0 ? size : 1.0)));
  }
  return tolerances;
}

}  // namespace gainsay::estimation
