#include "gainsay/cli/hypothesis_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

HypothesisReading read(const std::string& text) {
  const auto file = testing::source(text, "hypotheses/two.toml");
  Diagnostics diagnostics;
  const auto document = read_toml(file, diagnostics);
  HypothesisReading reading =
      read_hypothesis(document.value_or(TomlValue{}), whole(file), diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return reading;
}

TEST(HypothesisReader, WithoutATitleItIsCalledByItsFile) {
  EXPECT_EQ(read("").hypothesis.mechanism.title, "two");
  EXPECT_EQ(read("title = 'Two steps'\n").hypothesis.mechanism.title, "Two steps");
}

TEST(HypothesisReader, WithoutCompartmentsThereIsOneOfVolumeOne) {
  const core::Hypothesis mechanism = read("species.A = {}\n").hypothesis.mechanism;
  ASSERT_EQ(mechanism.compartments.size(), 1U);
  EXPECT_TRUE(mechanism.compartments[0].volume.is_number(1.0));
  EXPECT_EQ(mechanism.species[0].compartment, 0U);
}

TEST(HypothesisReader, AllKeysOfASpecies) {
  const core::Hypothesis mechanism =
      read(
          "compartments.a = {}\ncompartments.b = { volume = 'V' }\n"
          "[species]\n"
          "R = { in = 'b', start = '2 * s0', held = true, shown_as = 'R*', negligible = 1e-9 }\n"
          "depot = { amount = true }\n")
          .hypothesis.mechanism;
  const core::Species& R = mechanism.species[0];
  EXPECT_EQ(R.compartment, 1U);
  EXPECT_EQ(R.shown_as, "R*");
  EXPECT_TRUE(R.held);
  EXPECT_EQ(R.negligible, 1e-9);
  EXPECT_EQ(R.start, core::Expression(2.0) * core::Expression::symbol("s0"));
  EXPECT_TRUE(mechanism.species[1].amount);
  EXPECT_EQ(mechanism.species[1].shown_as, "depot");
  EXPECT_EQ(mechanism.compartments[1].volume, core::Expression::symbol("V"));
}

TEST(HypothesisReader, EveryListStandsInTheOrderOfTheText) {
  const core::Hypothesis mechanism =
      read("[where]\nz = 1\na = 2\n[species]\nzeta = {}\nalpha = {}\n").hypothesis.mechanism;
  EXPECT_EQ(mechanism.definitions[0].name, "z");
  EXPECT_EQ(mechanism.definitions[1].name, "a");
  EXPECT_EQ(mechanism.species[0].name, "zeta");
}

TEST(HypothesisReader, ItsUnknownsAreItsOwn) {
  const HypothesisReading reading = read("unknowns.k = [1, 2]\nknowns.c = 3\n");
  ASSERT_EQ(reading.hypothesis.unknowns.size(), 1U);
  EXPECT_TRUE(reading.hypothesis.unknowns[0].own);
  ASSERT_EQ(reading.knowns.size(), 1U);
  EXPECT_EQ(reading.knowns[0].value, 3.0);
}

TEST(HypothesisReader, AllThatIsDeclaredIsListedWithItsKind) {
  const HypothesisReading reading = read(
      "compartments.tank = {}\nspecies.A = {}\nwhere.v = 1\nknowns.c = 3\nunknowns.k = [1, 2]\n"
      "reactions.loss = { equation = 'A ->', rate = 'k * A' }\n");
  std::vector<std::pair<std::string, NameKind>> declared;
  for (const DeclaredName& name : reading.names) declared.emplace_back(name.name, name.kind);
  EXPECT_EQ(declared,
            (std::vector<std::pair<std::string, NameKind>>{{"tank", NameKind::Compartment},
                                                           {"A", NameKind::Species},
                                                           {"v", NameKind::Definition},
                                                           {"loss", NameKind::Reaction},
                                                           {"c", NameKind::Known},
                                                           {"k", NameKind::Unknown}}));
}

}  // namespace
}  // namespace gainsay::cli
