#include "gainsay/cli/equations.h"
#include "gainsay/core/print.h"

#include <string>

namespace gainsay::cli {
namespace {

std::string element(std::string_view tag, const std::string& content) {
  return "<" + std::string(tag) + ">" + content + "</" + std::string(tag) + ">";
}

/// The d of a derivative, upright as ISO 80000-2 sets it.
const std::string kDifferential = "<mi mathvariant=\"normal\">d</mi><mspace width=\"0.12em\"/>";

std::string argument(const std::string& inside) {
  return "<mo>&#x2061;</mo>" + element("mrow", "<mo stretchy=\"false\">(</mo>" + inside +
                                                   "<mo stretchy=\"false\">)</mo>");
}

Markup math(const std::string& content) {
  return Markup::raw("<math displaystyle=\"true\">" + element("mrow", content) + "</math>");
}

class Setter {
 public:
  explicit Setter(const StateSpace& form) : form_(form) {}

  std::string name(std::string_view name) const {
    const auto shown = form_.shown_as.find(name);
    return core::mathml_name(shown == form_.shown_as.end() ? name
                                                           : std::string_view(shown->second));
  }

  Markup line(const Equation& equation) const {
    const auto shown = [this](std::string_view each) { return name(each); };
    Markup line = tag("span", {{"class", "left"}}, math(left(equation)));
    line += tag("span", {{"class", "right"}},
                math("<mo>=</mo>" + core::print_mathml(equation.right, shown)));
    const std::string words = words_beside(equation);
    if (!words.empty()) line += tag("span", {{"class", "words"}}, text(words));
    return tag("div", {{"class", "equation"}}, line);
  }

  Markup line(const Quantity& quantity) const {
    return tag("div", {{"class", "equation"}},
               tag("span", {{"class", "left"}}, math(name(quantity.name))) +
                   tag("span", {{"class", "right"}}, text(quantity.words)));
  }

 private:
  std::string words_beside(const Equation& equation) const {
    if (!equation.turnover) return equation.words;
    const auto as_shown = [this](std::string_view name) {
      const auto shown = form_.shown_as.find(name);
      return shown == form_.shown_as.end() ? std::string(name) : shown->second;
    };
    const std::string words =
        equation_text(*equation.turnover, equation.turnover->reversible ? "⇌" : "→", as_shown);
    return equation.words.empty() ? words : words + "; " + equation.words;
  }

  std::string left(const Equation& equation) const {
    const std::string shown = name(equation.name);
    switch (equation.left) {
      case Equation::Left::Derivative:
        return element("mfrac", element("mrow", kDifferential + shown) +
                                    "<mrow><mi mathvariant=\"normal\">d</mi><mi>t</mi></mrow>");
      case Equation::Left::Name:
        return shown;
      case Equation::Left::AtBeginning:
        return shown +
               argument(form_.begins_at_zero ? "<mn>0</mn>" : "<msub><mi>t</mi><mn>0</mn></msub>");
      case Equation::Left::Rise:
        return "<mi mathvariant=\"normal\">&#x394;</mi>" + shown;
      case Equation::Left::OverTime:
        return shown + argument("<mi>t</mi>");
    }
    return shown;
  }

  const StateSpace& form_;
};

constexpr std::string_view kPageCss =
    ":root{color-scheme:light dark}"
    "body{max-width:60rem;margin:2rem auto;padding:0 1rem;"
    "font:16px/1.5 'Palatino Linotype',Palatino,P052,Georgia,serif}"
    "h1,h2,h4{font-weight:normal}h2{margin-top:3rem;border-top:1px solid}"
    "@media print{body{font-size:10.5pt;margin:0}h2,h4{break-after:avoid}}";

}  // namespace

Markup equations_html(const StateSpace& form) {
  const Setter setter(form);
  Markup content;
  for (const auto& section : form.sections) {
    content += tag("h4", text(section.title));
    for (const auto& equation : section.equations) content += setter.line(equation);
    for (const auto& quantity : section.quantities) content += setter.line(quantity);
  }
  return tag("section", {{"class", "equations"}}, content);
}

std::string_view equations_css() {
  // The left sides share one width so that the signs stand below each other; a table would do the
  // same on fewer engines.
  return ".equations h4{margin:1.2em 0 .3em;font-style:italic}"
         ".equations .equation{margin:.35em 0;overflow-x:auto;overflow-y:hidden;break-inside:avoid}"
         ".equations .left{display:inline-block;min-width:9.5em;margin-right:.4em}"
         ".equations .words{margin-left:1.6em;opacity:.75;font-size:.9em}";
}

std::string equations_html_page(const std::vector<StateSpace>& forms,
                                std::string_view study_title) {
  Markup body = tag("h1", text(study_title));
  for (const auto& form : forms)
    body += tag("h2", text(form.letter + "  " + form.title)) + equations_html(form);
  const Markup head =
      void_tag("meta", {{"charset", "utf-8"}}) +
      void_tag("meta", {{"name", "viewport"}, {"content", "width=device-width"}}) +
      tag("title", text(study_title)) +
      tag("style", Markup::raw(std::string(kPageCss) + std::string(equations_css())));
  return "<!doctype html>\n" +
         tag("html", {{"lang", "en"}}, tag("head", head) + tag("body", body)).str() + "\n";
}

}  // namespace gainsay::cli
