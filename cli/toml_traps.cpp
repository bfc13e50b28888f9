#include "gainsay/cli/toml_traps.h"

#include <algorithm>
#include <array>
#include <optional>
#include <string>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr std::string_view kPrefix = "Error while parsing ";
constexpr std::string_view kBlanks = " \t";

bool contains(std::string_view text, std::string_view part) {
  return text.find(part) != std::string_view::npos;
}

std::string_view trimmed(std::string_view text) {
  const std::size_t begin = text.find_first_not_of(kBlanks);
  if (begin == std::string_view::npos) return {};
  return text.substr(begin, text.find_last_not_of(kBlanks) - begin + 1);
}

// What stands before the first '=' of a line.
std::string_view key_part(std::string_view line) {
  return trimmed(line.substr(0, std::min(line.find('='), line.size())));
}

// The text between the first pair of single quotes in the parser's words.
std::string_view quoted(std::string_view description) {
  const std::size_t begin = description.find('\'');
  const std::size_t end = description.rfind('\'');
  if (begin == std::string_view::npos || end <= begin) return {};
  return description.substr(begin + 1, end - begin - 1);
}

std::optional<Message> inline_table(std::string_view description) {
  if (!contains(description, "inline table")) return std::nullopt;
  if (contains(description, "dangling comma")) {
    return Message{"a comma stands before the '}' of an inline table", "'}' after the last pair",
                   "remove the comma"};
  }
  if (!contains(description, "saw '\\n'") && !contains(description, "end-of-file")) {
    return std::nullopt;
  }
  return Message{"an inline table must end on the line on which it begins",
                 "'}' before the end of the line",
                 "put all of { ... } on one line, or give the table a header of its own, as "
                 "[reactions.name]"};
}

std::optional<Message> key_without_quotes(std::string_view line, std::string_view description) {
  const bool at_equals = contains(description, "key-value pair: expected '='");
  const bool at_begin = contains(description, "root table: expected keys");
  if (!at_equals && !at_begin) return std::nullopt;
  const std::string_view key = key_part(line);
  if (contains(key, ":") && !contains(line, "=")) {
    return Message{"a key is followed by ':'", "'=' between a key and its value", "write '='"};
  }
  if (key.empty() || !contains(line, "=")) {
    return Message{"this line is neither a key with its value nor a header",
                   "key = value, [header], [[header]] or # comment",
                   "complete the line, or begin it with '#'"};
  }
  return Message{"'" + std::string(key) + "' cannot be a key without quotes",
                 "letters a-z A-Z, digits, '_' and '-' in a key without quotes",
                 "put the key in quotes; a name for expressions has letters, digits and '_' alone, "
                 "and shown_as says what pages print"};
}

// `rest` is the line from the place of the error on.
std::optional<Message> value_without_quotes(std::string_view rest, std::string_view description) {
  const bool no_type = contains(description, "could not determine value type");
  const bool not_true = contains(description, "parsing boolean");
  if (!no_type && !not_true) return std::nullopt;
  if (rest.starts_with("\xE2\x80\x9C") || rest.starts_with("\xE2\x80\x9D")) {
    return Message{"a text stands in typographic quotes", "plain quotes: \"",
                   "replace the quotes by \""};
  }
  const std::string word(rest.substr(0, rest.find_first_of(" \t,]}#")));
  if (word == "True" || word == "False" || word == "TRUE" || word == "FALSE") {
    return Message{"'" + word + "' is no value", "true or false, in small letters",
                   "write it in small letters"};
  }
  return Message{"this value is neither a number nor a text in quotes",
                 "a number, true, false, \"text\", [list] or { table }",
                 "put a text or an expression in quotes: \"k1 * A\""};
}

std::optional<Message> more_behind_value(std::string_view line, std::string_view description) {
  if (!contains(description, "expected a comment or whitespace")) return std::nullopt;
  if (contains(description, "saw ','")) {
    return Message{"a comma stands behind the value", "the end of the line",
                   "write numbers with a point: 0.5; put a list in [ ]"};
  }
  if (std::count(line.begin(), line.end(), '=') > 1) {
    return Message{"more than one key stands on this line", "one key with its value on each line",
                   "begin a new line"};
  }
  return Message{"something stands behind the value", "the end of the line",
                 "put an expression in quotes: \"2 * k1\"; begin a comment with '#'"};
}

