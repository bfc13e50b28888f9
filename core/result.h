#pragma once

#include "gainsay/core/place.h"
#include "gainsay/core/require.h"

#include <optional>
#include <string>
#include <utility>
#include <variant>

namespace gainsay::core {

/// Why something handed in cannot be used: what is wrong (lower case, names in quotes), what was
/// expected, what to do. `place` points into the text handed in, where there was one.
struct Failure {
  std::string what;
  std::string expected;
  std::string to_do;
  std::optional<Place> place;
  bool operator==(const Failure&) const = default;
};

/// A value, or the failure that stands in its place.
template <class T, class E = Failure>
class [[nodiscard]] Result {
 public:
  Result(T value)
      : content_(std::in_place_index<0>, std::move(value)) {
  }  // NOLINT(google-explicit-constructor)
  Result(E failure)
      : content_(std::in_place_index<1>, std::move(failure)) {
  }  // NOLINT(google-explicit-constructor)

  explicit operator bool() const { return content_.index() == 0; }
  const T& value() const& { return require_value(), std::get<0>(content_); }
  T& value() & { return require_value(), std::get<0>(content_); }
  T&& value() && { return require_value(), std::get<0>(std::move(content_)); }
  const T& operator*() const& { return value(); }
  T& operator*() & { return value(); }
  const T* operator->() const { return &value(); }
  T* operator->() { return &value(); }
  const E& failure() const {
    GAINSAY_REQUIRE(!*this, "failure() is asked of a failed result");
    return std::get<1>(content_);
  }

 private:
  void require_value() const {
    GAINSAY_REQUIRE(*this, "value() is asked of a result that holds one");
  }
  std::variant<T, E> content_;
};

}  // namespace gainsay::core
