#include "gainsay/core/parse.h"

#include "gainsay/core/print.h"

#include <gtest/gtest.h>

#include <map>
#include <string>

namespace gainsay::core {
namespace {

double value_of(std::string_view text,
                const std::map<std::string, double, std::less<>>& values = {}) {
  const Result<Parsed> parsed = parse(text);
  if (!parsed) {
    ADD_FAILURE() << text << ": " << parsed.failure().what;
    return 0.0;
  }
  return evaluate(parsed->expression, values);
}

TEST(Parse, SignsBindAsInOrdinaryMathematics) {
  EXPECT_EQ(value_of("1 + 2 * 3"), 7.0);
  EXPECT_EQ(value_of("(1 + 2) * 3"), 9.0);
  EXPECT_EQ(value_of("8 - 4 - 2"), 2.0);
  EXPECT_EQ(value_of("8 / 4 / 2"), 1.0);
  EXPECT_EQ(value_of("2 ^ 3 ^ 2"), 512.0);
  EXPECT_EQ(value_of("-x^2", {{"x", 3.0}}), -9.0);
  EXPECT_EQ(value_of("-2^2"), -4.0);
  EXPECT_EQ(value_of("(-2)^2"), 4.0);
  EXPECT_EQ(value_of("2^-1"), 0.5);
  EXPECT_EQ(value_of("2^-1 * 3"), 1.5);
  EXPECT_EQ(value_of("2 - -3"), 5.0);
  EXPECT_EQ(value_of("2 * -3 + +1"), -5.0);
  EXPECT_EQ(value_of("1 + 1 < 3 and 2 * 2 == 4"), 1.0);
  EXPECT_EQ(value_of("not 1 < 2 or 3 != 3"), 0.0);
}

}  // namespace
}  // namespace gainsay::core
