#include "gainsay/core/expression.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/require.h"

#include <algorithm>
#include <bit>
#include <cmath>
#include <unordered_set>
#include <utility>

namespace gainsay::core {
namespace {

/// Spreads the bits of `value` into `seed` (the golden ratio as a bit pattern: Knuth 1973, 6.4).
std::size_t mixed(std::size_t seed, std::size_t value) {
  return seed ^ (value + 0x9e3779b97f4a7c15U + (seed << 6) + (seed >> 2));
}

std::size_t hash_of(Operation operation, double number, const std::string& name,
                    const std::vector<Expression>& operands) {
  std::size_t hash = mixed(0, static_cast<std::size_t>(operation));
  if (operation == Operation::Number) hash = mixed(hash, std::bit_cast<std::uint64_t>(number));
  if (operation == Operation::Symbol) hash = mixed(hash, std::hash<std::string>{}(name));
  for (const Expression& operand : operands) hash = mixed(hash, operand.hash());
  return hash;
}

double truth(bool holds) { return holds ? 1.0 : 0.0; }

/// Value of a node that has operands, from their values.
double applied(Operation operation, const std::vector<double>& x) {
  switch (operation) {
    case Operation::Number:
    case Operation::Symbol:
      break;
    case Operation::Negate:
      return -x[0];
    case Operation::Add:
      return x[0] + x[1];
    case Operation::Subtract:
      return x[0] - x[1];
    case Operation::Multiply:
      return x[0] * x[1];
    case Operation::Divide:
      return x[0] / x[1];
    case Operation::Power:
      return std::pow(x[0], x[1]);
    case Operation::Exp:
      return std::exp(x[0]);
    case Operation::Ln:
      return std::log(x[0]);
    case Operation::Log10:
      return std::log10(x[0]);
    case Operation::Sqrt:
      return std::sqrt(x[0]);
    case Operation::Abs:
      return std::abs(x[0]);
    case Operation::Sin:
      return std::sin(x[0]);
    case Operation::Cos:
      return std::cos(x[0]);
    case Operation::Tan:
      return std::tan(x[0]);
    case Operation::Tanh:
      return std::tanh(x[0]);
    case Operation::Min:
      return x[0] <= x[1] ? x[0] : x[1];
    case Operation::Max:
      return x[0] >= x[1] ? x[0] : x[1];
    case Operation::Less:
      return truth(x[0] < x[1]);
    case Operation::LessEqual:
      return truth(x[0] <= x[1]);
    case Operation::Greater:
      return truth(x[0] > x[1]);
    case Operation::GreaterEqual:
      return truth(x[0] >= x[1]);
    case Operation::Equal:
      return truth(x[0] == x[1]);
    case Operation::NotEqual:
      return truth(x[0] != x[1]);
    case Operation::And:
      return truth(x[0] != 0.0 && x[1] != 0.0);
    case Operation::Or:
      return truth(x[0] != 0.0 || x[1] != 0.0);
    case Operation::Not:
      return truth(x[0] == 0.0);
    case Operation::If:
      return x[0] != 0.0 ? x[1] : x[2];
  }
  throw BrokenPromise("applied() is asked of an operation with operands");
}

}  // namespace

struct Expression::Node {
  Operation operation = Operation::Number;
  double number = 0.0;
  std::string name;
  std::vector<Expression> operands;
  std::size_t hash = 0;

  Node(Operation node_operation, double node_number, std::string node_name,
       std::vector<Expression> node_operands)
      : operation(node_operation),
        number(node_number),
        name(std::move(node_name)),
        operands(std::move(node_operands)),
        hash(hash_of(operation, number, name, operands)) {}
  Node(const Node&) = delete;
  Node& operator=(const Node&) = delete;

