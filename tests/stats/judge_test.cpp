#include "gainsay/stats/judge.h"

#include "gainsay/stats/tails.h"
#include "gainsay/testing/decays.h"

#include <gmock/gmock.h>

#include <cmath>
#include <string>

namespace gainsay::stats {
namespace {

using gainsay::testing::against_decay;
using gainsay::testing::Bench;
using gainsay::testing::between;
using gainsay::testing::first_order;
using gainsay::testing::Mechanism;
using gainsay::testing::problem_of;
using gainsay::testing::shows;
using gainsay::testing::SimulatedDecay;
using gainsay::testing::wide_ranges;
using gainsay::testing::zeroth_order;
using ::testing::Contains;
using ::testing::HasSubstr;
using ::testing::StartsWith;

/// Two runs at different starts.
estimation::Problem two_runs(const core::Hypothesis& hypothesis, const estimation::Readout& readout,
                             double sd) {
  SimulatedDecay low;
  low.start = 4.0;
  low.sd = sd;
  SimulatedDecay high;
  high.sd = sd;
  return problem_of(hypothesis, wide_ranges(), {readout},
                    {Bench("high").start("A", "a0").data("signal", high.readings(1)),
                     Bench("low").start("A", "0.4 * a0").data("signal", low.readings(2))});
}

TEST(Judge, LetsTheTruthStandAndAWrongRivalFall) {
  const estimation::Readout readout = shows("signal", "A", 0.2);
  const Verdict truth = judge(two_runs(first_order(), readout, 0.2), {}).verdict;
  EXPECT_EQ(truth.decision, Decision::NotRejected);
  EXPECT_EQ(truth.N, 24U);
  EXPECT_EQ(truth.k, 2U);
  EXPECT_EQ(truth.decides, WhichLimit::Reduced);
  EXPECT_THAT(truth.sentences, Contains(StartsWith("Not rejected is not proven: all 24 data")));

  const Judged rival = judge(two_runs(zeroth_order(), readout, 0.2), {});
  EXPECT_EQ(rival.verdict.decision, Decision::Rejected);
  EXPECT_EQ(rival.verdict.ground, Ground::MisfitAboveLimit);
  EXPECT_EQ(rival.search.random_starts, 59U);
  EXPECT_LT(rival.verdict.p_value, 1e-10);
  EXPECT_THAT(rival.verdict.reason, StartsWith("misses signal in "));
}

TEST(Judge, SpendsNoMoreStartsThanItsVerdictHangsOn) {
  const Judged truth = judge(against_decay(first_order()), {});
  EXPECT_EQ(truth.verdict.decision, Decision::NotRejected);
  EXPECT_EQ(truth.search.random_starts, estimation::SearchPlan{}.least_starts);
}

TEST(Judge, EstimatesWhatTheDataWereMadeFrom) {
  const Verdict verdict =
      judge(two_runs(first_order(), shows("signal", "A", 0.2), 0.2), {}).verdict;
  for (const Interval& interval : verdict.intervals) {
    EXPECT_TRUE(interval.determined) << interval.unknown;
    const double truth = interval.unknown == "k" ? 0.3 : 10.0;
    // Five standard errors hold all but 6e-7 of estimates, which are nearly normal here.
    EXPECT_LT(std::abs(interval.estimate - truth), 5 * interval.standard_error);
  }
}

TEST(Judge, ShowsV_ThatAddsUpAndDoesNotHangOnTheIntegration) {
  const Verdict verdict =
      judge(two_runs(zeroth_order(), shows("signal", "A", 0.2), 0.2), {}).verdict;
  double by_shares = 0.0;
  for (const Share& share : verdict.shares) by_shares += share.V;
  double by_points = 0.0;
  for (const StandardResidual& point : verdict.residuals) by_points += point.r * point.r;
  constexpr double kRounding = 1e-12;
  EXPECT_NEAR(by_shares / verdict.V, 1.0, kRounding);
  EXPECT_NEAR(by_points / verdict.V, 1.0, kRounding);
  EXPECT_NE(verdict.V_tighter, verdict.V);
  // Tolerance 1e-6 of values up to 10 moves residuals of V = 1e3 to 1e4 by less than 1e-3 sd each.
  EXPECT_NEAR(verdict.V_tighter / verdict.V, 1.0, 1e-3);
  EXPECT_DOUBLE_EQ(verdict.reduced.p_value, chi_square_upper_tail(verdict.V, 22));
}

TEST(Judge, RejectsTheTruthAsOftenAsAlphaSays) {
  // 200 data sets of 12 points, one decay with unknown rate and start.
  JudgeOptions options;
  options.plan.least_starts = 2;
  int rejected = 0;
  for (std::uint64_t number = 0; number < 200; ++number) {
    const Judged judged = judge(against_decay(first_order(), {}, number), options);
    EXPECT_NE(judged.verdict.decision, Decision::Undecided) << judged.verdict.reason;
    rejected += judged.verdict.decision == Decision::Rejected;
  }
  // The 99.9 % binomial interval of 0.05 in 200; the count itself is that of these seeds.
  EXPECT_GE(rejected, 2);
  EXPECT_LE(rejected, 21);
  EXPECT_EQ(rejected, 8);
}

TEST(Judge, IsTheSameOnOneThreadAndOnTwo) {
  const estimation::Problem problem = two_runs(zeroth_order(), shows("signal", "A", 0.2), 0.2);
  JudgeOptions one;
  JudgeOptions two;
  two.plan.threads = 2;
  const Judged a = judge(problem, one);
  const Judged b = judge(problem, two);
  EXPECT_EQ(a.verdict.V, b.verdict.V);
  EXPECT_EQ(a.verdict.V_tighter, b.verdict.V_tighter);
  EXPECT_EQ(a.verdict.p_value, b.verdict.p_value);
  EXPECT_EQ(a.verdict.order.p_value, b.verdict.order.p_value);
  EXPECT_EQ(a.verdict.AIC, b.verdict.AIC);
  EXPECT_EQ(a.verdict.sentences, b.verdict.sentences);
  EXPECT_EQ(a.search.random_starts, b.search.random_starts);
  EXPECT_EQ(a.search.integrations, b.search.integrations);
  ASSERT_EQ(a.verdict.intervals.size(), b.verdict.intervals.size());
  for (std::size_t u = 0; u < a.verdict.intervals.size(); ++u)
    EXPECT_EQ(a.verdict.intervals[u].estimate, b.verdict.intervals[u].estimate);
}

TEST(Judge, DoesNotRejectAfterAFewStarts) {
  JudgeOptions options;
  options.plan.fixed = 20;
  options.until_convincing = false;
  const Judged judged = judge(against_decay(zeroth_order()), options);
  EXPECT_EQ(judged.verdict.decision, Decision::Undecided);
  EXPECT_EQ(judged.verdict.ground, Ground::TooFewStarts);
  EXPECT_EQ(judged.verdict.reason, "would be rejected, but 20 of 59 random starts");
}

TEST(Judge, IsUndecidedWhereTheBudgetEnds) {
  JudgeOptions options;
  options.plan.budget = 300;
  const Judged judged = judge(against_decay(zeroth_order()), options);
  EXPECT_EQ(judged.verdict.decision, Decision::Undecided);
  EXPECT_THAT(judged.verdict.reason, StartsWith("budget ended after "));
}

estimation::Problem in_a_narrow_range(bool hard) {
  std::vector<estimation::DeclaredUnknown> unknowns = wide_ranges();
  unknowns[0].unknown.low = 1e-4;
  unknowns[0].unknown.high = 0.02;  // the truth, 0.3, is two moves away
  unknowns[0].unknown.hard = hard;
  return problem_of(first_order(), unknowns, {shows("signal", "A", 0.2)},
                    {Bench("run-01").data("signal", SimulatedDecay{}.readings(0))});
}

TEST(Judge, SaysWhereARejectionHoldsWithinTheRangeAlone) {
  const Verdict verdict = judge(in_a_narrow_range(false), {}).verdict;
  EXPECT_EQ(verdict.decision, Decision::Rejected);
  EXPECT_TRUE(verdict.only_within_range);
  EXPECT_EQ(verdict.reason, "only within the range of k");
  ASSERT_EQ(verdict.moved.size(), 1U);
  EXPECT_EQ(verdict.moved[0].stated, 0.02);
  EXPECT_DOUBLE_EQ(verdict.moved[0].moved_to, 2.0);
  EXPECT_LT(verdict.moved[0].V, verdict.reduced.value);
  EXPECT_GT(verdict.V, verdict.reduced.value);
  EXPECT_EQ(verdict.k, 1U);  // of the stated ranges, where k is on its bound
  ASSERT_EQ(verdict.intervals[0].unknown, "k");
  EXPECT_EQ(verdict.intervals[0].words, "on its upper bound");
}

TEST(Judge, MovesNoHardBound) {
  const Verdict verdict = judge(in_a_narrow_range(true), {}).verdict;
  EXPECT_EQ(verdict.decision, Decision::Rejected);
  EXPECT_FALSE(verdict.only_within_range);
  EXPECT_TRUE(verdict.moved.empty());
}

TEST(Judge, SaysWhereTheBudgetEndsBeforeABoundWasMoved) {
  JudgeOptions options;
  const Judged judged = judge(in_a_narrow_range(false), options);
  options.plan.budget = judged.search.integrations + 1;  // one experiment: spent with the search
  const Verdict verdict = judge(in_a_narrow_range(false), options).verdict;
  EXPECT_EQ(verdict.decision, Decision::Rejected);
  EXPECT_TRUE(verdict.range_untried);
  EXPECT_THAT(verdict.sentences, Contains(HasSubstr("within the ranges searched")));
}

TEST(Judge, StillRejectsWhatNoRangeHelps) {
  // Growth cannot follow a decay: k ends on its lower bound wherever that is.
  const core::Hypothesis growth = Mechanism("growth")
                                      .species("A", "a0")
                                      .rate("gain", {}, {{"A", 1}}, "k * A")
                                      .unknowns({"k", "a0"});
  const Verdict verdict = judge(against_decay(growth), {}).verdict;
  EXPECT_EQ(verdict.decision, Decision::Rejected);
  EXPECT_FALSE(verdict.only_within_range);
  ASSERT_FALSE(verdict.moved.empty());
  EXPECT_EQ(verdict.moved[0].unknown, "k");
  EXPECT_DOUBLE_EQ(verdict.moved[0].moved_to, 1e-6);  // three times tenfold
  EXPECT_THAT(verdict.sentences, Contains(HasSubstr("it is still rejected")));
}

estimation::Readout of_unknown_noise() {
  estimation::Readout readout = shows("signal", "A");
  readout.noise = {};
  readout.noise.sd_unknown = true;
  return readout;
}

TEST(Judge, HearsOrderAloneWhereTheNoiseIsUnknown) {
  const Verdict truth = judge(two_runs(first_order(), of_unknown_noise(), 0.2), {}).verdict;
  EXPECT_EQ(truth.decision, Decision::NotRejected);
  EXPECT_EQ(truth.share_of_order, 1.0);
  EXPECT_EQ(truth.p_value, truth.order.p_value);
  EXPECT_FALSE(truth.full.offered());
  EXPECT_TRUE(std::isnan(truth.departure_sd));
  ASSERT_EQ(truth.fitted_noise.size(), 1U);
  // s / 0.2^2 is chi-square with 22 degrees: within 4.8 and 59 but for one case in 10,000.
  EXPECT_GT(truth.fitted_noise[0].sum_of_squares, 4.8 * 0.04);
  EXPECT_LT(truth.fitted_noise[0].sum_of_squares, 59 * 0.04);
  EXPECT_EQ(truth.K, 3.0);
  EXPECT_FALSE(std::isnan(truth.AICc));

  const Verdict rival = judge(two_runs(zeroth_order(), of_unknown_noise(), 0.2), {}).verdict;
  EXPECT_EQ(rival.decision, Decision::Rejected);
  EXPECT_EQ(rival.ground, Ground::ResidualsInOrder);
}

TEST(Judge, CannotTestAsManyUnknownsAsData) {
  SimulatedDecay decay;
  decay.points = 2;
  const Verdict verdict = judge(against_decay(first_order(), decay), {}).verdict;
  EXPECT_EQ(verdict.decision, Decision::Undecided);
  EXPECT_EQ(verdict.reason, "cannot be tested: 2 data, 2 unknowns");
}

TEST(Judge, AsksTheFullLimitOfFewData) {
  SimulatedDecay decay;
  decay.points = 6;
  const Verdict verdict = judge(against_decay(first_order(), decay), {}).verdict;
  EXPECT_EQ(verdict.decides, WhichLimit::Full);
  EXPECT_EQ(verdict.full.freedom, 6.0);
  EXPECT_EQ(verdict.decision, Decision::NotRejected);
}

TEST(Judge, AsksTheFullLimitOfTheLeastVWhereTheSdDependsOnTheModel) {
  estimation::Readout readout = shows("signal", "A", 0.05);
  readout.noise.relative = 0.3;
  JudgeOptions options;
  options.decides = WhichLimit::Full;
  const Verdict verdict = judge(two_runs(first_order(), readout, 0.2), options).verdict;
  EXPECT_LT(verdict.full.V, verdict.V);
  EXPECT_EQ(verdict.reduced.V, verdict.V);
  EXPECT_EQ(verdict.decision, Decision::NotRejected);
}

TEST(Judge, TrustsNoLimitWhereASumWasClosed) {
  const core::Hypothesis conversion = Mechanism("conversion")
                                          .species("A", "a0")
                                          .species("B")
                                          .rate("step", {{"A", 1}}, {{"B", 1}}, "k * A")
                                          .unknowns({"k", "a0"});
  const auto left = SimulatedDecay{}.readings(0);
  auto made = left;
  for (auto& [t, value] : made) value = 10.0 - value;
  const Verdict verdict =
      judge(problem_of(conversion, wide_ranges(), {shows("A", "A", 0.2), shows("B", "B", 0.2)},
                       {Bench("run-01").data("A", left).data("B", made)}),
            {})
          .verdict;
  EXPECT_EQ(verdict.decision, Decision::Undecided);
  EXPECT_EQ(verdict.ground, Ground::ReadoutsDepend);
  ASSERT_TRUE(verdict.dependence);
  EXPECT_THAT(verdict.dependence->readouts, ::testing::ElementsAre("A", "B"));
}

TEST(Judge, TakesEarlierWorkAsAMeasurement) {
  std::vector<estimation::DeclaredUnknown> unknowns = wide_ranges();
  unknowns[0].unknown.prior = estimation::Prior{0.3, {}, 1.2};
  const Verdict verdict =
      judge(problem_of(first_order(), unknowns, {shows("signal", "A", 0.2)},
                       {Bench("run-01").data("signal", SimulatedDecay{}.readings(0))}),
            {})
          .verdict;
  EXPECT_EQ(verdict.N, 13U);
  ASSERT_EQ(verdict.shares.size(), 2U);
  EXPECT_EQ(verdict.shares[1].readout, "earlier work");
  EXPECT_EQ(verdict.residuals.size(), 12U);
}

TEST(Judge, SaysWhereNoStartCanBeIntegrated) {
  // A grows without bound at t = 1 / (k a0), long before the first datum.
  const core::Hypothesis explosion = Mechanism("explosion")
                                         .species("A", "a0")
                                         .rate("gain", {}, {{"A", 1}}, "k * A^2")
                                         .unknowns({"k", "a0"});
  JudgeOptions options;
  options.plan.budget = 60;
  const Verdict verdict =
      judge(problem_of(explosion, {between("k", 10, 100), between("a0", 10, 100)},
                       {shows("signal", "A", 0.2)},
                       {Bench("run-01").data("signal", SimulatedDecay{}.readings(0))}),
            options)
          .verdict;
  EXPECT_EQ(verdict.decision, Decision::Undecided);
  EXPECT_EQ(verdict.reason, "no start could be integrated");
  EXPECT_TRUE(std::isnan(verdict.V));
}

TEST(Judge, TellsTheObserverOfEveryDescent) {
  std::size_t calls = 0;
  const Judged judged =
      judge(against_decay(first_order()), {}, [&](std::size_t, std::size_t, double) { ++calls; });
  EXPECT_EQ(calls, judged.search.descents.size() + judged.search.replaced_starts);
}

}  // namespace
}  // namespace gainsay::stats
