#include "gainsay/stats/departure.h"

#include "gainsay/stats/tails.h"

#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::stats {
namespace {

// The tail rises by less than 0.1 a unit of L here, and the root is found to half of the digits of
// a double at least.
constexpr double kRoot = 1e-7;

TEST(LeastNoncentrality, IsCaughtNineTimesInTen) {
  for (const double freedom : {1.0, 5.0, 40.0, 300.0}) {
    const double limit = chi_square_quantile(0.04, freedom);
    const double L = least_noncentrality(limit, freedom);
    EXPECT_NEAR(noncentral_chi_square_upper_tail(limit, freedom, L), 0.9, kRoot) << freedom;
  }
}

TEST(LeastNoncentrality, AgreesWithTheNormalLawOnOneDegree) {
  // P(|z + sqrt(L)| > 1.959964) = 0.9; the other side adds less than 1e-5: L = (1.959964 +
  // 1.281552)^2, quantiles of the normal law from printed tables, six decimals.
  constexpr double kOtherSide = 1e-3;
  const double two_quantiles = 1.959964 + 1.281552;
  EXPECT_NEAR(least_noncentrality(chi_square_quantile(0.05, 1), 1), two_quantiles * two_quantiles,
              kOtherSide);
}

// Haynam, Govindarajulu & Leone (1970), tables of the noncentral chi-square (from memory): at level
// 0.05 and power 0.9, two degrees need L = 12.65, ten need 20.53.
TEST(LeastNoncentrality, AgreesWithPrintedTables) {
  constexpr double kTwoDecimals = 0.5e-2;
  EXPECT_NEAR(least_noncentrality(chi_square_quantile(0.05, 2), 2), 12.65, kTwoDecimals);
  EXPECT_NEAR(least_noncentrality(chi_square_quantile(0.05, 10), 10), 20.53, kTwoDecimals);
}

TEST(LeastNoncentrality, IsNothingWhereChanceAlonePassesThatOften) {
  EXPECT_EQ(least_noncentrality(chi_square_quantile(0.95, 4), 4), 0.0);
}

TEST(Departure, IsSpreadOverAllData) {
  const double limit = chi_square_quantile(0.05, 8);
  EXPECT_DOUBLE_EQ(departure_in_sds(limit, 8, 10), std::sqrt(least_noncentrality(limit, 8) / 10));
}

}  // namespace
}  // namespace gainsay::stats
