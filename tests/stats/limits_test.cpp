#include "gainsay/stats/limits.h"

#include "gainsay/core/require.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

constexpr double kPrinted = 0.5e-3;  // quantiles of the table are printed to three decimals

// Quantiles: NIST/SEMATECH e-Handbook, section 1.3.6.7.4 (from memory).
TEST(FullLimit, HasOneDegreeForEachDatum) {
  const Limit limit = full_limit(20.0, 10, 0.05);
  EXPECT_EQ(limit.freedom, 10.0);
  EXPECT_NEAR(limit.value, 18.307, kPrinted);
  EXPECT_TRUE(limit.passed());
  EXPECT_LT(limit.p_value, 0.05);
}

TEST(ReducedLimit, SpendsADegreeOnEachFreeUnknown) {
  const Limit limit = reduced_limit(15.0, 10, 2, 0.05);
  EXPECT_EQ(limit.freedom, 8.0);
  EXPECT_NEAR(limit.value, 15.507, kPrinted);
  EXPECT_FALSE(limit.passed());
  EXPECT_GT(limit.p_value, 0.05);
}

TEST(ReducedLimit, IsNotOfferedWithoutFreedom) {
  const Limit limit = reduced_limit(3.0, 4, 4, 0.05);
  EXPECT_FALSE(limit.offered());
  EXPECT_FALSE(limit.passed());
  EXPECT_EQ(limit.not_offered, "no more data than free unknowns");
}

// Bevington & Robinson, Data Reduction and Error Analysis, table 8.1 (from memory): 59 counts of
// decaying silver; one isotope leaves V = 235.0917 on 56 degrees, two leave 66.0785 on 54.
TEST(ReducedLimit, RejectsOneSilverIsotopeAndNotTwo) {
  EXPECT_TRUE(reduced_limit(235.0917, 59, 3, 0.04).passed());
  EXPECT_FALSE(reduced_limit(66.0785, 59, 5, 0.04).passed());
}

TEST(WhichDecides, TakesTheReducedLimitWhereDataAreMany) {
  EXPECT_EQ(which_decides({}, 12, 4), WhichLimit::Reduced);
  EXPECT_EQ(which_decides({}, 11, 2), WhichLimit::Full);
  EXPECT_EQ(which_decides({}, 14, 5), WhichLimit::Full);
  EXPECT_EQ(which_decides({}, 15, 5), WhichLimit::Reduced);
}

TEST(WhichDecides, LeavesItToTheStudy) {
  EXPECT_EQ(which_decides(WhichLimit::Full, 100, 1), WhichLimit::Full);
  EXPECT_EQ(which_decides(WhichLimit::Reduced, 6, 4), WhichLimit::Reduced);
}

TEST(Limits, WantDataAndALevelBetweenZeroAndOne) {
  EXPECT_THROW(full_limit(1.0, 5, 0.0), core::BrokenPromise);
  EXPECT_THROW(reduced_limit(1.0, 5, 1, 1.0), core::BrokenPromise);
  EXPECT_THROW(full_limit(1.0, 0, 0.05), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::stats
