#include "gainsay/core/same_system.h"

#include "gainsay/core/balance.h"
#include "gainsay/core/precise.h"
#include "gainsay/core/sample.h"

#include <algorithm>
#include <cstdint>
#include <map>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::core {
namespace {

constexpr std::uint64_t kPoints = 12;
// 50 digits leave this much room for cancellation among values between 1e-3 and 1e3.
const Precise kRelative("1e-30");
const Precise kAbsolute("1e-35");

/// All that makes a system, in an order that does not depend on how it was written.
struct Content {
  std::vector<std::string> names;  ///< of what follows
  std::vector<Expression> values;  ///< written out
};

Content content(const Hypothesis& hypothesis, std::span<const Expression> shown) {
  const std::vector<Expression> rates = balance_by_name(hypothesis);
  std::map<std::string, Expression> parts;
  for (std::size_t i = 0; i < hypothesis.species.size(); ++i) {
    const Species& species = hypothesis.species[i];
    const std::string kind = species.amount ? "amount of " : "concentration of ";
    parts.emplace("rate of " + kind + species.name, rates[i]);
    parts.emplace("start of " + kind + species.name, species.start);
    parts.emplace("volume of " + species.name, hypothesis.compartments[species.compartment].volume);
  }
  Content content;
  for (const auto& [name, value] : parts) {
    content.names.push_back(name);
    content.values.push_back(value);
  }
  for (const auto& expression : shown) content.values.push_back(expression);
  content.values = written_out(content.values, hypothesis);
  return content;
}

PrecisePoint precise_point(const Expression& expression, const Hypothesis& hypothesis,
                           std::uint64_t number) {
  PrecisePoint point;
  for (const auto& [name, value] : sample_point(symbols(expression), hypothesis.knowns, number))
    point.emplace(name, as_written(value));
  return point;
}

bool is_finite(const Precise& value) { return boost::multiprecision::isfinite(value); }

/// Equal wherever both are defined, and defined somewhere.
bool are_equal(const Expression& a, const Hypothesis& of_a, const Expression& b,
               const Hypothesis& of_b) {
  std::uint64_t compared = 0;
  for (std::uint64_t number = 0; number < kPoints; ++number) {
    const Precise x = evaluate_precisely(a, precise_point(a, of_a, number));
    const Precise y = evaluate_precisely(b, precise_point(b, of_b, number));
    if (is_finite(x) != is_finite(y)) return false;
    if (!is_finite(x)) continue;
    const Precise difference = abs(x - y);
    if (difference > kAbsolute && difference > kRelative * abs(x)) return false;
    ++compared;
  }
  return compared > 0;
}

}  // namespace

bool same_system(const Hypothesis& a, const Hypothesis& b, std::span<const Expression> shown) {
  const Content in_a = content(a, shown);
  const Content in_b = content(b, shown);
  if (in_a.names != in_b.names) return false;
  for (std::size_t i = 0; i < in_a.values.size(); ++i)
    if (!are_equal(in_a.values[i], a, in_b.values[i], b)) return false;
  return true;
}

}  // namespace gainsay::core
