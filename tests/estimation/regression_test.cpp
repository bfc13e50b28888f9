#include "gainsay/estimation/regression.h"

#include "gainsay/estimation/coordinates.h"
#include "gainsay/testing/small_problems.h"

#include <Eigen/QR>
#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>
#include <limits>

namespace gainsay::estimation {
namespace {

using ::testing::ElementsAre;
constexpr long kNoLimit = std::numeric_limits<long>::max();
// Integrated to 1e-10, divided by sds of 0.1.
constexpr double kIntegration = 1e-8;

const testing::SystemText kDecay{.states = {{"A", "-k * A", "1"}},
                                 .unknowns = {"k", "scale", "offset"},
                                 .readouts = {"scale * A + offset"}};
const std::vector<std::array<double, 2>> kPoints = {
    {0.5, 9.5}, {1.0, 7.0}, {1.5, 5.6}, {3.0, 3.1}, {5.0, 2.4}};

Problem decay(Unknown scale, Unknown offset, Noise noise = {.sd = 0.1}) {
  Problem problem = testing::small_problem(
      kDecay, {testing::unknown("k", 0.01, 10), std::move(scale), std::move(offset)},
      {{{}, {{0, kPoints, kNotGiven, noise}}}});
  problem.experiments[0].linear.push_back({.scale = 1, .offset = 2, .readout = 0});
  return problem;
}

Problem usual_decay(Noise noise = {.sd = 0.1}) {
  return decay(testing::unknown("scale", 1e-3, 1e6), testing::linear_unknown("offset", -90, 90),
               noise);
}

std::vector<double> regressed_values(const Problem& problem, const std::vector<double>& from,
                                     const std::vector<std::size_t>& which) {
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const auto x = regressed(allowance, to_coordinates(problem.unknowns, from), which);
  return x ? from_coordinates(problem.unknowns, *x) : std::vector<double>();
}

/// Weighted linear regression of the readings on A = exp(-k t) by QR.
Eigen::Vector2d by_qr(double k, const std::function<double(double)>& sd) {
  Eigen::MatrixXd design(5, 2);
  Eigen::VectorXd z(5);
  for (int i = 0; i < 5; ++i) {
    const auto [t, value] = kPoints[i];
    design.row(i) << std::exp(-k * t) / sd(value), 1.0 / sd(value);
    z[i] = value / sd(value);
  }
  return design.householderQr().solve(z);
}

TEST(LinearUnknowns, AreScalesAndOffsets) {
  EXPECT_THAT(linear_unknowns(usual_decay()), ElementsAre(1, 2));
}

TEST(Regressed, IsWeightedLinearRegressionWhereverItStarts) {
  for (const double k : {0.1, 0.6, 3.0}) {
    const Eigen::Vector2d expected = by_qr(k, [](double) { return 0.1; });
    for (const double scale : {0.01, 30.0, 1e5}) {
      const auto values = regressed_values(usual_decay(), {k, scale, -40.0}, {1, 2});
      EXPECT_NEAR(values[0], k, 1e-14 * k);
      // From a scale of 1e5 the readings are small differences: 1e5 times the error of A.
      EXPECT_NEAR(values[1], expected[0], 1e5 * 1e-9);
      EXPECT_NEAR(values[2], expected[1], 1e5 * 1e-9);
    }
  }
}

TEST(Regressed, WeighsByTheSdAtTheObservedValue) {
  const auto values =
      regressed_values(usual_decay({.sd = 0.1, .relative = 0.3}), {0.6, 5.0, 0.0}, {1, 2});
  const Eigen::Vector2d expected = by_qr(0.6, [](double z) { return std::hypot(0.1, 0.3 * z); });
  EXPECT_NEAR(values[1], expected[0], 10 * kIntegration);
  EXPECT_NEAR(values[2], expected[1], 10 * kIntegration);
}

TEST(Regressed, TakesUnknownSdsAsEqual) {
  const auto values = regressed_values(usual_decay({.sd_unknown = true}), {0.6, 5.0, 0.0}, {1, 2});
  const Eigen::Vector2d expected = by_qr(0.6, [](double) { return 1.0; });
  EXPECT_NEAR(values[1], expected[0], 10 * kIntegration);
  EXPECT_NEAR(values[2], expected[1], 10 * kIntegration);
}

TEST(Regressed, SetsThoseAskedForAlone) {
  const auto values = regressed_values(usual_decay(), {0.6, 5.0, 1.0}, {1});
  EXPECT_EQ(values[2], 1.0);
  // Through the offset given: sum A (z - 1) / sum A^2.
  double above = 0.0, below = 0.0;
  for (const auto& [t, z] : kPoints) {
    above += std::exp(-0.6 * t) * (z - 1.0);
    below += std::exp(-1.2 * t);
  }
  EXPECT_NEAR(values[1], above / below, 10 * kIntegration);
}

TEST(Regressed, StaysWithinTheRangesAndFitsTheOthersToThat) {
  const Problem problem =
      decay(testing::unknown("scale", 1e-3, 4.0), testing::linear_unknown("offset", -90, 90));
  const auto values = regressed_values(problem, {0.6, 2.0, 1.0}, {1, 2});
  EXPECT_NEAR(values[1], 4.0, 1e-14);
  double mean = 0.0;  // with the scale held: the mean of what is left
  for (const auto& [t, z] : kPoints) mean += (z - 4.0 * std::exp(-0.6 * t)) / 5.0;
  EXPECT_NEAR(values[2], mean, 10 * kIntegration);
}

TEST(Regressed, LeavesAScaleThatNothingDependsOn) {
  // k = 10 from t = 5 on: A is 1e-22 and less, nothing that a scale could show.
  Problem problem = usual_decay();
  problem.experiments[0].series[0].data.erase(problem.experiments[0].series[0].data.begin(),
                                              problem.experiments[0].series[0].data.end() - 1);
  const auto values = regressed_values(problem, {10.0, 5.0, 0.0}, {1, 2});
  EXPECT_GE(values[1], 1e-3);
  EXPECT_LE(values[1], 1e6);
  EXPECT_NEAR(values[2], 2.4, 1e-6);
}

TEST(Regressed, OfNothingIsWhereItWas) {
  const Problem problem = usual_decay();
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  const Eigen::VectorXd x = Eigen::Vector3d(0.1, 0.2, 0.3);
  EXPECT_EQ(regressed(allowance, x, {}), x);
  EXPECT_EQ(evaluator.integrations(), 0);
}

}  // namespace
}  // namespace gainsay::estimation
