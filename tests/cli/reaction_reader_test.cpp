#include "gainsay/cli/reaction_reader.h"

#include "gainsay/core/parse.h"
#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

// A and B in one compartment, C in another, D an amount.
core::Hypothesis mechanism() {
  core::Hypothesis hypothesis;
  hypothesis.compartments = {{"left", 1.0}, {"right", 2.0}};
  for (const char* name : {"A", "B", "C", "D"}) hypothesis.species.emplace_back().name = name;
  hypothesis.species[2].compartment = 1;
  hypothesis.species[3].amount = true;
  return hypothesis;
}

struct Read {
  std::optional<core::Reaction> reaction;
  std::vector<WrittenExpression> expressions;
  std::string said;
};

Read read(const std::string& table) {
  const TomlValue document = testing::toml("step = " + table + "\n");
  Diagnostics diagnostics;
  Read result;
  result.reaction =
      read_reaction(document.entries[0], mechanism(), result.expressions, diagnostics);
  result.said = testing::said_briefly(diagnostics);
  return result;
}

core::Expression parsed(const char* text) { return core::parse(text)->expression; }

TEST(ReactionReader, RateOfOneWay) {
  const Read one = read("{ equation = '2 A -> B', rate = 'k * A^2' }");
  ASSERT_TRUE(one.reaction.has_value()) << one.said;
  EXPECT_EQ(one.reaction->name, "step");
  EXPECT_EQ(one.reaction->reactants, (std::vector<core::Term>{{0, 2.0}}));
  EXPECT_EQ(one.reaction->products, (std::vector<core::Term>{{1, 1.0}}));
  EXPECT_FALSE(one.reaction->flow);
  EXPECT_FALSE(one.reaction->reversible);
  EXPECT_EQ(one.reaction->forward, parsed("k * A^2"));
  EXPECT_EQ(one.expressions.size(), 1U);
}

TEST(ReactionReader, MassActionTakesTheSideFromWhichItGoes) {
  const Read one =
      read("{ equation = '2 A <-> B', rate = 'mass_action(k1)', back = 'mass_action(k2)' }");
  ASSERT_TRUE(one.reaction.has_value()) << one.said;
  EXPECT_EQ(one.reaction->forward, parsed("k1 * A^2"));
  EXPECT_EQ(one.reaction->back, parsed("k2 * B"));
  EXPECT_EQ(one.expressions.size(), 2U);
}

TEST(ReactionReader, ASingleSignedRateWillDo) {
  const Read one = read("{ equation = 'A <-> B', rate = 'k * (A - B)' }");
  ASSERT_TRUE(one.reaction.has_value()) << one.said;
  EXPECT_TRUE(one.reaction->reversible);
  EXPECT_FALSE(one.reaction->back.has_value());
}

TEST(ReactionReader, AFlowMayCrossCompartmentsAndMoveAmounts) {
  EXPECT_TRUE(read("{ equation = 'A <-> C', flow = 'Q * A', back = 'Q * C' }").reaction->flow);
  EXPECT_EQ(read("{ equation = 'D -> A', flow = 'k * D' }").said, "");
}

TEST(ReactionReader, ARateMayNot) {
  EXPECT_EQ(read("{ equation = 'A -> C', rate = 'Q * A' }").said,
            "1:29: 'step' has a rate, but 'A' and 'C' are in different compartments\n");
  EXPECT_EQ(read("{ equation = 'D -> A', rate = 'k * D' }").said,
            "1:32: 'step' has a rate, but 'D' is an amount\n");
}

TEST(ReactionReader, ARateOfOneSpeciesMayStandInAnyCompartment) {
  EXPECT_EQ(read("{ equation = 'C ->', rate = 'k * C' }").said, "");
  EXPECT_EQ(read("{ equation = '-> C', rate = 2 }").said, "");
}

}  // namespace
}  // namespace gainsay::cli
