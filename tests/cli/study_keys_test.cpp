#include "gainsay/cli/study_keys.h"

#include "gainsay/cli/key_check.h"
#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <set>
#include <string>
#include <utility>

namespace gainsay::cli {
namespace {

TEST(StudyKeys, NoKeyStandsTwiceInItsTable) {
  std::set<std::pair<Section, std::string_view>> seen;
  for (const StudyKey& key : all_study_keys()) {
    EXPECT_TRUE(seen.emplace(key.section, key.name).second) << key.name;
  }
}

TEST(StudyKeys, EverySectionIsNamedAndHeldBySomeKey) {
  std::set<Section> held = {Section::Study, Section::Hypothesis, Section::Experiment};
  for (const StudyKey& key : all_study_keys()) {
    EXPECT_FALSE(words_for(key.section).header.empty());
    held.insert(key.holds);
  }
  for (const SectionWords& words : all_sections()) EXPECT_TRUE(held.contains(words.section));
}

TEST(StudyKeys, EveryKeySaysWhatItTakesAndWhatItMeans) {
  for (const StudyKey& key : all_study_keys()) {
    EXPECT_NE(words_for_takes(key.takes), "") << key.name;
    EXPECT_FALSE(key.meaning.empty()) << key.name;
    EXPECT_EQ(key.accepted, key.instead.empty()) << key.name << ": what to do for now";
    EXPECT_TRUE(key.holds == Section::None || (key.takes & (kTable | kTables)) != 0) << key.name;
  }
}

TEST(StudyKeys, EveryExampleIsTomlOfItsKeyAndType) {
  for (const StudyKey& key : all_study_keys()) {
    const TomlValue document = testing::toml(std::string(key.example) + "\n");
    ASSERT_EQ(document.entries.size(), 1U) << key.example;
    const TomlEntry& entry = document.entries.front();
    if (key.name != "*") {
      EXPECT_EQ(entry.key, key.name) << key.example;
    }
    EXPECT_TRUE(fits(entry.value, key.takes)) << key.example;
  }
}

TEST(StudyKeys, TheTablesInExamplesAreKnownToo) {
  for (const StudyKey& key : all_study_keys()) {
    if (!key.accepted || key.holds == Section::None) continue;
    const TomlValue document = testing::toml(std::string(key.example) + "\n");
    const TomlValue& value = document.entries.front().value;
    if (!value.is_table()) continue;
    Diagnostics diagnostics;
    const CheckedTable table(value, key.holds, key.section, diagnostics);
    EXPECT_EQ(testing::said(diagnostics), "") << key.example;
  }
}

TEST(StudyKeys, ARowForAllNamesStandsWhereNoOtherDoes) {
  EXPECT_EQ(find_key(Section::Study, "title")->name, "title");
  EXPECT_EQ(find_key(Section::Study, "titel"), nullptr);
  EXPECT_EQ(find_key(Section::Knowns, "whatever")->name, "*");
}

TEST(StudyKeys, TypesInWords) {
  EXPECT_EQ(words_for_takes(kText), "a text");
  EXPECT_EQ(words_for_takes(kExpression), "a number or a text");
  EXPECT_EQ(words_for_takes(kNumber | kText | kTable), "a number, a text or a table");
}

}  // namespace
}  // namespace gainsay::cli
