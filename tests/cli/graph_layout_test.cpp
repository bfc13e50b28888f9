#include "gainsay/cli/graph_layout.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

Graph chain() {
  Graph graph;
  graph.nodes = {{50.0, 20.0}, {60.0, 16.0}, {40.0, 20.0}};
  graph.lines = {{0, 1}, {1, 2}};
  return graph;
}

TEST(GraphLayout, OrdersAChainFromLeftToRight) {
  const std::optional<Layout> layout = lay_out(chain());
  ASSERT_TRUE(layout);
  EXPECT_LT(layout->nodes[0].x, layout->nodes[1].x);
  EXPECT_LT(layout->nodes[1].x, layout->nodes[2].x);
  EXPECT_EQ(layout->nodes[0].y, layout->nodes[2].y);
}

TEST(GraphLayout, KeepsNodesApartAndInside) {
  constexpr double kHalfAPoint = 0.5;  // dot rounds to whole points
  const std::optional<Layout> layout = lay_out(chain());
  ASSERT_TRUE(layout);
  EXPECT_GE(layout->nodes[1].x - layout->nodes[0].x, (50.0 + 60.0) / 2.0);
  EXPECT_GE(layout->nodes[0].x, 25.0 - kHalfAPoint);
  EXPECT_LE(layout->nodes[2].x, layout->width - 20.0 + kHalfAPoint);
}

TEST(GraphLayout, DrawsEveryLineAsBezierCurves) {
  const std::optional<Layout> layout = lay_out(chain());
  ASSERT_TRUE(layout);
  ASSERT_EQ(layout->lines.size(), 2U);
  for (const std::vector<Spot>& line : layout->lines) {
    EXPECT_GE(line.size(), 4U);
    EXPECT_EQ(line.size() % 3, 1U);
    EXPECT_LT(line.front().x, line.back().x);
  }
}

TEST(GraphLayout, GivesTheSameTwice) {
  const std::optional<Layout> a = lay_out(chain());
  const std::optional<Layout> b = lay_out(chain());
  ASSERT_TRUE(a && b);
  EXPECT_EQ(a->nodes, b->nodes);
  EXPECT_EQ(a->lines, b->lines);
}

TEST(GraphLayout, OfNothingIsNothing) { EXPECT_FALSE(lay_out({})); }

}  // namespace
}  // namespace gainsay::cli
