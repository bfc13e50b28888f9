#include "gainsay/core/fold.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::core {
namespace {

TEST(NodesInOrder, EachOnceAfterItsOperands) {
  const Expression x = Expression::symbol("x");
  const Expression shared = x + 1.0;
  const Expression whole = shared * shared;
  const std::vector<Expression> nodes = nodes_in_order(whole);
  ASSERT_EQ(nodes.size(), 4U);
  EXPECT_EQ(nodes[0].identity(), x.identity());
  EXPECT_TRUE(nodes[1].is_number(1.0));
  EXPECT_EQ(nodes[2].identity(), shared.identity());
  EXPECT_EQ(nodes[3].identity(), whole.identity());
}

TEST(Fold, VisitsSharedNodesOnceAndHandsTheirValueToEachUser) {
  const Expression x = Expression::symbol("x");
  const Expression shared = x + 1.0;
  int visits = 0;
  const std::string text =
      fold<std::string>(shared * shared, [&](const Expression& node, const auto& operands) {
        ++visits;
        if (node.is_number()) return std::string("1");
        if (operands.empty()) return node.name();
        return "[" + operands[0] + operands[1] + "]";
      });
  EXPECT_EQ(visits, 4);
  EXPECT_EQ(text, "[[x1][x1]]");
}

}  // namespace
}  // namespace gainsay::core
