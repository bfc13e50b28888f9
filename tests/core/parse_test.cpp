#include "gainsay/core/parse.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/random_expressions.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <map>
#include <string>

namespace gainsay::core {
namespace {

using ::gainsay::testing::Dice;
using ::gainsay::testing::random_expression;
using ::gainsay::testing::Smoothness;
using ::testing::ElementsAre;
using ::testing::HasSubstr;
using ::testing::IsEmpty;

double value_of(std::string_view text,
                const std::map<std::string, double, std::less<>>& values = {}) {
  const Result<Parsed> parsed = parse(text);
  if (!parsed) {
    ADD_FAILURE() << text << ": " << parsed.failure().what;
    return 0.0;
  }
  return evaluate(parsed->expression, values);
}

Failure failure(std::string_view text) {
  const Result<Parsed> parsed = parse(text);
  if (!parsed) return parsed.failure();
  ADD_FAILURE() << text << " is taken for " << print_text(parsed->expression);
  return {};
}

std::vector<std::string> names(std::string_view text) {
  std::vector<std::string> result;
  const Result<Parsed> parsed = parse(text);
  for (const NamedPlace& name : parsed->names) result.push_back(name.name);
  return result;
}

TEST(Parse, SignsBindAsInOrdinaryMathematics) {
  EXPECT_EQ(value_of("1 + 2 * 3"), 7.0);
  EXPECT_EQ(value_of("(1 + 2) * 3"), 9.0);
  EXPECT_EQ(value_of("8 - 4 - 2"), 2.0);
  EXPECT_EQ(value_of("8 / 4 / 2"), 1.0);
  EXPECT_EQ(value_of("2 * -3 + +1"), -5.0);
  EXPECT_EQ(value_of("2 - -3"), 5.0);
}

TEST(Parse, APowerBindsToTheRightAndBeforeAMinusOnItsLeft) {
  EXPECT_EQ(value_of("2 ^ 3 ^ 2"), 512.0);
  EXPECT_EQ(value_of("-x^2", {{"x", 3.0}}), -9.0);
  EXPECT_EQ(value_of("-2^2"), -4.0);
  EXPECT_EQ(value_of("(-2)^2"), 4.0);
  EXPECT_EQ(value_of("2^-1"), 0.5);
  EXPECT_EQ(value_of("2^-1 * 3"), 1.5);
  EXPECT_EQ(value_of("2^-x^2", {{"x", 2.0}}), 0.0625);
  EXPECT_EQ(value_of("+x^2", {{"x", 3.0}}), 9.0);
}

TEST(Parse, ComparisonsAndLogic) {
  EXPECT_EQ(value_of("1 + 1 < 3 and 2 * 2 == 4"), 1.0);
  EXPECT_EQ(value_of("not 1 < 2 or 3 != 3"), 0.0);
  EXPECT_EQ(value_of("not not 3"), 1.0);
  EXPECT_EQ(value_of("1 or 0 and 0"), 1.0);
  EXPECT_EQ(value_of("(1 or 0) and 0"), 0.0);
  EXPECT_EQ(value_of("(3 > 2) * 5"), 5.0);
  EXPECT_EQ(value_of("if(2 >= 2, 7, 8)"), 7.0);
}

TEST(Parse, Functions) {
  EXPECT_EQ(value_of("exp(0) + ln(1) + log10(100) + sqrt(4) + abs(-3)"), 8.0);
  EXPECT_EQ(value_of("sin(0) + cos(0) + tan(0) + tanh(0)"), 1.0);
  EXPECT_EQ(value_of("min(3, 1, 2)"), 1.0);
  EXPECT_EQ(value_of("max(3, 1, 2, 5)"), 5.0);
  EXPECT_EQ(value_of("exp (0)"), 1.0);
}

TEST(Parse, KeepsTheFormThatWasWritten) {
  EXPECT_EQ(print_text(parse("0 + 1 * x + x / 1 - 2 / 4")->expression),
            "0 + 1 * x + x / 1 - 2 / 4");
}

TEST(Parse, ListsNamesWithTheirPlaces) {
  const Result<Parsed> parsed = parse("k * A + t * pi - k");
  ASSERT_TRUE(parsed);
  ASSERT_EQ(parsed->names.size(), 3U);
  EXPECT_EQ(parsed->names[0].name, "k");
  EXPECT_EQ(parsed->names[0].place, (Place{0, 1}));
  EXPECT_EQ(parsed->names[1].place, (Place{4, 1}));
  EXPECT_EQ(parsed->names[2].place, (Place{17, 1}));
  EXPECT_THAT(names("michaelis_menten(S, Vmax, Km)"), ElementsAre("S", "Vmax", "Km"));
  EXPECT_THAT(names("gas_constant * t"), IsEmpty());
}

TEST(Parse, LettersOfTheTradeAreOrdinaryNames) {
  EXPECT_THAT(names("e + E + I + R + S + V"), ElementsAre("e", "E", "I", "R", "S", "V"));
}

TEST(Parse, ConstantsBecomeNumbers) {
  EXPECT_TRUE(parse("pi")->expression.is_number(3.14159265358979323846));
  EXPECT_TRUE(parse("gas_constant")->expression.is_number(8.31446261815324));
}

TEST(Parse, WritesRateLawsOut) {
  EXPECT_EQ(print_text(parse("michaelis_menten(S + P, 2, Km)")->expression),
            "2 * (S + P) / (Km + (S + P))");
}

TEST(Parse, MassActionTakesTheSideOfItsReaction) {
  ParseContext context;
  context.mass_action_side = parse("A^2 * B")->expression;
  EXPECT_EQ(print_text(parse("mass_action(k1 + k2)", context)->expression),
            "(k1 + k2) * (A^2 * B)");
  context.mass_action_side = 1.0;  // an empty side
  EXPECT_EQ(print_text(parse("mass_action(k)", context)->expression), "k");
  EXPECT_EQ(failure("2 * mass_action(k)"),
            (Failure{"'mass_action' cannot stand here", "the 'rate' or 'back' of a reaction",
                     "write the product of the concentrations out", Place{4, 11}}));
}

TEST(ParseErrors, NothingAtAll) {
  EXPECT_EQ(failure(""), (Failure{"the expression is empty", "a number, a name or '('",
                                  "write an expression", Place{0, 0}}));
  EXPECT_EQ(failure("  ").place, (Place{2, 0}));
}

TEST(ParseErrors, AnEndTooEarly) {
  const Failure found = failure("k * ");
  EXPECT_EQ(found, (Failure{"the expression ends too early", "a number, a name or '('",
                            "complete the expression", Place{4, 0}}));
}

TEST(ParseErrors, AnOperandThatIsMissing) {
  EXPECT_EQ(failure("k * / A"), (Failure{"'/' cannot stand here", "a number, a name or '('",
                                         "put an operand before it", Place{4, 1}}));
  EXPECT_EQ(failure("and A").what, "'and' cannot stand here");
  EXPECT_EQ(failure("exp()").what, "'exp' takes 1 argument, not 0");
  EXPECT_EQ(failure("min(a,)").what, "')' cannot stand here");
}

TEST(ParseErrors, AProductWithoutASign) {
  EXPECT_EQ(failure("2 k"), (Failure{"a sign is missing before 'k'", "a sign such as + or *",
                                     "write '2 * k' if a product is meant", Place{2, 1}}));
  EXPECT_EQ(failure("2k").to_do, "write '2 * k' if a product is meant");
  EXPECT_EQ(failure("(a + b) c").to_do, "write ') * c' if a product is meant");
  EXPECT_EQ(failure("(a b)").to_do, "write 'a * b' if a product is meant");
  EXPECT_EQ(failure("a 2").what, "a sign is missing before '2'");
  EXPECT_EQ(failure("3(a)").to_do, "write '3 * (' if a product is meant");
}

TEST(ParseErrors, BracketsThatDoNotMatch) {
  EXPECT_EQ(failure("2 * (a + b"),
            (Failure{"this bracket is never closed", "')' before the end of the expression",
                     "add ')'", Place{4, 1}}));
  EXPECT_EQ(failure("exp(a").place, (Place{3, 1}));
  EXPECT_EQ(failure("a + b)"),
            (Failure{"this bracket was never opened", "an expression with '(' for every ')'",
                     "remove it, or add '('", Place{5, 1}}));
}

TEST(ParseErrors, ACommaForADecimalSign) {
  EXPECT_EQ(failure("1,5 * k"),
            (Failure{"a comma stands outside the arguments of a function", "a sign such as + or *",
                     "write the decimal sign of a number as a point", Place{1, 1}}));
  EXPECT_EQ(failure("(1,5)").place, (Place{2, 1}));
}

TEST(ParseErrors, AnUnknownFunction) {
  EXPECT_EQ(
      failure("1 + sqr(x)"),
      (Failure{"unknown function 'sqr'", "a function or a rate law; nearest known name: 'sqrt'",
               "correct the name; write 'sqr * (' if a product is meant", Place{4, 3}}));
  EXPECT_THAT(failure("michaelis_mentn(S, V, K)").expected,
              HasSubstr("nearest known name: 'michaelis_menten'"));
  EXPECT_THAT(failure("Exp(x)").expected, HasSubstr("nearest known name: 'exp'"));
  EXPECT_EQ(failure("glucose(x)").expected, "a function or a rate law");
}

TEST(ParseErrors, BareLogIsAmbiguous) {
  for (const char* text : {"log(x)", "1 + log"}) {
    const Failure found = failure(text);
    EXPECT_EQ(found.what, "'log' does not say which logarithm is meant");
    EXPECT_EQ(found.expected, "'ln' or 'log10'");
    EXPECT_THAT(found.to_do, HasSubstr("ISO 80000-2"));
  }
}

TEST(ParseErrors, APowerWrittenAsAFunction) {
  EXPECT_EQ(failure("pow(a, 2)").to_do, "write 'a^b'");
}

TEST(ParseErrors, WordsOfTheFormatThatComeLater) {
  const Failure found = failure("2 * accumulated(feed)");
  EXPECT_EQ(found.what, "'accumulated' is not yet understood");
  EXPECT_EQ(found.place, (Place{4, 11}));
  EXPECT_FALSE(found.to_do.empty());
}

TEST(ParseErrors, AFunctionWithoutItsBrackets) {
  EXPECT_EQ(failure("exp + 1"), (Failure{"'exp' is a function", "exp(x)",
                                         "give its arguments in brackets", Place{0, 3}}));
  EXPECT_EQ(failure("michaelis_menten").expected, "michaelis_menten(S, Vmax, Km)");
}

TEST(ParseErrors, ANameThatIsNoFunction) {
  EXPECT_EQ(failure("t(2)").what, "'t' is no function");
  EXPECT_EQ(failure("pi(2)").to_do, "write 'pi * (' if a product is meant");
}

TEST(ParseErrors, AWrongNumberOfArguments) {
  EXPECT_EQ(failure("exp(a, b)"), (Failure{"'exp' takes 1 argument, not 2", "exp(x)",
                                           "give one for each, in this order", Place{0, 3}}));
  EXPECT_EQ(failure("michaelis_menten(S, Km)"),
            (Failure{"'michaelis_menten' takes 3 arguments, not 2", "michaelis_menten(S, Vmax, Km)",
                     "give one for each, in this order", Place{0, 16}}));
  EXPECT_EQ(failure("if(a, b)").expected, "if(condition, a, b)");
  EXPECT_EQ(failure("min(a)").what, "'min' takes 2 or more arguments, not 1");
  EXPECT_EQ(failure("mass_action(k, A)").what, "'mass_action' takes 1 argument, not 2");
}

TEST(ParseErrors, ComparisonsThatChain) {
  EXPECT_EQ(failure("a < b < c"),
            (Failure{"comparisons do not chain", "'and', 'or', or the end of the comparison",
                     "write 'a < b and b < c'", Place{6, 1}}));
  EXPECT_EQ(value_of("(1 < 2) < 3"), 1.0);
}

TEST(ParseErrors, NotBehindASignThatBindsTighter) {
  EXPECT_EQ(failure("a + not b"), (Failure{"'not' cannot stand behind a sign that binds tighter",
                                           "brackets around it", "write '(not a)'", Place{4, 3}}));
  EXPECT_EQ(value_of("1 + (not 0)"), 2.0);
}

TEST(ParseErrors, WordsInCapitals) {
  EXPECT_EQ(failure("a AND b"),
            (Failure{"unknown sign 'AND'", "'and'", "write it in small letters", Place{2, 3}}));
}

TEST(ParseErrors, SignsOfOtherNotationsAndNumbersOutOfRange) {
  EXPECT_EQ(failure("x ** 2").what, "unknown sign '**'");
  EXPECT_EQ(failure("a = b").what, "unknown sign '='");
  EXPECT_EQ(failure("k · A").place, (Place{2, 2}));
  EXPECT_EQ(failure("1e400").what, "number '1e400' is out of range");
}

TEST(ParseErrors, TheFirstOneStands) {
  EXPECT_EQ(failure("2 k + log(x)").what, "a sign is missing before 'k'");
}

TEST(ParseErrors, HostileDepthIsAnErrorAndNoMore) {
  constexpr std::size_t kDepth = 10'000;
  const auto repeated = [](const std::string& piece) {
    std::string text;
    for (std::size_t i = 0; i < kDepth; ++i) text += piece;
    return text;
  };
  for (const char* piece : {"(", "-", "2^", "exp(", "not ", "+", "min(1, ", "if(1, 2, "}) {
    const Failure found = failure(repeated(piece) + "x");
    EXPECT_EQ(found.what, "the expression is nested too deeply") << piece;
    EXPECT_TRUE(found.place.has_value());
    EXPECT_EQ(found.to_do, "give parts of it names under [where]");
  }
}

TEST(Parse, LongChainsAreNotDeep) {
  std::string text = "x";
  for (int i = 0; i < 20'000; ++i) text += " + x";
  EXPECT_EQ(value_of(text, {{"x", 1.0}}), 20'001.0);
}

TEST(Parse, ReadsBackWhatIsPrinted) {
  constexpr std::uint64_t kSeed = 7;
  Dice dice(kSeed);
  for (int i = 0; i < 2000; ++i) {
    const Expression expression = random_expression(dice, 5, Smoothness::Any);
    const std::string text = print_text(expression);
    const Result<Parsed> parsed = parse(text);
    ASSERT_TRUE(parsed) << text << ": " << parsed.failure().what;
    ASSERT_EQ(parsed->expression, expression)
        << text << " reads back as " << print_text(parsed->expression);
  }
}

TEST(IsReserved, FunctionsConstantsTimeWordsAndLaws) {
  for (const char* name : {"t", "pi", "gas_constant", "exp", "if", "and", "or", "not", "log", "pow",
                           "accumulated", "michaelis_menten", "mass_action"}) {
    EXPECT_TRUE(is_reserved(name)) << name;
  }
  for (const char* name : {"e", "E", "I", "R", "S", "V", "T", "Pi", "x", ""}) {
    EXPECT_FALSE(is_reserved(name)) << name;
  }
}

}  // namespace
}  // namespace gainsay::core
