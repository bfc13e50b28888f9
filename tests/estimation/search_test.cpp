#include "gainsay/estimation/search.h"

#include "gainsay/estimation/coordinates.h"
#include "gainsay/estimation/starts.h"
#include "gainsay/testing/decay_data.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <atomic>
#include <cmath>
#include <thread>

namespace gainsay::estimation {
namespace {

using ::testing::Each;
using ::testing::ElementsAre;
using testing::TwoSteps;

Problem two_steps() { return TwoSteps::problem({.sd = 0.1}, 0.1, 0.0, 0, 1e-6); }

const NeedsMore kNoMore = [](const Fit&, std::size_t) { return false; };
const NeedsMore kAlwaysMore = [](const Fit&, std::size_t) { return true; };

void expect_equal(const Fit& a, const Fit& b) {
  EXPECT_EQ(a.x, b.x);
  EXPECT_EQ(a.values, b.values);
  EXPECT_EQ(a.stopped, b.stopped);
  EXPECT_EQ(a.why, b.why);
  EXPECT_EQ(a.on_bound, b.on_bound);
  EXPECT_EQ(a.shown, b.shown);
  EXPECT_EQ(a.sd, b.sd);
  EXPECT_EQ(a.integrations, b.integrations);
  EXPECT_EQ(a.evaluations, b.evaluations);
  EXPECT_EQ(a.jacobians, b.jacobians);
  if (a.ended()) {
    EXPECT_EQ(a.V, b.V);
    EXPECT_EQ(a.objective, b.objective);
  }
}

void expect_equal(const SearchResult& a, const SearchResult& b) {
  ASSERT_EQ(a.descents.size(), b.descents.size());
  for (std::size_t i = 0; i < a.descents.size(); ++i) {
    EXPECT_EQ(a.descents[i].start_number, b.descents[i].start_number);
    expect_equal(a.descents[i].fit, b.descents[i].fit);
  }
  EXPECT_EQ(a.optima, b.optima);
  expect_equal(a.best, b.best);
  EXPECT_EQ(a.random_starts, b.random_starts);
  EXPECT_EQ(a.replaced_starts, b.replaced_starts);
  EXPECT_EQ(a.integrations, b.integrations);
  EXPECT_EQ(a.out_of_budget, b.out_of_budget);
}

/// Starts with a large k blow up before the first datum.
Problem burst() {
  return testing::small_problem(
      {.states = {{"y", "k * y^2 - d * y", "1"}}, .unknowns = {"k", "d"}, .readouts = {"y"}},
      {testing::unknown("k", 1e-3, 1e2), testing::unknown("d", 1e-3, 1e2)},
      {{{}, {{0, {{1.0, 1.03}, {2.0, 1.01}, {4.0, 1.06}}, 0.05, {}}}}}, 1e-6);
}

TEST(Search, IsTheSameOnAnyNumberOfThreads) {
  for (const Problem& problem : {two_steps(), burst()}) {
    SearchPlan plan{.least_starts = 8, .starts_for_rejection = 14};
    const SearchResult one = search(problem, plan, kAlwaysMore);
    EXPECT_EQ(one.random_starts, 14u);
    for (const unsigned threads : {2u, 3u}) {
      plan.threads = threads;
      expect_equal(search(problem, plan, kAlwaysMore), one);
    }
  }
}

TEST(Search, EndsOutOfBudgetAtTheSameDescentOnAnyNumberOfThreads) {
  SearchPlan plan{.least_starts = 30, .budget = 200};
  const SearchResult one = search(two_steps(), plan, kNoMore);
  EXPECT_TRUE(one.out_of_budget);
  EXPECT_GE(one.integrations, 200);
  EXPECT_LT(one.integrations - one.descents.back().fit.integrations, 200);
  plan.threads = 3;
  expect_equal(search(two_steps(), plan, kNoMore), one);
}

TEST(Search, FindsTheOptimumAndCountsHowOften) {
  const SearchResult found = search(two_steps(), {.least_starts = 12}, kNoMore);
  EXPECT_EQ(found.random_starts, 12u);
  EXPECT_FALSE(found.out_of_budget);
  EXPECT_FALSE(found.interrupted);
  ASSERT_FALSE(found.optima.empty());
  EXPECT_EQ(found.best.stopped, Stopped::Converged);
  expect_equal(found.descents[found.optima[0].best_descent].fit, found.best);
  // The model is the truth: the best V is a draw of chi-square with 17 degrees, below 40.79 with
  // probability 0.999 (printed tables).
  EXPECT_LT(found.best.V, 40.79);
  EXPECT_GE(found.optima[0].found, 3u);
  std::size_t counted = 0;
  for (const Optimum& optimum : found.optima) counted += optimum.found;
  EXPECT_LE(counted, 12u);
}

TEST(Search, ReplacesStartsThatCannotBeIntegrated) {
  const SearchResult found = search(burst(), {.least_starts = 10}, kNoMore);
  EXPECT_EQ(found.random_starts, 10u);
  EXPECT_GT(found.replaced_starts, 0u);
  EXPECT_EQ(found.descents.size(), 10u);
  // The numbers go on: the last start has the number of all that were tried.
  EXPECT_EQ(found.descents.back().start_number, 10u + found.replaced_starts - 1u);
  for (const Descent& descent : found.descents)
    EXPECT_NE(descent.fit.stopped, Stopped::CannotIntegrate);
}

TEST(Search, EndsWhenNoStartCanBeIntegrated) {
  const Problem problem = testing::small_problem(
      {.states = {{"y", "k * y^2", "1"}}, .unknowns = {"k"}, .readouts = {"y"}},
      {testing::unknown("k", 5, 10)}, {{{}, {{0, {{1.0, 1.2}, {2.0, 1.4}}, 0.1, {}}}}});
  const SearchResult found = search(problem, {.least_starts = 10, .budget = 50}, kNoMore);
  EXPECT_TRUE(found.out_of_budget);
  EXPECT_EQ(found.random_starts, 0u);
  EXPECT_TRUE(found.optima.empty());
  EXPECT_FALSE(found.best.ended());
}

TEST(Search, AsksAfterEachDescentFromTheLeastNumberOn) {
  std::vector<std::size_t> asked;
  const NeedsMore until_seven = [&](const Fit& best, std::size_t starts) {
    EXPECT_TRUE(best.ended());
    asked.push_back(starts);
    return starts < 7;
  };
  const SearchResult found =
      search(two_steps(), {.least_starts = 4, .starts_for_rejection = 9}, until_seven);
  EXPECT_THAT(asked, ElementsAre(4, 5, 6, 7));
  EXPECT_EQ(found.random_starts, 7u);
}

TEST(Search, MakesAFixedNumberOfStartsWhateverHangsOnThem) {
  EXPECT_EQ(search(two_steps(), {.fixed = 3}, kAlwaysMore).random_starts, 3u);
}

TEST(Search, BeginsWithFirstGuesses) {
  Problem problem = two_steps();
  problem.unknowns[0].first = {0.5, 2.0};
  problem.unknowns[1].first = {0.2};
  const SearchResult found = search(problem, {.fixed = 2}, kNoMore);
  ASSERT_EQ(found.descents.size(), 4u);
  EXPECT_FALSE(found.descents[0].start_number.has_value());
  EXPECT_FALSE(found.descents[1].start_number.has_value());
  EXPECT_EQ(found.descents[2].start_number, 0u);
  EXPECT_EQ(found.descents[3].start_number, 1u);
  EXPECT_EQ(found.random_starts, 2u);
  std::size_t counted = 0;
  for (const Optimum& optimum : found.optima) counted += optimum.found;
  EXPECT_LE(counted, 2u);
}

TEST(Search, OfNoDescentsFitsFromFirstGuessesAlone) {
  Problem problem = two_steps();
  EXPECT_EQ(search(problem, {.fixed = 0}, kAlwaysMore).descents.size(), 1u);  // the middle
  problem.unknowns[0].first = {0.5, 2.0, 3.0};
  const SearchResult found = search(problem, {.fixed = 0}, kAlwaysMore);
  EXPECT_EQ(found.descents.size(), 3u);
  EXPECT_EQ(found.random_starts, 0u);
}

TEST(Search, DependsOnItsSeed) {
  const SearchResult a = search(two_steps(), {.fixed = 1, .seed = 1}, kNoMore);
  const SearchResult b = search(two_steps(), {.fixed = 1, .seed = 2}, kNoMore);
  EXPECT_NE(a.best.x, b.best.x);
}

TEST(Search, KeepsWhatIsSettledWhenInterrupted) {
  for (const unsigned threads : {1u, 3u}) {
    std::stop_source source;
    const SearchPlan plan{.least_starts = 1000, .threads = threads, .stop = source.get_token()};
    const SearchResult found =
        search(two_steps(), plan, kNoMore, [&](std::size_t done, std::size_t, double) {
          if (done == 5) source.request_stop();
        });
    EXPECT_TRUE(found.interrupted);
    EXPECT_EQ(found.descents.size(), 5u);
    EXPECT_TRUE(found.best.ended());
    for (const Descent& descent : found.descents)
      EXPECT_NE(descent.fit.stopped, Stopped::Interrupted);
  }
}

TEST(Search, TellsItsObserverHowFarItIs) {
  std::vector<std::size_t> done, expected;
  search(two_steps(), {.least_starts = 3, .starts_for_rejection = 5}, kAlwaysMore,
         [&](std::size_t so_far, std::size_t in_all, double best) {
           done.push_back(so_far);
           expected.push_back(in_all);
           EXPECT_TRUE(std::isfinite(best));
         });
  EXPECT_THAT(done, ElementsAre(1, 2, 3, 4, 5));
  EXPECT_THAT(expected, ElementsAre(3, 3, 5, 5, 5));
}

}  // namespace
}  // namespace gainsay::estimation
