#pragma once

#include <optional>
#include <span>
#include <string>
#include <string_view>

namespace gainsay::core {

/// The candidate with the least edit distance (insert, delete, change, swap of neighbours; case
/// counts half), if that is close enough to be a likely slip: at most a third of the longer name's
/// length, at least 1. Damerau (1964).
std::optional<std::string> nearest_name(std::string_view name,
                                        std::span<const std::string> candidates);

}  // namespace gainsay::core
