#pragma once

#include <cstddef>
#include <memory>
#include <string>
#include <string_view>

namespace gainsay::cli {

/// One file of a study as it was read: its name, relative to the study and with '/', and its bytes.
struct SourceText {
  std::string name;
  std::string bytes;
};

/// A place in a file. Lines and columns count from 1, columns in characters; line 0 means the whole
/// file.
struct Location {
  std::shared_ptr<const SourceText> source;
  std::size_t line = 0;
  std::size_t column = 0;

  /// Name of the file; empty without one.
  std::string file() const { return source ? source->name : std::string(); }
};

/// The whole of a file.
inline Location whole(std::shared_ptr<const SourceText> source) {
  return {std::move(source), 0, 0};
}

/// Bytes of the character that begins at `offset`, 1 where the bytes are not UTF-8 (RFC 3629).
std::size_t character_length(std::string_view bytes, std::size_t offset);

/// Offset of the first byte that is not UTF-8, or npos.
std::size_t first_not_utf8(std::string_view bytes);

/// Number of characters in UTF-8 text.
std::size_t count_characters(std::string_view bytes);

/// Offset in bytes of a line and column, at most the size of the text.
std::size_t offset_of(std::string_view bytes, std::size_t line, std::size_t column);

/// The line (without its end) that holds this number, or empty.
std::string_view line_of(std::string_view bytes, std::size_t line);

}  // namespace gainsay::cli
