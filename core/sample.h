#pragma once

#include "gainsay/core/expression.h"

#include <cstdint>
#include <functional>
#include <map>
#include <set>
#include <string>
#include <string_view>

namespace gainsay::core {

/// A positive number keyed by a name and a count, the same on every machine: log-uniform in
/// [1/10, 10] for even counts, in [1/1000, 1000] for odd ones. For finding out by sampling what an
/// expression does; the mixing is that of splitmix64 (Steele, Lea & Flood 2014).
double sample(std::string_view name, std::uint64_t number);

using Point = std::map<std::string, double, std::less<>>;

/// Point number `number` in the space of all symbols: `knowns` at their values, the rest sampled.
Point sample_point(const std::set<std::string, std::less<>>& symbols, const Point& knowns,
                   std::uint64_t number);

}  // namespace gainsay::core
