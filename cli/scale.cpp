#include "gainsay/cli/scale.h"

#include "gainsay/cli/number_text.h"
#include "gainsay/core/require.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

constexpr double kLogMargin = 0.04;  // of the width, at each end of a logarithmic axis
constexpr double kNearZero = 0.6;    // zero is taken in when closer than this share of the span
constexpr double kSlack = 1e-9;      // of a step: rounding of k * step

double round_step(double span, int wanted) {
  const double rough = span / std::max(1, wanted);
  const double power = std::pow(10.0, std::floor(std::log10(rough)));
  for (const double factor : {1.0, 2.0, 5.0}) {
    if (rough <= factor * power * (1.0 + kSlack)) return factor * power;
  }
  return 10.0 * power;
}

/// Digits after the point that a multiple of `step` needs.
int decimals_of(double step) {
  return std::max(0, static_cast<int>(-std::floor(std::log10(step) + kSlack)));
}

std::string label_of(double value, double step) {
  const double size = std::max(std::abs(value), step);
  if (size >= 1e5 || step < 1e-3) return value == 0.0 ? "0" : short_number(value, 2);
  return fixed(value, decimals_of(step));
}

std::string label_of_decade(double value) {
  if (value >= 1e-3 && value < 1e5) {
    return fixed(value, std::max(0, static_cast<int>(-std::floor(std::log10(value) + kSlack))));
  }
  return significant(value, 1);
}

}  // namespace

Scale Scale::linear(double low, double high) {
  GAINSAY_REQUIRE(std::isfinite(low) && std::isfinite(high) && low <= high, "low <= high, finite");
  if (low == high) {
    const double apart = low == 0.0 ? 1.0 : 0.5 * std::abs(low);
    low -= apart;
    high += apart;
  }
  const double span = high - low;
  if (low > 0.0 && low < kNearZero * span) low = 0.0;
  if (high < 0.0 && -high < kNearZero * span) high = 0.0;
  const double step = round_step(high - low, 8);
  return {step * std::floor(low / step + kSlack), step * std::ceil(high / step - kSlack), false};
}

Scale Scale::logarithmic(double low, double high) {
  GAINSAY_REQUIRE(low > 0.0 && low <= high && std::isfinite(high), "0 < low <= high, finite");
  const double span = std::max(std::log(high / low), std::log(2.0));
  const double middle = 0.5 * (std::log(low) + std::log(high));
  const double half = (0.5 + kLogMargin) * span;
  return {std::exp(middle - half), std::exp(middle + half), true};
}

Scale Scale::exact(double low, double high, bool logarithmic) {
  GAINSAY_REQUIRE(low < high && (!logarithmic || low > 0.0), "low < high, and above 0 if log");
  return {low, high, logarithmic};
}

double Scale::place(double value) const {
  if (!logarithmic_) return (value - low_) / (high_ - low_);
  if (value <= 0.0) return 0.0;
  return std::log(value / low_) / std::log(high_ / low_);
}

std::vector<Tick> Scale::ticks(int wanted) const {
  std::vector<Tick> ticks;
  if (!logarithmic_) {
    const double step = round_step(high_ - low_, wanted);
    const auto first = static_cast<long>(std::ceil(low_ / step - kSlack));
    const auto last = static_cast<long>(std::floor(high_ / step + kSlack));
    for (long k = first; k <= last; ++k) {
      const double value = static_cast<double>(k) * step;
      ticks.push_back({place(value), value, label_of(value, step)});
    }
    return ticks;
  }
  const double decades = std::log10(high_ / low_);
  const int every = std::max(1, static_cast<int>(std::ceil(decades / std::max(1, wanted))));
  const bool between = decades < 0.7 * wanted;
  const auto first = static_cast<int>(std::floor(std::log10(low_)));
  const auto last = static_cast<int>(std::ceil(std::log10(high_)));
  for (int decade = first; decade <= last; ++decade) {
    for (const double factor : {1.0, 2.0, 5.0}) {
      const double value = factor * std::pow(10.0, decade);
      const double at = place(value);
      if (at < -kSlack || at > 1.0 + kSlack) continue;
      if (factor == 1.0 ? (decade % every) != 0 : !between) continue;
      ticks.push_back({at, value, label_of_decade(value)});
    }
  }
  return ticks;
}

}  // namespace gainsay::cli
