#include "gainsay/cli/reaction_equation.h"

#include "gainsay/core/parse.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

std::string shown(const std::vector<EquationPart>& side) {
  std::string text;
  for (const EquationPart& part : side) {
    text += (text.empty() ? "" : " + ") + std::to_string(part.coefficient).substr(0, 4) + " " +
            part.species;
  }
  return text;
}

std::string shown(std::string_view text) {
  const auto equation = read_equation(text);
  if (!equation) return equation.failure().what;
  return shown(equation->left) + (equation->reversible ? " <-> " : " -> ") + shown(equation->right);
}

TEST(ReactionEquation, SidesHaveCoefficients) {
  EXPECT_EQ(shown("A -> B"), "1.00 A -> 1.00 B");
  EXPECT_EQ(shown("2 A + 0.5 B_2 -> 3C"), "2.00 A + 0.50 B_2 -> 3.00 C");
  EXPECT_EQ(shown("2*A->B"), "2.00 A -> 1.00 B");
  EXPECT_EQ(shown("  A\n-> B "), "1.00 A -> 1.00 B");
}

TEST(ReactionEquation, AllFourArrows) {
  EXPECT_EQ(shown("A \u2192 B"), "1.00 A -> 1.00 B");
  EXPECT_EQ(shown("A <-> B"), "1.00 A <-> 1.00 B");
  EXPECT_EQ(shown("A \u21CC B"), "1.00 A <-> 1.00 B");
}

TEST(ReactionEquation, AnEmptySideIsTheOutside) {
  EXPECT_EQ(shown("-> A"), " -> 1.00 A");
  EXPECT_EQ(shown("A ->"), "1.00 A -> ");
}

TEST(ReactionEquation, ASpeciesThatStandsTwiceOnASideIsOnePart) {
  EXPECT_EQ(shown("A + A -> B"), "2.00 A -> 1.00 B");
  EXPECT_EQ(shown("A -> 2 A"), "1.00 A -> 2.00 A");
}

// "E2" is a name, so that 2E2 is two E2 and no power of ten.
TEST(ReactionEquation, CoefficientsHaveNoExponents) {
  EXPECT_EQ(shown("2E2 -> B"), "2.00 E2 -> 1.00 B");
}

TEST(ReactionEquation, FailuresKnowTheirPlaces) {
  const auto offset = [](std::string_view text) {
    return read_equation(text).failure().place->offset;
  };
  EXPECT_EQ(offset("A => B"), 2U);
  EXPECT_EQ(offset("A -> B -> C"), 7U);
  EXPECT_EQ(offset("A -> 0 B"), 5U);
  EXPECT_EQ(offset("A B -> C"), 2U);
  EXPECT_EQ(offset("A + -> C"), 4U);
  EXPECT_EQ(offset("A -> 1.2.3 B"), 5U);
}

TEST(ReactionEquation, MassActionIsTheProductOfItsSide) {
  const auto equation = read_equation("2 A + B -> C");
  EXPECT_EQ(mass_action_side(equation->left), core::parse("A^2 * B")->expression);
  EXPECT_EQ(mass_action_side(equation->right), core::parse("C")->expression);
  EXPECT_EQ(mass_action_side({}), core::Expression(1.0));
}

TEST(ReactionEquation, IsWrittenAsItsAuthorWould) {
  core::Hypothesis hypothesis;
  for (const char* name : {"A", "B", "C"}) hypothesis.species.emplace_back().name = name;
  core::Reaction reaction;
  reaction.reactants = {{0, 2.0}, {1, 1.0}};
  reaction.products = {{2, 0.5}};
  EXPECT_EQ(equation_text(reaction, hypothesis), "2 A + B -> 0.5 C");
  reaction.reversible = true;
  reaction.products.clear();
  EXPECT_EQ(equation_text(reaction, hypothesis), "2 A + B <->");
  reaction.reversible = false;
  reaction.reactants.clear();
  reaction.products = {{0, 1.0}};
  EXPECT_EQ(equation_text(reaction, hypothesis), "-> A");
}

}  // namespace
}  // namespace gainsay::cli