  /// Lets operands go one by one: the destructors of a deep chain would otherwise nest as deeply as
  /// the chain and exhaust the stack.
  ~Node() {
    std::vector<Expression> orphans = std::move(operands);
    while (!orphans.empty()) {
      const Expression last = std::move(orphans.back());
      orphans.pop_back();
      if (last.node_.use_count() != 1) continue;
      // The node is ours alone and about to go; nodes are never created const.
      auto& below = const_cast<Node&>(*last.node_).operands;
      std::move(below.begin(), below.end(), std::back_inserter(orphans));
      below.clear();
    }
  }
};

std::size_t operand_count(Operation operation) {
  switch (operation) {
    case Operation::Number:
    case Operation::Symbol:
      return 0;
    case Operation::Negate:
    case Operation::Exp:
    case Operation::Ln:
    case Operation::Log10:
    case Operation::Sqrt:
    case Operation::Abs:
    case Operation::Sin:
    case Operation::Cos:
    case Operation::Tan:
    case Operation::Tanh:
    case Operation::Not:
      return 1;
    case Operation::If:
      return 3;
    default:
      return 2;
  }
}

Expression::Expression(std::shared_ptr<const Node> node) : node_(std::move(node)) {}

Expression::Expression(double number)
    : node_(std::make_shared<Node>(Operation::Number, number, "", std::vector<Expression>())) {}

Expression Expression::symbol(std::string name) {
  return Expression(
      std::make_shared<Node>(Operation::Symbol, 0.0, std::move(name), std::vector<Expression>()));
}

Expression Expression::make(Operation operation, std::vector<Expression> operands) {
  GAINSAY_REQUIRE(operation != Operation::Number && operation != Operation::Symbol,
                  "numbers and symbols are not made from operands");
  GAINSAY_REQUIRE(operands.size() == operand_count(operation),
                  "an operation gets as many operands as it takes");
  return Expression(std::make_shared<Node>(operation, 0.0, "", std::move(operands)));
}

Operation Expression::operation() const { return node_->operation; }

double Expression::number() const {
  GAINSAY_REQUIRE(is_number(), "number() is asked of a number");
  return node_->number;
}

const std::string& Expression::name() const {
  GAINSAY_REQUIRE(operation() == Operation::Symbol, "name() is asked of a symbol");
  return node_->name;
}

std::span<const Expression> Expression::operands() const { return node_->operands; }

std::size_t Expression::hash() const { return node_->hash; }

bool operator==(const Expression& a, const Expression& b) {
  // Pairs found equal or under way are not compared again: shared parts cost one comparison.
  struct PairHash {
    std::size_t operator()(const std::pair<const void*, const void*>& pair) const {
      return mixed(std::hash<const void*>{}(pair.first), std::hash<const void*>{}(pair.second));
    }
  };
  std::unordered_set<std::pair<const void*, const void*>, PairHash> seen;
  std::vector<std::pair<const Expression::Node*, const Expression::Node*>> open;
  open.emplace_back(a.node_.get(), b.node_.get());
  while (!open.empty()) {
    const auto [left, right] = open.back();
    open.pop_back();
    if (left == right) continue;
    if (left->hash != right->hash || left->operation != right->operation) return false;
    // By bits, as in the hash: 0 and -0 are two numbers (1 / x tells them apart).
    if (std::bit_cast<std::uint64_t>(left->number) != std::bit_cast<std::uint64_t>(right->number) ||
        left->name != right->name) {
      return false;
    }
    if (left->operands.empty() || !seen.emplace(left, right).second) continue;
    for (std::size_t i = 0; i < left->operands.size(); ++i) {
      open.emplace_back(left->operands[i].node_.get(), right->operands[i].node_.get());
    }
  }
  return true;
}

Expression operator-(const Expression& a) { return Expression::make(Operation::Negate, {a}); }
Expression operator+(const Expression& a, const Expression& b) {
  return Expression::make(Operation::Add, {a, b});
}
Expression operator-(const Expression& a, const Expression& b) {
  return Expression::make(Operation::Subtract, {a, b});
}
Expression operator*(const Expression& a, const Expression& b) {
  return Expression::make(Operation::Multiply, {a, b});
}
Expression operator/(const Expression& a, const Expression& b) {
  return Expression::make(Operation::Divide, {a, b});
}
Expression pow(const Expression& base, const Expression& exponent) {
  return Expression::make(Operation::Power, {base, exponent});
}

Expression with_operands(const Expression& node, std::vector<Expression> operands) {
  const std::span<const Expression> old = node.operands();
  const auto same = [](const Expression& a, const Expression& b) {
    return a.identity() == b.identity();
  };
  if (std::equal(old.begin(), old.end(), operands.begin(), operands.end(), same)) return node;
  return Expression::make(node.operation(), std::move(operands));
}

Expression substitute(const Expression& expression,
                      const std::map<std::string, Expression, std::less<>>& replacements) {
  return fold<Expression>(expression,
                          [&](const Expression& node, const std::vector<Expression>& operands) {
                            if (node.operation() != Operation::Symbol)
                              return with_operands(node, operands);
                            const auto found = replacements.find(node.name());
                            return found == replacements.end() ? node : found->second;
                          });
}

std::set<std::string, std::less<>> symbols(const Expression& expression) {
  std::set<std::string, std::less<>> names;
  for (const Expression& node : nodes_in_order(expression)) {
    if (node.operation() == Operation::Symbol) names.insert(node.name());
  }
  return names;
}

bool depends_on(const Expression& expression, std::string_view symbol) {
  const std::vector<Expression> nodes = nodes_in_order(expression);
  return std::any_of(nodes.begin(), nodes.end(), [&](const Expression& node) {
    return node.operation() == Operation::Symbol && node.name() == symbol;
  });
}

double evaluate(const Expression& expression,
                const std::map<std::string, double, std::less<>>& values) {
  return fold<double>(expression, [&](const Expression& node, const std::vector<double>& operands) {
    if (node.is_number()) return node.number();
    if (node.operation() != Operation::Symbol) return applied(node.operation(), operands);
    const auto found = values.find(node.name());
    GAINSAY_REQUIRE(found != values.end(), "no value is given for '" + node.name() + "'");
    return found->second;
  });
}

}  // namespace gainsay::core
