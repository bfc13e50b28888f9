#include "gainsay/cli/number_text.h"

#include <array>
#include <charconv>
#include <cmath>
#include <regex>
#include <string_view>

namespace gainsay::cli {
namespace {

constexpr const char* kMinus = "\u2212";
constexpr const char* kNothing = "\u2013";
constexpr double kSmallestPlain = 1e-3;
constexpr double kFirstNotPlain = 1e6;

std::string to_text(double value, std::chars_format format, int precision) {
  std::array<char, 400> buffer{};
  const auto end =
      std::to_chars(buffer.data(), buffer.data() + buffer.size(), value, format, precision).ptr;
  return {buffer.data(), end};
}

std::string raised(int exponent) {
  static constexpr std::array<const char*, 10> kDigits = {"⁰", "¹", "²", "³", "⁴",
                                                          "⁵", "⁶", "⁷", "⁸", "⁹"};
  std::string out = exponent < 0 ? "⁻" : "";
  for (const char c : std::to_string(std::abs(exponent))) out += kDigits[c - '0'];
  return out;
}

/// "-1.2" with a minus sign; thousands stay together, as the tables align them.
std::string with_minus(const std::string& plain) {
  return plain.starts_with('-') ? kMinus + plain.substr(1) : plain;
}

}  // namespace

std::string significant(double value, int digits) {
  if (std::isnan(value)) return kNothing;
  if (std::isinf(value)) return value < 0 ? std::string(kMinus) + "∞" : "∞";
  if (value == 0.0) return "0";
  // Rounded first, so that 999,999.9 is taken for the million that it prints as.
  const std::string rounded = to_text(value, std::chars_format::scientific, digits - 1);
  const std::size_t e = rounded.find('e');
  const int exponent = std::stoi(rounded.substr(e + 1));
  const double magnitude = std::pow(10.0, exponent);
  if (magnitude < kSmallestPlain || magnitude >= kFirstNotPlain) {
    std::string mantissa = rounded.substr(0, e);
    if (mantissa.find_first_not_of("-10.") == std::string::npos && std::stod(mantissa) == 1.0) {
      return "10" + raised(exponent);
    }
    return with_minus(mantissa) + "\u202f·\u202f10" + raised(exponent);
  }
  return with_minus(to_text(value, std::chars_format::fixed, std::max(0, digits - 1 - exponent)));
}

std::string short_number(double value, int digits) {
  std::string out = significant(value, digits);
  const std::size_t point = out.find('.');
  if (point == std::string::npos) return out;
  std::size_t end = point + 1;
  while (end < out.size() && out[end] >= '0' && out[end] <= '9') ++end;
  std::size_t kept = end;
  while (out[kept - 1] == '0') --kept;
  if (kept == point + 1) kept = point;
  return out.erase(kept, end - kept);
}

std::string fixed(double value, int decimals) {
  if (!std::isfinite(value)) return significant(value, 1);
  std::string out = to_text(value, std::chars_format::fixed, decimals);
  if (out.find_first_not_of("-0.") == std::string::npos && out.starts_with('-')) out.erase(0, 1);
  return with_minus(out);
}

std::string p_text(double p_value) {
  if (p_value == 0.0) return "below 10⁻³⁰⁰";
  return significant(p_value, 2);
}

std::string with_raised_powers(const std::string& words) {
  static const std::regex kPower("([0-9])e([+-]?[0-9]{1,3})(?![0-9A-Za-z_])");
  std::string out;
  auto rest = words.cbegin();
  for (std::sregex_iterator it(words.begin(), words.end(), kPower), end; it != end; ++it) {
    out.append(rest, (*it)[1].second);
    out += "\u202f·\u202f10" + raised(std::stoi((*it)[2].str()));
    rest = (*it)[0].second;
  }
  return out.append(rest, words.cend());
}

std::string percent_text(double share) {
  if (!std::isfinite(share)) return kNothing;
  const double percent = 100.0 * share;
  return fixed(percent, std::abs(percent) < 9.95 && std::round(percent) != percent ? 1 : 0) +
         "\u202f%";
}

std::string count_words(std::size_t count) {
  static constexpr std::array<const char*, 13> kWords = {"no",   "one",    "two",   "three", "four",
                                                         "five", "six",    "seven", "eight", "nine",
                                                         "ten",  "eleven", "twelve"};
  return count < kWords.size() ? kWords[count] : std::to_string(count);
}

std::string counted(std::size_t count, const std::string& one, const std::string& many) {
  return count_words(count) + " " + (count == 1 ? one : many);
}

std::string capitalized(std::string words) {
  if (!words.empty() && words[0] >= 'a' && words[0] <= 'z') {
    words[0] = static_cast<char>(words[0] - 'a' + 'A');
  }
  return words;
}

std::string coordinate(double value) {
  std::string out = to_text(value, std::chars_format::fixed, 2);
  out.erase(out.find_last_not_of('0') + 1);
  if (out.ends_with('.')) out.pop_back();
  return out == "-0" ? "0" : out;
}

std::string share_text(double share) { return coordinate(100.0 * share) + "%"; }

}  // namespace gainsay::cli
