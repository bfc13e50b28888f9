#include "gainsay/cli/equations.h"

#include "gainsay/cli/reaction_equation.h"
#include "gainsay/core/balance.h"
#include "gainsay/core/print.h"
#include "gainsay/estimation/course.h"
#include "gainsay/estimation/measurement.h"
#include "gainsay/estimation/names.h"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <algorithm>
#include <optional>
#include <set>
#include <utility>

namespace gainsay::cli {
namespace {

using core::Expression;
using core::Hypothesis;
using core::print_number;
using Left = Equation::Left;

/// Experiments that agree on a value, in order.
template <class Value>
struct Agreed {
  Value value;
  std::vector<std::string> experiments;
};

/// Groups what the experiments give by equal values; `give` returns nothing where one gives none.
template <class Value, class Give>
std::vector<Agreed<Value>> agreed(const std::vector<estimation::Experiment>& experiments,
                                  const Give& give) {
  std::vector<Agreed<Value>> groups;
  for (const auto& experiment : experiments) {
    const std::optional<Value> value = give(experiment);
    if (!value) continue;
    const auto group = std::find_if(groups.begin(), groups.end(),
                                    [&](const auto& each) { return each.value == *value; });
    if (group == groups.end())
      groups.push_back({*value, {experiment.name}});
    else
      group->experiments.push_back(experiment.name);
  }
  return groups;
}

/// "in run-03, run-04"; nothing where all agree.
std::string in_experiments(const std::vector<std::string>& names, const Study& study) {
  if (names.size() == study.experiments.size()) return "";
  return fmt::format("in {}", fmt::join(names, ", "));
}

EquationSection derivatives(const Hypothesis& hypothesis) {
  EquationSection section{"Derivatives", {}, {}};
  const auto rates = core::balance_by_name(hypothesis);
  for (std::size_t i = 0; i < hypothesis.species.size(); ++i) {
    const core::Species& species = hypothesis.species[i];
    std::string words = species.held ? "held by the experimenter" : "";
    if (species.amount) words += words.empty() ? "an amount" : "; an amount";
    section.equations.push_back({Left::Derivative, species.name, rates[i], std::nullopt, words});
  }
  return section;
}

EquationSection reactions(const Hypothesis& hypothesis) {
  EquationSection section{"Reactions", {}, {}};
  for (const auto& reaction : hypothesis.reactions)
    section.equations.push_back({Left::Name, reaction.name, core::net(reaction),
                                 equation_of(reaction, hypothesis),
                                 reaction.flow ? "amount per time" : ""});
  return section;
}

EquationSection definitions(const Hypothesis& hypothesis) {
  EquationSection section{"Where", {}, {}};
  for (const auto& compartment : hypothesis.compartments)
    if (!compartment.volume.is_number(1.0))
      section.equations.push_back(
          {Left::Name, compartment.name, compartment.volume, std::nullopt, "volume"});
  for (const auto& definition : hypothesis.definitions)
    section.equations.push_back(
        {Left::Name, definition.name, definition.meaning, std::nullopt, ""});
  return section;
}

std::optional<Expression> start_in(const estimation::Experiment& experiment,
                                   const core::Species& species) {
  for (const auto& start : experiment.starts) {
    if (start.species != species.name) continue;
    if (!start.unknown) return start.value;
    return Expression::symbol(estimation::particular("start." + species.name, experiment.name));
  }
  return species.start;
}

EquationSection starts(const Study& study, const Hypothesis& hypothesis) {
  EquationSection section{"Start values", {}, {}};
  for (const auto& species : hypothesis.species) {
    auto groups = agreed<Expression>(
        study.experiments, [&](const auto& experiment) { return start_in(experiment, species); });
    if (groups.empty()) groups.push_back({species.start, {}});
    for (const auto& group : groups)
      section.equations.push_back({Left::AtBeginning, species.name, group.value, std::nullopt,
                                   in_experiments(group.experiments, study)});
  }
  return section;
}

/// Doses in the unit of the state, as they are computed.
EquationSection additions(const Study& study, const Hypothesis& hypothesis) {
  EquationSection section{"Additions", {}, {}};
  const auto take = [&](const estimation::Experiment& experiment, double at,
                        const std::string& name, const Expression& size, bool is_amount) {
    const auto number = core::find_species(hypothesis, name);
    if (!number) return;
    const core::Species& species = hypothesis.species[*number];
    const core::Compartment& compartment = hypothesis.compartments[species.compartment];
    const Expression volume = Expression::symbol(compartment.name);
    const bool same_unit = is_amount == species.amount || compartment.volume.is_number(1.0);
    const Expression rise = same_unit ? size : is_amount ? size / volume : size * volume;
    section.equations.push_back(
        {Left::Rise, name, rise, std::nullopt,
         fmt::format("at t = {} in {}", print_number(at), experiment.name)});
  };
  for (const auto& experiment : study.experiments)
    for (const auto& dose : experiment.doses) {
      for (const auto& [name, amount] : dose.add) take(experiment, dose.at, name, amount, true);
      for (const auto& [name, rise] : dose.raise) take(experiment, dose.at, name, rise, false);
    }
  return section;
}

std::string noise_words(const estimation::Noise& noise) {
  if (noise.sd_unknown)
    return noise.same_as.empty() ? "sd unknown" : "sd unknown, that of " + noise.same_as;
  std::vector<std::string> parts;
  if (noise.sd) parts.push_back("sd " + print_number(*noise.sd));
  if (noise.relative) parts.push_back(print_number(100.0 * *noise.relative) + " % of the value");
  return parts.empty() ? "sd beside each reading" : fmt::format("{}", fmt::join(parts, " and "));
}

EquationSection measurements(const Study& study) {
  EquationSection section{"Measurement equations", {}, {}};
  for (const auto& readout : study.readouts)
    section.equations.push_back({Left::OverTime, readout.name,
                                 estimation::measurement(readout, readout.shows, "experiment"),
                                 std::nullopt, noise_words(readout.noise)});
  return section;
}

std::string with_unit(std::string words, const std::string& unit) {
  return unit.empty() ? words : words + " " + unit;
}

std::string words_of(const estimation::Unknown& unknown) {
  std::string words = with_unit(
      fmt::format("{} to {}", print_number(unknown.low), print_number(unknown.high)), unknown.unit);
  if (unknown.linear) words += ", on a linear scale";
  if (!unknown.prior) return words;
  words += "; earlier work: " + print_number(unknown.prior->value);
  if (unknown.prior->sd) words += ", sd " + print_number(*unknown.prior->sd);
  if (unknown.prior->geometric_sd)
    words += ", geometric sd " + print_number(*unknown.prior->geometric_sd);
  return words;
}

EquationSection unknowns(const estimation::Problem& problem, estimation::UnknownKind kind,
                         std::string title) {
  EquationSection section{std::move(title), {}, {}};
  for (const auto& unknown : problem.unknowns)
    if (unknown.kind == kind) section.quantities.push_back({unknown.name, words_of(unknown)});
  return section;
}

/// Every name that stands on the right of an equation.
std::set<std::string, std::less<>> used_names(const std::vector<EquationSection>& sections) {
  std::set<std::string, std::less<>> names;
  for (const auto& section : sections)
    for (const auto& equation : section.equations) names.merge(core::symbols(equation.right));
  return names;
}

std::string course_words(const std::vector<std::pair<double, double>>& steps) {
  if (steps.size() == 1) return print_number(steps.front().second);
  std::vector<std::string> parts;
  for (const auto& [time, value] : steps)
    parts.push_back(print_number(value) + " from " + print_number(time));
  return fmt::format("{}", fmt::join(parts, ", "));
}

/// One quantity with its value, or with those of each group of experiments.
template <class Value, class Words>
Quantity given(const std::string& name, const std::vector<Agreed<Value>>& groups,
               const Study& study, const Words& words) {
  std::vector<std::string> parts;
  for (const auto& group : groups) {
    const std::string where = in_experiments(group.experiments, study);
    parts.push_back(words(group.value) + (where.empty() ? "" : " " + where));
  }
  return {name, fmt::format("{}", fmt::join(parts, "; "))};
}

EquationSection inputs(const Study& study, const Hypothesis& hypothesis,
                       const std::set<std::string, std::less<>>& used) {
  using Steps = std::vector<std::pair<double, double>>;
  EquationSection section{"Inputs", {}, {}};
  for (const auto& input : hypothesis.inputs) {
    if (!used.contains(input)) continue;
    const auto groups = agreed<Steps>(study.experiments, [&](const auto& experiment) {
      const auto* course = estimation::find_course(experiment, input);
      return course ? std::optional<Steps>(course->steps) : std::nullopt;
    });
    section.quantities.push_back(given(input, groups, study, course_words));
  }
  return section;
}

EquationSection knowns(const Study& study, const Hypothesis& hypothesis,
                       const std::set<std::string, std::less<>>& used) {
  EquationSection section{"Knowns", {}, {}};
  for (const auto& name : used) {
    const auto shared = hypothesis.knowns.find(name);
    auto groups = agreed<double>(study.experiments, [&](const auto& experiment) {
      if (const auto own = experiment.knowns.find(name); own != experiment.knowns.end())
        return std::optional<double>(own->second);
      return shared != hypothesis.knowns.end() ? std::optional<double>(shared->second)
                                               : std::nullopt;
    });
    if (groups.empty() && shared != hypothesis.knowns.end()) groups.push_back({shared->second, {}});
    if (!groups.empty()) section.quantities.push_back(given(name, groups, study, print_number));
  }
  return section;
}

}  // namespace

StateSpace state_space(const Study& study, std::size_t hypothesis,
                       const estimation::Problem& problem) {
  const StudyHypothesis& chosen = study.hypotheses[hypothesis];
  const Hypothesis& mechanism = chosen.mechanism;
  std::vector<EquationSection> sections{derivatives(mechanism),      reactions(mechanism),
                                        definitions(mechanism),      starts(study, mechanism),
                                        additions(study, mechanism), measurements(study)};
  const auto used = used_names(sections);
  using enum estimation::UnknownKind;
  sections.push_back(unknowns(problem, Kinetic, "Kinetic unknowns"));
  sections.push_back(unknowns(problem, Initial, "Initial-condition unknowns"));
  sections.push_back(unknowns(problem, Measurement, "Measurement unknowns"));
  sections.push_back(inputs(study, mechanism, used));
  sections.push_back(knowns(study, mechanism, used));
  std::erase_if(sections, [](const EquationSection& section) {
    return section.equations.empty() && section.quantities.empty();
  });

  StateSpace form{chosen.letter, mechanism.title, std::move(sections), true, {}};
  for (const auto& experiment : study.experiments)
    form.begins_at_zero = form.begins_at_zero && experiment.begins == 0.0;
  for (const auto& species : mechanism.species)
    if (!species.shown_as.empty() && species.shown_as != species.name)
      form.shown_as.emplace(species.name, species.shown_as);
  return form;
}

}  // namespace gainsay::cli
