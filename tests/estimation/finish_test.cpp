#include "gainsay/estimation/finish.h"

#include "gainsay/estimation/approach.h"
#include "gainsay/testing/decay_data.h"
#include "gainsay/testing/simplex.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>
#include <limits>

namespace gainsay::estimation {
namespace {

using ::testing::ElementsAre;
using testing::minimised;
using testing::TwoSteps;
constexpr long kNoLimit = std::numeric_limits<long>::max();

const Eigen::VectorXd kNearby = Eigen::Vector3d(-0.4, -1.0, 1.4);

FinishEnd finished(const Problem& problem, const Eigen::VectorXd& from = kNearby) {
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  return finish(allowance, box_of(problem), from);
}

FinishEnd finished_in_region(const Problem& problem, Aim aim) {
  Evaluator evaluator(problem);
  Allowance allowance(evaluator, kNoLimit, {});
  return finish_in_region(allowance, box_of(problem), kNearby, aim);
}

// The objective is flat to second order at its minimum, so two minimisers that agree in it to d
// agree in x to about sqrt(d / curvature). Ceres' descent ends with changes below 1e-12 of V (1e2
// times the accuracy of 1e-10), and curvatures (in logarithms) are at least 1: 1e-5 is enough.
constexpr double kSamePoint = 1e-5;

TEST(Finish, AgreesWithADirectMinimiser) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  const FinishEnd end = finished(problem);
  EXPECT_TRUE(end.converged) << end.why;
  const Eigen::VectorXd expected = minimised(
      [&](const Eigen::VectorXd& x) {
        return TwoSteps::sum(
            problem, x, [](double f, double z, std::size_t) { return std::pow((f - z) / 0.1, 2); });
      },
      kNearby);
  EXPECT_LT((end.x - expected).cwiseAbs().maxCoeff(), kSamePoint);
  EXPECT_THAT(end.on_bound, ElementsAre(false, false, false));
}

TEST(Finish, OfUnknownNoiseAgreesWithADirectMinimiser) {
  // Two groups of ten, whose weights depend on how well each is fitted.
  const Problem problem = TwoSteps::problem({.sd_unknown = true}, 0.1, 0.05);
  const FinishEnd end = finished(problem);
  EXPECT_TRUE(end.converged) << end.why;
  const Eigen::VectorXd expected = minimised(
      [&](const Eigen::VectorXd& x) {
        double sums[2] = {0.0, 0.0};
        TwoSteps::sum(problem, x, [&](double f, double z, std::size_t readout) {
          return sums[readout] += (f - z) * (f - z);
        });
        return 10.0 * std::log(sums[0] / 10.0) + 10.0 * std::log(sums[1] / 10.0);
      },
      kNearby);
  EXPECT_LT((end.x - expected).cwiseAbs().maxCoeff(), kSamePoint);
  ASSERT_EQ(end.evaluation->group_sds.size(), 2u);
}

double minus_two_ln_L(double f, double z) {
  const double variance = 0.01 + 0.04 * f * f;
  return (f - z) * (f - z) / variance + std::log(variance);
}

TEST(Finish, OfModelDependentSdAgreesWithADirectMinimiser) {
  const Problem problem = TwoSteps::problem({.sd = 0.1, .relative = 0.2}, 0.1, 0.2);
  const FinishEnd end = finished_in_region(problem, Aim::Likelihood);
  EXPECT_TRUE(end.converged) << end.why;
  const Eigen::VectorXd expected = minimised(
      [&](const Eigen::VectorXd& x) {
        return TwoSteps::sum(problem, x,
                             [](double f, double z, std::size_t) { return minus_two_ln_L(f, z); });
      },
      kNearby);
  // Our own region ends below gains of 1e-10: sqrt of that, over curvatures of at least 1.
  EXPECT_LT((end.x - expected).cwiseAbs().maxCoeff(), 2 * kSamePoint);
}

TEST(Finish, OfTheMisfitItselfAgreesWithADirectMinimiser) {
  const Problem problem = TwoSteps::problem({.sd = 0.1, .relative = 0.2}, 0.1, 0.2);
  const FinishEnd end = finished_in_region(problem, Aim::Misfit);
  EXPECT_TRUE(end.converged) << end.why;
  const auto V = [&](const Eigen::VectorXd& x) {
    return TwoSteps::sum(problem, x, [](double f, double z, std::size_t) {
      return (f - z) * (f - z) / (0.01 + 0.04 * f * f);
    });
  };
  const Eigen::VectorXd expected = minimised(V, kNearby);
  EXPECT_LT((end.x - expected).cwiseAbs().maxCoeff(), 2 * kSamePoint);
  EXPECT_NEAR(end.evaluation->V, V(expected), 1e-8);
  EXPECT_LT(end.evaluation->V, V(finished_in_region(problem, Aim::Likelihood).x));
}

/// The least of V with some unknowns fixed at given logarithms, by the simplex.
double least_V_with(const Problem& problem, Eigen::Index fixed, double at) {
  const auto V = [&](const Eigen::VectorXd& two) {
    Eigen::VectorXd x(3);
    for (Eigen::Index i = 0, k = 0; i < 3; ++i) x[i] = i == fixed ? at : two[k++];
    return TwoSteps::sum(
        problem, x, [](double f, double z, std::size_t) { return std::pow((f - z) / 0.1, 2); });
  };
  return V(minimised(V, Eigen::Vector2d(-0.5, 1.0)));
}

TEST(Finish, HoldsUnknownsAtTheBoundThatIsInTheWay) {
  Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  problem.unknowns[1].high = 0.25;  // the best is near 0.3
  const FinishEnd end = finished(problem, Eigen::Vector3d(-0.4, -2.0, 1.4));
  EXPECT_TRUE(end.converged) << end.why;
  EXPECT_EQ(end.x[1], std::log(0.25));
  EXPECT_THAT(end.on_bound, ElementsAre(false, true, false));
  EXPECT_NEAR(end.evaluation->V, least_V_with(problem, 1, std::log(0.25)), 1e-7);
}

TEST(Finish, ReleasesUnknownsThatWantBack) {
  const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  Problem narrow = problem;
  narrow.unknowns[1].low = 0.2;
  const FinishEnd free = finished(problem);
  const FinishEnd end = finished(narrow, Eigen::Vector3d(-0.4, std::log(0.2), 1.4));
  EXPECT_TRUE(end.converged) << end.why;
  EXPECT_THAT(end.on_bound, ElementsAre(false, false, false));
  EXPECT_LT((end.x - free.x).cwiseAbs().maxCoeff(), kSamePoint);
}

TEST(Finish, MayEndWithEveryUnknownHeld) {
  Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
  problem.unknowns[0].high = 0.4;  // each range ends well below the truth
  problem.unknowns[1].high = 0.1;
  problem.unknowns[2].high = 2.0;
  const FinishEnd end =
      finished(problem, Eigen::Vector3d(std::log(0.4), std::log(0.1), std::log(2.0)));
  EXPECT_TRUE(end.converged);
  EXPECT_EQ(end.why, "every unknown is held at a bound");
  EXPECT_THAT(end.on_bound, ElementsAre(true, true, true));
}

TEST(Finish, OfAnInterruptedDescentIsNotConverged) {
  for (const bool in_region : {false, true}) {
    const Problem problem = TwoSteps::problem({.sd = 0.1}, 0.1, 0.0);
    Evaluator evaluator(problem);
    Allowance allowance(evaluator, 2, {});
    const Box box = box_of(problem);
    const FinishEnd end = in_region ? finish_in_region(allowance, box, kNearby, Aim::Likelihood)
                                    : finish(allowance, box, kNearby);
    EXPECT_FALSE(end.converged);
    EXPECT_FALSE(end.why.empty());
  }
}

TEST(OnBound, WantsTheGradientToPointOutward) {
  const Box box{Eigen::Vector4d::Zero(), Eigen::Vector4d::Ones()};
  const Eigen::VectorXd x = Eigen::Vector4d(5e-7, 0.0, 1.0, 0.5);
  EXPECT_THAT(on_bound(box, x, Eigen::Vector4d(1, 1, -1, 1)), ElementsAre(true, true, true, false));
  EXPECT_THAT(on_bound(box, x, Eigen::Vector4d(-1, 0, 1, -1)),
              ElementsAre(false, false, false, false));
}

}  // namespace
}  // namespace gainsay::estimation
