#include "gainsay/core/nearest_name.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::core {
namespace {

const std::vector<std::string> kKnown{"nitrile", "amide", "acid", "enzyme", "Km1", "Km2"};

TEST(NearestName, FindsSlipsOfTheKeyboard) {
  EXPECT_EQ(nearest_name("nitril", kKnown), "nitrile");             // one left out
  EXPECT_EQ(nearest_name("amidee", kKnown), "amide");               // one too many
  EXPECT_EQ(nearest_name("acud", kKnown), "acid");                  // one changed
  EXPECT_EQ(nearest_name("enzmye", kKnown), "enzyme");              // two swapped
  EXPECT_EQ(nearest_name("NITRILE", {{"nitrile"}}), std::nullopt);  // 7 halves exceed 2
  EXPECT_EQ(nearest_name("Nitrile", kKnown), "nitrile");
}

TEST(NearestName, KeepsSilentAboutWhatIsFarOff) {
  EXPECT_EQ(nearest_name("glucose", kKnown), std::nullopt);
  EXPECT_EQ(nearest_name("x", {}), std::nullopt);
  EXPECT_EQ(nearest_name("ab", {{"xy"}}), std::nullopt);
}

TEST(NearestName, TheNearerWinsThenTheFirst) {
  EXPECT_EQ(nearest_name("Km3", kKnown), "Km1");
  EXPECT_EQ(nearest_name("km2", kKnown),
            "Km2");  // a half for the case, before a whole for the digit
  EXPECT_EQ(nearest_name("Km2", kKnown), "Km2");
}

TEST(NearestName, AShortNameMayDifferInOneSign) {
  EXPECT_EQ(nearest_name("a", {{"b"}}), "b");
  EXPECT_EQ(nearest_name("k1", {{"k2"}}), "k2");
}

TEST(NearestName, LongTextsCostNothing) {
  const std::string long_text(1'000'000, 'a');
  EXPECT_EQ(nearest_name(long_text, {{long_text + "b"}}), std::nullopt);
}

}  // namespace
}  // namespace gainsay::core
