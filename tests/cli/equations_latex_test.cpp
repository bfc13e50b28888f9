#include "gainsay/cli/equations.h"
#include "gainsay/testing/fed_batch.h"

#include <gmock/gmock.h>

#include <regex>

namespace gainsay::cli {
namespace {

using testing::fed_batch_form;
using ::testing::HasSubstr;
using ::testing::Not;

/// Braces opened and not closed, escaped ones aside; -1 if one was closed before it was opened.
int depth_at_end(const std::string& text) {
  int depth = 0;
  for (std::size_t i = 0; i < text.size(); ++i) {
    if (text[i] == '\\') {
      ++i;
      continue;
    }
    depth += text[i] == '{' ? 1 : text[i] == '}' ? -1 : 0;
    if (depth < 0) return -1;
  }
  return depth;
}

TEST(EquationsLatex, SetsDerivativesReactionsAndStarts) {
  const std::string text = equations_latex(fed_batch_form());
  EXPECT_THAT(text, HasSubstr("\\frac{\\mathrm{d}\\,S}{\\mathrm{d}\\,t} &= "));
  EXPECT_THAT(text, HasSubstr("&& 2 S \\rightarrow \\mathrm{R*}"));
  EXPECT_THAT(text, HasSubstr("&& \\mathrm{R*} \\rightleftharpoons 2 S"));
  EXPECT_THAT(text, HasSubstr("S(0) &= 4"));
  EXPECT_THAT(text, HasSubstr("\\Delta\\,S &= \\frac{10}{\\mathrm{tank}}"));
  EXPECT_THAT(text, HasSubstr("\\mathrm{glow}(t) &= "));
  EXPECT_THAT(text, HasSubstr("\\mathrm{R*}")) << "a species is shown as its author wants it";
}

TEST(EquationsLatex, WordsAreEscaped) {
  StateSpace form;
  form.letter = "A";
  form.title = "50 % {a_b} #1 & ~^\\ <$>";
  EXPECT_THAT(equations_latex(form),
              HasSubstr("50 \\% \\{a\\_b\\} \\#1 \\& "
                        "\\textasciitilde{}\\textasciicircum{}\\textbackslash{} "
                        "\\textless{}\\$\\textgreater{}"));
}

TEST(EquationsLatex, EnvironmentsAndBracesAreClosed) {
  const std::string text = equations_latex_document({fed_batch_form(), fed_batch_form()}, "T {");
  const auto count = [&](const std::string& pattern) {
    const std::regex expression(pattern);
    return std::distance(std::sregex_iterator(text.begin(), text.end(), expression), {});
  };
  EXPECT_EQ(count(R"(\\begin\{document\})"), 1);
  EXPECT_EQ(count(R"(\\begin\{)"), count(R"(\\end\{)"));
  EXPECT_EQ(depth_at_end(text), 0);
  EXPECT_EQ(count(R"(\\left[(\[|])"), count(R"(\\right[)\]|])"));
  EXPECT_THAT(text, Not(HasSubstr("T {}"))) << "the title's brace is escaped";
}

}  // namespace
}  // namespace gainsay::cli
