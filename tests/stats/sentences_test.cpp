#include "gainsay/stats/sentences.h"

#include "gainsay/testing/verdicts.h"

#include <gmock/gmock.h>

namespace gainsay::stats {
namespace {

using gainsay::testing::convinced;
using gainsay::testing::drifting_verdict;
using gainsay::testing::misfitting_verdict;
using gainsay::testing::passing_verdict;
using gainsay::testing::verdict_of_unknown_noise;
using ::testing::Contains;
using ::testing::ElementsAre;
using ::testing::HasSubstr;
using ::testing::Not;
using ::testing::StartsWith;

std::vector<std::string> once_decided(Verdict verdict, const Conviction& conviction) {
  const Decided decided = decide(verdict, conviction);
  verdict.decision = decided.decision;
  verdict.ground = decided.ground;
  return sentences_of(verdict, conviction);
}

TEST(Sentences, SayByHowMuchTheMisfitPassesAndWhereItComesFrom) {
  EXPECT_THAT(
      once_decided(misfitting_verdict(), convinced()),
      ElementsAre("The misfit 131.2 passes the reduced limit 88.57 (72 data, 5 free unknowns; P = "
                  "4.7e-6). The largest part of it comes from acid in run-01 (59 %).",
                  "The residuals scatter without order (lag-1 statistic 1.9, P = 0.43).",
                  "None of 59 random starts came below the limit: with 95 % confidence another one "
                  "would with probability below 5 %."));
}

TEST(Sentences, PutOrderFirstWhereItRejects) {
  EXPECT_THAT(once_decided(drifting_verdict(), convinced())[0],
              "The residuals follow each other instead of scattering (lag-1 statistic 0.42, P = "
              "0.0001).");
  EXPECT_THAT(once_decided(drifting_verdict(), convinced()),
              Contains(StartsWith("It is the best fit of 59 random starts")));
}

TEST(Sentences, SayThatNotRejectedIsNotProven) {
  EXPECT_THAT(once_decided(passing_verdict(), convinced()),
              ElementsAre(StartsWith("The misfit 60 stays below the reduced limit 88.57"),
                          StartsWith("The residuals scatter without order"),
                          "Not rejected is not proven: all 72 data off by less than 0.6 sd may "
                          "have gone unseen (so much is caught nine times in ten)."));
}

TEST(Sentences, OfUnknownNoiseSayThatOrderAloneIsJudged) {
  const auto sentences = once_decided(verdict_of_unknown_noise(), convinced());
  EXPECT_THAT(sentences,
              Contains(HasSubstr("order is judged alone, with all of the significance")));
  EXPECT_THAT(sentences, Not(Contains(HasSubstr("limit"))));
  EXPECT_THAT(sentences, Contains(StartsWith("Not rejected is not proven: a wrong curve")));
}

TEST(Sentences, SayWhyOrderIsNotJudged) {
  Verdict verdict = passing_verdict();
  verdict.share_of_V = 1.0;
  verdict.share_of_order = 0.0;
  verdict.order.not_counted = "no series has two points";
  EXPECT_THAT(once_decided(verdict, convinced()),
              Contains("Order among the residuals is not judged: no series has two points."));
}

TEST(Sentences, OfTheFullLimitCountNoUnknowns) {
  Verdict verdict = passing_verdict();
  verdict.decides = WhichLimit::Full;
  EXPECT_THAT(once_decided(verdict, convinced())[0],
              StartsWith("The misfit 60 stays below the full limit 94.32 (72 data; P = "));
}

TEST(Sentences, SayWhatHappensBeyondTheRange) {
  Verdict verdict = misfitting_verdict();
  verdict.moved = {{"Km1", false, 100, 1000, 61.5}};
  EXPECT_THAT(once_decided(verdict, convinced()),
              Contains("Its best fit lies on a bound; searched Km1 up to 1000 instead of 100, it "
                       "is still rejected (misfit 61.5)."));
  verdict.range_untried = true;
  EXPECT_THAT(once_decided(verdict, convinced()),
              Contains(HasSubstr("the rejection holds within the ranges searched")));
  verdict.range_untried = false;
  verdict.only_within_range = true;
  EXPECT_THAT(once_decided(verdict, convinced()),
              Contains("It is rejected only within the range of Km1: searched Km1 up to 1000 "
                       "instead of 100, the misfit is 61.5 and it would not be rejected."));
}

TEST(Sentences, NameWhatTheDataDoNotDetermine) {
  Verdict verdict = passing_verdict();
  verdict.intervals.resize(3);
  verdict.intervals[0].unknown = "k1";
  verdict.intervals[1].unknown = "k2";
  verdict.intervals[1].determined = true;
  verdict.intervals[2].unknown = "k3";
  EXPECT_THAT(once_decided(verdict, convinced()),
              Contains("These data do not determine k1 and k3."));
}

TEST(Sentences, OpenWithWhyNothingIsDecided) {
  EXPECT_THAT(once_decided(Verdict{}, Conviction{}),
              ElementsAre("No start could be integrated to the last datum, so there is no fit to "
                          "judge."));
  Verdict verdict = passing_verdict();
  verdict.dependence = Dependence{{"y1", "y4"}};
  EXPECT_THAT(once_decided(verdict, convinced())[0],
              StartsWith("The readings of y1 and y4 depend on each other linearly"));
  Conviction conviction = convinced();
  conviction.random_starts = 31;
  EXPECT_THAT(once_decided(misfitting_verdict(), conviction)[0],
              "Something speaks against it, but a rejection asks for 59 random starts, and there "
              "were 31.");
  conviction.out_of_budget = true;
  EXPECT_THAT(once_decided(misfitting_verdict(), conviction)[0],
              HasSubstr("and the budget ended after 31."));
}

TEST(Sentences, OpenWithEveryOtherCauseOfDoubt) {
  Conviction conviction = convinced();
  conviction.converged = false;
  EXPECT_THAT(once_decided(misfitting_verdict(), conviction)[0], HasSubstr("did not converge"));
  Verdict verdict = passing_verdict();
  verdict.N = verdict.k;
  EXPECT_THAT(once_decided(verdict, convinced())[0],
              "It cannot be tested: 5 data for 5 free unknowns.");
  verdict = verdict_of_unknown_noise();
  verdict.share_of_order = 0.0;
  EXPECT_THAT(once_decided(verdict, convinced())[0], HasSubstr("the noise is unknown"));
  verdict = passing_verdict();
  verdict.V_tighter = verdict.reduced.value;
  EXPECT_THAT(once_decided(verdict, convinced())[0], HasSubstr("nearer to its limit"));
  verdict.V_tighter = kNotComputed;
  EXPECT_THAT(once_decided(verdict, convinced())[0], HasSubstr("100 times tighter"));
  verdict = passing_verdict();
  verdict.order.close = true;
  EXPECT_THAT(once_decided(verdict, convinced())[0],
              "After 9999 draws P of order is still too near its share 0.01 to call.");
}

}  // namespace
}  // namespace gainsay::stats
