#include "gainsay/cli/verdict_words.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using stats::Decision;
using ::testing::HasSubstr;

/// The sentence for so many hypotheses of each sort.
std::string sentence(int rejected, int not_rejected, int undecided) {
  JudgementFixture fixture;
  for (int i = 0; i < rejected; ++i) fixture.add("r", Decision::Rejected, 90.0, 0.0);
  for (int i = 0; i < not_rejected; ++i) fixture.add("n", Decision::NotRejected, 20.0, 0.0);
  for (int i = 0; i < undecided; ++i) fixture.add("u", Decision::Undecided, 50.0, 0.0);
  return verdict_sentence(fixture.judgement());
}

TEST(VerdictSentence, CountsBothSorts) {
  EXPECT_EQ(sentence(4, 2, 0), "The data contradict four of six mechanisms; two are not rejected.");
  EXPECT_EQ(sentence(1, 1, 0), "The data contradict one of two mechanisms; one is not rejected.");
}

TEST(VerdictSentence, SaysAllAndNone) {
  EXPECT_EQ(sentence(3, 0, 0), "The data contradict all three mechanisms.");
  EXPECT_EQ(sentence(2, 0, 0), "The data contradict both mechanisms.");
  EXPECT_EQ(sentence(0, 3, 0), "The data contradict none of three mechanisms.");
  EXPECT_EQ(sentence(0, 2, 0), "The data contradict neither of two mechanisms.");
}

TEST(VerdictSentence, SaysWhatIsUndecided) {
  EXPECT_EQ(
      sentence(3, 2, 1),
      "The data contradict three of six mechanisms; two are not rejected and one is undecided.");
  EXPECT_EQ(sentence(1, 0, 2), "The data contradict one of three mechanisms; two are undecided.");
  EXPECT_EQ(
      sentence(0, 1, 2),
      "The data contradict none of three mechanisms; one is not rejected and two are undecided.");
  EXPECT_EQ(sentence(0, 0, 3), "All three mechanisms are undecided.");
  EXPECT_EQ(sentence(0, 0, 2), "Both mechanisms are undecided.");
}

TEST(VerdictSentence, SpeaksOfOneAlone) {
  EXPECT_EQ(sentence(1, 0, 0), "The data contradict the one mechanism judged.");
  EXPECT_EQ(sentence(0, 1, 0), "The data do not contradict the one mechanism judged.");
  EXPECT_EQ(sentence(0, 0, 1), "The one mechanism judged is undecided.");
}

TEST(VerdictSentence, SaysWhatWasNotYetJudged) {
  JudgementFixture fixture;
  fixture.add("a", Decision::Rejected, 90.0, 0.0).add("b", Decision::NotRejected, 20.0, 0.0);
  fixture.add("c", Decision::Rejected, 90.0, 0.0);
  fixture.judgement().outcomes.pop_back();
  EXPECT_EQ(verdict_sentence(fixture.judgement()),
            "The data contradict one of three mechanisms; one is not rejected and one is not yet "
            "judged.");
}

TEST(Facts, NameTheDataAndWhatWouldHaveGoneUnseen) {
  JudgementFixture fixture;
  const std::vector<std::string> lines = facts(fixture.three());
  ASSERT_EQ(lines.size(), 2U);
  EXPECT_EQ(lines[0],
            "Two experiments, two readouts, 31 measurements. The closest rejected "
            "hypothesis, A, passes its limit by 133\u202f%.");
  EXPECT_EQ(lines[1],
            "Not rejected is not proven: all 32 points off by less than 0.83 sd would have "
            "gone unseen.");
}

TEST(Facts, DoNotSpeakOfALimitThatWasNotPassed) {
  JudgementFixture fixture;
  fixture.add("order alone", Decision::Rejected, 35.0, 0.1);
  EXPECT_THAT(facts(fixture.judgement())[0],
              HasSubstr("The closest rejected hypothesis, A, has P = 1.3\u202f·\u202f10⁻⁷."));
}

TEST(Facts, SayThatUnknownNoiseLeavesTheSizeUntested) {
  JudgementFixture fixture;
  fixture.add("a", Decision::NotRejected, 20.0, 0.1);
  fixture.judgement().outcomes[0].judged.verdict.noise_unknown = true;
  EXPECT_THAT(facts(fixture.judgement())[1], HasSubstr("the noise is unknown"));
}

TEST(StatisticiansLine, HasCountsSharesAndTheDecidingLimit) {
  JudgementFixture fixture;
  EXPECT_EQ(
      statisticians_line(fixture.three()),
      "N = 32, k = 2; α = 0.05, of which 0.04 for the misfit and 0.01 for the order; this look "
      "alone; decided by the reduced limit; noise stated as one sd a readout; data of two "
      "experiments, as fingerprinted below.");
}

TEST(Caution, LeavesDecisionsToThoseLicensed) {
  EXPECT_THAT(caution(),
              HasSubstr("do not replace safety assessment, dosing decisions or licensed practice"));
}

}  // namespace
}  // namespace gainsay::cli
