#include "gainsay/stats/rivals.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::stats {
namespace {

// Burnham & Anderson (2002), tables 3.1 to 3.3 (from memory): Hald's cement data (n = 13; Woods,
// Steinour & Starke 1932), every subset of four regressors. Printed: the best has AICc 32.41, with
// sigma^2 rounded to 4.45, and weight 0.567; then 0.12, 0.12, 0.11, 0.08. Sums of squares and the
// digits beyond: least squares in double precision.
struct Model {
  double sum_of_squares;
  double K;
  double AIC, AICc, weight, BIC;
};

const std::vector<Model> kCement = {{57.9044832, 4, 27.41999, 32.41999, 0.56571, 29.67979},
                                    {47.9727294, 5, 26.97388, 35.54531, 0.11856, 29.79863},
                                    {48.1106141, 5, 27.01120, 35.58262, 0.11637, 29.83594},
                                    {74.7621122, 4, 30.74170, 35.74170, 0.10747, 33.00150},
                                    {50.8361176, 5, 27.72755, 36.29898, 0.08134, 30.55230},
                                    {73.8145507, 5, 32.57588, 41.14731, 0.00720, 35.40063},
                                    {47.8636394, 6, 28.94429, 42.94429, 0.00293, 32.33398},
                                    {175.738005, 4, 41.85258, 46.85258, 0.00042, 44.11238},
                                    {415.442727, 4, 53.03714, 58.03714, 0.00000, 55.29694},
                                    {883.866917, 3, 60.85164, 63.51831, 0.00000, 62.54649},
                                    {906.336344, 3, 61.17799, 63.84466, 0.00000, 62.87284},
                                    {868.880131, 4, 62.62933, 67.62933, 0.00000, 64.88912},
                                    {1265.68675, 3, 65.51947, 68.18614, 0.00000, 67.21432},
                                    {1227.07206, 4, 67.11668, 72.11668, 0.00000, 69.37648},
                                    {1939.40047, 3, 71.06740, 73.73407, 0.00000, 72.76225}};

TEST(Criteria, AgreeWithThePublishedComparisonOfFifteenModels) {
  constexpr double kFiveDecimals = 0.5e-5 * (1 + 1e-6);  // the last may end in exactly 5
  std::vector<double> AICc;
  for (const Model& model : kCement) {
    const double minus_two_ln_L = 13 * std::log(model.sum_of_squares / 13);
    const Criteria by = criteria(minus_two_ln_L, 13, static_cast<std::size_t>(model.K) - 1, 1);
    EXPECT_EQ(by.K, model.K);
    EXPECT_NEAR(by.AIC, model.AIC, kFiveDecimals);
    EXPECT_NEAR(by.AICc, model.AICc, kFiveDecimals);
    EXPECT_NEAR(by.BIC, model.BIC, kFiveDecimals);
    AICc.push_back(by.AICc);
  }
  const std::vector<double> weights = akaike_weights(AICc);
  for (std::size_t i = 0; i < kCement.size(); ++i)
    EXPECT_NEAR(weights[i], kCement[i].weight, kFiveDecimals);
}

TEST(Criteria, CorrectForFewDataOnlyWhereAnSdIsFitted) {
  EXPECT_TRUE(std::isnan(criteria(10.0, 13, 3, 0).AICc));
  EXPECT_EQ(criteria(10.0, 13, 3, 0).AIC, 16.0);
  EXPECT_TRUE(std::isnan(criteria(10.0, 5, 3, 1).AICc));  // N = K + 1
}

TEST(AkaikeWeights, LeaveOutWhatIsNoNumber) {
  const std::vector<double> weights = akaike_weights({3.0, kNotComputed, 3.0});
  EXPECT_EQ(weights[0], 0.5);
  EXPECT_TRUE(std::isnan(weights[1]));
  EXPECT_EQ(weights[2], 0.5);
  EXPECT_TRUE(std::isnan(akaike_weights({kNotComputed})[0]));
}

estimation::Problem three_readings() {
  estimation::Problem problem;
  problem.experiments.resize(1);
  problem.experiments[0].series.resize(1);
  problem.experiments[0].series[0].data.resize(3);
  return problem;
}

Standardized residuals(double sd) {
  Standardized all;
  all.r = Eigen::Vector3d(1, -1, 2);
  all.sd = Eigen::Vector3d::Constant(sd);
  all.V = 6.0;
  return all;
}

constexpr double kRounding = 1e-13;

TEST(Likelihood, IsVWhereTheSdIsKnown) {
  estimation::Problem problem = three_readings();
  for (estimation::Datum& datum : problem.experiments[0].series[0].data) datum.sd = 0.1;
  EXPECT_EQ(minus_two_ln_likelihood(problem, residuals(0.1)), 6.0);
}

TEST(Likelihood, CountsTheSdThatDependsOnTheModel) {
  estimation::Problem problem = three_readings();
  problem.experiments[0].series[0].noise.relative = 0.1;
  EXPECT_NEAR(minus_two_ln_likelihood(problem, residuals(0.1)), 6.0 + 6.0 * std::log(0.1),
              kRounding);
}

TEST(Likelihood, OfAFittedSdIsThatOfItsSumOfSquares) {
  estimation::Problem problem = three_readings();
  problem.noise_groups = {"glow"};
  problem.experiments[0].series[0].noise.sd_unknown = true;
  Standardized all = residuals(0.5);
  all.r *= std::sqrt(0.5);  // so that the squares of the group add up to its count
  all.V = 3.0;
  all.noise = {{"glow", 3, 0.75, 0.5}};
  EXPECT_NEAR(minus_two_ln_likelihood(problem, all), 3.0 * std::log(0.75 / 3.0), kRounding);
}

}  // namespace
}  // namespace gainsay::stats
