#include "gainsay/cli/equations.h"
#include "gainsay/core/print.h"

#include <algorithm>
#include <string>

namespace gainsay::cli {
namespace {

constexpr std::size_t kWidth = 100;
constexpr std::size_t kWidestLeft = 28;

/// A line of a section in three columns.
struct Line {
  std::string left;
  std::string right;
  std::string words;
};

std::string left_of(const Equation& equation, bool begins_at_zero) {
  switch (equation.left) {
    case Equation::Left::Derivative:
      return "d " + equation.name + " / dt";
    case Equation::Left::Name:
      return equation.name;
    case Equation::Left::AtBeginning:
      return equation.name + (begins_at_zero ? "(0)" : "(t0)");
    case Equation::Left::Rise:
      return "rise of " + equation.name;
    case Equation::Left::OverTime:
      return equation.name + "(t)";
  }
  return equation.name;
}

std::string words_beside(const Equation& equation) {
  if (!equation.turnover) return equation.words;
  const auto as_written = [](std::string_view name) { return std::string(name); };
  const std::string turnover =
      equation_text(*equation.turnover, equation.turnover->reversible ? "<->" : "->", as_written);
  return equation.words.empty() ? turnover : turnover + "; " + equation.words;
}

std::vector<Line> lines_of(const EquationSection& section, bool begins_at_zero) {
  std::vector<Line> lines;
  for (const auto& equation : section.equations)
    lines.push_back({left_of(equation, begins_at_zero), "= " + core::print_text(equation.right),
                     words_beside(equation)});
  for (const auto& quantity : section.quantities)
    lines.push_back({quantity.name, quantity.words, ""});
  return lines;
}

/// Words stand behind the equation where there is room, else on a line of their own.
std::string set(const Line& line, std::size_t left_width) {
  const std::string margin = "  ";
  const std::size_t padding = line.left.size() < left_width ? left_width - line.left.size() : 0;
  std::string text = margin + line.left + std::string(padding, ' ') + " " + line.right;
  if (!line.words.empty()) {
    const std::string words = "(" + line.words + ")";
    const bool fits = text.size() + 3 + words.size() <= kWidth;
    text += fits ? "   " + words : "\n" + margin + std::string(left_width + 3, ' ') + words;
  }
  return text + "\n";
}

}  // namespace

std::string equations_text(const StateSpace& form) {
  const std::string heading = form.letter + "  " + form.title;
  std::string text = heading + "\n" + std::string(heading.size(), '=') + "\n";
  for (const auto& section : form.sections) {
    const std::vector<Line> lines = lines_of(section, form.begins_at_zero);
    std::size_t left_width = 0;
    for (const auto& line : lines)
      left_width = std::max(left_width, std::min(line.left.size(), kWidestLeft));
    text += "\n" + section.title + "\n";
    for (const auto& line : lines) text += set(line, left_width);
  }
  return text;
}

}  // namespace gainsay::cli
