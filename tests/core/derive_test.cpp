#include "gainsay/core/derive.h"

#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"

#include <gtest/gtest.h>

namespace gainsay::core {
namespace {

std::string derived(std::string_view text) {
  return print_text(derivative(parse(text)->expression, "x"));
}

TEST(Derivative, RulesOfTheTextbook) {
  EXPECT_EQ(derived("a * x"), "a");
  EXPECT_EQ(derived("x^3"), "3 * x^2");
  EXPECT_EQ(derived("ln(x)"), "1 / x");
  EXPECT_EQ(derived("a^x"), "a^x * ln(a)");
}

}  // namespace
}  // namespace gainsay::core
