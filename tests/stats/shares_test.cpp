#include "gainsay/stats/shares.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

estimation::Problem two_experiments() {
  estimation::Problem problem;
  problem.experiments.resize(2);
  problem.experiments[0].name = "run-01";
  problem.experiments[1].name = "run-02";
  problem.experiments[0].series.resize(2);
  problem.experiments[1].series.resize(1);
  problem.experiments[0].series[0].readout = "acid";
  problem.experiments[0].series[0].data.resize(2);
  problem.experiments[0].series[1].readout = "glow";
  problem.experiments[0].series[1].data.resize(1);
  problem.experiments[1].series[0].readout = "acid";
  problem.experiments[1].series[0].data.resize(1);
  problem.unknowns.resize(1);
  problem.unknowns[0].prior = estimation::Prior{1.0, 0.1, {}};
  return problem;
}

Standardized residuals() {
  Standardized all;
  all.r.resize(5);
  all.r << 1, -2, 3, 4, 0.5;
  all.sd.resize(4);
  all.sd << 0.1, 0.2, 0.3, 0.4;
  all.V = all.r.squaredNorm();
  return all;
}

TEST(SharesOfV, GoByExperimentAndReadoutAndAddUp) {
  const std::vector<Share> shares = shares_of_V(two_experiments(), residuals());
  ASSERT_EQ(shares.size(), 4U);
  EXPECT_EQ(shares[0].experiment, "run-01");
  EXPECT_EQ(shares[0].readout, "acid");
  EXPECT_EQ(shares[0].points, 2U);
  EXPECT_EQ(shares[0].V, 5.0);
  EXPECT_EQ(shares[1].V, 9.0);
  EXPECT_EQ(shares[2].experiment, "run-02");
  EXPECT_EQ(shares[2].V, 16.0);
  EXPECT_EQ(shares[0].V + shares[1].V + shares[2].V + shares[3].V, residuals().V);
}

TEST(SharesOfV, CallPriorsEarlierWork) {
  const std::vector<Share> shares = shares_of_V(two_experiments(), residuals());
  EXPECT_EQ(shares[3].readout, "earlier work");
  EXPECT_EQ(shares[3].experiment, "");
  EXPECT_EQ(shares[3].points, 1U);
  EXPECT_EQ(shares[3].V, 0.25);
}

TEST(StandardResiduals, AreObservedMinusShown) {
  const Eigen::VectorXd shown = Eigen::Vector4d(10, 20, 30, 40);
  const std::vector<StandardResidual> table =
      standard_residuals(two_experiments(), residuals(), shown);
  ASSERT_EQ(table.size(), 4U);
  EXPECT_EQ(table[1].experiment, 0U);
  EXPECT_EQ(table[1].series, 0U);
  EXPECT_EQ(table[1].datum, 1U);
  EXPECT_EQ(table[1].r, 2.0);
  EXPECT_EQ(table[3].experiment, 1U);
  EXPECT_EQ(table[3].shown, 40.0);
  EXPECT_EQ(table[3].sd, 0.4);
  EXPECT_EQ(table[3].r, -4.0);
  EXPECT_THROW(standard_residuals(two_experiments(), residuals(), Eigen::Vector3d::Zero()),
               core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
