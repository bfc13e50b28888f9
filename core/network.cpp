#include "gainsay/core/network.h"

#include "gainsay/core/balance.h"
#include "gainsay/core/conserved.h"
#include "gainsay/core/print.h"
#include "gainsay/core/sample.h"

#include <algorithm>
#include <cmath>
#include <cstdint>
#include <functional>
#include <optional>
#include <set>

namespace gainsay::core {
namespace {

using Names = std::set<std::string, std::less<>>;

Eigen::MatrixXd stoichiometry(const Hypothesis& hypothesis) {
  Eigen::MatrixXd S = Eigen::MatrixXd::Zero(static_cast<Eigen::Index>(hypothesis.species.size()),
                                            static_cast<Eigen::Index>(hypothesis.reactions.size()));
  for (Eigen::Index j = 0; j < S.cols(); ++j)
    for (Eigen::Index i = 0; i < S.rows(); ++i)
      if (const auto species = static_cast<std::size_t>(i); !hypothesis.species[species].held)
        S(i, j) =
            stoichiometric_coefficient(hypothesis.reactions[static_cast<std::size_t>(j)], species);
  return S;
}

/// The amounts as an expression of what the species' names stand for. Where all are concentrations
/// in one compartment, its volume is a common factor and left out.
Expression as_expression(const std::vector<double>& weights, const Hypothesis& hypothesis) {
  std::set<std::size_t> compartments;
  bool amounts = false;
  for (std::size_t i = 0; i < weights.size(); ++i)
    if (weights[i] != 0.0) {
      compartments.insert(hypothesis.species[i].compartment);
      amounts = amounts || hypothesis.species[i].amount;
    }
  const bool share_volume = compartments.size() == 1 && !amounts;

  std::optional<Expression> sum;
  for (std::size_t i = 0; i < weights.size(); ++i) {
    if (weights[i] == 0.0) continue;
    const Species& species = hypothesis.species[i];
    const Compartment& compartment = hypothesis.compartments[species.compartment];
    Expression term = Expression::symbol(species.name);
    if (std::abs(weights[i]) != 1.0) term = Expression(std::abs(weights[i])) * term;
    if (!share_volume && !species.amount && !compartment.volume.is_number(1.0))
      term = term * Expression::symbol(compartment.name);
    if (!sum)
      sum = weights[i] < 0.0 ? -term : term;
    else
      sum = weights[i] < 0.0 ? *sum - term : *sum + term;
  }
  return sum.value_or(0.0);
}

std::vector<ConservedSum> conserved_sums(const Eigen::MatrixXd& S, const Hypothesis& hypothesis) {
  std::vector<Eigen::Index> unheld;
  for (Eigen::Index i = 0; i < S.rows(); ++i)
    if (!hypothesis.species[static_cast<std::size_t>(i)].held) unheld.push_back(i);

  std::vector<ConservedSum> sums;
  for (const auto& of_unheld : conserved_weights(S(unheld, Eigen::all))) {
    ConservedSum sum;
    sum.weights.assign(hypothesis.species.size(), 0.0);
    for (std::size_t i = 0; i < unheld.size(); ++i)
      sum.weights[static_cast<std::size_t>(unheld[i])] = of_unheld[i];
    sum.text = print_text(as_expression(sum.weights, hypothesis));
    sums.push_back(std::move(sum));
  }
  return sums;
}

/// Whether `rate` (written out) can have the sign at species = 0, all else positive. Methods (8).
bool goes_on_without(const std::string& species, double sign, const Expression& rate,
                     const Hypothesis& hypothesis) {
  constexpr std::uint64_t kPoints = 24;
  const Names names = symbols(rate);
  for (std::uint64_t number = 0; number < kPoints; ++number) {
    Point point = sample_point(names, hypothesis.knowns, number);
    const double before = evaluate(rate, point);
    point[species] = 0.0;
    const double v = evaluate(rate, point);
    // What is left of a difference that should be 0 is rounding.
    constexpr double kRounding = 1e-12;
    if (std::isfinite(v) && sign * v > kRounding * std::abs(before)) return true;
  }
  return false;
}

void warn_of_negative_species(std::vector<Warning>& all, const Hypothesis& hypothesis,
                              const Network& network) {
  for (std::size_t j = 0; j < hypothesis.reactions.size(); ++j) {
    const Reaction& reaction = hypothesis.reactions[j];
    const Expression rate = written_out(net(reaction), hypothesis);
    for (std::size_t i = 0; i < hypothesis.species.size(); ++i) {
      const double nu =
          network.stoichiometry(static_cast<Eigen::Index>(i), static_cast<Eigen::Index>(j));
      const std::string& species = hypothesis.species[i].name;
      if (nu == 0.0 || !goes_on_without(species, nu < 0.0 ? 1.0 : -1.0, rate, hypothesis)) continue;
      all.push_back({"the " + std::string(reaction.flow ? "flow" : "rate") + " of '" +
                         reaction.name + "' does not vanish when '" + species + "' is used up: '" +
                         species + "' can go negative",
                     "let it depend on '" + species + "' so that it vanishes with it",
                     reaction.name});
    }
  }
}

/// All names that lead, through [where], to an equation or to what is used elsewhere.
Names used_names(const Hypothesis& hypothesis, const std::vector<std::string>& used_elsewhere) {
  std::vector<std::string> open = used_elsewhere;
  const auto take = [&](const Expression& expression) {
    const auto names = symbols(expression);
    open.insert(open.end(), names.begin(), names.end());
  };
  for (const auto& reaction : hypothesis.reactions) take(net(reaction));
  for (const auto& species : hypothesis.species) take(species.start);
  for (const auto& compartment : hypothesis.compartments) take(compartment.volume);
  Names used;
  while (!open.empty()) {
    const std::string name = open.back();
    open.pop_back();
    if (!used.insert(name).second) continue;
    for (const auto& definition : hypothesis.definitions)
      if (definition.name == name) take(definition.meaning);
  }
  return used;
}

bool stands_in_an_equation(const Hypothesis& hypothesis, std::size_t species) {
  const auto holds = [&](const std::vector<Term>& side) {
    return std::any_of(side.begin(), side.end(),
                       [&](const Term& term) { return term.species == species; });
  };
  return std::any_of(
      hypothesis.reactions.begin(), hypothesis.reactions.end(),
      [&](const Reaction& each) { return holds(each.reactants) || holds(each.products); });
}

void warn_of_idle_names(std::vector<Warning>& all, const Hypothesis& hypothesis,
                        const Names& used) {
  for (std::size_t i = 0; i < hypothesis.species.size(); ++i)
    if (const auto& name = hypothesis.species[i].name;
        !used.contains(name) && !stands_in_an_equation(hypothesis, i))
      all.push_back({"nothing makes or uses the species '" + name + "'",
                     "give it a reaction, or leave it out", name});
  for (const auto& definition : hypothesis.definitions)
    if (!used.contains(definition.name))
      all.push_back({"nothing uses '" + definition.name + "', which stands under [where]",
                     "use it, or leave it out", definition.name});
  for (std::size_t k = 0; k < hypothesis.compartments.size(); ++k) {
    const auto& name = hypothesis.compartments[k].name;
    const bool empty = std::none_of(hypothesis.species.begin(), hypothesis.species.end(),
                                    [&](const Species& each) { return each.compartment == k; });
    if (empty && !hypothesis.species.empty() && !used.contains(name))
      all.push_back({"the compartment '" + name + "' holds no species",
                     "put a species in it, or leave it out", name});
  }
}

}  // namespace

Network derive_network(const Hypothesis& hypothesis) {
  Network network;
  network.stoichiometry = stoichiometry(hypothesis);
  network.conserved = conserved_sums(network.stoichiometry, hypothesis);
  network.influences = find_influences(hypothesis);
  return network;
}

std::vector<Warning> warnings(const Hypothesis& hypothesis, const Network& network,
                              const std::vector<std::string>& used_elsewhere) {
  std::vector<Warning> all;
  warn_of_negative_species(all, hypothesis, network);
  warn_of_idle_names(all, hypothesis, used_names(hypothesis, used_elsewhere));
  return all;
}

}  // namespace gainsay::core
