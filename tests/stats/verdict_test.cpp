#include "gainsay/stats/verdict.h"

#include "gainsay/testing/verdicts.h"

#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::stats {
namespace {

using gainsay::testing::drifting_verdict;
using gainsay::testing::misfitting_verdict;
using gainsay::testing::passing_verdict;
using gainsay::testing::verdict_of_unknown_noise;

TEST(Verdict, IsSpokenAgainstByTheTestThatFails) {
  EXPECT_FALSE(passing_verdict().V_speaks_against());
  EXPECT_FALSE(passing_verdict().order_speaks_against());
  EXPECT_TRUE(misfitting_verdict().V_speaks_against());
  EXPECT_FALSE(misfitting_verdict().order_speaks_against());
  EXPECT_TRUE(drifting_verdict().order_speaks_against());
  EXPECT_FALSE(drifting_verdict().V_speaks_against());
}

TEST(Verdict, AsksTheDecidingLimit) {
  Verdict verdict = passing_verdict();
  verdict.V = 89.0;  // between the reduced limit (67 degrees: 88.6) and the full one (72)
  verdict.V_tighter = 89.001;
  verdict.full = full_limit(89.0, 72, 0.04);
  verdict.reduced = reduced_limit(89.0, 72, 5, 0.04);
  EXPECT_TRUE(verdict.V_speaks_against());
  verdict.decides = WhichLimit::Full;
  EXPECT_FALSE(verdict.V_speaks_against());
}

TEST(Verdict, IsNotSpokenAgainstWithinTheErrorOfTheIntegration) {
  Verdict verdict = misfitting_verdict();
  const double distance = verdict.V - verdict.reduced.value;
  verdict.V_tighter = verdict.V - 1.001 * distance;
  EXPECT_TRUE(verdict.V_too_near_limit());
  EXPECT_FALSE(verdict.V_speaks_against());
  verdict.V_tighter = verdict.V - 0.999 * distance;
  EXPECT_TRUE(verdict.V_speaks_against());
  verdict.V_tighter = kNotComputed;
  EXPECT_FALSE(verdict.V_speaks_against());
}

TEST(Verdict, OfUnknownNoiseHearsOrderAlone) {
  Verdict verdict = verdict_of_unknown_noise();
  EXPECT_FALSE(verdict.V_counts());
  EXPECT_TRUE(verdict.order_counts());
  verdict.order.p_value = 0.049;
  EXPECT_TRUE(verdict.order_speaks_against());
  verdict.order.close = true;
  EXPECT_FALSE(verdict.order_speaks_against());
}

TEST(Weights, AreSharedByThoseNotRejected) {
  Verdict first;
  first.decision = Decision::NotRejected;
  first.AIC = 10.0;
  Verdict second = first;
  second.decision = Decision::Undecided;
  second.AIC = 12.0;
  Verdict rejected = first;
  rejected.decision = Decision::Rejected;
  const Verdict without_fit;
  const std::vector<double> all = weights({&first, &rejected, &second, &without_fit});
  constexpr double kRounding = 1e-15;
  EXPECT_NEAR(all[0], 1.0 / (1.0 + std::exp(-1.0)), kRounding);
  EXPECT_TRUE(std::isnan(all[1]));
  EXPECT_NEAR(all[0] + all[2], 1.0, kRounding);
  EXPECT_TRUE(std::isnan(all[3]));
}

TEST(Weights, GoByAICcWhereTheSdIsFitted) {
  Verdict first;
  first.decision = Decision::NotRejected;
  first.fitted_noise.resize(1);
  first.AIC = 10.0;
  first.AICc = 20.0;
  Verdict second = first;
  second.AIC = 1.0;
  EXPECT_EQ(weights({&first, &second})[1], 0.5);
}

}  // namespace
}  // namespace gainsay::stats
