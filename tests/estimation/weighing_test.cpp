#include "gainsay/estimation/weighing.h"

#include <boost/math/distributions/normal.hpp>
#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::estimation {
namespace {

const Scatter kKnown{.constant = 0.04};
const Scatter kCombined{.constant = 0.04, .relative_squared = 0.01};
const Scatter kProportional{.relative_squared = 0.01, .floor = 1e-8};

TEST(Weigh, KnownSdGivesTheSquareOfTheResidual) {
  for (const Aim aim : {Aim::Likelihood, Aim::Misfit}) {
    const Weighed weighed = weigh(kKnown, 3.5, 3.0, aim);
    EXPECT_DOUBLE_EQ(weighed.sd, 0.2);
    EXPECT_DOUBLE_EQ(weighed.r, 2.5);
    EXPECT_DOUBLE_EQ(weighed.objective, 6.25);
    EXPECT_DOUBLE_EQ(weighed.slope, 2.5);
    EXPECT_DOUBLE_EQ(weighed.curvature, 1.0);
  }
}

// Differences of the objective must be those of -2 ln of the normal density of Boost.Math.
TEST(Weigh, ModelDependentSdGivesTheLikelihoodUpToAConstant) {
  const auto minus_two_ln_density = [](double shown, double observed, double sd) {
    return -2.0 * std::log(boost::math::pdf(boost::math::normal(shown, sd), observed));
  };
  const double observed = 2.0;
  const Weighed a = weigh(kCombined, 1.5, observed, Aim::Likelihood);
  const Weighed b = weigh(kCombined, 2.7, observed, Aim::Likelihood);
  EXPECT_DOUBLE_EQ(a.sd, std::sqrt(0.04 + 0.01 * 1.5 * 1.5));
  constexpr double kRounding = 1e-13;  // a few epsilon times values up to 10
  EXPECT_NEAR(a.objective - b.objective,
              minus_two_ln_density(1.5, observed, a.sd) - minus_two_ln_density(2.7, observed, b.sd),
              kRounding);
}

// The row of J is 1 / sd for df/dx = 1, so half the derivative of the objective is slope / sd. A
// central difference errs by h^2 / 6 of the third derivative and epsilon / h: below 1e-8 at 1e-5.
TEST(Weigh, SlopeIsHalfTheDerivativeOfTheObjective) {
  constexpr double kStep = 1e-5, kError = 1e-7;
  for (const Scatter& scatter : {kKnown, kCombined, kProportional}) {
    for (const Aim aim : {Aim::Likelihood, Aim::Misfit}) {
      for (const double shown : {-1.3, 0.4, 1.9, 6.0}) {
        const Weighed weighed = weigh(scatter, shown, 2.0, aim);
        const double difference = (weigh(scatter, shown + kStep, 2.0, aim).objective -
                                   weigh(scatter, shown - kStep, 2.0, aim).objective) /
                                  (2.0 * kStep);
        EXPECT_NEAR(2.0 * weighed.slope / weighed.sd, difference,
                    kError * (1.0 + std::abs(difference)));
      }
    }
  }
}

// Fisher's information of a normal law whose mean is f and whose sd is s(f): the expectation of
// the squared score, here summed over a fine grid of observations instead of being looked up.
TEST(Weigh, CurvatureIsFishersInformation) {
  const double shown = 1.7;
  const double sd = weigh(kCombined, shown, shown, Aim::Likelihood).sd;
  const boost::math::normal law(shown, sd);
  double information = 0.0;
  const double step = 0.01 * sd;
  for (double observed = shown - 9.0 * sd; observed < shown + 9.0 * sd; observed += step) {
    const double score = weigh(kCombined, shown, observed, Aim::Likelihood).slope / sd;
    information += score * score * boost::math::pdf(law, observed) * step;
  }
  const double curvature = weigh(kCombined, shown, shown, Aim::Likelihood).curvature / (sd * sd);
  // The sum over a smooth integrand that dies at both ends converges faster than any power of the
  // step; what is cut off beyond 9 sd is below 1e-15.
  EXPECT_NEAR(information, curvature, 1e-10 * curvature);
}

TEST(Weigh, AProportionalSdHasAFloor) {
  const Weighed weighed = weigh(kProportional, 0.0, 0.5, Aim::Likelihood);
  EXPECT_DOUBLE_EQ(weighed.sd, 1e-4);
  EXPECT_GE(weighed.objective, 0.0);
}

TEST(Weigh, EveryShareIsAtLeastZero) {
  for (const Scatter& scatter : {kKnown, kCombined, kProportional}) {
    for (double shown = -2.0; shown <= 2.0; shown += 0.125) {
      EXPECT_GE(weigh(scatter, shown, 0.5, Aim::Likelihood).objective, 0.0);
      EXPECT_GE(weigh(scatter, shown, shown, Aim::Likelihood).objective, 0.0);
    }
  }
}

// The profile likelihood over the variance, found by trying variances above the floor.
TEST(NoiseGroup, IsTheLikelihoodAtTheLikeliestSd) {
  const NoiseGroup group{.count = 12, .floor = 1e-3, .sum_squares = 0.75};
  const auto minus_two_ln_L = [&](double variance) {
    // s + N f^2: the floor acts like one more reading's worth of scatter in each datum.
    return (group.sum_squares + 12.0 * 1e-6) / variance + 12.0 * std::log(variance);
  };
  double least = minus_two_ln_L(1e-6), at = 1e-6;
  for (double variance = 1e-6; variance < 1.0; variance *= 1.0001) {
    if (minus_two_ln_L(variance) < least) {
      least = minus_two_ln_L(variance);
      at = variance;
    }
  }
  EXPECT_NEAR(group.variance(), at, 1e-4 * at);  // the step of the trial
  // The objective counts from a group that fits exactly, at its floor. Near its minimum the trial
  // errs by N (relative step)^2.
  EXPECT_NEAR(group.objective(), least - (12.0 + 12.0 * std::log(1e-6)), 12.0 * 1e-8);
}

}  // namespace
}  // namespace gainsay::estimation
