#include "gainsay/stats/decide.h"

#include "gainsay/testing/verdicts.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

using gainsay::testing::convinced;
using gainsay::testing::drifting_verdict;
using gainsay::testing::misfitting_verdict;
using gainsay::testing::passing_verdict;
using gainsay::testing::verdict_of_unknown_noise;

void expect(const Verdict& verdict, const Conviction& conviction, Decision decision,
            Ground ground) {
  const Decided decided = decide(verdict, conviction);
  EXPECT_EQ(decided.decision, decision);
  EXPECT_EQ(decided.ground, ground);
}

TEST(Decide, RejectsByEitherTest) {
  expect(misfitting_verdict(), convinced(), Decision::Rejected, Ground::MisfitAboveLimit);
  expect(drifting_verdict(), convinced(), Decision::Rejected, Ground::ResidualsInOrder);
}

TEST(Decide, NamesTheLouderOfTwoTests) {
  Verdict both = misfitting_verdict();
  both.order.p_value = 1e-4;
  expect(both, convinced(), Decision::Rejected, Ground::MisfitAboveLimit);
  both.reduced = reduced_limit(90.0, 72, 5, 0.04);
  both.V = 90.0;
  both.V_tighter = 90.001;
  expect(both, convinced(), Decision::Rejected, Ground::ResidualsInOrder);
}

TEST(Decide, DoesNotRejectWithoutCause) {
  expect(passing_verdict(), convinced(), Decision::NotRejected, Ground::NothingSpeaksAgainst);
  expect(verdict_of_unknown_noise(), convinced(), Decision::NotRejected,
         Ground::NothingSpeaksAgainst);
}

TEST(Decide, AsksFiftyNineRandomStartsOfARejectionAlone) {
  Conviction conviction = convinced();
  conviction.random_starts = 58;
  expect(misfitting_verdict(), conviction, Decision::Undecided, Ground::TooFewStarts);
  expect(drifting_verdict(), conviction, Decision::Undecided, Ground::TooFewStarts);
  expect(passing_verdict(), conviction, Decision::NotRejected, Ground::NothingSpeaksAgainst);
}

TEST(Decide, RejectsNoFitThatDidNotConverge) {
  Conviction conviction = convinced();
  conviction.converged = false;
  expect(misfitting_verdict(), conviction, Decision::Undecided, Ground::NoConvergence);
  expect(passing_verdict(), conviction, Decision::NotRejected, Ground::NothingSpeaksAgainst);
}

TEST(Decide, LeavesUndecidedWhatTheAccuracyDoesNotCarry) {
  Verdict near = passing_verdict();
  near.V_tighter = near.reduced.value;
  expect(near, convinced(), Decision::Undecided, Ground::MisfitTooNearLimit);
  near.V_tighter = kNotComputed;
  expect(near, convinced(), Decision::Undecided, Ground::FailsAtTighterControl);
  Verdict misfit = misfitting_verdict();
  misfit.V_tighter = kNotComputed;
  expect(misfit, convinced(), Decision::Undecided, Ground::FailsAtTighterControl);
}

TEST(Decide, LetsOneTestRejectWhereTheOtherIsTooNear) {
  Verdict near = drifting_verdict();
  near.V_tighter = near.reduced.value;
  expect(near, convinced(), Decision::Rejected, Ground::ResidualsInOrder);
  Verdict close = misfitting_verdict();
  close.order.close = true;
  expect(close, convinced(), Decision::Rejected, Ground::MisfitAboveLimit);
}

TEST(Decide, LeavesUndecidedWhatTheDrawsDoNotCarry) {
  Verdict close = passing_verdict();
  close.order.close = true;
  close.order.p_value = 0.0101;
  expect(close, convinced(), Decision::Undecided, Ground::OrderTooNearShare);
}

TEST(Decide, CannotTestWithoutAFitFreedomOrATest) {
  expect(Verdict{}, Conviction{}, Decision::Undecided, Ground::CannotBeIntegrated);
  Verdict full = misfitting_verdict();
  full.N = full.k = 5;
  expect(full, convinced(), Decision::Undecided, Ground::NoFreedom);
  Verdict nothing = verdict_of_unknown_noise();
  nothing.share_of_order = 0.0;
  expect(nothing, convinced(), Decision::Undecided, Ground::NothingToTest);
}

TEST(Decide, TrustsNoLimitWhereReadoutsDependOnEachOther) {
  for (Verdict verdict : {passing_verdict(), misfitting_verdict()}) {
    verdict.dependence = Dependence{{"y1", "y4"}};
    expect(verdict, convinced(), Decision::Undecided, Ground::ReadoutsDepend);
  }
}

TEST(ChanceOfAMiss, IsFivePercentAfterFiftyNineStarts) {
  EXPECT_LT(chance_of_a_miss(59), 0.05);
  EXPECT_GT(chance_of_a_miss(58), 0.05);
}

}  // namespace
}  // namespace gainsay::stats
