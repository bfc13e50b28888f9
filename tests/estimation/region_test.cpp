#include "gainsay/estimation/region.h"

#include <gtest/gtest.h>

#include <cmath>
#include <functional>
#include <limits>
#include <optional>

namespace gainsay::estimation {
namespace {

/// A sum of squares given by residuals and their Jacobian; nothing where `allowed` says so.
class SumOfSquares : public Landscape {
 public:
  using Vector = Eigen::VectorXd;
  std::function<Vector(const Vector&)> residuals;
  std::function<Eigen::MatrixXd(const Vector&)> jacobian;
  std::function<bool(const Vector&)> allowed = [](const Vector&) { return true; };
  std::function<bool(const Vector&)> jacobian_allowed = [](const Vector&) { return true; };
  int values = 0, models = 0, open_for = std::numeric_limits<int>::max();

  std::optional<double> value(const Vector& x, double give_up_above) override {
    ++values;
    if (closed() || !allowed(x)) return std::nullopt;
    const double sum = residuals(x).squaredNorm();
    return sum > give_up_above ? std::nullopt : std::optional(sum);
  }
  std::optional<LocalModel> model(const Vector& x) override {
    ++models;
    if (closed() || !allowed(x) || !jacobian_allowed(x)) return std::nullopt;
    const Vector r = residuals(x);
    const Eigen::MatrixXd J = jacobian(x);
    return LocalModel{r.squaredNorm(), J.transpose() * r, J.transpose() * J};
  }
  bool closed() const override { return values + models > open_for; }
};

/// Rosenbrock (1960): r = (10 (x2 - x1^2), 1 - x1), least at (1, 1).
SumOfSquares rosenbrock() {
  SumOfSquares made;
  made.residuals = [](const Eigen::VectorXd& x) {
    return Eigen::Vector2d(10.0 * (x[1] - x[0] * x[0]), 1.0 - x[0]);
  };
  made.jacobian = [](const Eigen::VectorXd& x) {
    return (Eigen::Matrix2d() << -20.0 * x[0], 10.0, -1.0, 0.0).finished();
  };
  return made;
}

Box wide(int n) {
  return {Eigen::VectorXd::Constant(n, -100.0), Eigen::VectorXd::Constant(n, 100.0)};
}

RegionPlan plan(double enough, int n, int models = 200) {
  return {.enough = enough, .models = models, .unit = Eigen::VectorXd::Ones(n)};
}

const Eigen::VectorXd kCustomaryStart = Eigen::Vector2d(-1.2, 1.0);

TEST(Region, FindsRosenbrocksMinimum) {
  SumOfSquares landscape = rosenbrock();
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-12, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Settled);
  // The sum of squares is zero at the minimum: a gain below 1e-12 leaves (x1 - 1)^2 below it.
  EXPECT_NEAR(end.x[0], 1.0, 1e-6);
  EXPECT_NEAR(end.x[1], 1.0, 2e-6);
  EXPECT_EQ(end.models, landscape.models);
}

TEST(Region, StopsAtTheBoundThatIsInTheWay) {
  // With x1 <= 0.5 the minimum is (0.5, 0.25), where the sum of squares is 0.25: by hand.
  SumOfSquares landscape = rosenbrock();
  Box box = wide(2);
  box.high[0] = 0.5;
  const RegionEnd end = descend_in_region(landscape, box, kCustomaryStart, plan(1e-12, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Settled);
  EXPECT_EQ(end.x[0], 0.5);  // on it exactly
  EXPECT_NEAR(end.x[1], 0.25, 1e-6);
  EXPECT_NEAR(end.here->value, 0.25, 1e-12);
}

TEST(Region, NeverAsksOutsideTheBox) {
  SumOfSquares landscape = rosenbrock();
  const Box box{Eigen::Vector2d(-1.3, -0.5), Eigen::Vector2d(0.7, 1.1)};
  landscape.allowed = [&](const Eigen::VectorXd& x) {
    EXPECT_TRUE((x.array() >= box.low.array()).all() && (x.array() <= box.high.array()).all());
    return true;
  };
  const RegionEnd end = descend_in_region(landscape, box, kCustomaryStart, plan(1e-12, 2));
  EXPECT_EQ(end.x[0], 0.7);
}

TEST(Region, StepsAwayFromWhereNothingCanBeEvaluated) {
  // A barrier right behind the minimum: full steps from afar land beyond it.
  SumOfSquares landscape = rosenbrock();
  landscape.allowed = [](const Eigen::VectorXd& x) { return x[0] < 1.05 && x[1] > -0.2; };
  const RegionEnd end =
      descend_in_region(landscape, wide(2), Eigen::Vector2d(-3.0, 9.0), plan(1e-12, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Settled);
  EXPECT_NEAR(end.x[0], 1.0, 1e-6);
}

TEST(Region, GoesBackWhereTheJacobianOfAnAcceptedPointFails) {
  SumOfSquares landscape = rosenbrock();
  landscape.jacobian_allowed = [](const Eigen::VectorXd& x) { return x[0] < 0.9; };
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-9, 2));
  EXPECT_LT(end.x[0], 0.9);
  ASSERT_TRUE(end.here.has_value());
  EXPECT_EQ(end.here->value, landscape.residuals(end.x).squaredNorm());
}

TEST(Region, SaysWhenItsStartIsBad) {
  SumOfSquares landscape = rosenbrock();
  landscape.allowed = [](const Eigen::VectorXd&) { return false; };
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-9, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::BadStart);
  EXPECT_FALSE(end.here.has_value());
  EXPECT_EQ(end.x, kCustomaryStart);
}

