#pragma once

#include <compare>
#include <cstddef>

namespace gainsay::core {

/// A stretch of a text that was handed in: offset in bytes from its beginning, and length in bytes.
struct Place {
  std::size_t offset = 0;
  std::size_t length = 0;
  auto operator<=>(const Place&) const = default;
};

}  // namespace gainsay::core
