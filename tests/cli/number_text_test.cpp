#include "gainsay/cli/number_text.h"

#include <gtest/gtest.h>

#include <limits>

namespace gainsay::cli {
namespace {

constexpr double kNaN = std::numeric_limits<double>::quiet_NaN();

TEST(NumberText, KeepsSignificantDigits) {
  EXPECT_EQ(significant(41.337, 4), "41.34");
  EXPECT_EQ(significant(0.08, 4), "0.08000");
  EXPECT_EQ(significant(1234.5, 2), "1234");
  EXPECT_EQ(significant(-0.5, 2), "\u22120.50");
  EXPECT_EQ(significant(0.0, 3), "0");
}

TEST(NumberText, WritesPowersOfTenWhereZerosWouldHaveToBeCounted) {
  EXPECT_EQ(significant(1.3e-7, 2), "1.3\u202f·\u202f10⁻⁷");
  EXPECT_EQ(significant(1e-4, 2), "10⁻⁴");
  EXPECT_EQ(significant(2.5e6, 2), "2.5\u202f·\u202f10⁶");
  EXPECT_EQ(significant(999999.9, 2), "10⁶");
}

TEST(NumberText, ShowsADashForWhatWasNotComputed) {
  EXPECT_EQ(significant(kNaN, 3), "–");
  EXPECT_EQ(fixed(kNaN, 3), "–");
  EXPECT_EQ(p_text(kNaN), "–");
  EXPECT_EQ(significant(-std::numeric_limits<double>::infinity(), 3), "\u2212∞");
}

TEST(NumberText, LabelsHaveNoZerosAtTheEnd) {
  EXPECT_EQ(short_number(0.05, 3), "0.05");
  EXPECT_EQ(short_number(2.0, 2), "2");
  EXPECT_EQ(short_number(100.0, 2), "100");
  EXPECT_EQ(short_number(2.5e-5, 3), "2.5\u202f·\u202f10⁻⁵");
}

TEST(NumberText, HasNoNegativeZero) { EXPECT_EQ(fixed(-0.001, 1), "0.0"); }

TEST(NumberText, PValuesNeverReadAsZero) {
  EXPECT_EQ(p_text(0.19), "0.19");
  EXPECT_EQ(p_text(3.7e-27), "3.7\u202f·\u202f10⁻²⁷");
  EXPECT_EQ(p_text(0.0), "below 10⁻³⁰⁰");
}

TEST(NumberText, RaisesPowersInsideWords) {
  EXPECT_EQ(with_raised_powers("(P = 2.7e-12) of 3e+05"),
            "(P = 2.7\u202f·\u202f10⁻¹²) of 3\u202f·\u202f10⁵");
  EXPECT_EQ(with_raised_powers("4exp of k2e-1x, e-3"), "4exp of k2e-1x, e-3");
}

TEST(NumberText, PercentagesHaveADecimalWhereTheyAreSmall) {
  EXPECT_EQ(percent_text(0.114), "11\u202f%");
  EXPECT_EQ(percent_text(0.034), "3.4\u202f%");
  EXPECT_EQ(percent_text(0.05), "5\u202f%");
}

TEST(NumberText, CountsInWordsUpToTwelve) {
  EXPECT_EQ(counted(1, "mechanism", "mechanisms"), "one mechanism");
  EXPECT_EQ(counted(12, "mechanism", "mechanisms"), "twelve mechanisms");
  EXPECT_EQ(counted(13, "mechanism", "mechanisms"), "13 mechanisms");
  EXPECT_EQ(capitalized("two runs"), "Two runs");
}

TEST(NumberText, CoordinatesAreShort) {
  EXPECT_EQ(coordinate(12.0), "12");
  EXPECT_EQ(coordinate(0.126), "0.13");
  EXPECT_EQ(coordinate(-0.001), "0");
  EXPECT_EQ(share_text(0.25), "25%");
}

}  // namespace
}  // namespace gainsay::cli
