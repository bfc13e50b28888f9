#include "gainsay/core/same_system.h"

#include "gainsay/testing/mechanism.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

using testing::Mechanism;
using testing::written;

Mechanism michaelis(const char* rate) {
  return Mechanism("m").species("S").species("P").rate("turnover", {{"S", 1}}, {{"P", 1}}, rate);
}

TEST(SameSystem, TheSameFunctionInAnotherForm) {
  EXPECT_TRUE(same_system(michaelis("Vmax * S / (Km + S)"), michaelis("Vmax / (1 + Km / S)")));
  EXPECT_TRUE(same_system(michaelis("k * (S + P)^2 - k * P^2"), michaelis("k * S * (S + 2 * P)")));
  EXPECT_TRUE(same_system(michaelis("0.1 * S"), michaelis("S / 10")));
}

TEST(SameSystem, AnotherFunctionHoweverClose) {
  EXPECT_FALSE(same_system(michaelis("Vmax * S / (Km + S)"), michaelis("Vmax * S / (Kd + S)")));
  EXPECT_FALSE(same_system(michaelis("k * S"), michaelis("k * S * (1 + 1e-15)")));
  EXPECT_FALSE(same_system(michaelis("k * S"), michaelis("k * S + 1e-20 * P")));
}

TEST(SameSystem, OneReactionOrTwoMakeNoDifference) {
  const Hypothesis two = Mechanism("m")
                             .species("P")
                             .species("S")
                             .rate("a", {{"S", 1}}, {{"P", 1}}, "k * S")
                             .rate("b", {{"S", 1}}, {{"P", 1}}, "q * S");
  EXPECT_TRUE(same_system(michaelis("(k + q) * S"), two));
}

TEST(SameSystem, StartsKindsVolumesAndKnownsCount) {
  const auto decay = [](const char* start) {
    return Mechanism("d").species("A", start).flow("loss", {{"A", 1}}, {}, "k * A");
  };
  EXPECT_TRUE(same_system(decay("2"), decay("1 + 1")));
  EXPECT_FALSE(same_system(decay("2"), decay("a0")));
  EXPECT_FALSE(same_system(decay("2"),
                           Mechanism("d").amount("A", "2").flow("loss", {{"A", 1}}, {}, "k * A")));
  EXPECT_FALSE(same_system(Mechanism("v").compartment("v", "2").species("A"),
                           Mechanism("v").compartment("v", "3").species("A")));
  EXPECT_FALSE(same_system(decay("2").known("k", 1.0), decay("2").known("k", 2.0)));
  EXPECT_FALSE(same_system(decay("2").known("k", 1.0), decay("2")));
}

TEST(SameSystem, WhatReadoutsShowCounts) {
  const Hypothesis a = michaelis("k * S").where("shown", "S");
  const Hypothesis b = michaelis("k * S").where("shown", "S + P");
  EXPECT_TRUE(same_system(a, b));
  const std::vector<Expression> shows{written("2 * shown")};
  EXPECT_FALSE(same_system(a, b, shows));
}

}  // namespace
}  // namespace gainsay::core
