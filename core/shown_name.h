#pragma once

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::core {

/// A name as it is set in mathematics: "K_m1" is K with "m1" below, "CO2" is CO with 2 below.
struct ShownName {
  std::string base;
  std::vector<std::string> below;  ///< subscripts, in order
  bool operator==(const ShownName&) const = default;
};

/// Splits trailing digits of the first part, and all parts behind a `_`, off as subscripts. What is
/// no name in the sense of is_name, or has an empty part, stays whole: two names never look alike.
ShownName split_name(std::string_view name);

struct GreekLetter {
  std::string_view name;  ///< "alpha", "Gamma"
  std::string_view utf8;
  std::string_view latex;
};

/// Null if `name` is no spelt-out Greek letter.
const GreekLetter* find_greek_letter(std::string_view name);

/// Whether a name's base is set as one letter, so that it can stand beside another without a sign.
bool shows_one_letter(std::string_view name);

}  // namespace gainsay::core
