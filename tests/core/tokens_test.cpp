#include "gainsay/core/tokens.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using ::testing::HasSubstr;

std::vector<std::string> words(std::string_view text) {
  const auto tokens = cut_into_tokens(text);
  std::vector<std::string> result;
  if (!tokens) return {tokens.failure().what};
  for (const Token& token : *tokens) result.emplace_back(token.text);
  return result;
}

Failure failure(std::string_view text) { return cut_into_tokens(text).failure(); }

TEST(Tokens, AreCutAtSignsAndBlanks) {
  EXPECT_THAT(words("k1*A_2 <=3"), ElementsAre("k1", "*", "A_2", "<=", "3", ""));
  EXPECT_THAT(words("a<b>=c==d!=e"),
              ElementsAre("a", "<", "b", ">=", "c", "==", "d", "!=", "e", ""));
  EXPECT_THAT(words(" \t\r\n"), ElementsAre(""));
}

TEST(Tokens, KnowTheirPlaces) {
  const auto tokens = cut_into_tokens("a + 12");
  ASSERT_TRUE(tokens);
  EXPECT_EQ((*tokens)[0].place, (Place{0, 1}));
  EXPECT_EQ((*tokens)[1].place, (Place{2, 1}));
  EXPECT_EQ((*tokens)[2].place, (Place{4, 2}));
  EXPECT_EQ((*tokens)[3].place, (Place{6, 0}));
  EXPECT_EQ((*tokens)[3].kind, TokenKind::End);
}

TEST(Tokens, ReadNumbersInEveryForm) {
  const std::vector<std::pair<std::string, double>> cases{
      {"3", 3.0},      {"3.", 3.0},      {".5", 0.5},        {"0.25", 0.25},
      {"1e3", 1000.0}, {"1E+3", 1000.0}, {"2.5e-3", 2.5e-3}, {"1e-310", 1e-310}};
  for (const auto& [text, value] : cases) {
    const auto tokens = cut_into_tokens(text);
    ASSERT_TRUE(tokens) << text;
    ASSERT_EQ(tokens->size(), 2U) << text;
    EXPECT_EQ(tokens->front().number, value) << text;
  }
}

TEST(Tokens, AnEWithoutDigitsIsTheBeginningOfAName) {
  EXPECT_THAT(words("2e"), ElementsAre("2", "e", ""));
  EXPECT_THAT(words("2e+x"), ElementsAre("2", "e", "+", "x", ""));
  EXPECT_THAT(words("1.2.3"), ElementsAre("1.2", ".3", ""));
}

TEST(Tokens, RefuseNumbersThatADoubleCannotHold) {
  EXPECT_EQ(
      failure("2 * 1e400"),
      (Failure{"number '1e400' is out of range", "0, or a size between about 1e-307 and 1e308",
               "state the quantity in a unit that suits its size", Place{4, 5}}));
  EXPECT_EQ(failure("1e-400").what, "number '1e-400' is out of range");
}

TEST(Tokens, ExplainTheSignsOfOtherNotations) {
  const std::vector<std::pair<std::string, std::string>> cases{{"**", "'a^b'"},
                                                               {"&&", "'a and b'"},
                                                               {"&", "'a and b'"},
                                                               {"||", "'a or b'"},
                                                               {"|", "'abs(x)'"},
                                                               {"!", "'not a'"},
                                                               {"=", "'a == b'"},
                                                               {"<>", "'a != b'"},
                                                               {"[", "'('"},
                                                               {"]", "')'"},
                                                               {"{", "'('"},
                                                               {"}", "')'"},
                                                               {"?", "'if(condition, a, b)'"},
                                                               {"%", "0.05"},
                                                               {"−", "'-'"},
                                                               {"–", "'-'"},
                                                               {"×", "'*'"},
                                                               {"·", "'*'"},
                                                               {"⋅", "'*'"},
                                                               {"÷", "'/'"},
                                                               {"≤", "'<='"},
                                                               {"≥", "'>='"},
                                                               {"≠", "'!='"},
                                                               {"²", "'x^2'"},
                                                               {"³", "'x^3'"},
                                                               {"√", "'sqrt(x)'"},
                                                               {"π", "'pi'"}};
  for (const auto& [sign, advice] : cases) {
    const Failure found = failure("a " + sign + " b");
    EXPECT_EQ(found.what, "unknown sign '" + sign + "'");
    EXPECT_EQ(found.place, (Place{2, sign.size()})) << sign;
    EXPECT_THAT(found.to_do, HasSubstr(advice)) << sign;
  }
}

TEST(Tokens, SayHowNamesAreSpelt) {
  const Failure found = failure("k_α * A");
  EXPECT_EQ(found.what, "unknown sign 'α'");
  EXPECT_EQ(found.place, (Place{2, 2}));
  EXPECT_THAT(found.to_do, HasSubstr("spell names with a-z, A-Z, digits and '_'"));
}

TEST(Tokens, ShowBytesThatAreNoText) {
  EXPECT_EQ(failure("a\x01").what, "unknown sign '0x01'");
  EXPECT_EQ(failure("a\xff").what, "unknown sign '0xff'");
  EXPECT_EQ(failure("\xce").what, "unknown sign '0xce'");      // a character cut short
  EXPECT_EQ(failure("\xc0\xaf").what, "unknown sign '0xc0'");  // overlong: no UTF-8
  EXPECT_EQ(failure("#").what, "unknown sign '#'");
  EXPECT_EQ(failure("#").to_do, "remove it");
}

TEST(IsName, ALetterThenLettersDigitsAndUnderscores) {
  for (const char* name : {"e", "E", "Km1", "k_cat", "a__b", "x_"}) EXPECT_TRUE(is_name(name));
  for (const char* name : {"", "1a", "_a", "a-b", "a b", "α", "a\n"}) EXPECT_FALSE(is_name(name));
}

}  // namespace
}  // namespace gainsay::core
