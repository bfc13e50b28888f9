#include "gainsay/core/precise.h"

#include "gainsay/core/fold.h"
#include "gainsay/core/print.h"
#include "gainsay/core/require.h"

#include <limits>
#include <vector>

namespace gainsay::core {
namespace {

Precise truth(bool holds) { return holds ? 1 : 0; }

Precise not_a_number() { return std::numeric_limits<Precise>::quiet_NaN(); }

Precise applied(Operation operation, const std::vector<Precise>& x) {
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
      return x[1] == 0 ? not_a_number() : Precise(x[0] / x[1]);
    case Operation::Power:
      return x[0] == 0 && x[1] < 0 ? not_a_number() : Precise(pow(x[0], x[1]));
    case Operation::Exp:
      return exp(x[0]);
    case Operation::Ln:
      return x[0] > 0 ? Precise(log(x[0])) : not_a_number();
    case Operation::Log10:
      return x[0] > 0 ? Precise(log10(x[0])) : not_a_number();
    case Operation::Sqrt:
      return x[0] >= 0 ? Precise(sqrt(x[0])) : not_a_number();
    case Operation::Abs:
      return abs(x[0]);
    case Operation::Sin:
      return sin(x[0]);
    case Operation::Cos:
      return cos(x[0]);
    case Operation::Tan:
      return tan(x[0]);
    case Operation::Tanh:
      return tanh(x[0]);
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
      return truth(x[0] != 0 && x[1] != 0);
    case Operation::Or:
      return truth(x[0] != 0 || x[1] != 0);
    case Operation::Not:
      return truth(x[0] == 0);
    case Operation::If:
      return x[0] != 0 ? x[1] : x[2];
  }
  throw BrokenPromise("applied() is asked of an operation with operands");
}

}  // namespace

Precise as_written(double value) { return Precise(print_number(value)); }

Precise evaluate_precisely(const Expression& expression, const PrecisePoint& values) {
  return fold<Precise>(
      expression, [&](const Expression& node, const std::vector<Precise>& operands) -> Precise {
        if (node.is_number()) return as_written(node.number());
        if (node.operation() != Operation::Symbol) return applied(node.operation(), operands);
        const auto found = values.find(node.name());
        GAINSAY_REQUIRE(found != values.end(), "no value is given for '" + node.name() + "'");
        return found->second;
      });
}

}  // namespace gainsay::core
