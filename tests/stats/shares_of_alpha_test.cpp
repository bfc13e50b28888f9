#include "gainsay/stats/shares_of_alpha.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

TEST(SharesOfAlpha, AreFixedBeforehand) {
  EXPECT_EQ(shares_of_alpha(true, true).V, 0.8);
  EXPECT_EQ(shares_of_alpha(true, true).order, 0.2);
  EXPECT_EQ(shares_of_alpha(true, false).V, 1.0);
  EXPECT_EQ(shares_of_alpha(true, false).order, 0.0);
  EXPECT_EQ(shares_of_alpha(false, true).V, 0.0);
  EXPECT_EQ(shares_of_alpha(false, true).order, 1.0);
  EXPECT_EQ(shares_of_alpha(false, false).V + shares_of_alpha(false, false).order, 0.0);
}

TEST(JointP, IsAtMostAlphaExactlyWhereOneTestRejects) {
  const SharesOfAlpha both = shares_of_alpha(true, true);
  const double alpha = 0.05;
  for (const double V : {0.001, 0.039, 0.041, 0.9}) {
    for (const double order : {0.0001, 0.0099, 0.0101, 0.5}) {
      const bool one_rejects = V <= both.V * alpha || order <= both.order * alpha;
      EXPECT_EQ(joint_p_value(both, V, order) <= alpha, one_rejects) << V << ", " << order;
    }
  }
}

TEST(JointP, IsNeverAboveOneAndLeavesOutWhatHasNoShare) {
  EXPECT_EQ(joint_p_value(shares_of_alpha(true, true), 0.95, 0.9), 1.0);
  EXPECT_EQ(joint_p_value(shares_of_alpha(true, false), 0.3, 1e-9), 0.3);
  EXPECT_EQ(joint_p_value(shares_of_alpha(false, true), 1e-9, 0.3), 0.3);
  EXPECT_EQ(joint_p_value(shares_of_alpha(false, false), 1e-9, 1e-9), 1.0);
}

}  // namespace
}  // namespace gainsay::stats
