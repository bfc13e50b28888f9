#include "gainsay/estimation/box_step.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/starts.h"

#include <Eigen/Cholesky>
#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <vector>

namespace gainsay::estimation {
namespace {

struct Case {
  Eigen::MatrixXd A;
  Eigen::VectorXd g, low, high;

  double quadratic(const Eigen::VectorXd& p) const { return g.dot(p) + 0.5 * p.dot(A * p); }
};

/// A random positive definite quadratic whose condition number is at most about 1e6, and a box
/// around the origin, some of whose sides pass through it.
Case random_case(int n, std::uint64_t number) {
  Draws draws(3, 0, number);
  const auto normal = [&] { return draws.normal(); };
  const Eigen::MatrixXd root = Eigen::MatrixXd::NullaryExpr(n, n, normal);
  Case made;
  made.A = root.transpose() * root + 1e-5 * Eigen::MatrixXd::Identity(n, n);
  made.g = 2.0 * Eigen::VectorXd::NullaryExpr(n, normal);
  const auto side = [&] { return draws.uniform() < 0.2 ? 0.0 : draws.uniform(); };
  made.low = -Eigen::VectorXd::NullaryExpr(n, side);
  made.high = Eigen::VectorXd::NullaryExpr(n, side);
  return made;
}

/// The least value over all 3^n faces of the box, each minimised by itself: slow and certain.
double least_over_faces(const Case& problem) {
  const int n = static_cast<int>(problem.g.size());
  double least = std::numeric_limits<double>::infinity();
  const int faces = static_cast<int>(std::lround(std::pow(3.0, n)));
  for (int face = 0; face < faces; ++face) {
    Eigen::VectorXd p = Eigen::VectorXd::Zero(n);
    std::vector<int> free;
    for (int i = 0, code = face; i < n; ++i, code /= 3) {
      if (code % 3 == 0) free.push_back(i);
      if (code % 3 == 1) p[i] = problem.low[i];
      if (code % 3 == 2) p[i] = problem.high[i];
    }
    if (!free.empty()) {
      const Eigen::MatrixXd block = problem.A(free, free);
      const Eigen::VectorXd right = -(problem.g + problem.A * p)(free);
      const Eigen::VectorXd inner = block.llt().solve(right);
      for (std::size_t k = 0; k < free.size(); ++k) p[free[k]] = inner[static_cast<int>(k)];
    }
    const bool inside =
        (p.array() >= problem.low.array()).all() && (p.array() <= problem.high.array()).all();
    if (inside) least = std::min(least, problem.quadratic(p));
  }
  return least;
}

// Value at the minimiser: rounding times the condition number (1e6) times its size.
constexpr double kRounding = 1e-9;

TEST(BoxStep, IsTheMinimiserFoundByTryingEveryFace) {
  for (int n = 1; n <= 6; ++n) {
    for (std::uint64_t number = 0; number < 40; ++number) {
      const Case problem = random_case(n, 100 * static_cast<std::uint64_t>(n) + number);
      const Eigen::VectorXd p = box_step(problem.A, problem.g, problem.low, problem.high);
      EXPECT_TRUE((p.array() >= problem.low.array()).all());
      EXPECT_TRUE((p.array() <= problem.high.array()).all());
      const double least = least_over_faces(problem);
      EXPECT_NEAR(problem.quadratic(p), least, kRounding * (1.0 + std::abs(least)))
          << "n = " << n << ", case " << number;
    }
  }
}

TEST(BoxStep, IsNewtonsWhereTheBoxIsWide) {
  Case problem = random_case(8, 1);
  problem.low.setConstant(-1e9);
  problem.high.setConstant(1e9);
  const Eigen::VectorXd newton = problem.A.llt().solve(-problem.g);
  const Eigen::VectorXd p = box_step(problem.A, problem.g, problem.low, problem.high);
  EXPECT_NEAR(problem.quadratic(p), problem.quadratic(newton),
              kRounding * std::abs(problem.quadratic(newton)));
}

TEST(BoxStep, PutsHeldCoordinatesOnTheirBoundExactly) {
  const Eigen::MatrixXd A = Eigen::Vector2d(2.0, 2.0).asDiagonal();
  const Eigen::VectorXd g = Eigen::Vector2d(-10.0, 1.0);
  const Eigen::VectorXd p = box_step(A, g, Eigen::Vector2d(-0.3, -0.1), Eigen::Vector2d(0.3, 0.7));
  EXPECT_EQ(p[0], 0.3);
  EXPECT_EQ(p[1], -0.1);
}

TEST(BoxStep, IsNotTheNewtonStepClampedToTheBox) {
  // Strongly coupled: the Newton step is (1, 1), clamped to p1 <= 0.5 it is (0.5, 1). By hand, on
  // the side p1 = 0.5: p2 + 0.9 p1 - 1.9 = 0.
  const Eigen::MatrixXd A = (Eigen::Matrix2d() << 1.0, 0.9, 0.9, 1.0).finished();
  const Eigen::VectorXd g = Eigen::Vector2d(-1.9, -1.9);
  const Eigen::VectorXd p = box_step(A, g, Eigen::Vector2d(-9, -9), Eigen::Vector2d(0.5, 9));
  EXPECT_EQ(p[0], 0.5);
  EXPECT_NEAR(p[1], 1.9 - 0.9 * 0.5, 1e-14);  // a few roundings of numbers near 1
}

TEST(BoxStep, OfNoCoordinatesIsEmpty) {
  EXPECT_EQ(
      box_step(Eigen::MatrixXd(0, 0), Eigen::VectorXd(0), Eigen::VectorXd(0), Eigen::VectorXd(0))
          .size(),
      0);
}

TEST(BoxStep, WantsTheOriginInside) {
  const Eigen::MatrixXd A = Eigen::MatrixXd::Identity(1, 1);
  const Eigen::VectorXd one = Eigen::VectorXd::Ones(1);
  EXPECT_THROW(box_step(A, one, one, 2.0 * one), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::estimation
