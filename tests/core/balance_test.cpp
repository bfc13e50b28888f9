#include "gainsay/core/balance.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/mechanism.h"

#include <gmock/gmock.h>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using testing::Mechanism;

std::vector<std::string> printed(const std::vector<Expression>& expressions) {
  std::vector<std::string> texts;
  for (const auto& expression : expressions) texts.push_back(print_text(expression));
  return texts;
}

TEST(Balance, CoefficientsMultiplyTheRateOfTheReaction) {
  const Hypothesis hypothesis = Mechanism("dimer")
                                    .species("M")
                                    .species("D")
                                    .rate("pairing", {{"M", 2}}, {{"D", 1}}, "k * M^2")
                                    .rate("half", {{"D", 0.5}}, {}, "q * D");
  EXPECT_THAT(printed(balance_by_name(hypothesis)),
              ElementsAre("-2 * pairing", "pairing - 0.5 * half"));
  EXPECT_THAT(printed(balance(hypothesis)),
              ElementsAre("-2 * (k * M^2)", "k * M^2 - 0.5 * (q * D)"));
}

// Mass balances of two compartments joined by flow, as in any text on compartmental analysis
// (Jacquez 1972): V1 dc1/dt = -CL c1 - Q c1 + Q c2, V2 dc2/dt = Q c1 - Q c2.
TEST(Balance, FlowsAreDividedByTheVolumeOfEachCompartment) {
  const Hypothesis hypothesis =
      Mechanism("two compartments")
          .amount("depot")
          .compartment("plasma", "V1")
          .species("drug")
          .compartment("tissue", "V2")
          .species("deep")
          .flow("absorption", {{"depot", 1}}, {{"drug", 1}}, "ka * depot")
          .flow("elimination", {{"drug", 1}}, {}, "CL * drug")
          .flow("distribution", {{"drug", 1}}, {{"deep", 1}}, "Q * drug", "Q * deep");
  EXPECT_THAT(printed(balance_by_name(hypothesis)),
              ElementsAre("-absorption", "(absorption - elimination - distribution) / plasma",
                          "distribution / tissue"));
  EXPECT_THAT(printed(balance(hypothesis)),
              ElementsAre("-(ka * depot)", "(ka * depot - CL * drug - (Q * drug - Q * deep)) / V1",
                          "(Q * drug - Q * deep) / V2"));
}

TEST(Balance, RatesAndFlowsAddUpInOneSpecies) {
  const Hypothesis hypothesis = Mechanism("fed")
                                    .compartment("tank", "fill")
                                    .species("nitrile")
                                    .flow("feeding", {}, {{"nitrile", 1}}, "feed * c_feed")
                                    .rate("hydration", {{"nitrile", 1}}, {}, "k * nitrile");
  EXPECT_THAT(printed(balance_by_name(hypothesis)), ElementsAre("-hydration + feeding / tank"));
}

TEST(Balance, AVolumeOfOneIsNotWritten) {
  const Hypothesis hypothesis =
      Mechanism("flask").species("A").flow("loss", {{"A", 1}}, {}, "k * A");
  EXPECT_THAT(printed(balance_by_name(hypothesis)), ElementsAre("-loss"));
}

TEST(Balance, WhatIsHeldDoesNotChange) {
  const Hypothesis hypothesis = Mechanism("buffered")
                                    .held("H", "1e-7")
                                    .species("A")
                                    .rate("protonation", {{"A", 1}, {"H", 1}}, {}, "k * A * H");
  EXPECT_THAT(printed(balance_by_name(hypothesis)), ElementsAre("0", "-protonation"));
}

TEST(StoichiometricCoefficient, ACatalystOnBothSidesCancels) {
  const Hypothesis hypothesis = Mechanism("catalysis")
                                    .species("E")
                                    .species("S")
                                    .rate("turnover", {{"E", 1}, {"S", 1}}, {{"E", 1}}, "k * E * S")
                                    .rate("split", {{"E", 0.3}}, {{"E", 0.1}, {"E", 0.2}}, "k * E");
  EXPECT_EQ(stoichiometric_coefficient(hypothesis.reactions[0], 0), 0.0);
  EXPECT_EQ(stoichiometric_coefficient(hypothesis.reactions[0], 1), -1.0);
  EXPECT_EQ(stoichiometric_coefficient(hypothesis.reactions[1], 0), 0.0);
}

}  // namespace
}  // namespace gainsay::core
