#pragma once

#include "gainsay/estimation/unknown.h"

#include <Eigen/Core>

#include <span>
#include <vector>

namespace gainsay::estimation {

/// Search coordinates: x = ln p where the unknown is searched in its logarithm, x = p / (high -
/// low) where linear.
Eigen::VectorXd to_coordinates(std::span<const Unknown> unknowns, std::span<const double> values);
std::vector<double> from_coordinates(std::span<const Unknown> unknowns, const Eigen::VectorXd& x);
/// dp/dx: p where logarithmic, the width of the range where linear.
Eigen::VectorXd scale_at(std::span<const Unknown> unknowns, std::span<const double> values);
Eigen::VectorXd lower_bounds(std::span<const Unknown> unknowns);
Eigen::VectorXd upper_bounds(std::span<const Unknown> unknowns);

}  // namespace gainsay::estimation
