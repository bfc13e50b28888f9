#include "gainsay/stats/free_columns.h"

#include "gainsay/core/require.h"

#include <Eigen/SVD>

namespace gainsay::stats {
namespace {

std::size_t rank_of(const Eigen::VectorXd& singular_values) {
  if (singular_values.size() == 0 || singular_values[0] == 0.0) return 0;
  return static_cast<std::size_t>(
      (singular_values.array() > kRankTolerance * singular_values[0]).count());
}

}  // namespace

FreeColumns free_columns(const Eigen::MatrixXd& J, const std::vector<bool>& on_bound) {
  GAINSAY_REQUIRE(static_cast<std::size_t>(J.cols()) == on_bound.size(),
                  "each column of J is told whether its unknown is on a bound");
  GAINSAY_REQUIRE(J.allFinite(), "J is finite");
  FreeColumns free;
  for (std::size_t j = 0; j < on_bound.size(); ++j)
    if (!on_bound[j]) free.unknowns.push_back(j);

  Eigen::MatrixXd columns(J.rows(), free.unknowns.size());
  for (std::size_t j = 0; j < free.unknowns.size(); ++j) columns.col(j) = J.col(free.unknowns[j]);
  if (columns.size() == 0) {
    free.Q.resize(J.rows(), 0);
    free.W = Eigen::MatrixXd::Identity(columns.cols(), columns.cols());
    return free;
  }
  const Eigen::JacobiSVD<Eigen::MatrixXd> svd(columns, Eigen::ComputeThinU | Eigen::ComputeFullV);
  free.singular_values = svd.singularValues();
  free.rank = rank_of(free.singular_values);
  free.Q = svd.matrixU().leftCols(static_cast<Eigen::Index>(free.rank));
  free.W = svd.matrixV();
  return free;
}

}  // namespace gainsay::stats
