#include "gainsay/cli/source_text.h"

#include <algorithm>

namespace gainsay::cli {

namespace {

constexpr std::string_view kByteOrderMark = "\xEF\xBB\xBF";

bool is_continuation(std::string_view bytes, std::size_t offset) {
  return offset < bytes.size() && (static_cast<unsigned char>(bytes[offset]) & 0xC0U) == 0x80U;
}

// Offset at which a line begins, or npos. A byte-order mark is no part of the first line.
std::size_t begin_of_line(std::string_view bytes, std::size_t line) {
  std::size_t offset = bytes.starts_with(kByteOrderMark) ? kByteOrderMark.size() : 0;
  for (std::size_t number = 1; number < line; ++number) {
    offset = bytes.find('\n', offset);
    if (offset == std::string_view::npos) return offset;
    ++offset;
  }
  return offset;
}

}  // namespace

std::size_t character_length(std::string_view bytes, std::size_t offset) {
  const auto byte = [&](std::size_t i) { return static_cast<unsigned char>(bytes[i]); };
  const unsigned char first = byte(offset);
  std::size_t length = 1;
  if (first >= 0xC2 && first <= 0xDF) length = 2;
  if (first >= 0xE0 && first <= 0xEF) length = 3;
  if (first >= 0xF0 && first <= 0xF4) length = 4;
  for (std::size_t i = 1; i < length; ++i) {
    if (!is_continuation(bytes, offset + i)) return 1;
  }
  // Overlong forms, surrogates and what lies beyond U+10FFFF.
  if (first == 0xE0 && byte(offset + 1) < 0xA0) return 1;
  if (first == 0xED && byte(offset + 1) > 0x9F) return 1;
  if (first == 0xF0 && byte(offset + 1) < 0x90) return 1;
  if (first == 0xF4 && byte(offset + 1) > 0x8F) return 1;
  return length;
}

std::size_t first_not_utf8(std::string_view bytes) {
  for (std::size_t offset = 0; offset < bytes.size();) {
    const std::size_t length = character_length(bytes, offset);
    if (length == 1 && static_cast<unsigned char>(bytes[offset]) >= 0x80) return offset;
    offset += length;
  }
  return std::string_view::npos;
}

std::size_t count_characters(std::string_view bytes) {
  std::size_t count = 0;
  for (std::size_t offset = 0; offset < bytes.size(); ++count) {
    offset += character_length(bytes, offset);
  }
  return count;
}

std::size_t offset_of(std::string_view bytes, std::size_t line, std::size_t column) {
  std::size_t offset = begin_of_line(bytes, line);
  if (offset == std::string_view::npos) return bytes.size();
  for (std::size_t number = 1; number < column && offset < bytes.size(); ++number) {
    if (bytes[offset] == '\n') break;
    offset += character_length(bytes, offset);
  }
  return std::min(offset, bytes.size());
}

std::string_view line_of(std::string_view bytes, std::size_t line) {
  const std::size_t begin = begin_of_line(bytes, line);
  if (line == 0 || begin == std::string_view::npos || begin >= bytes.size()) return {};
  const std::size_t end = std::min(bytes.find('\n', begin), bytes.size());
  std::string_view found = bytes.substr(begin, end - begin);
  if (found.ends_with('\r')) found.remove_suffix(1);
  return found;
}

}  // namespace gainsay::cli
