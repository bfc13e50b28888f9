#include "gainsay/stats/wording.h"

#include "gainsay/testing/verdicts.h"

#include <gtest/gtest.h>

namespace gainsay::stats {
namespace {

TEST(Readable, HasSoManyDigitsAndAShortExponent) {
  EXPECT_EQ(readable(131.2345, 4), "131.2");
  EXPECT_EQ(readable(2.04e-9, 2), "2e-9");
  EXPECT_EQ(readable(8.34e-24, 2), "8.3e-24");
  EXPECT_EQ(readable(1e20, 3), "1e20");
  EXPECT_EQ(readable(0.0, 3), "0");
  EXPECT_EQ(readable(-1.5e-7, 2), "-1.5e-7");
  EXPECT_EQ(readable(1e-5, 1), "1e-5");
}

TEST(Readable, ShowsVToFourDigitsAndPToTwo) {
  EXPECT_EQ(shown_V(88.29), "88.29");
  EXPECT_EQ(shown_V(1234.6), "1235");
  EXPECT_EQ(shown_V(123456.7), "123457");
  EXPECT_EQ(shown_V(2.34567e8), "2.346e8");
  EXPECT_EQ(shown_P(0.04312), "0.043");
  EXPECT_EQ(percent(0.414), "41 %");
}

TEST(Counted, KnowsOneFromMany) {
  EXPECT_EQ(counted(1, "datum", "data"), "1 datum");
  EXPECT_EQ(counted(72, "datum", "data"), "72 data");
}

TEST(Listed, SetsCommasAndAnAnd) {
  EXPECT_EQ(listed({}), "");
  EXPECT_EQ(listed({"a"}), "a");
  EXPECT_EQ(listed({"a", "b"}), "a and b");
  EXPECT_EQ(listed({"a", "b", "c"}), "a, b and c");
}

TEST(LargestShare, IsTheOneWithMostOfV) {
  const Verdict verdict = gainsay::testing::misfitting_verdict();
  EXPECT_EQ(place_of(*largest_share(verdict)), "acid in run-01");
  EXPECT_EQ(place_of({"", "earlier work", 1, 4.0}), "earlier work");
  Verdict one = verdict;
  one.shares.resize(1);
  EXPECT_EQ(largest_share(one), nullptr);
}

TEST(MovedUnknowns, AreNamedOnce) {
  Verdict verdict;
  verdict.moved = {{"Km1", true, 1, 0.1, 5}, {"Km1", false, 10, 100, 5}, {"k", true, 1, 0.1, 5}};
  EXPECT_EQ(moved_unknowns(verdict), (std::vector<std::string>{"Km1", "k"}));
}

}  // namespace
}  // namespace gainsay::stats
