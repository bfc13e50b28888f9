#pragma once

#include "gainsay/core/expression.h"

#include <cstddef>
#include <unordered_map>
#include <utility>
#include <vector>

namespace gainsay::core {

/// The distinct nodes of an expression, each after its operands, the expression itself last. Works
/// without recursion, so that no depth exhausts the stack.
std::vector<Expression> nodes_in_order(const Expression& expression);

/// Computes a value for every distinct node from the values of its operands and returns that of the
/// expression itself. `visit(node, operands)` is called once a node, however often the node is
/// shared; `operands` is a `std::vector<Value>&` that it may consume. A value is let go after its
/// last use.
template <class Value, class Visit>
Value fold(const Expression& expression, Visit&& visit) {
  const std::vector<Expression> nodes = nodes_in_order(expression);
  std::unordered_map<const void*, std::size_t> number_of;
  number_of.reserve(nodes.size());
  for (std::size_t i = 0; i < nodes.size(); ++i) number_of.emplace(nodes[i].identity(), i);

  std::vector<std::size_t> uses(nodes.size(), 0);
  for (const Expression& node : nodes) {
    for (const Expression& operand : node.operands()) ++uses[number_of.at(operand.identity())];
  }
  std::vector<Value> values;
  values.reserve(nodes.size());
  std::vector<Value> operands;
  for (std::size_t i = 0; i < nodes.size(); ++i) {
    operands.clear();
    for (const Expression& operand : nodes[i].operands()) {
      const std::size_t number = number_of.at(operand.identity());
      if (--uses[number] == 0) {
        operands.push_back(std::move(values[number]));
      } else {
        operands.push_back(values[number]);
      }
    }
    values.push_back(visit(nodes[i], operands));
  }
  return std::move(values.back());
}

}  // namespace gainsay::core
