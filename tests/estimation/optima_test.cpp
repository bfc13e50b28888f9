#include "gainsay/estimation/optima.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::estimation {
namespace {

using ::testing::ElementsAre;

Fit fit(double V, double shown, Stopped stopped = Stopped::Converged) {
  Fit made;
  made.V = made.objective = V;
  made.shown = Eigen::Vector2d(shown, 7.0);
  made.sd = Eigen::Vector2d(0.5, 0.5);
  made.stopped = stopped;
  return made;
}

std::vector<Optimum> optima_of(const std::vector<Fit>& fits, std::size_t guesses = 0) {
  std::vector<const Fit*> pointers;
  for (const Fit& each : fits) pointers.push_back(&each);
  return distinct_optima(pointers, [&](std::size_t number) { return number >= guesses; });
}

TEST(AreOneOptimum, ComparesVAndPredictions) {
  EXPECT_TRUE(are_one_optimum(fit(10.0, 3.0), fit(10.009, 3.0)));
  EXPECT_FALSE(are_one_optimum(fit(10.0, 3.0), fit(10.02, 3.0)));
  EXPECT_TRUE(are_one_optimum(fit(10.0, 3.0), fit(10.0, 3.049)));
  EXPECT_FALSE(are_one_optimum(fit(10.0, 3.0), fit(10.0, 3.06)));  // beyond 0.1 of 0.5
}

TEST(AreOneOptimum, NeverByUnknowns) {
  Fit a = fit(10.0, 3.0), b = a;
  a.x = Eigen::Vector2d(0.0, 0.0);
  b.x = Eigen::Vector2d(5.0, -5.0);
  EXPECT_TRUE(are_one_optimum(a, b));
}

TEST(AreOneOptimum, IsNotWhatCouldNotBeEvaluated) {
  Fit nowhere;
  EXPECT_FALSE(are_one_optimum(nowhere, nowhere));
}

TEST(IsBetter, PutsConvergedFitsFirst) {
  const Fit converged = fit(10.0, 3.0);
  const Fit lower = fit(9.0, 3.0, Stopped::NotConverged);
  EXPECT_TRUE(is_better(converged, lower));
  EXPECT_FALSE(is_better(lower, converged));
  EXPECT_TRUE(is_better(fit(9.0, 3.0), converged));
  EXPECT_FALSE(is_better(converged, converged));
  EXPECT_TRUE(is_better(lower, Fit()));
  EXPECT_FALSE(is_better(Fit(), lower));
}

TEST(DistinctOptima, AreListedBestFirstWithCounts) {
  const auto optima = optima_of(
      {fit(12.0, 1.0), fit(10.0, 3.0), fit(12.001, 1.01), fit(10.005, 3.0), fit(10.0, 9.0)});
  ASSERT_EQ(optima.size(), 3u);
  EXPECT_EQ(optima[0], (Optimum{1, 2}));
  EXPECT_EQ(optima[1], (Optimum{4, 1}));
  EXPECT_EQ(optima[2], (Optimum{0, 2}));
}

TEST(DistinctOptima, CountRandomStartsAlone) {
  const auto optima = optima_of({fit(10.0, 3.0), fit(10.0, 3.0), fit(11.0, 1.0)}, 1);
  EXPECT_THAT(optima, ElementsAre(Optimum{0, 1}, Optimum{2, 1}));
}

TEST(DistinctOptima, AreFoundByConvergedDescentsAlone) {
  const auto optima = optima_of({fit(8.0, 2.0, Stopped::NotConverged), fit(10.0, 3.0), Fit()});
  EXPECT_THAT(optima, ElementsAre(Optimum{1, 1}));
}

}  // namespace
}  // namespace gainsay::estimation
