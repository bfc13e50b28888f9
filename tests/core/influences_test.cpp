#include "gainsay/core/influences.h"

#include "gainsay/testing/mechanism.h"

#include <gmock/gmock.h>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using ::testing::IsEmpty;
using testing::Mechanism;
using testing::written;

TEST(Influences, HelpersRaiseAndInhibitorsLower) {
  const Hypothesis hypothesis =
      Mechanism("inhibited")
          .species("S")
          .species("P")
          .species("E")
          .rate("turnover", {{"S", 1}}, {{"P", 1}}, "kcat * E * S / (Km * brake + S)")
          .where("brake", "1 + P / Ki")
          .unknowns({"kcat", "Km", "Ki"});
  EXPECT_THAT(find_influences(hypothesis),
              ElementsAre(Influence{"P", 0, Sign::Lowers}, Influence{"E", 0, Sign::Raises}));
}

TEST(Influences, AnInputCountsLikeAHelper) {
  const Hypothesis hypothesis = Mechanism("heated")
                                    .species("A")
                                    .rate("loss", {{"A", 1}}, {}, "k * exp(-Ea / (8.314 * T)) * A")
                                    .unknowns({"k", "Ea"})
                                    .inputs({"T", "feed"});
  EXPECT_THAT(find_influences(hypothesis), ElementsAre(Influence{"T", 0, Sign::Raises}));
}

TEST(Influences, WhatDoesBothIsEither) {
  // Activation at little, inhibition at much (Haldane 1930), by a third species.
  const Hypothesis hypothesis = Mechanism("bell").species("A").species("M").rate(
      "loss", {{"A", 1}}, {}, "k * A * M / (1 + M + M^2 / Ki)");
  EXPECT_THAT(find_influences(hypothesis), ElementsAre(Influence{"M", 0, Sign::Either}));
}

TEST(Influences, ReactantsAndProductsOfAWayBackAreNone) {
  const Hypothesis hypothesis = Mechanism("reversible")
                                    .species("A")
                                    .species("B")
                                    .rate("turn", {{"A", 1}}, {{"B", 1}}, "k * A", "q * B");
  EXPECT_THAT(find_influences(hypothesis), IsEmpty());
}

TEST(Influences, AHelperOfBothWaysRaisesBoth) {
  const Hypothesis separate = Mechanism("separate")
                                  .species("A")
                                  .species("B")
                                  .species("E")
                                  .rate("turn", {{"A", 1}}, {{"B", 1}}, "k * E * A", "q * E * B");
  EXPECT_THAT(find_influences(separate), ElementsAre(Influence{"E", 0, Sign::Raises}));
  const Hypothesis single = Mechanism("single")
                                .species("A")
                                .species("B")
                                .species("E")
                                .rate("turn", {{"A", 1}}, {{"B", 1}}, "k * E * (A - B / K)")
                                .reversible();
  EXPECT_THAT(find_influences(single), ElementsAre(Influence{"E", 0, Sign::Raises}));
}

TEST(Influences, WhatCancelsIsNone) {
  const Hypothesis hypothesis = Mechanism("cancelled")
                                    .species("A")
                                    .species("M")
                                    .rate("loss", {{"A", 1}}, {}, "k * A * (1 + M - M)");
  EXPECT_THAT(find_influences(hypothesis), IsEmpty());
}

TEST(Effect, KnownsCountAtTheirValues) {
  const Hypothesis hypothesis = Mechanism("signed").known("c", -1.0);
  EXPECT_EQ(effect(written("c * x"), "x", hypothesis, false), Sign::Lowers);
}

}  // namespace
}  // namespace gainsay::core
