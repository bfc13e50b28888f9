#include "gainsay/cli/markup.h"

#include <array>
#include <charconv>

namespace gainsay::cli {
namespace {

bool forbidden(unsigned char c) {
  return (c < 0x20 && c != '\t' && c != '\n' && c != '\r') || c == 0x7f;
}

std::string opening(std::string_view name, Attributes attributes) {
  std::string tag = "<" + std::string(name);
  for (const auto& [key, value] : attributes) {
    tag += ' ';
    tag += key;
    tag += "=\"" + escaped(value) + '"';
  }
  return tag + '>';
}

}  // namespace

std::string escaped(std::string_view words) {
  std::string out;
  out.reserve(words.size());
  for (const char c : words) {
    switch (c) {
      case '&':
        out += "&amp;";
        break;
      case '<':
        out += "&lt;";
        break;
      case '>':
        out += "&gt;";
        break;
      case '"':
        out += "&quot;";
        break;
      case '\'':
        out += "&#39;";
        break;
      default:
        if (!forbidden(static_cast<unsigned char>(c))) out += c;
    }
  }
  return out;
}

Markup text(std::string_view words) { return Markup::raw(escaped(words)); }

Markup tag(std::string_view name, Attributes attributes, const Markup& content) {
  return Markup::raw(opening(name, attributes) + content.str() + "</" + std::string(name) + '>');
}

Markup tag(std::string_view name, const Markup& content) { return tag(name, {}, content); }

Markup void_tag(std::string_view name, Attributes attributes) {
  return Markup::raw(opening(name, attributes));
}

std::string json_for_script(std::string_view json) {
  std::string out;
  out.reserve(json.size());
  for (const char c : json) {
    if (c == '<') {
      out += "\\u003c";
    } else {
      out += c;
    }
  }
  return out;
}

std::string css_string(std::string_view words) {
  std::string out = "\"";
  for (const char c : words) {
    const auto byte = static_cast<unsigned char>(c);
    const bool plain = byte >= 0x80 || c == ' ' || (c >= '0' && c <= '9') ||
                       (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
    if (plain) {
      out += c;
    } else if (!forbidden(byte)) {
      std::array<char, 8> digits{};
      const auto end = std::to_chars(digits.data(), digits.data() + digits.size(), byte, 16).ptr;
      out += '\\' + std::string(digits.data(), end) + ' ';
    }
  }
  return out + '"';
}

}  // namespace gainsay::cli
