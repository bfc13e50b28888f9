#include "gainsay/cli/table_columns.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <optional>
#include <string>

namespace gainsay::cli {
namespace {

const TableContext kContext{{"glow", "dim"}, {"light"}, {"c0"}, {"remarks"}, 0.0};

std::optional<TableColumns> understand(const std::string& header, std::string& said) {
  Diagnostics diagnostics;
  const auto table = read_csv(testing::source(header + "\n", "t.csv"), diagnostics);
  auto columns = understand_columns(table.value_or(CsvTable{}), kContext, diagnostics);
  said = testing::said_briefly(diagnostics);
  return columns;
}

TEST(TableColumns, Wide) {
  std::string said;
  const auto columns = understand("sd dim,replicate,dim,remarks,time,left_out,glow", said);
  ASSERT_TRUE(columns.has_value()) << said;
  EXPECT_FALSE(columns->is_tidy());
  EXPECT_EQ(columns->time, 4U);
  EXPECT_EQ(columns->left_out, 5U);
  ASSERT_EQ(columns->wide.size(), 2U);
  EXPECT_EQ(columns->wide[0].readout, 0U);
  EXPECT_EQ(columns->wide[0].value, 6U);
  EXPECT_FALSE(columns->wide[0].sd.has_value());
  EXPECT_EQ(columns->wide[1].value, 2U);
  EXPECT_EQ(columns->wide[1].sd, 0U);
}

TEST(TableColumns, Tidy) {
  std::string said;
  const auto columns = understand("time,readout,value,sd,left_out", said);
  ASSERT_TRUE(columns.has_value()) << said;
  EXPECT_TRUE(columns->is_tidy());
  EXPECT_EQ(columns->readout, 1U);
  EXPECT_EQ(columns->value, 2U);
  EXPECT_EQ(columns->sd, 3U);
}

TEST(TableColumns, EveryColumnOfNoUseIsSaidAtOnce) {
  std::string said;
  EXPECT_FALSE(understand("time,glow,foo,light,c0,n glow,time (min)", said));
  EXPECT_EQ(said,
            "1:11: the column 'foo' has no meaning\n"
            "1:15: not yet: 'light' is not read by this version\n"
            "1:21: not yet: 'c0' is not read by this version\n"
            "1:24: not yet: 'n glow' is not read by this version\n"
            "1:31: not yet: 'time (min)' is not read by this version\n");
}

TEST(TableColumns, TheTimeIsNeeded) {
  std::string said;
  EXPECT_FALSE(understand("glow,dim", said));
  EXPECT_EQ(said, "1:1: not yet: a table without a time column is not read by this version\n");
}

}  // namespace
}  // namespace gainsay::cli
