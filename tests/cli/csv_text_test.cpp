#include "gainsay/cli/csv_text.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

// RFC 4180, section 2, rules 5 to 7.
TEST(CsvText, QuotesOnlyWhatNeedsIt) {
  EXPECT_EQ(csv_cell("plain text"), "plain text");
  EXPECT_EQ(csv_cell("a,b"), "\"a,b\"");
  EXPECT_EQ(csv_cell("say \"x\""), "\"say \"\"x\"\"\"");
  EXPECT_EQ(csv_cell("two\nlines"), "\"two\nlines\"");
}

TEST(CsvText, ALineIsCellsJoinedByCommas) {
  EXPECT_EQ(csv_line({"time", "a,b", ""}), "time,\"a,b\",\n");
}

}  // namespace
}  // namespace gainsay::cli
