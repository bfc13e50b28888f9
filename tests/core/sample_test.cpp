#include "gainsay/core/sample.h"

#include <gmock/gmock.h>

namespace gainsay::core {
namespace {

TEST(Sample, DependsOnNameAndNumberAlone) {
  EXPECT_EQ(sample("k", 4), sample("k", 4));
  EXPECT_NE(sample("k", 4), sample("k", 6));
  EXPECT_NE(sample("k", 4), sample("q", 4));
  EXPECT_NE(sample("ab", 4), sample("ba", 4));
}

TEST(Sample, FillsItsDecades) {
  double least = 1.0;
  double most = 1.0;
  for (std::uint64_t number = 0; number < 1000; number += 2) {
    least = std::min(least, sample("k", number));
    most = std::max(most, sample("k", number));
  }
  // 500 even draws: the chance that none falls in an outer twentieth of two decades is 1e-11.
  EXPECT_GT(least, 0.1);
  EXPECT_LT(least, 0.1 * 1.2590);
  EXPECT_LT(most, 10.0);
  EXPECT_GT(most, 10.0 / 1.2590);
}

TEST(SamplePoint, TakesKnownsAtTheirValues) {
  const Point point = sample_point({"a", "b"}, {{"b", -2.0}, {"c", 1.0}}, 3);
  EXPECT_EQ(point.size(), 2U);
  EXPECT_EQ(point.at("a"), sample("a", 3));
  EXPECT_EQ(point.at("b"), -2.0);
}

}  // namespace
}  // namespace gainsay::core
