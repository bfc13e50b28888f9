#include "gainsay/cli/contenders.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;

std::string letters(const std::vector<Contender>& contenders) {
  std::string all;
  for (const Contender& contender : contenders) all += contender.letter;
  return all;
}

std::string shown(const std::vector<Contender>& contenders) {
  std::string all;
  for (const Contender& contender : contenders) {
    if (contender.shown_at_first) all += contender.letter;
  }
  return all;
}

TEST(LineUp, HasSurvivorsFirstThenUndecidedThenTheClosestRival) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Rejected, 300.0, 0.3)
      .add("b", stats::Decision::NotRejected, 30.0, 0.0)
      .add("c", stats::Decision::Rejected, 60.0, 0.1)
      .add("d", stats::Decision::NotRejected, 20.0, 0.0)
      .add("e", stats::Decision::Undecided, 50.0, 0.0);
  const std::vector<Contender> line = line_up(fixture.judgement());
  EXPECT_EQ(letters(line), "DBECA");
  EXPECT_EQ(shown(line), "DBE");
}

TEST(LineUp, ShowsTheTwoClosestWhereNoneSurvives) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Rejected, 300.0, 0.3)
      .add("b", stats::Decision::Rejected, 60.0, 0.1)
      .add("c", stats::Decision::Rejected, 90.0, 0.1);
  EXPECT_EQ(shown(line_up(fixture.judgement())), "BC");
}

TEST(LineUp, GivesSixHuesAndGreyToTheRest) {
  JudgementFixture fixture;
  for (int i = 0; i < 8; ++i) fixture.add("h", stats::Decision::Rejected, 60.0 + i, 0.1);
  const std::vector<Contender> line = line_up(fixture.judgement());
  EXPECT_EQ(line[0].hue, 1);
  EXPECT_EQ(line[5].hue, 6);
  EXPECT_EQ(line[6].hue, 0);
  EXPECT_EQ(classes(line[7]), "of-H h0 d2");
}

TEST(LineUp, PutsWhatWasNotJudgedOrNotFittedLast) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Rejected, 60.0, 0.1)
      .add("b", stats::Decision::Undecided, 50.0, 0.0);
  fixture.add("c", stats::Decision::Undecided, 45.0, 0.0);
  fixture.judgement().outcomes[1].judged.verdict.reduced.V = stats::kNotComputed;
  fixture.judgement().outcomes.erase(fixture.judgement().outcomes.begin());
  const std::vector<Contender> line = line_up(fixture.judgement());
  EXPECT_EQ(letters(line), "CBA");
  EXPECT_EQ(line[2].outcome, nullptr);
}

TEST(Distance, IsTheMisfitInLimits) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Rejected, 82.6, 0.1);
  stats::Verdict verdict = fixture.judgement().outcomes[0].judged.verdict;
  EXPECT_DOUBLE_EQ(distance(verdict), 2.0);  // the fixture's reduced limit is 41.3
  verdict.decides = stats::WhichLimit::Full;
  EXPECT_DOUBLE_EQ(distance(verdict), 82.6 / 43.7);
}

TEST(Distance, IsAlphaOverPWhereTheNoiseIsUnknown) {
  stats::Verdict verdict;
  verdict.noise_unknown = true;
  verdict.alpha = 0.05;
  verdict.p_value = 0.0125;
  EXPECT_DOUBLE_EQ(distance(verdict), 4.0);
}

}  // namespace
}  // namespace gainsay::cli
