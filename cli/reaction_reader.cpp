#include "gainsay/cli/reaction_reader.h"

#include "gainsay/cli/key_check.h"
#include "gainsay/cli/reaction_equation.h"
#include "gainsay/core/nearest_name.h"

#include <string>
#include <utility>

namespace gainsay::cli {

namespace {

class ReactionReader {
 public:
  ReactionReader(const TomlEntry& entry, const core::Hypothesis& mechanism,
                 std::vector<WrittenExpression>& expressions, Diagnostics& diagnostics)
      : entry_(entry),
        mechanism_(mechanism),
        expressions_(expressions),
        diagnostics_(diagnostics),
        table_(entry.value, Section::Reaction, Section::Hypothesis, diagnostics) {}

  std::optional<core::Reaction> read() {
    if (!read_equation_key()) return std::nullopt;
    reaction_.name = entry_.key;
    reaction_.reversible = equation_.reversible;
    reaction_.reactants = terms(equation_.left);
    reaction_.products = terms(equation_.right);
    const TomlEntry* forward = forward_key();
    if (forward == nullptr) return std::nullopt;
    reaction_.flow = forward->key == "flow";
    if (!reaction_.flow) require_one_compartment(*forward);
    const std::string role = "the " + forward->key + " of '" + entry_.key + "'";
    reaction_.forward = expression(forward->value, role, equation_.left).value_or(0.0);
    read_back();
    return std::move(reaction_);
  }

 private:
  bool read_equation_key() {
    const TomlValue* text = table_.value("equation");
    if (text == nullptr) {
      if (table_.lacks("equation")) {
        diagnostics_.error(entry_.place,
                           {"the reaction '" + entry_.key + "' has no equation",
                            "equation = \"A -> B\"", "add it; an empty side is the outside"});
      }
      return false;
    }
    auto read = read_equation(text->text);
    if (!read) {
      const core::Failure& failure = read.failure();
      const Location at = failure.place ? place_in(*text, failure.place->offset) : text->place;
      diagnostics_.error(
          at, {failure.what + " (of '" + entry_.key + "')", failure.expected, failure.to_do});
      return false;
    }
    equation_ = *std::move(read);
    return true;
  }

  std::vector<core::Term> terms(const std::vector<EquationPart>& side) {
    std::vector<core::Term> terms;
    for (const EquationPart& part : side) {
      std::optional<std::size_t> number;
      for (std::size_t i = 0; i < mechanism_.species.size(); ++i) {
        if (mechanism_.species[i].name == part.species) number = i;
      }
      if (number) {
        terms.push_back({*number, part.coefficient});
      } else {
        say_unknown(part);
      }
    }
    return terms;
  }

  void say_unknown(const EquationPart& part) {
    std::vector<std::string> names;
    for (const core::Species& species : mechanism_.species) names.push_back(species.name);
    const auto nearest = core::nearest_name(part.species, names);
    diagnostics_.error(
        place_in(*table_.value("equation"), part.place.offset),
        {"unknown species '" + part.species + "' in the equation of '" + entry_.key + "'",
         nearest ? "a name under [species]; nearest: '" + *nearest + "'" : "a name under [species]",
         "correct the name, or add '" + part.species + "' under [species]"});
  }

  const TomlEntry* forward_key() {
    const TomlEntry* rate = table_.entry("rate");
    const TomlEntry* flow = table_.entry("flow");
    if (rate != nullptr && flow != nullptr) {
      diagnostics_.error(
          (rate->place.line < flow->place.line ? flow : rate)->place,
          {"the reaction '" + entry_.key + "' has both rate and flow",
           "rate (concentration per time) or flow (amount per time)", "remove one of the two"});
      return nullptr;
    }
    if (rate == nullptr && flow == nullptr && table_.lacks("rate") && table_.lacks("flow")) {
      diagnostics_.error(
          entry_.place,
          {"the reaction '" + entry_.key + "' has neither rate nor flow",
           "rate = \"...\" or flow = \"...\"", "add one of the two; \"mass_action(k)\" is a rate"});
    }
    return rate != nullptr ? rate : flow;
  }

  void require_one_compartment(const TomlEntry& rate) {
    const core::Species* first = nullptr;
    for (const std::vector<core::Term>* side : {&reaction_.reactants, &reaction_.products}) {
      for (const core::Term& term : *side) {
        const core::Species& species = mechanism_.species[term.species];
        if (species.amount) {
          diagnostics_.error(rate.place, {"'" + entry_.key + "' has a rate, but '" + species.name +
                                              "' is an amount",
                                          "flow, in amount per time",
                                          "write flow = \"...\"; a concentration times its volume "
                                          "is an amount"});
          return;
        }
        if (first == nullptr) first = &species;
        if (first->compartment == species.compartment) continue;
        diagnostics_.error(rate.place,
                           {"'" + entry_.key + "' has a rate, but '" + first->name + "' and '" +
                                species.name + "' are in different compartments",
                            "flow, in amount per time",
                            "write flow = \"...\"; a concentration times its volume is an amount"});
        return;
      }
    }
  }

  void read_back() {
    const TomlEntry* back = table_.entry("back");
    if (back == nullptr) return;
    if (!equation_.reversible) {
      diagnostics_.error(back->place, {"'" + entry_.key + "' goes one way, but has a way back",
                                       "'<->' in the equation, or no back",
                                       "write the equation with '<->', or remove back"});
      return;
    }
    reaction_.back =
        expression(back->value, "the way back of '" + entry_.key + "'", equation_.right);
  }

  std::optional<core::Expression> expression(const TomlValue& value, std::string role,
                                             const std::vector<EquationPart>& side) {
    const core::ParseContext context{mass_action_side(side)};
    auto written =
        read_expression(value, std::move(role), Leans::OnAnything, diagnostics_, context);
    if (!written) return std::nullopt;
    core::Expression result = written->expression;
    expressions_.push_back(*std::move(written));
    return result;
  }

  const TomlEntry& entry_;
  const core::Hypothesis& mechanism_;
  std::vector<WrittenExpression>& expressions_;
  Diagnostics& diagnostics_;
  CheckedTable table_;
  ReactionEquation equation_;
  core::Reaction reaction_;
};

}  // namespace

std::optional<core::Reaction> read_reaction(const TomlEntry& entry,
                                            const core::Hypothesis& mechanism,
                                            std::vector<WrittenExpression>& expressions,
                                            Diagnostics& diagnostics) {
  return ReactionReader(entry, mechanism, expressions, diagnostics).read();
}

}  // namespace gainsay::cli
