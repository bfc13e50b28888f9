#include "gainsay/core/network.h"

#include "gainsay/testing/mechanism.h"

#include <gmock/gmock.h>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using ::testing::Field;
using ::testing::HasSubstr;
using ::testing::IsEmpty;
using testing::Mechanism;

Mechanism cells() {
  return Mechanism("cells")
      .species("nitrile")
      .species("amide")
      .species("acid")
      .species("enzyme", "1")
      .rate("hydration", {{"nitrile", 1}}, {{"amide", 1}}, "k1 * enzyme * nitrile / (K1 + nitrile)")
      .rate("hydrolysis", {{"amide", 1}}, {{"acid", 1}}, "k2 * amide")
      .unknowns({"k1", "K1", "k2"});
}

std::vector<std::string> texts(const std::vector<ConservedSum>& sums) {
  std::vector<std::string> all;
  for (const auto& sum : sums) all.push_back(sum.text);
  return all;
}

TEST(Network, StoichiometryAndSumsOfAChain) {
  const Network network = derive_network(cells());
  Eigen::MatrixXd expected(4, 2);
  expected << -1, 0, 1, -1, 0, 1, 0, 0;
  EXPECT_EQ(network.stoichiometry, expected);
  EXPECT_THAT(texts(network.conserved), ElementsAre("nitrile + amide + acid", "enzyme"));
  EXPECT_THAT(network.influences, ElementsAre(Influence{"enzyme", 0, Sign::Raises}));
}

TEST(Network, SumsOverCompartmentsAreOfAmounts) {
  const Network network = derive_network(
      Mechanism("closed")
          .amount("depot")
          .compartment("plasma", "V1")
          .species("drug")
          .compartment("tissue", "V2")
          .species("deep")
          .flow("absorption", {{"depot", 1}}, {{"drug", 1}}, "ka * depot")
          .flow("distribution", {{"drug", 1}}, {{"deep", 1}}, "Q * drug", "Q * deep"));
  EXPECT_THAT(texts(network.conserved), ElementsAre("depot + drug * plasma + deep * tissue"));
}

TEST(Network, WeightsOfADimerAreWholeNumbers) {
  const Network network = derive_network(Mechanism("dimer").species("M").species("D").rate(
      "pairing", {{"M", 2}}, {{"D", 1}}, "k * M^2"));
  EXPECT_THAT(texts(network.conserved), ElementsAre("M + 2 * D"));
}

TEST(Network, HeldSpeciesAreOutsideOfSums) {
  const Network network = derive_network(Mechanism("buffered")
                                             .species("A")
                                             .held("H", "1")
                                             .rate("bind", {{"A", 1}, {"H", 1}}, {}, "k * A * H"));
  EXPECT_THAT(network.conserved, IsEmpty());
  EXPECT_TRUE(network.stoichiometry.row(1).isZero(0));
}

std::vector<Warning> warnings_of(const Hypothesis& hypothesis,
                                 const std::vector<std::string>& used_elsewhere = {}) {
  return warnings(hypothesis, derive_network(hypothesis), used_elsewhere);
}

TEST(Warnings, NoneOfASoundMechanism) { EXPECT_THAT(warnings_of(cells()), IsEmpty()); }

TEST(Warnings, ARateThatGoesOnWithoutItsReactant) {
  const auto all = warnings_of(
      Mechanism("zero order").species("A").species("B").rate("loss", {{"A", 1}}, {}, "k0 + B"));
  ASSERT_THAT(all, ElementsAre(Field(&Warning::about, "loss")));
  EXPECT_EQ(all[0].what,
            "the rate of 'loss' does not vanish when 'A' is used up: 'A' can go negative");
}

TEST(Warnings, AWayBackMustVanishWithTheProduct) {
  EXPECT_THAT(warnings_of(Mechanism("back").species("A").species("B").rate(
                  "turn", {{"A", 1}}, {{"B", 1}}, "k * A", "q")),
              ElementsAre(Field(&Warning::what, HasSubstr("'B' can go negative"))));
  EXPECT_THAT(warnings_of(Mechanism("single")
                              .species("A")
                              .species("B")
                              .rate("turn", {{"A", 1}}, {{"B", 1}}, "k * (A - B / K)")
                              .reversible()),
              IsEmpty());
}

TEST(Warnings, ACatalystOrAHeldSpeciesCannotRunOut) {
  EXPECT_THAT(warnings_of(Mechanism("autocatalysis")
                              .species("E")
                              .held("H", "1")
                              .rate("growth", {{"E", 1}, {"H", 1}}, {{"E", 2}}, "k")),
              IsEmpty());
}

TEST(Warnings, IdleNames) {
  const Hypothesis hypothesis = Mechanism("idle")
                                    .compartment("jar", "1")
                                    .compartment("tank", "1")
                                    .species("A")
                                    .species("X")
                                    .rate("loss", {{"A", 1}}, {}, "k * A")
                                    .where("ratio", "half / A")
                                    .where("half", "A / 2")
                                    .where("spare", "1 + half");
  EXPECT_THAT(warnings_of(hypothesis, {"ratio"}),
              ElementsAre(Field(&Warning::what, "nothing makes or uses the species 'X'"),
                          Field(&Warning::about, "spare"), Field(&Warning::about, "jar")));
  EXPECT_THAT(warnings_of(hypothesis, {"ratio", "X", "spare", "jar"}), IsEmpty());
}

}  // namespace
}  // namespace gainsay::core