TEST(Region, EndsWhenTheLandscapeIsClosed) {
  SumOfSquares landscape = rosenbrock();
  landscape.open_for = 5;
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-12, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Closed);
  EXPECT_TRUE(end.here.has_value());
}

TEST(Region, UsesNoMoreModelsThanPlanned) {
  SumOfSquares landscape = rosenbrock();
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-12, 2, 4));
  EXPECT_EQ(end.why, RegionEnd::Why::NoModelsLeft);
  EXPECT_EQ(landscape.models, 4);
}

TEST(Region, IsStuckAfterManyRejectionsOnly) {
  // The Jacobian points uphill: every promise is broken.
  SumOfSquares landscape = rosenbrock();
  const auto right = landscape.jacobian;
  landscape.jacobian = [=](const Eigen::VectorXd& x) { return Eigen::MatrixXd(-right(x)); };
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(1e-300, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Stuck);
  EXPECT_EQ(end.x, kCustomaryStart);
  EXPECT_EQ(landscape.models + landscape.values, 1 + 26);
}

TEST(Region, SettlesAtOnceWhereNothingMatters) {
  SumOfSquares landscape;
  landscape.residuals = [](const Eigen::VectorXd&) { return Eigen::VectorXd::Ones(3); };
  landscape.jacobian = [](const Eigen::VectorXd&) { return Eigen::MatrixXd::Zero(3, 2); };
  const RegionEnd end = descend_in_region(landscape, wide(2), kCustomaryStart, plan(0.01, 2));
  EXPECT_EQ(end.why, RegionEnd::Why::Settled);
  EXPECT_EQ(end.x, kCustomaryStart);
}

TEST(Region, TakesStepsInTheUnitsOfTheCoordinates) {
  // Far from the minimum at (50, 50) the first step is as long as the region allows: half a unit.
  SumOfSquares landscape;
  landscape.residuals = [](const Eigen::VectorXd& x) { return Eigen::VectorXd(x.array() - 50.0); };
  landscape.jacobian = [](const Eigen::VectorXd&) { return Eigen::MatrixXd::Identity(2, 2); };
  RegionPlan with_units = plan(0.01, 2, 2);
  with_units.unit = Eigen::Vector2d(1.0, 0.1);
  const RegionEnd end = descend_in_region(landscape, wide(2), Eigen::Vector2d::Zero(), with_units);
  EXPECT_EQ(end.x[0], 0.5);
  EXPECT_EQ(end.x[1], 0.05);
}

}  // namespace
}  // namespace gainsay::estimation
