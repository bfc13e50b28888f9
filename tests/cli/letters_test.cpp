#include "gainsay/cli/letters.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

TEST(Letters, GoOnWithTwoAfterTheAlphabet) {
  EXPECT_EQ(letter_of(0), "A");
  EXPECT_EQ(letter_of(25), "Z");
  EXPECT_EQ(letter_of(26), "AA");
  EXPECT_EQ(letter_of(27), "AB");
  EXPECT_EQ(letter_of(26 + 26 * 26 - 1), "ZZ");
  EXPECT_EQ(letter_of(26 + 26 * 26), "AAA");
}

}  // namespace
}  // namespace gainsay::cli
