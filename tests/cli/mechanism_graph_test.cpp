#include "gainsay/cli/mechanism_graph.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;

TEST(MechanismGraph, HasAPlaceForEverythingAnyHypothesisHas) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const Page page(judgement);
  const MechanismGraph graph(page);
  ASSERT_TRUE(graph.layout());
  EXPECT_LT(graph.species("nitrile").x, graph.reaction("hydration").x);
  EXPECT_LT(graph.reaction("hydration").x, graph.species("amide").x);
  EXPECT_GE(graph.line(LineKind::Uses, "hydration", "nitrile").size(), 4U);
  EXPECT_GE(graph.line(LineKind::Makes, "inactivation", "").size(), 4U);  // the outside
  EXPECT_GE(graph.line(LineKind::Influences, "hydration", "enzyme").size(), 4U);
}

TEST(MechanismGraph, LaysOutAlikeEachTime) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const Page page(judgement);
  EXPECT_EQ(MechanismGraph(page).layout()->nodes, MechanismGraph(page).layout()->nodes);
}

TEST(ShownName, IsWhatTheStudyPrints) {
  core::Hypothesis hypothesis;
  hypothesis.species.resize(1);
  hypothesis.species[0].name = "Ra";
  hypothesis.species[0].shown_as = "R*";
  EXPECT_EQ(shown_name(hypothesis, "Ra"), "R*");
  EXPECT_EQ(shown_name(hypothesis, "T"), "T");
}

}  // namespace
}  // namespace gainsay::cli
