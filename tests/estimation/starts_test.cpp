#include "gainsay/estimation/starts.h"

#include "gainsay/estimation/coordinates.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <numeric>
#include <vector>

namespace gainsay::estimation {
namespace {

using testing::ElementsAre;

Unknown logarithmic(std::string name, double low, double high) {
  return {.name = std::move(name), .low = low, .high = high};
}

Unknown linear(std::string name, double low, double high) {
  Unknown unknown = logarithmic(std::move(name), low, high);
  unknown.linear = true;
  return unknown;
}

// Known answers published with the generator (Salmon et al. 2011: Random123, file kat_vectors,
// lines "philox4x64 10").
TEST(Philox, GivesThePublishedKnownAnswers) {
  EXPECT_THAT(philox({0, 0}, {0, 0, 0, 0}), ElementsAre(0x16554d9eca36314cu, 0xdb20fe9d672d0fdcu,
                                                        0xd7e772cee186176bu, 0x7e68b68aec7ba23bu));
  constexpr std::uint64_t kOnes = ~std::uint64_t{0};
  EXPECT_THAT(philox({kOnes, kOnes}, {kOnes, kOnes, kOnes, kOnes}),
              ElementsAre(0x87b092c3013fe90bu, 0x438c3c67be8d0224u, 0x9cc7d7c69cd777b6u,
                          0xa09caebf594f0ba0u));
  EXPECT_THAT(
      philox({0x452821e638d01377u, 0xbe5466cf34e90c6cu},
             {0x243f6a8885a308d3u, 0x13198a2e03707344u, 0xa4093822299f31d0u, 0x082efa98ec4e6c89u}),
      ElementsAre(0xa528f45403e61d95u, 0x38c72dbd566e9788u, 0xa5a1610e72fd18b5u,
                  0x57bd43b5e52b7fe6u));
}

TEST(Draws, DependOnSeedStreamAndNumberAlone) {
  Draws a(1, 2, 3);
  Draws b(1, 2, 3);
  for (int i = 0; i < 10; ++i) EXPECT_EQ(a.uniform(), b.uniform());
  EXPECT_NE(Draws(1, 2, 3).uniform(), Draws(2, 2, 3).uniform());
  EXPECT_NE(Draws(1, 2, 3).uniform(), Draws(1, 3, 3).uniform());
  EXPECT_NE(Draws(1, 2, 3).uniform(), Draws(1, 2, 4).uniform());
}

// Kolmogorov's statistic of n uniform draws exceeds 1.95 / sqrt(n) with probability 0.001
// (Smirnov 1948, asymptotic); the seed is fixed, so the outcome is too.
TEST(Draws, UniformOnesAreUniform) {
  constexpr int kCount = 20000;
  std::vector<double> draws;
  Draws source(7, 0, 0);
  for (int i = 0; i < kCount; ++i) draws.push_back(source.uniform());
  std::sort(draws.begin(), draws.end());
  EXPECT_GT(draws.front(), 0.0);
  EXPECT_LT(draws.back(), 1.0);
  double largest = 0.0;
  for (int i = 0; i < kCount; ++i) {
    largest = std::max({largest, (i + 1.0) / kCount - draws[i], draws[i] - i * 1.0 / kCount});
  }
  EXPECT_LT(largest, 1.95 / std::sqrt(kCount));
}

TEST(Draws, NormalOnesAreNormal) {
  constexpr int kCount = 20000;
  std::vector<double> draws;
  Draws source(11, 5, 0);
  for (int i = 0; i < kCount; ++i) draws.push_back(source.normal());
  std::sort(draws.begin(), draws.end());
  double largest = 0.0;
  for (int i = 0; i < kCount; ++i) {
    const double share = 0.5 * std::erfc(-draws[i] / std::sqrt(2.0));
    largest = std::max({largest, (i + 1.0) / kCount - share, share - i * 1.0 / kCount});
  }
  EXPECT_LT(largest, 1.95 / std::sqrt(kCount));  // as above
}

TEST(NthStart, LiesInTheBoxAndFillsIt) {
  const std::vector<Unknown> unknowns = {logarithmic("k", 1e-3, 1e3), linear("offset", -2.0, 6.0)};
  const Eigen::VectorXd low = lower_bounds(unknowns), high = upper_bounds(unknowns);
  Eigen::VectorXd mean = Eigen::VectorXd::Zero(2);
  constexpr int kCount = 2000;
  for (int n = 0; n < kCount; ++n) {
    const Eigen::VectorXd x = nth_start(unknowns, 1, n);
    EXPECT_TRUE((x.array() >= low.array()).all() && (x.array() <= high.array()).all());
    mean += x / kCount;
  }
  // The mean of n uniform draws has sd width / sqrt(12 n); four of them.
  const Eigen::VectorXd within = 4.0 * (high - low) / std::sqrt(12.0 * kCount);
  for (int i = 0; i < 2; ++i) EXPECT_NEAR(mean[i], 0.5 * (low[i] + high[i]), within[i]);
}

TEST(NthStart, OfOneUnknownStaysWhenAnotherIsAdded) {
  const std::vector<Unknown> one = {logarithmic("k", 1e-3, 1e3)};
  const std::vector<Unknown> two = {logarithmic("a", 1e-3, 1e3), logarithmic("k", 1e-3, 1e3)};
  for (int n = 0; n < 5; ++n) {
    EXPECT_EQ(nth_start(one, 1, n)[0], nth_start(two, 1, n)[1]);
    EXPECT_NE(nth_start(two, 1, n)[0], nth_start(two, 1, n)[1]);
    EXPECT_NE(nth_start(one, 1, n)[0], nth_start(one, 2, n)[0]);
  }
}

TEST(FirstGuesses, AreAsManyAsTheLongestListHas) {
  std::vector<Unknown> unknowns = {logarithmic("k", 1e-2, 1e2), linear("b", 0.0, 4.0),
                                   logarithmic("c", 1.0, 100.0), logarithmic("d", 1.0, 100.0)};
  EXPECT_TRUE(first_guesses(unknowns).empty());
  unknowns[0].first = {0.5, 2.0, 1e9};
  unknowns[1].first = {1.0};
  unknowns[2].prior = Prior{.value = 20.0, .sd = 1.0};
  const std::vector<Eigen::VectorXd> guesses = first_guesses(unknowns);
  ASSERT_EQ(guesses.size(), 3u);
  const auto values = [&](int n) { return from_coordinates(unknowns, guesses[n]); };
  constexpr double kRounding = 1e-14;  // of exp(ln x): a few epsilon times |ln x|
  const auto near = [](double value) {
    return testing::DoubleNear(value, kRounding * std::max(1.0, value));
  };
  EXPECT_THAT(values(0), ElementsAre(near(0.5), near(1.0), near(20.0), near(10.0)));
  EXPECT_THAT(values(1), ElementsAre(near(2.0), near(1.0), near(20.0), near(10.0)));
  EXPECT_THAT(values(2), ElementsAre(near(100.0), near(1.0), near(20.0), near(10.0)));
}

TEST(Middle, IsThatOfTheTransformedRange) {
  const std::vector<Unknown> unknowns = {logarithmic("k", 1e-4, 1e2), linear("b", -1.0, 4.0)};
  const Eigen::VectorXd expected = 0.5 * (lower_bounds(unknowns) + upper_bounds(unknowns));
  // Both logarithms and the square roots round: a few epsilon of the largest logarithm.
  constexpr double kRounding = 1e-14;
  EXPECT_LT((middle(unknowns) - expected).cwiseAbs().maxCoeff(), kRounding);
}

}  // namespace
}  // namespace gainsay::estimation
