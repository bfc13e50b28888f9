#pragma once

#include <initializer_list>
#include <string>
#include <string_view>
#include <utility>

namespace gainsay::cli {

/// Finished HTML, SVG or MathML. Names and words of a study get in through `text` or as the value
/// of an attribute, both escaped; there is no other way but `raw`, which is for text of our own.
class Markup {
 public:
  Markup() = default;
  static Markup raw(std::string_view finished) { return Markup(std::string(finished)); }
  const std::string& str() const { return finished_; }
  bool empty() const { return finished_.empty(); }
  Markup& operator+=(const Markup& more) {
    finished_ += more.finished_;
    return *this;
  }
  friend Markup operator+(Markup a, const Markup& b) { return a += b; }

 private:
  explicit Markup(std::string finished) : finished_(std::move(finished)) {}
  std::string finished_;
};

using Attribute = std::pair<std::string_view, std::string>;
using Attributes = std::initializer_list<Attribute>;

/// `&`, `<`, `>`, `"` and `'` written as references, control characters that HTML forbids left out.
std::string escaped(std::string_view words);

/// Words as the content of an element.
Markup text(std::string_view words);

/// `<name attributes>content</name>`.
Markup tag(std::string_view name, Attributes attributes, const Markup& content);
Markup tag(std::string_view name, const Markup& content);

/// An element of HTML without content (`<input>`, `<meta>`): no end tag.
Markup void_tag(std::string_view name, Attributes attributes);

/// JSON as it may stand inside <script>: every `<` as \u003c, so that no tag can begin or end
/// there.
std::string json_for_script(std::string_view json);

/// A CSS string with its quotes; whatever is no letter, digit or blank is written as an escape.
std::string css_string(std::string_view words);

}  // namespace gainsay::cli
