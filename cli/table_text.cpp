#include "gainsay/cli/table_text.h"

namespace gainsay::cli {
namespace {

bool begins_character(char byte) { return (static_cast<unsigned char>(byte) & 0xC0U) != 0x80U; }

}  // namespace

std::size_t columns(std::string_view text) {
  std::size_t count = 0;
  for (const char byte : text) count += begins_character(byte) ? 1 : 0;
  return count;
}

std::string cut(std::string_view text, std::size_t width) {
  if (columns(text) <= width) return std::string(text);
  if (width == 0) return {};
  std::size_t count = 0, end = 0;
  for (; end < text.size(); ++end) {
    if (begins_character(text[end]) && ++count == width) break;
  }
  return std::string(text.substr(0, end)) + "…";
}

std::string pad(std::string_view text, std::size_t width) {
  std::string padded = cut(text, width);
  padded.append(width - columns(padded), ' ');
  return padded;
}

std::string harmless(std::string_view text) {
  std::string clean(text);
  for (std::size_t i = 0; i < clean.size(); ++i) {
    const auto byte = static_cast<unsigned char>(clean[i]);
    const bool c1 =
        byte == 0xC2 && i + 1 < clean.size() && static_cast<unsigned char>(clean[i + 1]) < 0xA0;
    if (c1) clean.erase(i, 1);
    if (c1 || byte < 0x20 || byte == 0x7F) clean[i] = '?';
  }
  return clean;
}

std::string wrap(std::string_view text, std::size_t width, std::size_t indent) {
  std::string lines, line;
  const auto finish = [&] {
    if (!line.empty()) lines += std::string(indent, ' ') + line + "\n";
    line.clear();
  };
  for (std::size_t begin = 0; begin < text.size();) {
    const std::size_t end = std::min(text.find(' ', begin), text.size());
    const std::string_view piece = text.substr(begin, end - begin);
    if (!line.empty() && indent + columns(line) + 1 + columns(piece) > width) finish();
    if (!piece.empty()) line += (line.empty() ? "" : " ") + std::string(piece);
    begin = end + 1;
  }
  finish();
  return lines;
}

}  // namespace gainsay::cli
