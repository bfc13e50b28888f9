#include "gainsay/cli/equations.h"
#include "gainsay/core/print.h"

#include <string>

namespace gainsay::cli {
namespace {

/// Words as LaTeX text.
std::string words_in_latex(std::string_view words) {
  std::string text;
  for (const char c : words) {
    switch (c) {
      case '\\':
        text += "\\textbackslash{}";
        break;
      case '^':
        text += "\\textasciicircum{}";
        break;
      case '~':
        text += "\\textasciitilde{}";
        break;
      case '<':
        text += "\\textless{}";
        break;
      case '>':
        text += "\\textgreater{}";
        break;
      case '#':
      case '$':
      case '%':
      case '&':
      case '_':
      case '{':
      case '}':
        text += std::string("\\") + c;
        break;
      default:
        text += c;
    }
  }
  return text;
}

class Setter {
 public:
  explicit Setter(const StateSpace& form) : form_(form) {}

  std::string name(std::string_view name) const {
    const auto shown = form_.shown_as.find(name);
    return core::latex_name(shown == form_.shown_as.end() ? name : std::string_view(shown->second));
  }

  std::string left(const Equation& equation) const {
    const std::string shown = name(equation.name);
    switch (equation.left) {
      case Equation::Left::Derivative:
        return "\\frac{\\mathrm{d}\\," + shown + "}{\\mathrm{d}\\,t}";
      case Equation::Left::Name:
        return shown;
      case Equation::Left::AtBeginning:
        return shown + (form_.begins_at_zero ? "(0)" : "(t_0)");
      case Equation::Left::Rise:
        return "\\Delta\\," + shown;
      case Equation::Left::OverTime:
        return shown + "(t)";
    }
    return shown;
  }

  std::string line(const Equation& equation) const {
    const auto shown = [this](std::string_view each) { return name(each); };
    std::string text = left(equation) + " &= " + core::print_latex(equation.right, shown);
    if (equation.turnover)
      text += " && " +
              equation_text(*equation.turnover,
                            equation.turnover->reversible ? "\\rightleftharpoons" : "\\rightarrow",
                            shown);
    if (!equation.words.empty())
      text += (equation.turnover ? "\\quad " : " && ") + in_text(equation.words);
    return text;
  }

 private:
  static std::string in_text(const std::string& words) {
    return "\\text{" + words_in_latex(words) + "}";
  }

  const StateSpace& form_;
};

}  // namespace

std::string equations_latex(const StateSpace& form) {
  const Setter setter(form);
  std::string text =
      "\\section*{" + words_in_latex(form.letter) + "\\quad " + words_in_latex(form.title) + "}\n";
  for (const auto& section : form.sections) {
    text += "\\subsection*{" + words_in_latex(section.title) + "}\n";
    if (!section.equations.empty()) {
      text += "\\begin{align*}\n";
      for (std::size_t i = 0; i < section.equations.size(); ++i)
        text += "  " + setter.line(section.equations[i]) +
                (i + 1 < section.equations.size() ? " \\\\[2pt]\n" : "\n");
      text += "\\end{align*}\n";
    }
    if (!section.quantities.empty()) {
      text += "\\begin{itemize}\n";
      for (const auto& quantity : section.quantities)
        text += "  \\item $" + setter.name(quantity.name) + "$: " + words_in_latex(quantity.words) +
                "\n";
      text += "\\end{itemize}\n";
    }
  }
  return text;
}

std::string equations_latex_document(const std::vector<StateSpace>& forms,
                                     std::string_view study_title) {
  std::string text =
      "\\documentclass[fleqn]{article}\n"
      "\\usepackage[utf8]{inputenc}\n"
      "\\usepackage[T1]{fontenc}\n"
      "\\usepackage[margin=25mm]{geometry}\n"
      "\\usepackage{amsmath}\n"
      "\\allowdisplaybreaks\n"
      "\\title{" +
      words_in_latex(study_title) +
      "}\n\\author{}\n\\date{}\n"
      "\\begin{document}\n"
      "\\maketitle\n";
  for (const auto& form : forms) text += "\n" + equations_latex(form);
  return text + "\n\\end{document}\n";
}

}  // namespace gainsay::cli
