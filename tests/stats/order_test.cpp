#include "gainsay/stats/order.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/starts.h"

#include <gtest/gtest.h>

#include <cmath>
#include <numbers>
#include <vector>

namespace gainsay::stats {
namespace {

OrderLayout one_series(std::size_t count) {
  OrderLayout layout;
  layout.residuals = count;
  layout.series.resize(1);
  for (std::size_t i = 0; i < count; ++i) layout.series[0].places.push_back({i});
  return layout;
}

/// Eigenvectors of the quadratic form of squared steps, for 2 - 2 cos(pi i / n), i = 0 .. n - 1:
/// cos(pi i (j + 1/2) / n). The one for i = 0 is constant.
Eigen::VectorXd wave(int n, int i) {
  Eigen::VectorXd v(n);
  for (int j = 0; j < n; ++j) v[j] = std::cos(std::numbers::pi * i * (j + 0.5) / n);
  return v.normalized();
}

double eigenvalue(int n, int i) { return 2.0 - 2.0 * std::cos(std::numbers::pi * i / n); }

/// Residuals that lie along waves i and j and have the statistic T.
Eigen::VectorXd with_statistic(double T, int n, int i, int j) {
  const double share = (T - eigenvalue(n, j)) / (eigenvalue(n, i) - eigenvalue(n, j));
  return std::sqrt(share) * wave(n, i) + std::sqrt(1.0 - share) * wave(n, j);
}

Eigen::MatrixXd columns(int n, const std::vector<int>& waves) {
  Eigen::MatrixXd Q(n, waves.size());
  for (std::size_t c = 0; c < waves.size(); ++c) Q.col(c) = wave(n, waves[c]);
  return Q;
}

// Savin & White (1977), 5 % bounds of the Durbin-Watson statistic (from memory), with more digits
// from numerical inversion of the law (Imhof). The lower bound is the 5 % point where the columns
// are the constant and the steepest waves, the upper one where they are the constant and the
// flattest (Durbin & Watson 1950).
struct Bound {
  int n;
  int regressors;
  double lower;
  double upper;
};

class DurbinWatsonBounds : public testing::TestWithParam<Bound> {};

TEST_P(DurbinWatsonBounds, AreTheFivePercentPointsOfTheSimulatedLaw) {
  const auto [n, regressors, lower, upper] = GetParam();
  // With 99,999 draws the standard error of P = 0.05 is 6.9e-4; 3.29 of them hold 99.9 %. The last
  // printed digit of the bounds moves P by less than 1e-5.
  constexpr double kInterval = 3.29 * 6.9e-4;
  std::vector<int> steepest = {0};
  std::vector<int> flattest = {0};
  for (int i = 1; i <= regressors; ++i) {
    steepest.push_back(n - i);
    flattest.push_back(i);
  }
  const OrderPlan plan{0.3, 5, 99'999, 99'999};
  const int first = regressors + 1;
  const OrderTest low =
      test_order(with_statistic(lower, n, 1, n - first), columns(n, steepest), one_series(n), plan);
  EXPECT_NEAR(low.T, lower, 1e-12);
  EXPECT_NEAR(low.p_value, 0.05, kInterval);
  const OrderTest high =
      test_order(with_statistic(upper, n, first, n - 1), columns(n, flattest), one_series(n), plan);
  EXPECT_NEAR(high.p_value, 0.05, kInterval);
}

INSTANTIATE_TEST_SUITE_P(SavinAndWhite, DurbinWatsonBounds,
                         testing::Values(Bound{15, 1, 1.07696, 1.36055},
                                         Bound{20, 1, 1.2015, 1.41073},
                                         Bound{30, 2, 1.28374, 1.56661},
                                         Bound{50, 1, 1.50345, 1.58486},
                                         Bound{50, 3, 1.42059, 1.67385}));

TEST(OrderTest, RejectsATrendAndNotNoise) {
  const int n = 20;
  Eigen::VectorXd trend = Eigen::VectorXd::LinSpaced(n, -2.0, 2.0);
  Eigen::VectorXd noise(n);
  estimation::Draws draws(3, 1, 4);
  for (double& e : noise) e = draws.normal();
  const Eigen::MatrixXd Q = columns(n, {0});
  noise -= Q * (Q.transpose() * noise);
  EXPECT_EQ(test_order(trend, Q, one_series(n), {}).p_value, 1e-4);
  EXPECT_EQ(test_order(trend, Q, one_series(n), {}).runs_p, 1e-4);
  EXPECT_EQ(test_order(trend, Q, one_series(n), {}).ljung_box_p, 1e-4);
  EXPECT_GT(test_order(noise, Q, one_series(n), {}).p_value, 0.01);
}

TEST(OrderTest, KeepsItsSizeAfterAFitThatWhiteNoiseWouldMisjudge) {
  // 12 points, 5 flattest waves fitted: T of true residuals is larger than that of white noise.
  const int n = 12;
  const Eigen::MatrixXd Q = columns(n, {0, 1, 2, 3, 4});
  int rejected = 0;
  for (std::uint64_t set = 0; set < 400; ++set) {
    estimation::Draws draws(11, 2, set);
    Eigen::VectorXd r(n);
    for (double& e : r) e = draws.normal();
    r -= Q * (Q.transpose() * r);
    const OrderTest test = test_order(r, Q, one_series(n), {0.1, set, 999, 999});
    rejected += test.p_value <= 0.1;
  }
  // 40 expected; the 99.9 % binomial interval of 0.1 in 400 is 22 to 61.
  EXPECT_GE(rejected, 22);
  EXPECT_LE(rejected, 61);
}

TEST(OrderTest, DrawsTenfoldWhileTheAnswerIsClose) {
  const int n = 15;
  const Eigen::MatrixXd Q = columns(n, {0, n - 1});
  const Eigen::VectorXd at_the_share = with_statistic(1.07696, n, 1, n - 2);
  const OrderTest close = test_order(at_the_share, Q, one_series(n), {0.05, 2, 999, 99'999});
  EXPECT_EQ(close.draws, 99'999U);
  EXPECT_TRUE(close.close);
  const OrderTest clear = test_order(at_the_share, Q, one_series(n), {0.3, 2, 999, 99'999});
  EXPECT_EQ(clear.draws, 999U);
  EXPECT_FALSE(clear.close);
}

TEST(OrderTest, IsTheSameEachTimeAndAnotherForAnotherSeed) {
  const Eigen::VectorXd r = with_statistic(1.5, 15, 1, 9);
  const Eigen::MatrixXd Q = columns(15, {0});
  const OrderTest once = test_order(r, Q, one_series(15), {0.01, 1, 9'999, 9'999});
  EXPECT_EQ(once.p_value, test_order(r, Q, one_series(15), {0.01, 1, 9'999, 9'999}).p_value);
  EXPECT_NE(once.p_value, test_order(r, Q, one_series(15), {0.01, 2, 9'999, 9'999}).p_value);
}

TEST(OrderTest, SaysWhyItCannotCount) {
  OrderLayout empty;
  empty.residuals = 3;
  const Eigen::VectorXd r = Eigen::Vector3d(1, -2, 1);
  EXPECT_EQ(test_order(r, columns(3, {0}), empty, {}).not_counted, "no series has two points");
  EXPECT_EQ(test_order(r, columns(3, {0, 1}), one_series(3), {}).not_counted,
            "the fit leaves one degree of freedom at most");
  EXPECT_EQ(test_order(r, columns(3, {0}), one_series(3), {1e-7}).not_counted,
            "its share of the significance is too small to be reached");
  EXPECT_EQ(test_order(Eigen::Vector3d::Zero(), columns(3, {0}), one_series(3), {}).not_counted,
            "the residuals are all zero");
}

TEST(OrderTest, CannotCountWhereTheStatisticIsAlwaysTheSame) {
  // Two series of two points, each with a mean of its own fitted: T is 2 whatever the noise.
  OrderLayout layout;
  layout.residuals = 4;
  layout.series.resize(2);
  layout.series[0].places = {{0}, {1}};
  layout.series[1].places = {{2}, {3}};
  Eigen::MatrixXd Q(4, 2);
  Q << 1, 0, 1, 0, 0, 1, 0, 1;
  Q /= std::sqrt(2.0);
  const OrderTest test = test_order(Eigen::Vector4d(1, -1, 3, -3), Q, layout, {});
  EXPECT_EQ(test.not_counted, "its statistic cannot vary after this fit");
  EXPECT_FALSE(test.close);
}

TEST(OrderTest, WantsColumnsAsLongAsTheResiduals) {
  EXPECT_THROW(test_order(Eigen::Vector3d(1, 2, 3), columns(4, {0}), one_series(3), {}),
               core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
