#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"
#include "gainsay/core/rate_laws.h"
#include "gainsay/testing/random_expressions.h"

#include <gtest/gtest.h>

#include <cstdint>
#include <map>
#include <set>
#include <string>
#include <vector>

namespace gainsay::core {
namespace {

using ::gainsay::testing::Dice;
using ::gainsay::testing::random_expression;
using ::gainsay::testing::Smoothness;

std::string mathml(std::string_view text) { return print_mathml(parse(text)->expression); }

/// What is wrong with a piece of MathML, or nothing: tags that do not match, elements that MathML
/// Core does not know, containers with the wrong number of children (W3C MathML Core, 3).
std::string fault(const std::string& markup) {
  static const std::set<std::string> kKnown{"mi",     "mn",    "mo",   "mtext", "mrow",
                                            "mfrac",  "msqrt", "msub", "msup",  "msubsup",
                                            "mtable", "mtr",   "mtd"};
  static const std::map<std::string, int> kChildren{
      {"mfrac", 2}, {"msub", 2}, {"msup", 2}, {"msubsup", 3}};
  std::vector<std::pair<std::string, int>> open{{"", 0}};
  for (std::size_t at = markup.find('<'); at != std::string::npos; at = markup.find('<', at + 1)) {
    const std::size_t end = markup.find('>', at);
    if (end == std::string::npos) return "a tag without an end";
    const std::string tag = markup.substr(at + 1, end - at - 1);
    if (tag.starts_with("/")) {
      const auto [name, children] = open.back();
      if (tag.substr(1) != name) return "<" + name + "> is closed by <" + tag + ">";
      if (kChildren.contains(name) && kChildren.at(name) != children) {
        return "<" + name + "> has " + std::to_string(children) + " children";
      }
      open.pop_back();
      continue;
    }
    const std::string name = tag.substr(0, tag.find(' '));
    if (!kKnown.contains(name)) return "<" + name + "> is not known";
    ++open.back().second;
    open.emplace_back(name, 0);
  }
  if (open.size() != 1) return "<" + open.back().first + "> is never closed";
  return open.front().second == 1 ? "" : "more than one element";
}

TEST(MathMlFault, IsFound) {
  EXPECT_EQ(fault("<mrow><mi>x</mi></mrow>"), "");
  EXPECT_EQ(fault("<mrow><mi>x</mrow></mi>"), "<mi> is closed by </mrow>");
  EXPECT_EQ(fault("<mfrac><mi>x</mi></mfrac>"), "<mfrac> has 1 children");
  EXPECT_EQ(fault("<mfenced><mi>x</mi></mfenced>"), "<mfenced> is not known");
  EXPECT_EQ(fault("<mi>x</mi><mi>y</mi>"), "more than one element");
  EXPECT_EQ(fault("<mrow><mi>x</mi>"), "<mrow> is never closed");
}

TEST(MathMlName, LettersWordsAndSubscripts) {
  EXPECT_EQ(mathml_name("k"), "<mi>k</mi>");
  EXPECT_EQ(mathml_name("k1"), "<msub><mi>k</mi><mn>1</mn></msub>");
  EXPECT_EQ(mathml_name("Km"), "<mi>Km</mi>");
  EXPECT_EQ(mathml_name("mu_max"), "<msub><mi>μ</mi><mi>max</mi></msub>");
  EXPECT_EQ(mathml_name("k_a_1"),
            "<msub><mi>k</mi><mrow><mi>a</mi><mo>,</mo><mn>1</mn></mrow></msub>");
}

TEST(MathMlName, ShowsHostileNamesAsText) {
  EXPECT_EQ(mathml_name("<script>alert('&\"')</script>"),
            "<mi>&lt;script&gt;alert(&#39;&amp;&quot;&#39;)&lt;/script&gt;</mi>");
}

TEST(PrintMathMl, Arithmetic) {
  EXPECT_EQ(mathml("k"), "<mi>k</mi>");
  EXPECT_EQ(mathml("a - b"), "<mrow><mi>a</mi><mo>&#x2212;</mo><mi>b</mi></mrow>");
  EXPECT_EQ(mathml("a / 2"), "<mrow><mfrac><mi>a</mi><mn>2</mn></mfrac></mrow>");
  EXPECT_EQ(mathml("x^2"), "<mrow><msup><mi>x</mi><mn>2</mn></msup></mrow>");
  EXPECT_EQ(mathml("k1^2"), "<mrow><msubsup><mi>k</mi><mn>1</mn><mn>2</mn></msubsup></mrow>");
  EXPECT_EQ(mathml("x * 2"), "<mrow><mi>x</mi><mo>&#x22C5;</mo><mn>2</mn></mrow>");
  EXPECT_EQ(mathml("a * b"),
            "<mrow><mi>a</mi><mo lspace=\"0\" rspace=\"0.17em\">&#x2062;</mo><mi>b</mi></mrow>");
  EXPECT_EQ(mathml("-a"), "<mrow><mrow><mo form=\"prefix\">&#x2212;</mo><mi>a</mi></mrow></mrow>");
}

TEST(PrintMathMl, FunctionsAndConstants) {
  EXPECT_EQ(mathml("sqrt(x)"), "<mrow><msqrt><mi>x</mi></msqrt></mrow>");
  EXPECT_EQ(
      mathml("exp(x)"),
      "<mrow><mi>exp</mi><mo>&#x2061;</mo><mrow><mo>(</mo><mi>x</mi><mo>)</mo></mrow></mrow>");
  EXPECT_EQ(mathml("pi"), "<mi>&#x3C0;</mi>");
  EXPECT_EQ(mathml("gas_constant"),
            "<mrow><msub><mi mathvariant=\"normal\">R</mi><mi>gas</mi></msub></mrow>");
}

TEST(PrintMathMl, EscapesSigns) {
  EXPECT_EQ(mathml("a < b"), "<mrow><mi>a</mi><mo>&lt;</mo><mi>b</mi></mrow>");
  EXPECT_EQ(mathml("a > b"), "<mrow><mi>a</mi><mo>&gt;</mo><mi>b</mi></mrow>");
}

TEST(PrintMathMl, Cases) {
  EXPECT_EQ(mathml("if(t < 5, a, b)"),
            "<mrow><mrow><mo>{</mo><mtable><mtr><mtd style=\"text-align:left\"><mi>a</mi></mtd>"
            "<mtd style=\"text-align:left\"><mtext>if&#xA0;</mtext><mi>t</mi><mo>&lt;</mo>"
            "<mn>5</mn></mtd></mtr><mtr><mtd style=\"text-align:left\"><mi>b</mi></mtd>"
            "<mtd style=\"text-align:left\"><mtext>otherwise</mtext></mtd></mtr></mtable></mrow>"
            "</mrow>");
}

TEST(PrintMathMl, IsWellFormedForEveryRateLaw) {
  for (const RateLaw& law : all_rate_laws()) EXPECT_EQ(fault(mathml(law.formula)), "") << law.name;
}

TEST(PrintMathMl, IsWellFormedForRandomExpressions) {
  constexpr std::uint64_t kSeed = 13;
  Dice dice(kSeed);
  for (int i = 0; i < 1000; ++i) {
    const Expression expression = random_expression(dice, 5, Smoothness::Any);
    EXPECT_EQ(fault(print_mathml(expression)), "") << print_text(expression);
  }
}

}  // namespace
}  // namespace gainsay::core
