#include "gainsay/cli/key_check.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::said_briefly;
using testing::toml;

TEST(KeyCheck, OnlyWhatPassesCanBeAskedFor) {
  const TomlValue document = toml("seed = 7\nbudget = 'much'\nmay_miss = 0.1\nsede = 8\n");
  Diagnostics diagnostics;
  const CheckedTable table(document, Section::Search, Section::Study, diagnostics);
  EXPECT_EQ(table.number("seed"), 7.0);
  EXPECT_FALSE(table.has("budget"));
  EXPECT_TRUE(table.mentions("budget"));
  EXPECT_EQ(table.entries().size(), 1U);
  EXPECT_EQ(table.failed().size(), 3U);
  EXPECT_EQ(said_briefly(diagnostics),
            "2:10: 'budget' is a text\n"
            "3:1: not yet: 'may_miss' is not read by this version\n"
            "4:1: unknown key 'sede' in [search]\n");
}

TEST(KeyCheck, AKeyIsMissedOnlyWhereNoSlipMayStandForIt) {
  Diagnostics diagnostics;
  const TomlValue slipped = toml("rat = 1\n");
  EXPECT_FALSE(
      CheckedTable(slipped, Section::Reaction, Section::Hypothesis, diagnostics).lacks("rate"));
  const TomlValue without = toml("equation = 'A ->'\n");
  EXPECT_TRUE(
      CheckedTable(without, Section::Reaction, Section::Hypothesis, diagnostics).lacks("rate"));
}

TEST(KeyCheck, Types) {
  const auto value = [](const char* text) {
    return toml(std::string("x = ") + text + "\n").entries.front().value;
  };
  EXPECT_TRUE(fits(value("3"), kWhole));
  EXPECT_FALSE(fits(value("-3"), kWhole));
  EXPECT_FALSE(fits(value("3.5"), kWhole));
  EXPECT_TRUE(fits(value("3.5"), kNumber));
  EXPECT_FALSE(fits(value("inf"), kNumber));
  EXPECT_FALSE(fits(value("nan"), kNumber));
  EXPECT_TRUE(fits(value("true"), kTruth));
  EXPECT_TRUE(fits(value("['a']"), kTexts));
  EXPECT_TRUE(fits(value("[]"), kTexts));
  EXPECT_FALSE(fits(value("['a', 1]"), kTexts));
  EXPECT_TRUE(fits(value("[1, 2.5]"), kNumbers));
  EXPECT_TRUE(fits(value("[[0, 1], [2, 3]]"), kPairs));
  EXPECT_FALSE(fits(value("[[0, 1, 2]]"), kPairs));
  EXPECT_TRUE(fits(value("{ a = 1 }"), kTable));
  EXPECT_TRUE(fits(value("[{ a = 1 }]"), kTables));
  EXPECT_FALSE(fits(value("2024-02-29"), kNumber | kText | kTable));
}

std::string misplaced(const char* document, const char* below, Section section, Section top) {
  const TomlValue value = toml(document);
  Diagnostics diagnostics;
  const CheckedTable table(value.find(below)->value, section, top, diagnostics);
  return said_briefly(diagnostics);
}

TEST(KeyCheck, AKeyOfTheTopLevelBelowAHeaderIsATrap) {
  EXPECT_EQ(misplaced("[unknowns]\ntitle = 'x'\n", "unknowns", Section::Unknowns, Section::Study),
            "2:1: 'title' stands below [unknowns], so it belongs to it\n");
  EXPECT_EQ(
      misplaced("[where]\ntitle = 'A long story'\n", "where", Section::Where, Section::Hypothesis),
      "2:1: 'title' stands below [where], so it belongs to it\n");
  EXPECT_EQ(misplaced("[reactions]\nspecies.A = {}\n", "reactions", Section::Reactions,
                      Section::Hypothesis),
            "2:1: 'species' stands below [reactions], so it belongs to it\n");
}

TEST(KeyCheck, ANameLikeAKeyOfTheTopLevelIsNoTrapWhereItFits) {
  EXPECT_EQ(misplaced("[where]\ntitle = '2 * x'\n", "where", Section::Where, Section::Hypothesis),
            "");
  EXPECT_EQ(
      misplaced("[unknowns]\ntitle = [1, 2]\n", "unknowns", Section::Unknowns, Section::Study), "");
  EXPECT_EQ(misplaced("[reactions]\nwhere = { equation = 'A ->' }\n", "reactions",
                      Section::Reactions, Section::Hypothesis),
            "");
}

TEST(KeyCheck, NamesForExpressions) {
  const auto usable = [](const char* key) {
    Diagnostics diagnostics;
    return is_usable_name({key, {}, {}}, diagnostics);
  };
  for (const char* name : {"A", "e", "E", "I", "R", "S", "V", "k_1", "Km"})
    EXPECT_TRUE(usable(name)) << name;
  for (const char* name :
       {"t", "pi", "gas_constant", "exp", "michaelis_menten", "1k", "k-1", "R*", ""})
    EXPECT_FALSE(usable(name)) << name;
}

}  // namespace
}  // namespace gainsay::cli
