#include "gainsay/stats/wording.h"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>

namespace gainsay::stats {
namespace {

constexpr int kDigitsOfV = 4;
constexpr int kDigitsOfP = 2;
// In between V is shown as a whole number, above in powers of ten.
constexpr double kTenThousand = 1e4;
constexpr double kTenMillion = 1e7;
constexpr int kDigitsOfWholeV = 7;

}  // namespace

std::string readable(double number, int digits) {
  std::array<char, 40> buffer;
  const auto end = std::to_chars(buffer.data(), buffer.data() + buffer.size(), number,
                                 std::chars_format::general, digits);
  std::string text(buffer.data(), end.ptr);
  const std::size_t exponent = text.find('e');
  if (exponent == std::string::npos) return text;
  std::size_t zeros = exponent + 1;
  if (text[zeros] == '+') text.erase(zeros, 1);
  if (text[zeros] == '-') ++zeros;
  while (zeros + 1 < text.size() && text[zeros] == '0') text.erase(zeros, 1);
  return text;
}

std::string shown_V(double V) {
  if (V < kTenThousand || V >= kTenMillion) return readable(V, kDigitsOfV);
  return readable(std::round(V), kDigitsOfWholeV);
}
std::string shown_P(double p_value) { return readable(p_value, kDigitsOfP); }

std::string percent(double part) { return fmt::format("{:.0f} %", 100.0 * part); }

std::string counted(std::size_t count, const std::string& one, const std::string& many) {
  return fmt::format("{} {}", count, count == 1 ? one : many);
}

std::string listed(const std::vector<std::string>& names) {
  std::string text;
  for (std::size_t i = 0; i < names.size(); ++i) {
    if (i > 0) text += i + 1 < names.size() ? ", " : " and ";
    text += names[i];
  }
  return text;
}

std::string place_of(const Share& share) {
  return share.experiment.empty() ? share.readout : share.readout + " in " + share.experiment;
}

const Share* largest_share(const Verdict& verdict) {
  if (verdict.shares.size() < 2) return nullptr;
  return &*std::max_element(verdict.shares.begin(), verdict.shares.end(),
                            [](const Share& a, const Share& b) { return a.V < b.V; });
}

std::vector<std::string> moved_unknowns(const Verdict& verdict) {
  std::vector<std::string> names;
  for (const MovedBound& bound : verdict.moved)
    if (names.empty() || names.back() != bound.unknown) names.push_back(bound.unknown);
  return names;
}

}  // namespace gainsay::stats
