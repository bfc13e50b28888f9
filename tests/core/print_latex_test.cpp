#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

std::string latex(std::string_view text) { return print_latex(parse(text)->expression); }

TEST(LatexName, LettersInItalicsWordsUprightSubscriptsBelow) {
  EXPECT_EQ(latex_name("k"), "k");
  EXPECT_EQ(latex_name("k1"), "k_{1}");
  EXPECT_EQ(latex_name("Km"), "\\mathrm{Km}");
  EXPECT_EQ(latex_name("k_cat1"), "k_{\\mathrm{cat1}}");
  EXPECT_EQ(latex_name("mu_max_2"), "\\mu_{\\mathrm{max},2}");
  EXPECT_EQ(latex_name("k_alpha"), "k_{\\alpha}");
}

TEST(LatexName, EscapesWhatLatexReserves) {
  EXPECT_EQ(latex_name("k__1"), "\\mathrm{k\\_\\_1}");
  EXPECT_EQ(latex_name("50 % {a} $b$ #1 & c"), "\\mathrm{50 \\% \\{a\\} \\$b\\$ \\#1 \\& c}");
  EXPECT_EQ(latex_name("a\\b^c~d"), "\\mathrm{a\\backslash{}b\\wedge{}c\\sim{}d}");
}

// Commands: Mittelbach and Goossens (2004), The LaTeX Companion, chapter 8.
TEST(PrintLatex, Arithmetic) {
  EXPECT_EQ(latex("Vmax * S / (Km + S)"), "\\frac{\\mathrm{Vmax} \\, S}{\\mathrm{Km} + S}");
  EXPECT_EQ(latex("k * (S - P)"), "k \\cdot \\left(S - P\\right)");
  EXPECT_EQ(latex("-x^2"), "-x^{2}");
  EXPECT_EQ(latex("k1^2"), "k_{1}^{2}");
  EXPECT_EQ(latex("2^x^y"), "2^{x^{y}}");
  EXPECT_EQ(latex("1e-7 * pi"), "10^{-7} \\, \\pi");
  EXPECT_EQ(latex("gas_constant"), "R_{\\mathrm{gas}}");
}

TEST(PrintLatex, Functions) {
  EXPECT_EQ(latex("exp(x)"), "\\exp\\left(x\\right)");
  EXPECT_EQ(latex("ln(x)"), "\\ln\\left(x\\right)");
  EXPECT_EQ(latex("log10(x)"), "\\log_{10}\\left(x\\right)");
  EXPECT_EQ(latex("sin(x) + cos(x) + tan(x) + tanh(x)"),
            "\\sin\\left(x\\right) + \\cos\\left(x\\right) + \\tan\\left(x\\right) + "
            "\\tanh\\left(x\\right)");
  EXPECT_EQ(latex("min(a, b, c)"), "\\min\\left(a, b, c\\right)");
  EXPECT_EQ(latex("max(a, b)"), "\\max\\left(a, b\\right)");
  EXPECT_EQ(latex("sqrt(abs(x))"), "\\sqrt{\\left|x\\right|}");
}

TEST(PrintLatex, ComparisonsLogicAndCases) {
  EXPECT_EQ(latex("a < b"), "a < b");
  EXPECT_EQ(latex("a <= b"), "a \\le b");
  EXPECT_EQ(latex("a > b"), "a > b");
  EXPECT_EQ(latex("a >= b"), "a \\ge b");
  EXPECT_EQ(latex("a == b"), "a = b");
  EXPECT_EQ(latex("a != b"), "a \\ne b");
  EXPECT_EQ(latex("a and b"), "a \\;\\text{and}\\; b");
  EXPECT_EQ(latex("a or not b"), "a \\;\\text{or}\\; \\text{not}\\; b");
  EXPECT_EQ(latex("(t >= 5) * k"), "\\left[t \\ge 5\\right] \\, k");
  EXPECT_EQ(latex("if(t < 5, a, b)"),
            "\\begin{cases} a & \\text{if}\\; t < 5 \\\\ b & \\text{otherwise} \\end{cases}");
}

TEST(PrintLatex, NamesAsTheCallerShowsThem) {
  const NameShown starred = [](std::string_view name) { return std::string(name) + "^{*}"; };
  EXPECT_EQ(print_latex(parse("R^2")->expression, starred), "{R^{*}}^{2}");
}

}  // namespace
}  // namespace gainsay::core
