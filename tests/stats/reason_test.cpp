#include "gainsay/stats/reason.h"

#include "gainsay/testing/verdicts.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

using gainsay::testing::convinced;
using gainsay::testing::drifting_verdict;
using gainsay::testing::misfitting_verdict;
using gainsay::testing::passing_verdict;
using gainsay::testing::verdict_of_unknown_noise;

std::string reason_once_decided(Verdict verdict, const Conviction& conviction) {
  const Decided decided = decide(verdict, conviction);
  verdict.decision = decided.decision;
  verdict.ground = decided.ground;
  return reason_of(verdict, conviction);
}

TEST(Reason, NamesWhereMostOfTheMisfitIs) {
  EXPECT_EQ(reason_once_decided(misfitting_verdict(), convinced()),
            "misses acid in run-01 (59 % of misfit)");
  Verdict one = misfitting_verdict();
  one.shares.resize(1);
  EXPECT_EQ(reason_once_decided(one, convinced()), "misfit 131.2 passes its limit 88.57");
}

TEST(Reason, SaysWhatTheResidualsDo) {
  EXPECT_EQ(reason_once_decided(drifting_verdict(), convinced()), "residuals follow each other");
  EXPECT_EQ(reason_once_decided(passing_verdict(), convinced()), "as close as the noise allows");
  EXPECT_EQ(reason_once_decided(verdict_of_unknown_noise(), convinced()),
            "residuals without order");
}

TEST(Reason, NamesTheRangeThatARejectionHoldsIn) {
  Verdict verdict = misfitting_verdict();
  verdict.moved = {{"Km1", false, 100, 1000, 61.5}};
  verdict.only_within_range = true;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "only within the range of Km1");
}

TEST(Reason, SaysHowFarTheSearchGot) {
  Conviction conviction = convinced();
  conviction.random_starts = 12;
  EXPECT_EQ(reason_once_decided(misfitting_verdict(), conviction),
            "would be rejected, but 12 of 59 random starts");
  conviction.out_of_budget = true;
  EXPECT_EQ(reason_once_decided(misfitting_verdict(), conviction),
            "budget ended after 12 of 59 random starts");
  conviction.interrupted = true;
  EXPECT_EQ(reason_once_decided(misfitting_verdict(), conviction),
            "interrupted after 12 of 59 random starts");
}

TEST(Reason, SaysWhyNothingIsDecided) {
  EXPECT_EQ(reason_once_decided(Verdict{}, Conviction{}), "no start could be integrated");
  Verdict verdict = passing_verdict();
  verdict.dependence = Dependence{{"y1", "y4"}};
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "readouts depend on each other");
  verdict = passing_verdict();
  verdict.N = verdict.k;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "cannot be tested: 5 data, 5 unknowns");
  verdict = verdict_of_unknown_noise();
  verdict.share_of_order = 0.0;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "cannot be tested: noise unknown");
  verdict = passing_verdict();
  verdict.V_tighter = verdict.reduced.value;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "misfit too near its limit");
  verdict.V_tighter = kNotComputed;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "accuracy of its misfit not known");
  verdict = passing_verdict();
  verdict.order.close = true;
  EXPECT_EQ(reason_once_decided(verdict, convinced()), "order too near its share to call");
  Conviction conviction = convinced();
  conviction.converged = false;
  EXPECT_EQ(reason_once_decided(misfitting_verdict(), conviction), "no descent converged");
}

}  // namespace
}  // namespace gainsay::stats
