#include "gainsay/cli/csv_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using Texts = std::vector<std::string>;

CsvTable read(std::string text) {
  Diagnostics diagnostics;
  auto table = read_csv(testing::source(std::move(text), "t.csv"), diagnostics);
  EXPECT_TRUE(table.has_value()) << testing::said(diagnostics);
  return table.value_or(CsvTable{});
}

std::string errors_of(std::string text) {
  Diagnostics diagnostics;
  EXPECT_FALSE(read_csv(testing::source(std::move(text), "t.csv"), diagnostics).has_value());
  return testing::said_briefly(diagnostics);
}

Texts texts(const CsvRow& row) {
  Texts all;
  for (const CsvCell& cell : row) all.push_back(cell.text);
  return all;
}

TEST(CsvReader, HeaderAndRows) {
  const CsvTable table = read("time,glow\n1,2.5\n2,\n");
  EXPECT_EQ(texts(table.header), (Texts{"time", "glow"}));
  ASSERT_EQ(table.rows.size(), 2U);
  EXPECT_EQ(texts(table.rows[1]), (Texts{"2", ""}));
}

// RFC 4180, section 2: the last line may lack its end (2), quotes (5), line ends, quotes and commas
// within quotes (6), doubled quotes (7).
TEST(CsvReader, TheFormOfRfc4180) {
  const CsvTable table = read("a,b,c\r\n\"aaa\",\"b \r\nbb\",\"c,c\"\r\n\"x\"\"y\",,z");
  ASSERT_EQ(table.rows.size(), 2U);
  EXPECT_EQ(texts(table.rows[0]), (Texts{"aaa", "b \r\nbb", "c,c"}));
  EXPECT_EQ(texts(table.rows[1]), (Texts{"x\"y", "", "z"}));
  EXPECT_EQ(table.rows[1][0].line, 4U);
}

TEST(CsvReader, BlanksAroundFieldsAndEmptyLinesCountForNothing) {
  const CsvTable table = read("\n time ,\tglow\n\n1 , \" 2 \" \n\n");
  EXPECT_EQ(texts(table.header), (Texts{"time", "glow"}));
  ASSERT_EQ(table.rows.size(), 1U);
  EXPECT_EQ(texts(table.rows[0]), (Texts{"1", " 2 "}));
}

TEST(CsvReader, PlacesCountCharacters) {
  const CsvTable table = read("\xEF\xBB\xBFtime,\xC3\xA4,b\n1,\xE2\x82\xAC,3\n");
  EXPECT_EQ(table.header[0].column, 1U);
  EXPECT_EQ(table.header[2].column, 8U);
  EXPECT_EQ(table.rows[0][2].line, 2U);
  EXPECT_EQ(table.rows[0][2].column, 5U);
}

TEST(CsvReader, WhatIsNoTableIsSaid) {
  EXPECT_EQ(errors_of(""), "1:1: the table is empty\n");
  EXPECT_EQ(errors_of("\xEF\xBB\xBF"), "1:1: the table is empty\n");
  EXPECT_EQ(errors_of("\n\n"), "1:1: the table is empty\n");
  EXPECT_EQ(errors_of(std::string("a,b\n1,\0\n", 8)), "2:3: a NUL byte stands in the table\n");
  EXPECT_EQ(errors_of("a,b\n1,\xB5\n"), "2:3: the table is not UTF-8 here\n");
  EXPECT_EQ(errors_of("a,b\r1,2\r"),
            "1:4: a carriage return stands without a line feed\n"
            "1:8: a carriage return stands without a line feed\n");
}

TEST(CsvReader, EveryRowOfAnotherLengthIsSaid) {
  EXPECT_EQ(errors_of("a,b\n1\n1,2\n1,2,3,4\n"),
            "2:1: this row has 1 field, the header 2\n"
            "4:5: this row has 4 fields, the header 2\n");
}

TEST(CsvReader, QuotesThatAreWrongAreSaid) {
  EXPECT_EQ(errors_of("a,b\n1,\"2\n3,4\n"), "2:3: this quoted field is never closed\n");
  EXPECT_EQ(errors_of("a,b\n1,x\"y\n"), "2:4: a quote stands within a field that is not quoted\n");
  EXPECT_EQ(errors_of("a,b\n1,\"x\"y\n"), "2:6: something stands behind a closing quote\n");
}

TEST(CsvReader, ATableTooLargeIsRefused) {
  EXPECT_EQ(errors_of(std::string(65'000'000, 'x')), "0:0: the table is larger than 64 MB\n");
}

}  // namespace
}  // namespace gainsay::cli
