#include "gainsay/core/fold.h"

#include <span>
#include <unordered_set>

namespace gainsay::core {

std::vector<Expression> nodes_in_order(const Expression& expression) {
  struct Visit {
    Expression node;
    std::size_t next_operand = 0;
  };
  std::vector<Expression> order;
  std::unordered_set<const void*> seen{expression.identity()};
  std::vector<Visit> path{{expression}};
  while (!path.empty()) {
    Visit& here = path.back();
    const std::span<const Expression> operands = here.node.operands();
    if (here.next_operand == operands.size()) {
      order.push_back(std::move(here.node));
      path.pop_back();
      continue;
    }
    const Expression& operand = operands[here.next_operand++];
    if (seen.insert(operand.identity()).second) path.push_back({operand});
  }
  return order;
}

}  // namespace gainsay::core
