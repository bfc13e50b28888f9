#include "gainsay/stats/intervals.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::stats {
namespace {

// A few operations on numbers near 1.
constexpr double kRounding = 1e-13;
// Quantiles of printed tables: three decimals, times standard errors below 1.
constexpr double kPrinted = 0.5e-3;

estimation::Unknown unknown(double low, double high, bool linear) {
  estimation::Unknown u;
  u.name = "k";
  u.low = low;
  u.high = high;
  u.linear = linear;
  return u;
}

std::vector<Interval> of(const std::vector<estimation::Unknown>& unknowns,
                         const std::vector<double>& values, const Eigen::MatrixXd& J,
                         const std::vector<bool>& on_bound, const IntervalLaw& law = {}) {
  return linear_intervals(unknowns, values, on_bound, free_columns(J, on_bound), law);
}

TEST(LinearIntervals, OfAMeanAreItsTextbookOnes) {
  // n readings of one number p, range of width 10: dr/dx = 10 / sd, standard error sd / sqrt(n).
  const double sd = 0.8;
  const Eigen::MatrixXd J = Eigen::MatrixXd::Constant(16, 1, 10.0 / sd);
  const Interval interval = of({unknown(0, 10, true)}, {4.0}, J, {false})[0];
  EXPECT_TRUE(interval.determined);
  EXPECT_NEAR(interval.standard_error, 0.2, kRounding);
  EXPECT_NEAR(interval.low, 4.0 - 1.960 * 0.2, kPrinted);
  EXPECT_NEAR(interval.high, 4.0 + 1.960 * 0.2, kPrinted);
  EXPECT_EQ(interval.words, "");
}

TEST(LinearIntervals, UseStudentsLawWhereTheSdIsFitted) {
  // 11 readings: sd by the fit is sqrt(s / 11); with s / 10 in its place and t on 10 degrees.
  const double s = 4.4;
  const double fitted_sd = std::sqrt(s / 11);
  const Eigen::MatrixXd J = Eigen::MatrixXd::Constant(11, 1, 10.0 / fitted_sd);
  const IntervalLaw law{10.0, 11.0 / 10.0};
  const Interval interval = of({unknown(0, 10, true)}, {4.0}, J, {false}, law)[0];
  const double error = std::sqrt(s / 10 / 11);
  EXPECT_NEAR(interval.standard_error, error, kRounding);
  EXPECT_NEAR(interval.high, 4.0 + 2.228 * error, kPrinted);
}

TEST(LinearIntervals, AreFactorsWhereTheSearchIsLogarithmic) {
  const Eigen::MatrixXd J = Eigen::MatrixXd::Constant(1, 1, 1.0 / 0.1);
  const Interval interval = of({unknown(0.01, 100, false)}, {2.0}, J, {false})[0];
  EXPECT_NEAR(interval.standard_error, 0.2, kRounding);
  EXPECT_NEAR(interval.low * interval.high, 4.0, 10 * kRounding);
  EXPECT_NEAR(std::log(interval.high / 2.0), 0.196, kPrinted);
}

TEST(LinearIntervals, AgreeWithTheStraightLine) {
  // y = a + b t at t = -2 .. 2, sd 1: variances 1/5 and 1/10 (Gauss 1823).
  Eigen::MatrixXd J(5, 2);
  for (int i = 0; i < 5; ++i) J.row(i) << 1.0, i - 2.0;
  const auto all =
      of({unknown(-0.5, 0.5, true), unknown(-0.5, 0.5, true)}, {0.0, 0.0}, J, {false, false});
  EXPECT_NEAR(all[0].standard_error, std::sqrt(0.2), kRounding);
  EXPECT_NEAR(all[1].standard_error, std::sqrt(0.1), kRounding);
}

TEST(LinearIntervals, SayWhatTheDataLeaveFree) {
  Eigen::MatrixXd J(3, 3);  // the first two act through their product alone
  J << 1, 1, 0, 2, 2, 1, 3, 3, -1;
  const estimation::Unknown u = unknown(1e-3, 1e3, false);
  const auto all = of({u, u, u}, {1.0, 1.0, 1.0}, J, {false, false, false});
  EXPECT_FALSE(all[0].determined);
  EXPECT_FALSE(all[1].determined);
  EXPECT_TRUE(all[2].determined);
  EXPECT_EQ(all[0].words, "not determined by these data");
  EXPECT_TRUE(std::isnan(all[0].low) && std::isnan(all[0].standard_error));
  EXPECT_GT(all[2].standard_error, 0.0);
}

TEST(LinearIntervals, SayWhereAnEndLiesBeyondTheRangeSearched) {
  const Eigen::MatrixXd J = Eigen::MatrixXd::Constant(1, 1, 1.0);
  const auto ends = [&](double low, double high) {
    return of({unknown(low, high, false)}, {1.0}, J, {false})[0];
  };
  EXPECT_EQ(ends(0.5, 100).words, "no lower end");
  EXPECT_TRUE(std::isnan(ends(0.5, 100).low));
  EXPECT_NEAR(std::log(ends(0.5, 100).high), 1.960, kPrinted);
  EXPECT_EQ(ends(0.01, 2).words, "no upper end");
  EXPECT_EQ(ends(0.5, 2).words, "no end within its range");
  EXPECT_EQ(ends(0.01, 100).words, "");
}

TEST(LinearIntervals, AreNotGivenOnABound) {
  const Eigen::MatrixXd J = Eigen::MatrixXd::Identity(2, 2);
  const estimation::Unknown u = unknown(0.1, 10, false);
  const auto all = of({u, u}, {0.1, 10.0}, J, {true, true});
  EXPECT_EQ(all[0].words, "on its lower bound");
  EXPECT_EQ(all[1].words, "on its upper bound");
  EXPECT_TRUE(all[0].on_bound);
  EXPECT_FALSE(all[0].determined);
  EXPECT_TRUE(std::isnan(all[0].low));
  EXPECT_EQ(all[0].estimate, 0.1);
}

TEST(LinearIntervals, WantAValueForEachUnknown) {
  const Eigen::MatrixXd J = Eigen::MatrixXd::Identity(1, 1);
  EXPECT_THROW(of({unknown(0.1, 10, false)}, {}, J, {false}), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
