#include "gainsay/cli/panel.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <limits>

namespace gainsay::cli {
namespace {

using ::testing::ElementsAre;
using ::testing::HasSubstr;

TEST(StretchedPath, KeepsCornersAndDropsWhatLiesOnALine) {
  EXPECT_EQ(stretched_path({{0.0, 0.0}, {0.5, 0.5}, {1.0, 1.0}}), "M0 1000L1000 0");
  EXPECT_EQ(stretched_path({{0.0, 0.0}, {0.5, 1.0}, {1.0, 0.0}}), "M0 1000L500 0L1000 1000");
}

TEST(StretchedPath, StaysWithinItsToleranceOfTheCurve) {
  std::vector<Corner> curve;
  for (int i = 0; i <= 500; ++i) curve.push_back({i / 500.0, std::exp(-4.0 * i / 500.0)});
  const std::string d = stretched_path(curve);
  EXPECT_LT(std::count(d.begin(), d.end(), 'L'), 60);
  EXPECT_GT(std::count(d.begin(), d.end(), 'L'), 5);
}

TEST(StretchedPath, IsInterruptedByWhatIsNoNumber) {
  const double nan = std::numeric_limits<double>::quiet_NaN();
  EXPECT_EQ(stretched_path({{0.0, 0.0}, {0.1, 0.0}, {0.2, nan}, {0.3, 0.0}, {0.4, 0.0}}),
            "M0 1000L100 1000M300 1000L400 1000");
}

TEST(StretchedPath, KeepsJumps) {
  EXPECT_EQ(stretched_path({{0.0, 0.0}, {0.5, 0.0}, {0.5, 1.0}, {1.0, 1.0}}),
            "M0 1000L500 1000L500 0L1000 0");
}

TEST(PulledApart, LeavesAloneWhatIsApart) {
  EXPECT_THAT(pulled_apart({0.1, 0.9, 0.5}, 0.1), ElementsAre(0.1, 0.9, 0.5));
}

TEST(PulledApart, MovesTheLaterOnesJustBesideTheEarlier) {
  const std::vector<double> placed = pulled_apart({0.5, 0.5, 0.52}, 0.1);
  EXPECT_EQ(placed[0], 0.5);
  for (std::size_t i = 0; i < placed.size(); ++i) {
    for (std::size_t j = 0; j < i; ++j) EXPECT_GE(std::abs(placed[i] - placed[j]), 0.1 - 1e-9);
  }
}

TEST(PulledApart, StaysInsideAsLongAsThereIsRoom) {
  for (const double place : pulled_apart({0.0, 0.0, 0.0, -4.0}, 0.2)) {
    EXPECT_GE(place, -1e-9);
    EXPECT_LE(place, 1.0);
  }
  EXPECT_EQ(pulled_apart({0.5, 0.5, 0.5}, 0.9).size(), 3U);
}

TEST(Figure, HasItsAlternativeItsUnitAndNoStyleOfItsOwn) {
  Panel panel;
  panel.id = "p0-0";
  panel.caption = "low & slow";
  panel.alternative = "eight readings";
  panel.x = Scale::exact(0.0, 60.0, false);
  panel.x_unit = "min";
  const std::string html = figure(panel).str();
  EXPECT_THAT(html, HasSubstr("low &amp; slow"));
  EXPECT_THAT(html, HasSubstr("aria-label=\"eight readings\""));
  EXPECT_THAT(html, HasSubstr("60\u202fmin"));
  EXPECT_EQ(html.find("style="), std::string::npos);
}

}  // namespace
}  // namespace gainsay::cli
