#pragma once

#include "gainsay/core/result.h"

#include <cstdint>
#include <string_view>
#include <vector>

namespace gainsay::core {

enum class TokenKind : std::uint8_t { Number, Name, Sign, End };

/// A word of an expression's text.
struct Token {
  TokenKind kind = TokenKind::End;
  std::string_view text;  ///< as written; empty at the end
  Place place;
  double number = 0.0;  ///< of a Number
};

/// Cuts a text into numbers, names and signs (+ - * / ^ ( ) , < <= > >= == !=), with an End behind
/// them. Fails at the first character that begins none of them and at a number that a double cannot
/// hold. The tokens look into `text`.
Result<std::vector<Token>> cut_into_tokens(std::string_view text);

/// True for a letter followed by letters, digits and `_`.
bool is_name(std::string_view text);

}  // namespace gainsay::core
