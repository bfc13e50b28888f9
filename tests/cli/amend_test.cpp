#include "gainsay/cli/amend.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using testing::toml;

TomlValue amend(std::string base, std::string amendment) {
  Diagnostics diagnostics;
  TomlValue result = amended(toml(std::move(base)), toml(std::move(amendment)), diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return result;
}

const TomlValue* at(const TomlValue& document, const std::vector<std::string>& path) {
  const TomlValue* value = &document;
  for (const std::string& key : path) {
    const TomlEntry* entry = value->find(key);
    if (entry == nullptr) return nullptr;
    value = &entry->value;
  }
  return value;
}

TEST(Amend, KeysMergeAtAnyDepth) {
  const TomlValue result = amend("species.A = { start = 1, in = 'tank' }\nwhere.x = 1\n",
                                 "species.A.start = 2\nspecies.B = {}\n");
  EXPECT_EQ(at(result, {"species", "A", "start"})->number, 2.0);
  EXPECT_EQ(at(result, {"species", "A", "in"})->text, "tank");
  EXPECT_NE(at(result, {"species", "B"}), nullptr);
  EXPECT_EQ(at(result, {"where", "x"})->number, 1.0);
}

TEST(Amend, ListsAreReplacedWholeAndTakeTheWholePlaceOfTables) {
  const TomlValue result = amend("unknowns.a = [1, 2]\nunknowns.b = { between = [1, 2] }\n",
                                 "unknowns.a = [3, 4]\nunknowns.b = [5, 6]\n");
  EXPECT_EQ(at(result, {"unknowns", "a"})->items[0].number, 3.0);
  EXPECT_EQ(at(result, {"unknowns", "a"})->items.size(), 2U);
  EXPECT_TRUE(at(result, {"unknowns", "b"})->is_list());
}

TEST(Amend, WhatIsRemovedIsGoneBeforeKeysAreMerged) {
  const TomlValue result =
      amend("reactions.loss = { equation = 'A ->', rate = 1 }\nunknowns.k = [1, 2]\n",
            "remove = ['reactions.loss', 'unknowns.k']\nreactions.loss.flow = 2\n");
  EXPECT_EQ(at(result, {"reactions", "loss", "equation"}), nullptr);
  EXPECT_EQ(at(result, {"reactions", "loss", "flow"})->number, 2.0);
  EXPECT_EQ(at(result, {"unknowns", "k"}), nullptr);
}

TEST(Amend, TitleBaseAndRemoveAreNotInherited) {
  const TomlValue result =
      amend("title = 'a'\nbase = 'z.toml'\nremove = []\nwhere.x = 1\n", "base = 'a.toml'\n");
  EXPECT_EQ(at(result, {"title"}), nullptr);
  EXPECT_EQ(at(result, {"base"})->text, "a.toml");
  EXPECT_EQ(at(result, {"remove"}), nullptr);
}

TEST(Amend, FlowDropsAnInheritedRateAndTheReverse) {
  const std::string base =
      "reactions.a = { equation = 'A ->', rate = 1 }\nreactions.b = { equation = 'B ->', flow = 1 "
      "}\n";
  const TomlValue result = amend(base, "reactions.a.flow = 2\nreactions.b.rate = 2\n");
  EXPECT_EQ(at(result, {"reactions", "a", "rate"}), nullptr);
  EXPECT_EQ(at(result, {"reactions", "a", "flow"})->number, 2.0);
  EXPECT_EQ(at(result, {"reactions", "b", "flow"}), nullptr);
  EXPECT_EQ(at(result, {"reactions", "b", "equation"})->text, "B ->");
}

TEST(Amend, KeysKeepTheOrderOfTheBase) {
  const TomlValue result =
      amend("species.A = {}\nspecies.B = {}\n", "species.C = {}\nspecies.A.start = 1\n");
  const TomlValue& species = *at(result, {"species"});
  ASSERT_EQ(species.entries.size(), 3U);
  EXPECT_EQ(species.entries[0].key, "A");
  EXPECT_EQ(species.entries[2].key, "C");
}

TEST(Amend, APathThatIsNotThereIsSaid) {
  Diagnostics diagnostics;
  amended(toml("where.brake = 1\n"), toml("remove = ['where.break', 'x.y']\n"), diagnostics);
  EXPECT_EQ(testing::said_briefly(diagnostics),
            "1:11: the base has no 'where.break' to remove\n"
            "1:26: the base has no 'x.y' to remove\n");
}

}  // namespace
}  // namespace gainsay::cli
