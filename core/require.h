#pragma once

#include <stdexcept>
#include <string>

namespace gainsay::core {

/// Thrown by GAINSAY_REQUIRE: the caller broke a documented precondition. Never used for bad input.
class BrokenPromise : public std::logic_error {
 public:
  using std::logic_error::logic_error;
};

}  // namespace gainsay::core

/// States a precondition in words; throws BrokenPromise with them if the condition does not hold.
#define GAINSAY_REQUIRE(condition, words)                                       \
  do {                                                                          \
    if (!(condition)) throw ::gainsay::core::BrokenPromise(std::string(words)); \
  } while (false)
