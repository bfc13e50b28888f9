#include "gainsay/cli/table_text.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

TEST(TableText, ColumnsCountCharactersNotBytes) {
  EXPECT_EQ(columns("abc"), 3U);
  EXPECT_EQ(columns("α → β"), 5U);
}

TEST(TableText, CutKeepsWholeCharactersAndSaysThatItCut) {
  EXPECT_EQ(cut("nitrile", 7), "nitrile");
  EXPECT_EQ(cut("nitrile", 4), "nit…");
  EXPECT_EQ(cut("αβγδ", 3), "αβ…");
  EXPECT_EQ(cut("αβγδ", 0), "");
}

TEST(TableText, PadFillsUpToTheWidth) {
  EXPECT_EQ(pad("αβ", 4), "αβ  ");
  EXPECT_EQ(columns(pad("a long name", 6)), 6U);
}

TEST(TableText, ControlCharactersCannotSteerATerminal) {
  EXPECT_EQ(harmless("a\033[31mb\tc\n"), "a?[31mb?c?");
  EXPECT_EQ(harmless("\xC2\x9B"
                     "31m"),
            "?31m");
  EXPECT_EQ(harmless("größer"), "größer");
}

TEST(TableText, WrapBreaksAtSpacesAndIndents) {
  EXPECT_EQ(wrap("one two three", 9, 2), "  one two\n  three\n");
  EXPECT_EQ(wrap("  spaced   out ", 80, 0), "spaced out\n");
  EXPECT_EQ(wrap("unbreakable", 4, 0), "unbreakable\n");
  EXPECT_EQ(wrap("", 10, 0), "");
}

}  // namespace
}  // namespace gainsay::cli
