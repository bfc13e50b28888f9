#include "gainsay/core/typeset.h"

#include "gainsay/core/parse.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

/// Sets mathematics as plain characters, so that tests show the layout and no language.
class Plain final : public Typesetter {
 public:
  std::string name(std::string_view name) const override { return std::string(name); }
  std::string digits(std::string_view digits) const override { return std::string(digits); }
  std::string constant(std::string_view name) const override { return "#" + std::string(name); }
  std::string minus(const std::string& x) const override { return "-" + x; }
  std::string times(const std::string& a, Times sign, const std::string& b) const override {
    return a + (sign == Times::Dot ? "." : "~") + b;
  }
  std::string between(const std::string& a, Operation sign, const std::string& b) const override {
    switch (sign) {
      case Operation::Add:
        return a + "+" + b;
      case Operation::Subtract:
        return a + "-" + b;
      case Operation::And:
        return a + "&" + b;
      case Operation::Or:
        return a + "|" + b;
      default:
        return a + "<" + b;
    }
  }
  std::string negation(const std::string& x) const override { return "!" + x; }
  std::string fraction(const std::string& above, const std::string& below) const override {
    return "{" + above + "/" + below + "}";
  }
  std::string power(const std::string& base, const std::string& exponent) const override {
    return base + "^{" + exponent + "}";
  }
  std::string root(const std::string& x) const override { return "root{" + x + "}"; }
  std::string magnitude(const std::string& x) const override { return "|" + x + "|"; }
  std::string call(Operation, const std::vector<std::string>& arguments) const override {
    std::string text = "f";
    for (const std::string& argument : arguments) text += ":" + argument;
    return text;
  }
  std::string brackets(const std::string& x) const override { return "(" + x + ")"; }
  std::string indicator(const std::string& x) const override { return "[" + x + "]"; }
  std::string cases(const std::vector<Case>& rows) const override {
    std::string text;
    for (const Case& row : rows) text += "<" + row.value + " if " + row.condition + ">";
    return text;
  }
};

std::string set(std::string_view text) { return typeset(parse(text)->expression, Plain()); }

TEST(Typeset, ProductsWithoutASignWhereThatReadsWell) {
  EXPECT_EQ(set("k * S"), "k~S");
  EXPECT_EQ(set("2 * x"), "2~x");
  EXPECT_EQ(set("Vmax * S"), "Vmax~S");
  EXPECT_EQ(set("k * nitrile"), "k~nitrile");
  EXPECT_EQ(set("(a + b) * (c + d)"), "(a+b)~(c+d)");
  EXPECT_EQ(set("(a + b) * c"), "(a+b)~c");
  EXPECT_EQ(set("mu_max * X"), "mu_max~X");
}

TEST(Typeset, ADotWhereNothingWouldBeMisread) {
  EXPECT_EQ(set("x * 2"), "x.2");
  EXPECT_EQ(set("2 * 3"), "2.3");
  EXPECT_EQ(set("2 * (a / b)"), "2.{a/b}");              // a mixed number
  EXPECT_EQ(set("enzyme * nitrile"), "enzyme.nitrile");  // one long word
  EXPECT_EQ(set("k * (a + b)"), "k.(a+b)");              // a function of a + b
  EXPECT_EQ(set("enzyme * exp(x)"), "enzyme.f:x");
}

TEST(Typeset, ProductsAndSumsNeedNoBracketsInside) {
  EXPECT_EQ(set("a * (b * c)"), "a~b~c");
  EXPECT_EQ(set("a + (b + c)"), "a+b+c");
  EXPECT_EQ(set("a - (b + c)"), "a-(b+c)");
  EXPECT_EQ(set("a - (b - c)"), "a-(b-c)");
  EXPECT_EQ(set("a - b * c"), "a-b~c");
}

