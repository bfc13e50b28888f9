#pragma once

#include "gainsay/estimation/objective.h"

#include <Eigen/Core>

#include <cstddef>
#include <optional>
#include <vector>

namespace gainsay::estimation {

/// Numbers of the unknowns in which everything shown is linear: scales and offsets, ascending.
std::vector<std::size_t> linear_unknowns(const Problem& problem);

/// `x` with the unknowns `which` (of linear_unknowns) where weighted linear regression of the data
/// on the trajectory of x puts them, within their ranges. Methods (23). Sds that depend on the
/// modelled value are taken at the observed one, unknown ones as equal within a readout. Nothing
/// where x cannot be integrated to the end.
std::optional<Eigen::VectorXd> regressed(Allowance& allowance, const Eigen::VectorXd& x,
                                         const std::vector<std::size_t>& which);

}  // namespace gainsay::estimation
