#pragma once

#include "gainsay/core/derive.h"
#include "gainsay/core/expression.h"
#include "gainsay/testing/fifty_digits.h"

#include <algorithm>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::testing {

/// A claimed derivative, and the function it is claimed of.
struct DerivativeEntry {
  std::string name;  ///< "d rate / d Km"
  core::Expression function;
  std::string symbol;
  core::Expression derivative;
};

/// The derivatives of a function by all its symbols.
inline std::vector<DerivativeEntry> derivative_entries(std::string_view name,
                                                       const core::Expression& function) {
  std::vector<DerivativeEntry> entries;
  for (const std::string& symbol : core::symbols(function)) {
    entries.push_back({"d " + std::string(name) + " / d " + symbol, function, symbol,
                       core::derivative(function, symbol)});
  }
  return entries;
}

/// Central difference of fourth order, (8 (f(h) - f(-h)) - (f(2h) - f(-2h))) / 12h (Abramowitz &
/// Stegun 1964, 25.3.21, in their numbering of 1972).
inline Fifty central_difference(const DerivativeEntry& entry, FiftyValues point, const Fifty& h) {
  const Fifty middle = point.at(entry.symbol);
  const auto at = [&](int steps) {
    point[entry.symbol] = middle + steps * h;
    return in_fifty_digits(entry.function, point);
  };
  return (8 * (at(1) - at(-1)) - (at(2) - at(-2))) / (12 * h);
}

// The error of a difference with step h goes as h^4, 1e-40 of the function's fifth derivative, and
// rounding adds 1e-50 / h = 1e-40 of its value: 30 digits leave 10 for large higher derivatives.
inline const Fifty kStep("1e-10");
inline const Fifty kAgreement("1e-30");

/// The derivative by differences, if it can be had at this point: two steps must agree, which they
/// do not where the function is undefined or switches nearby, or is lost in cancellation.
inline std::optional<Fifty> difference_quotient(const DerivativeEntry& entry,
                                                const FiftyValues& point) {
  const Fifty fine = central_difference(entry, point, kStep);
  const Fifty coarse = central_difference(entry, point, 2 * kStep);
  if (!isfinite(fine) || !isfinite(coarse)) return std::nullopt;
  const Fifty scale = abs(fine) + abs(in_fifty_digits(entry.function, point)) + Fifty("1e-5");
  // 15 times the error of the fine step is what the two may differ by: the error goes as h^4.
  if (abs(fine - coarse) > 15 * kAgreement * scale) return std::nullopt;
  return fine;
}

struct DerivativeCheck {
  std::vector<std::string> mismatches;  ///< names of entries that disagree somewhere
  std::size_t compared = 0;             ///< pairs of entry and point
  std::size_t not_comparable = 0;       ///< pairs where differences gave no answer
};

/// Holds every entry against differences at every point.
inline DerivativeCheck check_derivatives(const std::vector<DerivativeEntry>& entries,
                                         const std::vector<FiftyValues>& points) {
  DerivativeCheck check;
  for (const DerivativeEntry& entry : entries) {
    bool agrees = true;
    for (const FiftyValues& point : points) {
      const std::optional<Fifty> expected = difference_quotient(entry, point);
      if (!expected) {
        ++check.not_comparable;
        continue;
      }
      ++check.compared;
      const Fifty scale =
          abs(*expected) + abs(in_fifty_digits(entry.function, point)) + Fifty("1e-5");
      const Fifty claimed = in_fifty_digits(entry.derivative, point);
      // Written so that an undefined claim disagrees.
      agrees = agrees && abs(claimed - *expected) <= 16 * kAgreement * scale;
    }
    if (!agrees) check.mismatches.push_back(entry.name);
  }
  return check;
}

}  // namespace gainsay::testing