TEST(Typeset, AMinusBehindASignIsBracketed) {
  EXPECT_EQ(set("a + -b"), "a+(-b)");
  EXPECT_EQ(set("a * -b"), "a.(-b)");
  EXPECT_EQ(set("a * -2"), "a.(-2)");
  EXPECT_EQ(set("a - -b * c"), "a-(-b~c)");
  EXPECT_EQ(set("--a"), "-(-a)");
  EXPECT_EQ(set("-a + b"), "-a+b");
  EXPECT_EQ(set("-(a * b)"), "-a~b");
  EXPECT_EQ(set("-(a + b)"), "-(a+b)");
  EXPECT_EQ(set("x^-2"), "x^{-2}");
}

TEST(Typeset, QuotientsAreFractionsOnOneLine) {
  EXPECT_EQ(set("(a + b) / (c + d)"), "{a+b/c+d}");
  EXPECT_EQ(set("a / b / c"), "{a/b~c}");
  EXPECT_EQ(set("a / (b + c) / d"), "{a/(b+c)~d}");
  EXPECT_EQ(set("a / (b / c)"), "{a/{b/c}}");
  EXPECT_EQ(set("-a / b"), "-{a/b}");
  EXPECT_EQ(set("-a / b / c"), "-{a/b~c}");
  EXPECT_EQ(set("a / b * c"), "{a/b}~c");
  EXPECT_EQ(set("(a / b)^n"), "({a/b})^{n}");
  EXPECT_EQ(set("a - b / c"), "a-{b/c}");
}

TEST(Typeset, PowersRootsAndMagnitudes) {
  EXPECT_EQ(set("-x^2"), "-x^{2}");
  EXPECT_EQ(set("(-x)^2"), "(-x)^{2}");
  EXPECT_EQ(set("(a * b)^2"), "(a~b)^{2}");
  EXPECT_EQ(set("x^y^z"), "x^{y^{z}}");
  EXPECT_EQ(set("(x^y)^z"), "(x^{y})^{z}");
  EXPECT_EQ(set("sqrt(a + b)^2"), "root{a+b}^{2}");
  EXPECT_EQ(set("abs(a - b)"), "|a-b|");
}

TEST(Typeset, NumbersWithPowersOfTen) {
  EXPECT_EQ(set("1e-7 * x"), "10^{-7}~x");
  EXPECT_EQ(set("2.5e22"), "2.5.10^{22}");
  EXPECT_EQ(set("(2.5e22)^2"), "(2.5.10^{22})^{2}");
  EXPECT_EQ(set("-3 * pi"), "-3~#pi");
}

TEST(Typeset, MinimaOfMinimaAreOne) {
  EXPECT_EQ(set("min(a, b, c)"), "f:a:b:c");
  EXPECT_EQ(set("max(min(a, b), c)"), "f:f:a:b:c");
}

TEST(Typeset, ChoicesAreCasesOfOneTable) {
  EXPECT_EQ(set("if(a < b, 1, if(c < d, 2, 3))"), "<1 if a<b><2 if c<d><3 if >");
  EXPECT_EQ(set("k * if(a < b, 1, 2)"), "k.(<1 if a<b><2 if >)");
}

TEST(Typeset, ComparisonsAmongNumbersAreIndicators) {
  EXPECT_EQ(set("a < b"), "a<b");
  EXPECT_EQ(set("(a < b) * c"), "[a<b]~c");
  EXPECT_EQ(set("exp(a < b)"), "f:[a<b]");
  EXPECT_EQ(set("c / (a < b)"), "{c/[a<b]}");
  EXPECT_EQ(set("x^(a < b)"), "x^{[a<b]}");
  EXPECT_EQ(set("(a < b) < c"), "[a<b]<c");
}

TEST(Typeset, LogicInItsOwnOrder) {
  EXPECT_EQ(set("a and b or c"), "a&b|c");
  EXPECT_EQ(set("a and (b or c)"), "a&(b|c)");
  EXPECT_EQ(set("not (a and b)"), "!(a&b)");
  EXPECT_EQ(set("not a < b"), "!a<b");
}

TEST(Typeset, SharedAndLongExpressions) {
  Expression sum = Expression::symbol("x");
  for (int i = 0; i < 2000; ++i) sum = sum + 1.0;
  EXPECT_EQ(typeset(sum, Plain()).size(), 1U + 2000U * 2U);
}

}  // namespace
}  // namespace gainsay::core