std::optional<Message> stands_twice(std::string_view description) {
  if (!contains(description, "cannot redefine")) return std::nullopt;
  const std::string name(quoted(description).substr(0, quoted(description).find('\'')));
  if (contains(description, "table header")) {
    return Message{"the header '" + name + "' stands twice", "each header once",
                   "gather under one header what belongs to it"};
  }
  const std::string which = name.empty() ? "this key" : "'" + name + "'";
  return Message{which + " is given twice", "each key once", "remove one of the two"};
}

std::optional<Message> number_form(std::string_view description) {
  const bool number = contains(description, "floating-point") || contains(description, "integer");
  if (!number || contains(description, "cannot redefine")) return std::nullopt;
  return Message{"this number is not written as TOML wants it",
                 "digits on both sides of a point, no zeros in front",
                 "write 0.5 for .5, 5.0 for 5. and 7 for 07"};
}

std::optional<Message> open_string(std::string_view rest, std::string_view description) {
  if (!contains(description, "parsing string")) return std::nullopt;
  if (contains(description, "escape sequence")) {
    return Message{"a backslash in \"...\" does not begin an escape that TOML has",
                   "\\n, \\t, \\\", \\\\ or \\u with four digits",
                   "write '...' with single quotes, which know no escapes"};
  }
  if (contains(description, "control characters") && !rest.empty()) {
    return Message{"a control character stands in a text", "characters that can be seen",
                   "remove it, or write it as \\u with four digits"};
  }
  return Message{"a text is not closed", "a closing quote on the same line",
                 "close the quote; a text over several lines stands between \"\"\" and \"\"\""};
}

std::optional<Message> open_bracket(std::string_view description) {
  const bool list = contains(description, "parsing array");
  const bool header =
      contains(description, "table header") && contains(description, "expected ']'");
  if (!list && !header) return std::nullopt;
  return Message{list ? "a list is not closed, or lacks a comma" : "a header is not closed",
                 list ? "',' or ']'" : "']'",
                 list ? "write it as [0.01, 10]" : "write it as [unknowns]"};
}

// The parser's own words, cut at "expected".
Message in_other_cases(std::string_view description) {
  std::string_view rest = description;
  if (rest.starts_with(kPrefix)) rest.remove_prefix(kPrefix.size());
  const std::size_t expected = rest.find("expected ");
  if (expected == std::string_view::npos) {
    return {"not TOML: " + std::string(rest), "TOML 1.0", "correct the line"};
  }
  const std::size_t saw = rest.rfind(", saw ");
  const bool has_saw = saw != std::string_view::npos && saw > expected;
  const std::string_view wanted =
      rest.substr(expected + 9, has_saw ? saw - expected - 9 : std::string_view::npos);
  const std::string seen = has_saw ? "'" + std::string(quoted(rest.substr(saw))) + "' in a " : "a ";
  const std::string_view part = rest.substr(0, rest.find(": expected"));
  return {"not TOML: " + seen + std::string(part), std::string(wanted), "correct the line"};
}

}  // namespace

Message explain_syntax_error(const Location& at, std::string_view description) {
  const std::string_view bytes = at.source ? std::string_view(at.source->bytes) : "";
  const std::string_view line = line_of(bytes, at.line);
  const std::string_view from_here = bytes.substr(offset_of(bytes, at.line, at.column));
  const std::string_view rest = from_here.substr(0, from_here.find_first_of("\r\n"));
  if (contains(description, "invalid utf-8")) {
    return {"the file is not UTF-8 here", "text in UTF-8", "save the file as UTF-8"};
  }
  for (std::optional<Message> message :
       {inline_table(description), key_without_quotes(line, description),
        value_without_quotes(rest, description), more_behind_value(line, description),
        stands_twice(description), number_form(description), open_string(rest, description),
        open_bracket(description)}) {
    if (message) return *std::move(message);
  }
  return in_other_cases(description);
}

}  // namespace gainsay::cli
