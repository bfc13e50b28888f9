#include "gainsay/core/shown_name.h"

#include "gainsay/core/print.h"

#include <gtest/gtest.h>

#include <set>
#include <string>
#include <vector>

namespace gainsay::core {
namespace {

ShownName shown(std::string base, std::vector<std::string> below) {
  return {std::move(base), std::move(below)};
}

TEST(SplitName, TakesTrailingDigitsAndPartsAsSubscripts) {
  EXPECT_EQ(split_name("k"), shown("k", {}));
  EXPECT_EQ(split_name("k1"), shown("k", {"1"}));
  EXPECT_EQ(split_name("Km12"), shown("Km", {"12"}));
  EXPECT_EQ(split_name("k_cat"), shown("k", {"cat"}));
  EXPECT_EQ(split_name("k1_cat2_b"), shown("k", {"1", "cat2", "b"}));
  EXPECT_EQ(split_name("H2O"), shown("H2O", {}));
  EXPECT_EQ(split_name("CO2"), shown("CO", {"2"}));
}

TEST(SplitName, LeavesWholeWhatWouldLookLikeAnotherName) {
  EXPECT_EQ(split_name("k_"), shown("k_", {}));
  EXPECT_EQ(split_name("k__1"), shown("k__1", {}));
  EXPECT_EQ(split_name("R*"), shown("R*", {}));
  EXPECT_EQ(split_name("a b1"), shown("a b1", {}));
  EXPECT_EQ(split_name(""), shown("", {}));
}

TEST(GreekLetters, AreFoundByTheirNames) {
  EXPECT_EQ(find_greek_letter("alpha")->utf8, "α");
  EXPECT_EQ(find_greek_letter("Omega")->latex, "\\Omega");
  EXPECT_EQ(find_greek_letter("Alpha"), nullptr);  // looks like A
  EXPECT_EQ(find_greek_letter("alph"), nullptr);
}

TEST(ShowsOneLetter, LatinOrGreekWithOrWithoutSubscripts) {
  for (const char* name : {"k", "k1", "k_cat", "mu_max", "Gamma"})
    EXPECT_TRUE(shows_one_letter(name));
  for (const char* name : {"Km", "nitrile", "Km1"}) EXPECT_FALSE(shows_one_letter(name));
}

}  // namespace
}  // namespace gainsay::core
