#include "gainsay/estimation/curves.h"

#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <cmath>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using testing::between;
using ::testing::ElementsAre;
using testing::Mechanism;
using testing::shows;

// The global error of BDF stays within a few hundred local tolerances on problems as short as
// these (Hairer & Wanner 1996, V.7); 1e-3 of each value at rtol 1e-6.
constexpr double kShare = 1e-3;

Problem decay_with_dose(Bench bench) {
  const core::Hypothesis hypothesis = Mechanism("decay")
                                          .species("A", "1")
                                          .rate("loss", {{"A", 1}}, {}, "k * A * open")
                                          .unknowns({"k"})
                                          .inputs({"open"});
  const std::vector<DeclaredUnknown> declared{between("k", 0.01, 10)};
  const std::vector<Readout> readouts{shows("A", "A"), shows("flux", "loss")};
  const std::vector<Experiment> experiments{bench};
  auto made = assemble(hypothesis, declared, readouts, experiments, {});
  if (made) return std::move(made).value();
  ADD_FAILURE() << made.failure().what;
  return {};
}

std::vector<Curve> drawn(const Problem& problem, double k, std::size_t points) {
  auto made = curves(problem, {k}, points);
  if (made) return *made;
  ADD_FAILURE() << made.failure().integration.words;
  return {};
}

TEST(Curves, FollowTheExactSolutionThroughADose) {
  const Problem problem = decay_with_dose(
      Bench("dosed").input("open", {{0, 1}}).add(2, "A", "3").data("A", {{0.5, 1}, {4, 1}}));
  const auto all = drawn(problem, 0.7, 21);
  ASSERT_EQ(all.size(), 1U);
  const Curve& curve = all[0];
  EXPECT_EQ(curve.experiment, "dosed");
  EXPECT_EQ(curve.readout, "A");
  bool dosed = false;
  for (std::size_t i = 0; i < curve.times.size(); ++i) {
    const double t = curve.times[i];
    if (i > 0 && curve.times[i - 1] == t) dosed = true;
    const double exact = std::exp(-0.7 * t) + (dosed ? 3.0 * std::exp(-0.7 * (t - 2.0)) : 0.0);
    EXPECT_NEAR(curve.shown[i], exact, kShare * exact) << "t = " << t;
  }
  EXPECT_TRUE(dosed);
  EXPECT_EQ(curve.times.front(), 0);
  EXPECT_EQ(curve.times.back(), 4);
  EXPECT_EQ(std::count(curve.times.begin(), curve.times.end(), 0.5), 1);
  EXPECT_EQ(std::count(curve.times.begin(), curve.times.end(), 2.0), 2);
}

TEST(Curves, AnInputThatStepsIsShownBeforeAndAfter) {
  const Problem problem =
      decay_with_dose(Bench("opened").input("open", {{0, 0}, {1, 1}}).data("flux", {{2, 0.1}}));
  const auto all = drawn(problem, 0.5, 3);
  ASSERT_EQ(all.size(), 1U);
  EXPECT_THAT(all[0].times, ElementsAre(0, 1, 1, 2));
  EXPECT_EQ(all[0].shown[0], 0);
  EXPECT_EQ(all[0].shown[1], 0);
  EXPECT_NEAR(all[0].shown[2], 0.5, kShare * 0.5);
  EXPECT_NEAR(all[0].shown[3], 0.5 * std::exp(-0.5), kShare * 0.5);
}

TEST(Curves, AFailureNamesTheExperiment) {
  const core::Hypothesis blows_up = Mechanism("blow-up")
                                        .species("A", "1")
                                        .rate("growth", {}, {{"A", 1}}, "k * A^2")
                                        .unknowns({"k"});
  const std::vector<DeclaredUnknown> declared{between("k", 0.01, 10)};
  const std::vector<Readout> readouts{shows("A", "A")};
  const std::vector<Experiment> experiments{Bench("long").data("A", {{5, 1}})};
  const auto problem = assemble(blows_up, declared, readouts, experiments, {});
  ASSERT_TRUE(problem);
  // 1 / (1 - k t) is infinite at t = 1.
  const auto made = curves(*problem, {1.0}, 50);
  ASSERT_FALSE(made);
  EXPECT_EQ(made.failure().experiment, "long");
}

}  // namespace
}  // namespace gainsay::estimation
