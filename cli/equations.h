#pragma once

#include "gainsay/cli/markup.h"
#include "gainsay/cli/reaction_equation.h"
#include "gainsay/cli/study.h"
#include "gainsay/core/expression.h"
#include "gainsay/estimation/problem.h"

#include <cstddef>
#include <map>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// One line `left = right` of the state-space form, and words beside it.
struct Equation {
  enum class Left {
    Derivative,   ///< d name / dt
    Name,         ///< name
    AtBeginning,  ///< name(t0)
    Rise,         ///< the jump of a state
    OverTime      ///< name(t)
  };
  Left left = Left::Name;
  std::string name;
  core::Expression right;                    ///< as written by the author; names stay names
  std::optional<ReactionEquation> turnover;  ///< of a reaction
  std::string words;
};

/// An unknown, known or input, and what is said of it: "0.01 to 100 mmol/L".
struct Quantity {
  std::string name;
  std::string words;
};

/// Equations or quantities of one sort; sections without any are left out.
struct EquationSection {
  std::string title;
  std::vector<Equation> equations;
  std::vector<Quantity> quantities;
};

/// A hypothesis as what is computed from it, for people. Methods (1)-(6):
///   dx/dt = sum of reactions by name,   each reaction's rate or flow,   x(t0),   jumps,
///   readout(t) = scale * shown + offset,   and the unknowns by kind.
struct StateSpace {
  std::string letter;
  std::string title;
  std::vector<EquationSection> sections;
  bool begins_at_zero = true;                                ///< every experiment does: x(0)
  std::map<std::string, std::string, std::less<>> shown_as;  ///< of species
};

/// `problem` is the hypothesis put together with the study's experiments; its unknowns are listed.
StateSpace state_space(const Study& study, std::size_t hypothesis,
                       const estimation::Problem& problem);

/// For a terminal.
std::string equations_text(const StateSpace& form);

/// A part of a LaTeX document (amsmath), from \section* on.
std::string equations_latex(const StateSpace& form);
/// A whole document that compiles.
std::string equations_latex_document(const std::vector<StateSpace>& forms,
                                     std::string_view study_title);

/// A part of a page: a <section class="equations"> with MathML Core, no heading of its own for the
/// hypothesis, each sort of equations under an <h4>.
Markup equations_html(const StateSpace& form);
/// The rules of style that the part needs; colours and type are the page's.
std::string_view equations_css();
/// A whole page.
std::string equations_html_page(const std::vector<StateSpace>& forms, std::string_view study_title);

}  // namespace gainsay::cli
