#include "gainsay/core/tokens.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <optional>
#include <string>
#include <system_error>

namespace gainsay::core {
namespace {

bool is_digit(char c) { return c >= '0' && c <= '9'; }
bool is_letter(char c) { return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z'); }
bool is_blank(char c) { return c == ' ' || c == '\t' || c == '\n' || c == '\r'; }

/// Signs of other notations, and what stands for them here.
struct ForeignSign {
  std::string_view sign;
  std::string_view to_do;
};
constexpr std::array kForeignSigns{
    ForeignSign{"**", "write a power as 'a^b'"},
    ForeignSign{"&&", "write 'a and b'"},
    ForeignSign{"||", "write 'a or b'"},
    ForeignSign{"&", "write 'a and b'"},
    ForeignSign{"|", "write 'a or b', or 'abs(x)' for a magnitude"},
    ForeignSign{"!", "write 'not a', or 'a != b'"},
    ForeignSign{"=", "write 'a == b' to compare; an expression cannot set a value"},
    ForeignSign{"<>", "write 'a != b'"},
    ForeignSign{"[", "write '(' and ')' for brackets"},
    ForeignSign{"]", "write '(' and ')' for brackets"},
    ForeignSign{"{", "write '(' and ')' for brackets"},
    ForeignSign{"}", "write '(' and ')' for brackets"},
    ForeignSign{"?", "write 'if(condition, a, b)'"},
    ForeignSign{"%", "write a share as a number: 0.05 for 5 %"},
    ForeignSign{"\u2212", "write '-'"},           // minus sign
    ForeignSign{"\u2013", "write '-'"},           // en dash
    ForeignSign{"\u00d7", "write '*'"},           // multiplication sign
    ForeignSign{"\u00b7", "write '*'"},           // middle dot
    ForeignSign{"\u22c5", "write '*'"},           // dot operator
    ForeignSign{"\u00f7", "write '/'"},           // division sign
    ForeignSign{"\u2264", "write '<='"},          // less or equal
    ForeignSign{"\u2265", "write '>='"},          // greater or equal
    ForeignSign{"\u2260", "write '!='"},          // not equal
    ForeignSign{"\u00b2", "write 'x^2'"},         // superscript two
    ForeignSign{"\u00b3", "write 'x^3'"},         // superscript three
    ForeignSign{"\u221a", "write 'sqrt(x)'"},     // square root
    ForeignSign{"\u03c0", "write 'pi'"},          // small pi
    ForeignSign{"\u00a0", "write a plain blank"}  // no-break space
};

/// Longer signs first, so that `<=` is not cut into `<` and `=`.
constexpr std::array<std::string_view, 14> kSigns{"<=", ">=", "==", "!=", "+", "-", "*",
                                                  "/",  "^",  "(",  ")",  ",", "<", ">"};

/// Bytes of the UTF-8 character at the beginning of `text`; 1 where it is none.
std::size_t character_length(std::string_view text) {
  const auto first = static_cast<unsigned char>(text.front());
  std::size_t length = 1;
  if (first >= 0xC2 && first <= 0xDF) length = 2;
  if (first >= 0xE0 && first <= 0xEF) length = 3;
  if (first >= 0xF0 && first <= 0xF4) length = 4;
  if (length > text.size()) return 1;
  for (std::size_t i = 1; i < length; ++i) {
    if ((static_cast<unsigned char>(text[i]) & 0xC0U) != 0x80U) return 1;
  }
  return length;
}

Failure unknown_sign(std::string_view rest, std::size_t offset) {
  std::size_t length = character_length(rest);
  std::string to_do = "remove it";
  const auto byte = static_cast<unsigned char>(rest.front());
  if (length > 1) {
    to_do = "spell names with a-z, A-Z, digits and '_'; pages show 'alpha' as the Greek letter";
  }
  for (const ForeignSign& foreign : kForeignSigns) {
    if (!rest.starts_with(foreign.sign)) continue;
    length = foreign.sign.size();
    to_do = foreign.to_do;
    break;
  }
  // Control characters and bytes that are no UTF-8 would spoil the terminal: show their number.
  const bool shows = byte >= 0x20 && byte != 0x7F && (byte < 0x80 || length > 1);
  std::string sign(rest.substr(0, length));
  if (!shows) {
    constexpr std::string_view kHex = "0123456789abcdef";
    sign = {'0', 'x', kHex[byte >> 4U], kHex[byte & 0xFU]};
  }
  return {"unknown sign '" + sign + "'", "a number, a name, or one of + - * / ^ ( ) , < >",
          std::move(to_do), Place{offset, length}};
}

/// Characters of the number at the beginning of `text`, 0 if there is none: digits with at most one
/// point, and an exponent if digits follow.
std::size_t number_length(std::string_view text) {
  std::size_t end = 0;
  const auto digits = [&] {
    const std::size_t begin = end;
    while (end < text.size() && is_digit(text[end])) ++end;
    return end - begin;
  };
  std::size_t count = digits();
  if (end < text.size() && text[end] == '.') {
    ++end;
    count += digits();
  }
  if (count == 0) return 0;
  if (end < text.size() && (text[end] == 'e' || text[end] == 'E')) {
    const std::size_t mantissa = end++;
    if (end < text.size() && (text[end] == '+' || text[end] == '-')) ++end;
    if (digits() == 0) end = mantissa;
  }
  return end;
}

Result<Token> number_token(std::string_view text, std::size_t offset) {
  const Place place{offset, text.size()};
  Token token{TokenKind::Number, text, place};
  const auto read = std::from_chars(text.data(), text.data() + text.size(), token.number);
  if (read.ec == std::errc::result_out_of_range) {
    return Failure{"number '" + std::string(text) + "' is out of range",
                   "0, or a size between about 1e-307 and 1e308",
                   "state the quantity in a unit that suits its size", place};
  }
  return token;
}

std::size_t name_length(std::string_view text) {
  if (text.empty() || !is_letter(text.front())) return 0;
  const auto ends = std::find_if_not(
      text.begin(), text.end(), [](char c) { return is_letter(c) || is_digit(c) || c == '_'; });
  return static_cast<std::size_t>(ends - text.begin());
}

std::size_t sign_length(std::string_view text) {
  if (text.starts_with("**") || text.starts_with("<>")) return 0;
  for (const std::string_view sign : kSigns) {
    if (text.starts_with(sign)) return sign.size();
  }
  return 0;
}

}  // namespace

bool is_name(std::string_view text) { return !text.empty() && name_length(text) == text.size(); }

Result<std::vector<Token>> cut_into_tokens(std::string_view text) {
  std::vector<Token> tokens;
  std::size_t offset = 0;
  const auto take = [&](TokenKind kind, std::size_t length) {
    tokens.push_back({kind, text.substr(offset, length), {offset, length}});
    offset += length;
  };
  while (offset < text.size()) {
    const std::string_view rest = text.substr(offset);
    if (is_blank(rest.front())) {
      ++offset;
    } else if (const std::size_t number = number_length(rest); number > 0) {
      const Result<Token> token = number_token(rest.substr(0, number), offset);
      if (!token) return token.failure();
      tokens.push_back(*token);
      offset += number;
    } else if (const std::size_t name = name_length(rest); name > 0) {
      take(TokenKind::Name, name);
    } else if (const std::size_t sign = sign_length(rest); sign > 0) {
      take(TokenKind::Sign, sign);
    } else {
      return unknown_sign(rest, offset);
    }
  }
  take(TokenKind::End, 0);
  return tokens;
}

}  // namespace gainsay::core
