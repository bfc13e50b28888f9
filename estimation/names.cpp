#include "gainsay/estimation/names.h"

#include "gainsay/core/nearest_name.h"
#include "gainsay/core/simplify.h"
#include "gainsay/estimation/course.h"

#include <algorithm>
#include <functional>
#include <map>
#include <optional>
#include <utility>

namespace gainsay::estimation {
namespace {

using core::Expression;
using core::Failure;
using core::Result;
using Meanings = std::map<std::string, Expression, std::less<>>;

bool contains(const std::vector<std::string>& names, std::string_view name) {
  return std::find(names.begin(), names.end(), name) != names.end();
}

std::string quoted(std::string_view name) { return "'" + std::string(name) + "'"; }

}  // namespace

std::string particular(std::string_view name, std::string_view experiment) {
  if (experiment.empty()) return std::string(name);
  return std::string(name) + "[" + std::string(experiment) + "]";
}

Names::Names(const core::Hypothesis& hypothesis, std::span<const DeclaredUnknown> declared,
             std::span<const Experiment> experiments, const Experiment& experiment)
    : hypothesis_(hypothesis),
      declared_(declared),
      experiments_(experiments),
      experiment_(experiment) {}

Result<Expression> Names::over_time(const Expression& written, const std::string& where) const {
  Meanings meanings;
  for (const auto& name : core::symbols(written)) {
    if (name == "t" || core::find_species(hypothesis_, name)) continue;
    auto found = meaning(name, where);
    if (!found) return found.failure();
    meanings.emplace(name, *found);
  }
  return core::simplify(core::substitute(written, meanings));
}

Result<Expression> Names::at_time(const Expression& written, double time,
                                  const std::string& where) const {
  Meanings meanings{{"t", time}};
  for (const auto& name : core::symbols(written)) {
    if (core::find_species(hypothesis_, name))
      return failure(where + " uses the species " + quoted(name),
                     "knowns, unknowns and inputs: species have no value before the beginning",
                     "write it without " + quoted(name));
    if (const auto* course = find_course(experiment_, name);
        course && contains(hypothesis_.inputs, name))
      meanings.emplace(name, value_at(*course, time));
  }
  return over_time(core::substitute(written, meanings), where);
}

Result<Expression> Names::meaning(const std::string& name, const std::string& where) const {
  if (contains(hypothesis_.unknowns, name)) {
    const auto declared = std::find_if(declared_.begin(), declared_.end(),
                                       [&](const auto& each) { return each.unknown.name == name; });
    if (declared == declared_.end())
      return failure("the unknown " + quoted(name) + " has no range", "a range to search it in",
                     "add '" + name + " = [low, high]' under [unknowns]");
    if (experiment_.knowns.contains(name))
      return failure("the experiment gives a value to " + quoted(name) + ", which is an unknown",
                     "a known: an experiment replaces knowns, never unknowns",
                     "make " + quoted(name) + " a known of the hypothesis, or rename one of them");
    return Expression::symbol(declared->per_experiment ? particular(name, experiment_.name) : name);
  }
  if (const auto known = experiment_.knowns.find(name); known != experiment_.knowns.end())
    return Expression(known->second);
  if (const auto known = hypothesis_.knowns.find(name); known != hypothesis_.knowns.end())
    return Expression(known->second);
  if (contains(hypothesis_.inputs, name)) return meaning_of_input(name, where);
  return without_meaning(name, where);
}

Result<Expression> Names::meaning_of_input(const std::string& name,
                                           const std::string& where) const {
  const InputCourse* course = find_course(experiment_, name);
  if (!course)
    return failure("the input " + quoted(name) + ", used in " + where + ", is not set",
                   "a value for each input that a hypothesis uses",
                   "add it under [inputs] of the experiment, or give it an 'otherwise' under "
                   "[inputs] of study.toml");
  if (is_constant(*course, experiment_.begins))
    return Expression(value_at(*course, experiment_.begins));
  return Expression::symbol(name);
}

Failure Names::without_meaning(const std::string& name, const std::string& where) const {
  const auto giver = std::find_if(experiments_.begin(), experiments_.end(),
                                  [&](const auto& each) { return each.knowns.contains(name); });
  if (giver != experiments_.end())
    return failure(
        "the known " + quoted(name) + ", used in " + where + ", is not given",
        "a value from each experiment, as " + quoted(giver->name) + " gives one",
        "add 'knowns." + name +
            " = ...' to the experiment, or a value for all under [knowns] of study.toml");
  std::string expected =
      "a species, reaction, compartment, known, unknown or input of this hypothesis, or a name "
      "under its [where]";
  if (const auto nearest = core::nearest_name(name, all_names()))
    expected += "; nearest known name: " + quoted(*nearest);
  return failure(quoted(name) + ", used in " + where + ", means nothing in this hypothesis",
                 expected,
                 "correct the name, or give the hypothesis a meaning for it under [where]");
}

std::vector<std::string> Names::all_names() const {
  std::vector<std::string> names;
  for (const auto& species : hypothesis_.species) names.push_back(species.name);
  for (const auto& compartment : hypothesis_.compartments) names.push_back(compartment.name);
  for (const auto& reaction : hypothesis_.reactions) names.push_back(reaction.name);
  for (const auto& definition : hypothesis_.definitions) names.push_back(definition.name);
  for (const auto& known : hypothesis_.knowns) names.push_back(known.first);
  for (const auto& known : experiment_.knowns) names.push_back(known.first);
  names.insert(names.end(), hypothesis_.unknowns.begin(), hypothesis_.unknowns.end());
  names.insert(names.end(), hypothesis_.inputs.begin(), hypothesis_.inputs.end());
  return names;
}

Failure Names::failure(std::string what, std::string expected, std::string to_do) const {
  const std::string with =
      experiment_.name.empty() ? "" : " with experiment " + quoted(experiment_.name);
  return {"hypothesis " + quoted(hypothesis_.title) + with + ": " + std::move(what),
          std::move(expected), std::move(to_do), std::nullopt};
}

}  // namespace gainsay::estimation
