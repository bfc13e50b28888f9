#pragma once

#include "gainsay/core/hypothesis.h"
#include "gainsay/core/parse.h"

#include <gtest/gtest.h>

#include <initializer_list>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// An expression from its text; a failed test and 0 where it does not parse.
inline core::Expression written(std::string_view text) {
  const auto parsed = core::parse(text);
  if (parsed) return parsed->expression;
  ADD_FAILURE() << text << ": " << parsed.failure().what;
  return 0.0;
}

/// Writes a hypothesis down line by line, much as its file would:
///   Mechanism("decay").species("A", "a0").rate("loss", {{"A", 1}}, {}, "k * A").unknowns({"k"})
class Mechanism {
 public:
  using Side = std::initializer_list<std::pair<const char*, double>>;

  explicit Mechanism(std::string title) {
    hypothesis_.title = std::move(title);
    hypothesis_.compartments.push_back({"whole", 1.0});
  }

  /// The first call replaces the only compartment; species that follow are in the last one.
  Mechanism& compartment(const char* name, std::string_view volume) {
    if (hypothesis_.compartments.front().name == "whole") hypothesis_.compartments.clear();
    hypothesis_.compartments.push_back({name, written(volume)});
    return *this;
  }
  Mechanism& species(const char* name, std::string_view start = "0") {
    core::Species species;
    species.name = species.shown_as = name;
    species.compartment = hypothesis_.compartments.size() - 1;
    species.start = written(start);
    hypothesis_.species.push_back(species);
    return *this;
  }
  Mechanism& amount(const char* name, std::string_view start = "0") {
    species(name, start);
    hypothesis_.species.back().amount = true;
    return *this;
  }
  Mechanism& held(const char* name, std::string_view start) {
    species(name, start);
    hypothesis_.species.back().held = true;
    return *this;
  }
  Mechanism& rate(const char* name, Side from, Side to, std::string_view forward,
                  std::string_view back = "") {
    core::Reaction reaction;
    reaction.name = name;
    reaction.reactants = terms(from);
    reaction.products = terms(to);
    reaction.forward = written(forward);
    if (!back.empty()) {
      reaction.reversible = true;
      reaction.back = written(back);
    }
    hypothesis_.reactions.push_back(reaction);
    return *this;
  }
  Mechanism& flow(const char* name, Side from, Side to, std::string_view forward,
                  std::string_view back = "") {
    rate(name, from, to, forward, back);
    hypothesis_.reactions.back().flow = true;
    return *this;
  }
  /// The reaction written last is one of a single signed rate.
  Mechanism& reversible() {
    hypothesis_.reactions.back().reversible = true;
    return *this;
  }
  Mechanism& where(const char* name, std::string_view meaning) {
    hypothesis_.definitions.push_back({name, written(meaning)});
    return *this;
  }
  Mechanism& known(const char* name, double value) {
    hypothesis_.knowns[name] = value;
    return *this;
  }
  Mechanism& unknowns(std::vector<std::string> names) {
    hypothesis_.unknowns = std::move(names);
    return *this;
  }
  Mechanism& inputs(std::vector<std::string> names) {
    hypothesis_.inputs = std::move(names);
    return *this;
  }

  const core::Hypothesis& get() const { return hypothesis_; }
  operator const core::Hypothesis&() const { return hypothesis_; }  // NOLINT: it is one

 private:
  std::vector<core::Term> terms(Side side) const {
    std::vector<core::Term> all;
    for (const auto& [name, coefficient] : side) {
      const auto species = core::find_species(hypothesis_, name);
      if (!species) ADD_FAILURE() << "no species '" << name << "' above its reaction";
      all.push_back({species.value_or(0), coefficient});
    }
    return all;
  }

  core::Hypothesis hypothesis_;
};

}  // namespace gainsay::testing
