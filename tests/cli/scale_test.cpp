#include "gainsay/cli/scale.h"

#include "gainsay/core/require.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using ::testing::ElementsAre;

std::vector<std::string> labels(const Scale& scale, int wanted) {
  std::vector<std::string> all;
  for (const Tick& tick : scale.ticks(wanted)) all.push_back(tick.label);
  return all;
}

TEST(LinearScale, TakesInZeroWhereItIsNear) {
  const Scale scale = Scale::linear(3.0, 19.0);
  EXPECT_EQ(scale.low(), 0.0);
  EXPECT_GE(scale.high(), 19.0);
  EXPECT_EQ(Scale::linear(101.0, 104.0).low(), 101.0);
}

TEST(LinearScale, HasRoundTicks) {
  EXPECT_THAT(labels(Scale::exact(0.0, 70.0, false), 4), ElementsAre("0", "20", "40", "60"));
  EXPECT_THAT(labels(Scale::exact(-0.2, 0.2, false), 4),
              ElementsAre("\u22120.2", "\u22120.1", "0.0", "0.1", "0.2"));
}

TEST(LinearScale, SetsEqualEndsApart) {
  const Scale scale = Scale::linear(2.0, 2.0);
  EXPECT_LT(scale.low(), 2.0);
  EXPECT_GT(scale.high(), 2.0);
  EXPECT_LT(Scale::linear(0.0, 0.0).low(), Scale::linear(0.0, 0.0).high());
}

TEST(Scale, PlacesItsEndsAtZeroAndOne) {
  for (const bool logarithmic : {false, true}) {
    const Scale scale = Scale::exact(0.1, 1000.0, logarithmic);
    EXPECT_EQ(scale.place(0.1), 0.0);
    EXPECT_EQ(scale.place(1000.0), 1.0);
  }
}

TEST(LogarithmicScale, PutsDecadesAtEqualDistances) {
  constexpr double kRounding = 1e-12;  // a handful of roundings of logarithms near 1
  const Scale scale = Scale::exact(0.1, 1000.0, true);
  EXPECT_NEAR(scale.place(1.0), 0.25, kRounding);
  EXPECT_NEAR(scale.place(100.0), 0.75, kRounding);
  EXPECT_THAT(labels(scale, 5), ElementsAre("0.1", "1", "10", "100", "1000"));
}

TEST(LogarithmicScale, HasTwosAndFivesWhereDecadesAreFew) {
  EXPECT_THAT(labels(Scale::exact(1.0, 10.0, true), 4), ElementsAre("1", "2", "5", "10"));
}

TEST(LogarithmicScale, CannotShowZeroAndPutsItAtTheLowerEnd) {
  const Scale scale = Scale::logarithmic(0.1, 10.0);
  EXPECT_FALSE(scale.can_show(0.0));
  EXPECT_EQ(scale.place(-3.0), 0.0);
  EXPECT_GT(scale.place(0.1), 0.0);  // its own ends have a margin
}

TEST(Scale, RefusesWhatIsNoRange) {
  EXPECT_THROW(static_cast<void>(Scale::exact(0.0, 1.0, true)), core::BrokenPromise);
  EXPECT_THROW(static_cast<void>(Scale::linear(2.0, 1.0)), core::BrokenPromise);
}

}  // namespace
}  // namespace gainsay::cli
