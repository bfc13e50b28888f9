#include "gainsay/stats/order_statistics.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <vector>

namespace gainsay::stats {
namespace {

OrderedSeries plain_series(std::size_t first, std::size_t count) {
  OrderedSeries series;
  for (std::size_t i = 0; i < count; ++i) series.places.push_back({first + i});
  return series;
}

OrderLayout layout_of(std::vector<OrderedSeries> series, std::size_t residuals) {
  return {residuals, std::move(series), {}};
}

OrderStatistics of_one_series(const std::vector<double>& r) {
  const Eigen::Map<const Eigen::RowVectorXd> row(r.data(), r.size());
  return order_statistics(row, layout_of({plain_series(0, r.size())}, r.size()));
}

// Series and statistics: printed by the function durbinWatsonTest of R, quoted in the tests of
// statsmodels (test_statstools.py); recomputed from the plain formula to 15 digits.
const std::vector<double> kX = {-0.1184, -1.3403, 0.0063, -0.612,  -0.3869, -0.2313, -2.8485,
                                -0.2167, 0.4153,  1.8492, -0.3706, 0.9726,  -0.1501, -0.0337,
                                -1.4423, 1.2489,  0.9182, -0.2331, -0.6182, 0.183};

std::vector<double> with_lag(double share) {
  std::vector<double> sums;
  for (std::size_t i = 1; i < kX.size(); ++i) sums.push_back(kX[i] + share * kX[i - 1]);
  return sums;
}

TEST(LagOneStatistic, AgreesWithPublishedValuesToFourteenDigits) {
  constexpr double kFourteenDigits = 1e-14;  // relative
  std::vector<double> squares;
  for (const double x : kX) squares.push_back(x * x);
  const auto expect = [](const std::vector<double>& series, double published) {
    EXPECT_NEAR(of_one_series(series).T[0] / published, 1.0, kFourteenDigits) << published;
  };
  expect(kX, 1.95298958377419);
  expect(squares, 1.848802400319998);
  expect(with_lag(0.5), 1.09897993228779);
  expect(with_lag(0.8), 0.937241876707273);
  expect(with_lag(0.9), 0.921488912587806);
}

TEST(LagOneStatistic, TakesNoStepAcrossTheJointOfTwoSeries) {
  Eigen::RowVectorXd r(4);
  r << 1, 1, -1, -1;
  EXPECT_EQ(order_statistics(r, layout_of({plain_series(0, 2), plain_series(2, 2)}, 4)).T[0], 0.0);
  EXPECT_EQ(order_statistics(r, layout_of({plain_series(0, 4)}, 4)).T[0], 1.0);
}

TEST(LagOneStatistic, TakesReplicatesByTheirWeightedMean) {
  OrderedSeries series;
  series.places = {{0, 1, 2, 3}, {4}};
  Eigen::RowVectorXd r(5);
  r << 1, 2, 3, 2, 4;  // sqrt(4) times 2 is 4: no step
  EXPECT_EQ(order_statistics(r, layout_of({series}, 5)).T[0], 0.0);
}

TEST(LagOneStatistic, DoesNotFeelTheSdThatAGroupIsFittedWith) {
  OrderLayout layout = layout_of({plain_series(0, 3), plain_series(3, 3)}, 6);
  layout.noise_groups = {{0, 1, 2}, {3, 4, 5}};
  Eigen::MatrixXd R(2, 6);
  R << 1, -2, 1, 3, 1, 2, 1, -2, 1, 300, 100, 200;
  const OrderStatistics statistics = order_statistics(R, layout);
  constexpr double kRounding = 1e-14;
  EXPECT_NEAR(statistics.T[1], statistics.T[0], kRounding);
  // Each group counts with its points: (3 * 18 / 6 + 3 * 5 / 14) / 6.
  EXPECT_NEAR(statistics.T[0], (3.0 * 18 / 6 + 3.0 * 5 / 14) / 6, kRounding);
}

// statsmodels, tests of its runs test (test_runs.py), sequence 1110010101110101: 11 runs.
TEST(Runs, AreStretchesOfOneSign) {
  std::vector<double> signs;
  for (const char c : std::string("1110010101110101")) signs.push_back(c == '1' ? 1.0 : -1.0);
  EXPECT_EQ(of_one_series(signs).runs[0], 11.0);
}

TEST(LjungBox, IsItsFormula) {
  // n = 6, one lag: Q = 6 * 8 * rho^2 / 5 with rho = (2 - 2 + 3 + 3 - 1) / (1 + 4 + 1 + 9 + 1 + 1).
  constexpr double kRounding = 1e-14;
  const double rho = 5.0 / 17.0;
  EXPECT_NEAR(of_one_series({1, 2, -1, -3, -1, 1}).ljung_box[0], 48.0 * rho * rho / 5.0, kRounding);
}

TEST(LjungBox, TakesALagForEachFivePlaces) {
  // Period 2 over 10 places: rho_1 = -9/10, rho_2 = 8/10: Q = 120 (0.81 / 9 + 0.64 / 8).
  constexpr double kRounding = 1e-13;
  EXPECT_NEAR(of_one_series({1, -1, 1, -1, 1, -1, 1, -1, 1, -1}).ljung_box[0], 20.4, kRounding);
}

TEST(OrderStatistics, AreTheSameOneByOneAndTogether) {
  Eigen::MatrixXd R(2, 5);
  R << 1, 2, -1, 0.5, 3, -2, 2, 1, 0.25, -1;
  const OrderLayout layout = layout_of({plain_series(1, 4)}, 5);
  const OrderStatistics together = order_statistics(R, layout);
  for (int i = 0; i < 2; ++i) EXPECT_EQ(together.T[i], order_statistics(R.row(i), layout).T[0]);
}

estimation::FittedSeries fitted(const std::vector<std::size_t>& outputs) {
  estimation::FittedSeries series;
  for (const std::size_t output : outputs) {
    estimation::Datum datum;
    datum.output = output;
    series.data.push_back(datum);
  }
  return series;
}

TEST(OrderLayout, KeepsSeriesOfTwoPlacesAndLeavesPriorsOut) {
  estimation::Problem problem;
  problem.experiments.resize(2);
  problem.experiments[0].series = {fitted({0, 0}), fitted({0, 1, 1, 2})};
  problem.experiments[1].series = {fitted({4}), fitted({0, 3})};
  problem.unknowns.resize(2);
  problem.unknowns[1].prior = estimation::Prior{1.0, 0.1, {}};
  const OrderLayout layout = order_layout(problem);
  EXPECT_EQ(layout.residuals, 10U);
  ASSERT_EQ(layout.series.size(), 2U);
  EXPECT_EQ(layout.series[0].places, (std::vector<std::vector<std::size_t>>{{2}, {3, 4}, {5}}));
  EXPECT_EQ(layout.series[1].places, (std::vector<std::vector<std::size_t>>{{7}, {8}}));
  EXPECT_TRUE(layout.noise_groups.empty());
}

TEST(OrderLayout, KnowsWhichResidualsShareAFittedSd) {
  estimation::Problem problem;
  problem.noise_groups = {"glow"};
  problem.experiments.resize(2);
  problem.experiments[0].series = {fitted({0, 1}), fitted({0, 1})};
  problem.experiments[1].series = {fitted({0})};
  for (estimation::FittedSeries* series :
       {&problem.experiments[0].series[1], &problem.experiments[1].series[0]})
    series->noise.sd_unknown = true;
  problem.experiments[0].series[1].data[0].sd = 0.1;  // its own: known
  const OrderLayout layout = order_layout(problem);
  EXPECT_EQ(layout.noise_groups, (std::vector<std::vector<std::size_t>>{{3, 4}}));
}

TEST(OrderStatistics, OfResidualsThatAreAllZeroAreNoNumber) {
  EXPECT_TRUE(std::isnan(of_one_series({0, 0, 0}).T[0]));
}

}  // namespace
}  // namespace gainsay::stats
