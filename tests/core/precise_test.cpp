#include "gainsay/core/precise.h"

#include "gainsay/testing/mechanism.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

using testing::written;

// 50 digits are promised; the type carries a few more.
const Precise kFifty("1e-49");

Precise value_of(std::string_view text) {
  return evaluate_precisely(written(text), {{"x", Precise("0.5")}, {"t", Precise(2)}});
}

// Digits of e, ln 2 and pi as printed by Abramowitz & Stegun (1964), table 1.1.
TEST(Precise, FunctionsToFiftyDigits) {
  EXPECT_LT(
      abs(value_of("exp(1)") - Precise("2.71828182845904523536028747135266249775724709369996")),
      kFifty * 10);
  EXPECT_LT(
      abs(value_of("-ln(x)") - Precise("0.69314718055994530941723212145817656807550013436026")),
      kFifty);
  EXPECT_LT(abs(value_of("sqrt(t)^2 / 2") - 1), kFifty);
  EXPECT_LT(abs(value_of("sin(x)^2 + cos(x)^2") - 1), kFifty);
  EXPECT_LT(abs(value_of("tanh(x) - (exp(t * x) - 1) / (exp(t * x) + 1)")), kFifty);
  EXPECT_LT(abs(value_of("tan(x) - sin(x) / cos(x)")), kFifty);
  EXPECT_LT(abs(value_of("10^log10(t) - t")), kFifty * 10);
}

TEST(Precise, NumbersAreTakenAsWritten) {
  EXPECT_EQ(value_of("0.1 + 0.2 - 0.3"), 0);
  EXPECT_EQ(as_written(0.1) * 10, 1);
}

TEST(Precise, ChoicesAndComparisons) {
  EXPECT_EQ(value_of("if(x < t and not x == 1, min(x, t), 7)"), Precise("0.5"));
  EXPECT_EQ(value_of("max(abs(-3), t) * (x >= 1 or x <= 0 or x != x or t > 1)"), 3);
}

TEST(Precise, OutsideOfADomainNothingIsFinite) {
  for (const char* text : {"ln(x - 1)", "sqrt(-t)", "1 / (t - 2)", "log10(0)", "(t - 2)^(-1)"})
    EXPECT_FALSE(isfinite(value_of(text))) << text;
}

}  // namespace
}  // namespace gainsay::core
