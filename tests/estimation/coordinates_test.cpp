#include "gainsay/estimation/coordinates.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::estimation {
namespace {

std::vector<Unknown> one_of_each() {
  return {{.name = "k", .low = 0.01, .high = 100.0},
          {.name = "offset", .low = -2.0, .high = 8.0, .linear = true}};
}

TEST(Coordinates, AreLogarithmsOrSharesOfTheWidth) {
  const Eigen::VectorXd x = to_coordinates(one_of_each(), std::vector{3.0, 5.0});
  EXPECT_EQ(x[0], std::log(3.0));
  EXPECT_EQ(x[1], 0.5);
}

TEST(Coordinates, LeadBackToTheValues) {
  const std::vector<double> values = {3.0, 5.0};
  const std::vector<double> back =
      from_coordinates(one_of_each(), to_coordinates(one_of_each(), values));
  EXPECT_DOUBLE_EQ(back[0], values[0]);
  EXPECT_DOUBLE_EQ(back[1], values[1]);
}

TEST(Coordinates, BoundsAreThoseOfTheRange) {
  const Eigen::VectorXd low = lower_bounds(one_of_each());
  const Eigen::VectorXd high = upper_bounds(one_of_each());
  EXPECT_EQ(low[0], std::log(0.01));
  EXPECT_EQ(high[0], std::log(100.0));
  EXPECT_EQ(low[1], -0.2);
  EXPECT_EQ(high[1] - low[1], 1.0);
}

// dp/dx against a central difference: its error is x'''h^2/6 + epsilon/h relative to the value,
// least near h = 1e-5, where both stay below 1e-10.
TEST(Coordinates, ScaleIsTheDerivativeOfTheValue) {
  const std::vector<Unknown> unknowns = one_of_each();
  const std::vector<double> values = {3.0, 5.0};
  const Eigen::VectorXd x = to_coordinates(unknowns, values);
  const Eigen::VectorXd scale = scale_at(unknowns, values);
  constexpr double kStep = 1e-5, kError = 1e-9;
  for (int i = 0; i < 2; ++i) {
    Eigen::VectorXd up = x, down = x;
    up[i] += kStep;
    down[i] -= kStep;
    const double difference =
        (from_coordinates(unknowns, up)[i] - from_coordinates(unknowns, down)[i]) / (2.0 * kStep);
    EXPECT_NEAR(scale[i], difference, kError * std::abs(difference));
  }
}

}  // namespace
}  // namespace gainsay::estimation
