#include "gainsay/cli/reaction_equation.h"

#include "gainsay/core/print.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <optional>
#include <utility>

namespace gainsay::cli {

namespace {

struct Arrow {
  std::string_view sign;
  bool reversible;
};

// The longer sign first where one holds the other.
constexpr std::array kArrows = {Arrow{"<->", true}, Arrow{"\xE2\x87\x8C", true}, Arrow{"->", false},
                                Arrow{"\xE2\x86\x92", false}};
constexpr std::array<std::string_view, 8> kOtherArrows = {
    "<=>", "=>", "<-", "\xE2\x86\x94", "\xE2\x86\x90", "\xE2\x87\x84", "\xE2\x87\x92", "="};
constexpr std::string_view kArrowWords = "'->', '→', '<->' or '⇌'";

bool is_blank(char c) { return c == ' ' || c == '\t' || c == '\n' || c == '\r'; }
bool is_digit(char c) { return c >= '0' && c <= '9'; }
bool is_letter(char c) { return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z'); }

struct FoundArrow {
  std::size_t begin = std::string_view::npos;
  std::size_t end = 0;
  bool reversible = false;
};

FoundArrow find_arrow(std::string_view text) {
  FoundArrow found;
  for (const Arrow& arrow : kArrows) {
    const std::size_t at = text.find(arrow.sign);
    if (at < found.begin) found = {at, at + arrow.sign.size(), arrow.reversible};
  }
  return found;
}

// One side, read from left to right.
class SideReader {
 public:
  SideReader(std::string_view text, std::size_t begin, std::size_t end)
      : text_(text.substr(0, end)), at_(begin) {}

  core::Result<std::vector<EquationPart>> read() {
    std::vector<EquationPart> parts;
    skip_blanks();
    if (at_ == text_.size()) return parts;
    while (true) {
      auto part = read_part();
      if (!part) return part.failure();
      add(parts, *std::move(part));
      skip_blanks();
      if (at_ == text_.size()) return parts;
      if (text_[at_] != '+') {
        return fail(at_, "a sign is missing before '" + word_at(at_) + "' in the equation",
                    "'+', an arrow or the end", "join the parts of a side by '+'");
      }
      ++at_;
      skip_blanks();
    }
  }

 private:
  static void add(std::vector<EquationPart>& parts, EquationPart part) {
    const auto same = std::find_if(parts.begin(), parts.end(), [&](const EquationPart& known) {
      return known.species == part.species;
    });
    if (same == parts.end()) return parts.push_back(std::move(part));
    same->coefficient += part.coefficient;
  }

  core::Result<EquationPart> read_part() {
    const std::size_t begin = at_;
    EquationPart part;
    if (at_ < text_.size() && (is_digit(text_[at_]) || text_[at_] == '.')) {
      const auto coefficient = read_coefficient();
      if (!coefficient) return coefficient.failure();
      part.coefficient = *coefficient;
      skip_blanks();
    }
    if (at_ < text_.size() && text_[at_] == '*') {
      ++at_;
      skip_blanks();
    }
    if (at_ == text_.size()) {
      return fail(begin, "a part of the equation lacks its species", "the name of a species",
                  "complete the equation; an empty side is left empty");
    }
    if (!is_letter(text_[at_])) {
      return fail(at_, "'" + word_at(at_) + "' cannot stand in an equation",
                  "a positive coefficient or the name of a species",
                  "correct the equation, as in \"2 A + B -> C\"");
    }
    const std::size_t name = at_;
    while (at_ < text_.size() &&
           (is_letter(text_[at_]) || is_digit(text_[at_]) || text_[at_] == '_'))
      ++at_;
    part.species = std::string(text_.substr(name, at_ - name));
    part.place = {name, at_ - name};
    return part;
  }

  core::Result<double> read_coefficient() {
    const std::size_t begin = at_;
    while (at_ < text_.size() && (is_digit(text_[at_]) || text_[at_] == '.')) ++at_;
    double value = 0.0;
    const char* end = text_.data() + at_;
    const auto read = std::from_chars(text_.data() + begin, end, value, std::chars_format::fixed);
    if (read.ec != std::errc() || read.ptr != end || !std::isfinite(value) || value <= 0.0) {
      return fail(begin,
                  "'" + std::string(text_.substr(begin, at_ - begin)) + "' is no coefficient",
                  "a positive number, as 2 or 0.5", "correct it; an empty side is left empty");
    }
    return value;
  }

  core::Failure fail(std::size_t at, std::string what, std::string expected,
                     std::string to_do) const {
    return {std::move(what), std::move(expected), std::move(to_do), core::Place{at, 1}};
  }

  std::string word_at(std::size_t at) const {
    std::size_t end = at;
    while (end < text_.size() && !is_blank(text_[end]) && text_[end] != '+') ++end;
    return std::string(text_.substr(at, std::max<std::size_t>(end - at, 1)));
  }

  void skip_blanks() {
    while (at_ < text_.size() && is_blank(text_[at_])) ++at_;
  }

  std::string_view text_;
  std::size_t at_;
};

core::Failure without_arrow(std::string_view text) {
  core::Failure failure{
      "the equation has no arrow", std::string(kArrowWords) + " between its sides",
      "write it as \"A -> B\"; an empty side is the outside", core::Place{0, text.size()}};
  for (const std::string_view sign : kOtherArrows) {
    const std::size_t at = text.find(sign);
    if (at == std::string_view::npos) continue;
    failure.what = "'" + std::string(sign) + "' is no arrow of an equation";
    failure.expected = kArrowWords;
    failure.to_do = "write '->' for one direction, '<->' for both";
    failure.place = core::Place{at, sign.size()};
    break;
  }
  return failure;
}

std::vector<EquationPart> parts_of(const std::vector<core::Term>& terms,
                                   const core::Hypothesis& hypothesis) {
  std::vector<EquationPart> parts;
  for (const core::Term& term : terms)
    parts.push_back({term.coefficient, hypothesis.species[term.species].name, {}});
  return parts;
}

std::string side_text(const std::vector<EquationPart>& side,
                      const std::function<std::string(std::string_view)>& shown) {
  std::string text;
  for (const EquationPart& part : side) {
    if (!text.empty()) text += " + ";
    if (part.coefficient != 1.0) text += core::print_number(part.coefficient) + " ";
    text += shown(part.species);
  }
  return text;
}

}  // namespace

core::Result<ReactionEquation> read_equation(std::string_view text) {
  const FoundArrow arrow = find_arrow(text);
  if (arrow.begin == std::string_view::npos) return without_arrow(text);
  const FoundArrow second = find_arrow(text.substr(arrow.end));
  if (second.begin != std::string_view::npos) {
    return core::Failure{"the equation has two arrows", "one arrow between two sides",
                         "write one reaction for each step",
                         core::Place{arrow.end + second.begin, second.end - second.begin}};
  }
  auto left = SideReader(text, 0, arrow.begin).read();
  if (!left) return left.failure();
  auto right = SideReader(text, arrow.end, text.size()).read();
  if (!right) return right.failure();
  if (left->empty() && right->empty()) {
    return core::Failure{"the equation names no species", "a species on at least one side",
                         "write it as \"A -> B\"", core::Place{0, text.size()}};
  }
  return ReactionEquation{*std::move(left), *std::move(right), arrow.reversible};
}

core::Expression mass_action_side(const std::vector<EquationPart>& side) {
  core::Expression product = 1.0;
  for (std::size_t i = 0; i < side.size(); ++i) {
    core::Expression factor = core::Expression::symbol(side[i].species);
    if (side[i].coefficient != 1.0) factor = pow(factor, side[i].coefficient);
    product = i == 0 ? factor : product * factor;
  }
  return product;
}

ReactionEquation equation_of(const core::Reaction& reaction, const core::Hypothesis& hypothesis) {
  return {parts_of(reaction.reactants, hypothesis), parts_of(reaction.products, hypothesis),
          reaction.reversible};
}

std::string equation_text(const ReactionEquation& equation, std::string_view arrow,
                          const std::function<std::string(std::string_view)>& shown) {
  const std::string from = side_text(equation.left, shown);
  const std::string to = side_text(equation.right, shown);
  return from + (from.empty() ? "" : " ") + std::string(arrow) + (to.empty() ? "" : " ") + to;
}

std::string equation_text(const core::Reaction& reaction, const core::Hypothesis& hypothesis) {
  return equation_text(equation_of(reaction, hypothesis), reaction.reversible ? "<->" : "->",
                       [](std::string_view name) { return std::string(name); });
}

}  // namespace gainsay::cli
