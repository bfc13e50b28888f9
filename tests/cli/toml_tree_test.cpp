#include "gainsay/cli/toml_tree.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using testing::said;
using testing::source;
using testing::toml;

std::vector<std::string> keys(const TomlValue& table) {
  std::vector<std::string> names;
  for (const TomlEntry& entry : table.entries) names.push_back(entry.key);
  return names;
}

std::string place(const Location& at) {
  return std::to_string(at.line) + ":" + std::to_string(at.column);
}

TEST(TomlTree, EntriesStandInTheOrderOfTheText) {
  const TomlValue document = toml("zeta = 1\nalpha = 2\n[middle]\nz = 1\na = 2\n[beta]\n");
  EXPECT_EQ(keys(document), (std::vector<std::string>{"zeta", "alpha", "middle", "beta"}));
  EXPECT_EQ(keys(document.find("middle")->value), (std::vector<std::string>{"z", "a"}));
}

TEST(TomlTree, DottedKeysAndHeadersMakeTables) {
  const TomlValue document = toml("where.b = 1\nwhere.a = 2\n[reactions.loss]\nrate = 3\n");
  EXPECT_EQ(keys(document.find("where")->value), (std::vector<std::string>{"b", "a"}));
  EXPECT_FALSE(document.find("where")->value.has_header);
  EXPECT_TRUE(document.find("reactions")->value.find("loss")->value.has_header);
}

TEST(TomlTree, ValuesKeepTheirKinds) {
  const TomlValue document =
      toml("text = 'a'\nwhole = 3\npoint = 3.0\ntruth = true\nday = 2024-02-29\nlist = [1, 'b']\n");
  EXPECT_EQ(document.find("text")->value.text, "a");
  EXPECT_TRUE(document.find("whole")->value.is_whole);
  EXPECT_FALSE(document.find("point")->value.is_whole);
  EXPECT_EQ(document.find("point")->value.number, 3.0);
  EXPECT_TRUE(document.find("truth")->value.truth);
  EXPECT_EQ(document.find("day")->value.kind, TomlValue::Kind::Moment);
  EXPECT_EQ(document.find("list")->value.items.size(), 2U);
}

TEST(TomlTree, KeysAndValuesKnowTheirPlaces) {
  const TomlValue document = toml(
      "a = 1\n  w\u00F6 = 2\n"
      "\"\u00E4\" = { b = [1, 2] }\n"
      "[[doses]]\nat = 1\n");
  EXPECT_EQ(place(document.find("a")->value.place), "1:5");
  const TomlValue& inner = document.find("\u00E4")->value;
  EXPECT_EQ(place(inner.find("b")->place), "3:9");
  EXPECT_EQ(place(inner.find("b")->value.items[1].place), "3:17");
  EXPECT_EQ(place(document.find("doses")->value.items[0].place), "4:1");
}

struct InText {
  const char* name;
  const char* literal;  // of the key `k`
  std::size_t offset;   // in the value
  const char* place;
};

class PlaceInText : public ::testing::TestWithParam<InText> {};

TEST_P(PlaceInText, CountsTheLiteralAsWritten) {
  const TomlValue document = toml(std::string("k = ") + GetParam().literal + "\n");
  EXPECT_EQ(place(place_in(document.find("k")->value, GetParam().offset)), GetParam().place);
}

INSTANTIATE_TEST_SUITE_P(
    TomlTree, PlaceInText,
    ::testing::Values(InText{"Plain", R"("abc")", 2, "1:8"}, InText{"Literal", "'abc'", 2, "1:8"},
                      InText{"AtTheEnd", R"("abc")", 3, "1:9"},
                      InText{"Umlaut",
                             "\"\xC3\xA4"
                             "bc\"",
                             2, "1:7"},
                      InText{"Escape", R"("a\tbc")", 2, "1:9"},
                      InText{"ShortCode", R"("\u00e4bc")", 2, "1:12"},
                      InText{"LongCode", R"("\U0001F600bc")", 4, "1:16"},
                      InText{"BackslashInALiteral", R"('a\tbc')", 2, "1:8"},
                      InText{"Lines", "\"\"\"\nab\ncd\"\"\"", 3, "3:1"},
                      InText{"LinesOfALiteral", "'''ab\ncd'''", 4, "2:2"},
                      InText{"LinesOfWindows", "\"\"\"\r\nab\r\ncd\"\"\"", 4, "3:2"},
                      InText{"JoinedLines", "\"\"\"ab\\\n    cd\"\"\"", 2, "2:5"}),
    [](const auto& tested) { return std::string(tested.param.name); });

TEST(TomlTree, AFileWithAByteOrderMarkIsRead) {
  const TomlValue document = toml("\xEF\xBB\xBFk = 'ab'\n");
  EXPECT_EQ(place(place_in(document.find("k")->value, 1)), "1:7");
}

std::string errors_of(std::string text) {
  Diagnostics diagnostics;
  EXPECT_FALSE(read_toml(source(std::move(text)), diagnostics).has_value());
  return testing::said_briefly(diagnostics);
}

TEST(TomlTree, WhatIsNoTextIsSaid) {
  EXPECT_EQ(errors_of("a = \"\xFF\"\n"), "1:6: the file is not UTF-8 here\n");
  EXPECT_EQ(errors_of(std::string("a = \"x\0y\"\n", 10)),
            "1:7: a control character stands in a text\n");
}

TEST(TomlTree, AKeyOfVeryManyPartsIsRefused) {
  std::string key = "a";
  for (int i = 0; i < 100000; ++i) key += ".a";
  EXPECT_EQ(errors_of(key + " = 1\n"), "1:202: a key of more than 100 parts\n");
  EXPECT_EQ(errors_of("x = 1\n[" + key + "]\n"), "2:203: a key of more than 100 parts\n");
  EXPECT_EQ(toml("x = 'a. b. c... 1.2, 3.4'\n").entries.size(), 1U);
}

TEST(TomlTree, AFileTooLargeIsRefused) {
  EXPECT_EQ(errors_of("# " + std::string(17'000'000, 'x') + "\n"),
            "0:0: the file is larger than 16 MB\n");
}

}  // namespace
}  // namespace gainsay::cli
