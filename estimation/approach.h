#pragma once

#include "gainsay/estimation/objective.h"
#include "gainsay/estimation/region.h"

#include <Eigen/Core>

#include <optional>

namespace gainsay::estimation {

/// The box of a problem in search coordinates.
Box box_of(const Problem& problem);

/// The size of a step in each coordinate that the region counts as 1: 1 in logarithms, a tenth of
/// the range where linear.
Eigen::VectorXd units_of(const Problem& problem);

enum class Stages {
  All,      ///< data up to a third and two thirds of the time, tempered and pulled; then all
  LastOnly  ///< all data with their true sd and nothing else, for starts that are near already
};

/// The first part of a descent: gets into the basin. Methods (19). Nothing where the start cannot
/// be evaluated.
std::optional<Eigen::VectorXd> approach(Allowance& allowance, const Eigen::VectorXd& start,
                                        Stages stages);

}  // namespace gainsay::estimation
