#include "gainsay/cli/report_sections.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

TEST(Reasons, AreGivenForRejectedAndUndecidedOnes) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.outcomes[0].judged.verdict.sentences = {"Too far.", "And in order."};
  judgement.outcomes[2].judged.verdict.sentences.clear();
  const std::string html = reasons(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("<p>Too far.</p><p>And in order.</p>"));
  EXPECT_THAT(html, HasSubstr("<p>Misfit 28 against 41.3.</p>"));  // the short reason stands in
  EXPECT_THAT(html, Not(HasSubstr("enzyme lost")));
}

TEST(Reasons, AreAbsentWhereNothingIsRejected) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::NotRejected, 20.0, 0.0);
  EXPECT_TRUE(reasons(Page(fixture.judgement())).empty());
}

TEST(Equations, StandAsMathMlForEveryHypothesis) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = equations(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("class=\"system of-A"));
  EXPECT_THAT(html, HasSubstr("<math"));
  EXPECT_THAT(html, HasSubstr("<mi>hydration</mi>"));
}

TEST(Tables, HoldTestsCriteriaAndShares) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = tables(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("96.4000"));
  EXPECT_THAT(html, HasSubstr("all points off by 0.83 sd"));
  EXPECT_THAT(html, HasSubstr("run-2"));
}

TEST(Method, HasCautionVersionsSeedAndFingerprints) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = method(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("local rules prevail"));
  EXPECT_THAT(html, HasSubstr("gainsay 0.1.0, SUNDIALS 6.4.1, Ceres 2.1.0. Seed 1."));
  EXPECT_THAT(html, HasSubstr(std::string(64, 'a')));
}

}  // namespace
}  // namespace gainsay::cli
