#pragma once

#include "gainsay/core/expression.h"

#include <cstddef>
#include <map>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

struct Compartment {
  std::string name;
  Expression volume = 1.0;  ///< of knowns and unknowns; constant in time
  bool operator==(const Compartment&) const = default;
};

struct Species {
  std::string name;
  std::string shown_as;         ///< what pages print; the name if not said
  std::size_t compartment = 0;  ///< index into Hypothesis::compartments
  bool amount = false;          ///< its symbol stands for its amount, else for its concentration
  bool held = false;            ///< the experimenter holds it at its start
  Expression start = 0.0;  ///< unless the experiment says otherwise; of knowns, unknowns, inputs
  std::optional<double> negligible;
  bool operator==(const Species&) const = default;
};

/// `coefficient` of species number `species` on one side of a reaction; positive.
struct Term {
  std::size_t species = 0;
  double coefficient = 1.0;
  bool operator==(const Term&) const = default;
};

struct Reaction {
  std::string name;
  std::vector<Term> reactants;
  std::vector<Term> products;
  bool reversible = false;         ///< written with <->
  bool flow = false;               ///< amount per time, else concentration per time
  Expression forward;              ///< as written
  std::optional<Expression> back;  ///< as written; only if reversible
  bool operator==(const Reaction&) const = default;
};

struct Definition {
  std::string name;
  Expression meaning;
  bool operator==(const Definition&) const = default;
};

/// A proposed mechanism as plain values; every list in the order in which it was written.
/// Expressions may use species, compartments, reactions, definitions, knowns, unknowns, inputs and
/// t, by name.
struct Hypothesis {
  std::string title;
  std::vector<Compartment> compartments;
  std::vector<Species> species;
  std::vector<Reaction> reactions;
  std::vector<Definition> definitions;  ///< [where]; free of cycles
  std::map<std::string, double, std::less<>>
      knowns;                         ///< study's and own; an experiment may replace them
  std::vector<std::string> unknowns;  ///< names that may be fitted: study's and own
  std::vector<std::string> inputs;    ///< names set by the experimenter over time
  bool operator==(const Hypothesis&) const = default;
};

std::optional<std::size_t> find_species(const Hypothesis& hypothesis, std::string_view name);

/// The net rate or flow of a reaction as its symbol stands for it: forward, minus back.
Expression net(const Reaction& reaction);

/// `expression` in species, unknowns, knowns, inputs and t alone: compartments, reactions and
/// definitions written out.
Expression written_out(const Expression& expression, const Hypothesis& hypothesis);

/// The same for several expressions, which then share what they have in common.
std::vector<Expression> written_out(const std::vector<Expression>& expressions,
                                    const Hypothesis& hypothesis);

/// Names of definitions that lead back to themselves, in order of the circle; empty if there is
/// none.
std::vector<std::string> circle(const std::vector<Definition>& definitions);

}  // namespace gainsay::core
