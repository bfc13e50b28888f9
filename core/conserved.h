#pragma once

#include <Eigen/Core>

#include <vector>

namespace gainsay::core {

/// A basis of the sums that reactions leave unchanged: the vectors w with w' S = 0, for a
/// stoichiometric matrix S (species x reactions), in smallest whole numbers. Methods (4).
///
/// Computed in whole numbers of any length, hence exact: each coefficient is taken for the simplest
/// fraction that is the same double (2/3 typed as 0.6667 is 6667/10000). Sums without negative
/// weights come first where there are such, those of the fewest species among them (the extreme
/// semipositive relations of Schuster & Höfer 1991, by the tableau of Fourier and Motzkin); the
/// rest of the basis, if any, by Gauss' elimination. In order of their first species.
std::vector<std::vector<double>> conserved_weights(const Eigen::MatrixXd& stoichiometry);

}  // namespace gainsay::core
