#include "gainsay/cli/source_text.h"

#include <gtest/gtest.h>

#include <string>
#include <string_view>

namespace gainsay::cli {
namespace {

constexpr std::string_view kText = "one\nzw\xC3\xB6lf\r\nlast";

TEST(SourceText, ColumnsCountCharactersNotBytes) {
  EXPECT_EQ(offset_of(kText, 1, 1), 0U);
  EXPECT_EQ(offset_of(kText, 2, 1), 4U);
  EXPECT_EQ(offset_of(kText, 2, 4), 8U);  // behind the two bytes of the third character
  EXPECT_EQ(offset_of(kText, 3, 1), 12U);
  EXPECT_EQ(count_characters("zw\xC3\xB6lf"), 5U);
}

TEST(SourceText, AColumnBeyondItsLineIsTheLinesEnd) {
  EXPECT_EQ(offset_of(kText, 1, 99), 3U);
  EXPECT_EQ(offset_of(kText, 9, 1), kText.size());
}

TEST(SourceText, LinesComeWithoutTheirEnds) {
  EXPECT_EQ(line_of(kText, 1), "one");
  EXPECT_EQ(line_of(kText, 2), "zw\xC3\xB6lf");
  EXPECT_EQ(line_of(kText, 3), "last");
  EXPECT_EQ(line_of(kText, 4), "");
  EXPECT_EQ(line_of(kText, 0), "");
}

TEST(SourceText, AByteOrderMarkIsNoPartOfTheFirstLine) {
  EXPECT_EQ(line_of("\xEF\xBB\xBFone\n", 1), "one");
  EXPECT_EQ(offset_of("\xEF\xBB\xBFone\n", 1, 2), 4U);
}

// RFC 3629, section 4: the well-formed byte sequences.
TEST(SourceText, WhatIsNotUtf8IsFound) {
  EXPECT_EQ(first_not_utf8("a\xC3\xA4\xE2\x82\xAC\xF0\x9F\x98\x80"), std::string_view::npos);
  EXPECT_EQ(first_not_utf8("ab\xB5"), 2U);            // a continuation alone
  EXPECT_EQ(first_not_utf8("\xC3"), 0U);              // cut short
  EXPECT_EQ(first_not_utf8("\xC0\xAF"), 0U);          // overlong
  EXPECT_EQ(first_not_utf8("\xE0\x80\x80"), 0U);      // overlong
  EXPECT_EQ(first_not_utf8("\xED\xA0\x80"), 0U);      // a surrogate
  EXPECT_EQ(first_not_utf8("\xF4\x90\x80\x80"), 0U);  // beyond U+10FFFF
  EXPECT_EQ(first_not_utf8("\xF0\x80\x80\x80"), 0U);  // overlong
}

}  // namespace
}  // namespace gainsay::cli
