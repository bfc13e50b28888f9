#include "gainsay/stats/free_columns.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

#include <limits>

namespace gainsay::stats {
namespace {

// A handful of additions of numbers near 1.
constexpr double kRounding = 1e-14;

TEST(FreeColumns, LeaveOutWhatIsOnABound) {
  Eigen::MatrixXd J(4, 3);
  J << 1, 0, 1, 0, 1, 1, 0, 0, 1, 0, 0, 1;
  const FreeColumns free = free_columns(J, {false, true, false});
  EXPECT_EQ(free.unknowns, (std::vector<std::size_t>{0, 2}));
  EXPECT_EQ(free.rank, 2U);
  EXPECT_EQ(free.Q.cols(), 2);
}

TEST(FreeColumns, AreProjectedOnByQ) {
  Eigen::MatrixXd J(5, 2);
  J << 1, 2, -1, 0.5, 3, 1, 0, -2, 1, 1;
  const FreeColumns free = free_columns(J, {false, false});
  EXPECT_LT((free.Q * free.Q.transpose() * J - J).cwiseAbs().maxCoeff(), kRounding);
  EXPECT_LT((free.Q.transpose() * free.Q - Eigen::Matrix2d::Identity()).cwiseAbs().maxCoeff(),
            kRounding);
}

TEST(FreeColumns, CountNoDirectionBelowTheCut) {
  Eigen::MatrixXd J = Eigen::MatrixXd::Zero(4, 3);
  J.diagonal() << 1.0, 1.1 * kRankTolerance, 0.9 * kRankTolerance;
  EXPECT_EQ(free_columns(J, {false, false, false}).rank, 2U);
}

TEST(FreeColumns, NameTheDirectionThatTheDataLeaveFree) {
  Eigen::MatrixXd J(3, 2);
  J << 1, 1, 2, 2, -1, -1;  // the sum alone matters
  const FreeColumns free = free_columns(J, {false, false});
  EXPECT_EQ(free.rank, 1U);
  EXPECT_NEAR(free.W(0, 1) + free.W(1, 1), 0.0, kRounding);
}

TEST(FreeColumns, MayBeMoreThanTheDataOrNone) {
  const FreeColumns wide = free_columns(Eigen::MatrixXd::Ones(2, 3), {false, false, false});
  EXPECT_EQ(wide.rank, 1U);
  EXPECT_EQ(wide.W.cols(), 3);
  const FreeColumns none = free_columns(Eigen::MatrixXd::Ones(2, 1), {true});
  EXPECT_EQ(none.rank, 0U);
  EXPECT_EQ(none.Q.rows(), 2);
  EXPECT_EQ(free_columns(Eigen::MatrixXd::Zero(3, 1), {false}).rank, 0U);
}

TEST(FreeColumns, WantAFiniteJ) {
  Eigen::MatrixXd J = Eigen::MatrixXd::Ones(2, 1);
  J(1, 0) = std::numeric_limits<double>::quiet_NaN();
  EXPECT_THROW(free_columns(J, {false}), core::BrokenPromise);
  EXPECT_THROW(free_columns(Eigen::MatrixXd::Ones(2, 1), {}), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
