#include "gainsay/cli/table_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <cmath>
#include <string>
#include <utility>
#include <vector>

namespace gainsay::cli {
namespace {

const TableContext kContext{{"glow", "dim"}, {}, {}, {}, 0.0};

std::vector<ReadSeries> read(const std::string& text, const TableContext& context = kContext) {
  Diagnostics diagnostics;
  const auto table = read_csv(testing::source(text, "t.csv"), diagnostics);
  auto series = read_table(table.value_or(CsvTable{}), context, diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return series;
}

// (time, value) of each point.
std::vector<std::pair<double, double>> points(const ReadSeries& series) {
  std::vector<std::pair<double, double>> all;
  for (const ReadPoint& read : series.points) all.emplace_back(read.point.time, read.point.value);
  return all;
}

using Points = std::vector<std::pair<double, double>>;

TEST(TableReader, WideWithMissingFields) {
  const auto series = read("time,dim,glow\n1,10,1\n2,NA,2\n3,,3\n");
  ASSERT_EQ(series.size(), 2U);
  EXPECT_EQ(series[0].readout, 0U);
  EXPECT_EQ(points(series[0]), (Points{{1, 1}, {2, 2}, {3, 3}}));
  EXPECT_EQ(points(series[1]), (Points{{1, 10}}));
  EXPECT_EQ(series[1].points[0].place.column, 3U);
  EXPECT_EQ(series[1].points[0].point.line, 2U);
}

TEST(TableReader, TidySaysTheSameAsWide) {
  const auto tidy = read("readout,time,value\ndim,1,10\nglow,1,1\nglow,3,3\nglow,2,2\n");
  const auto wide = read("time,dim,glow\n1,10,1\n2,,2\n3,,3\n");
  ASSERT_EQ(tidy.size(), wide.size());
  for (std::size_t i = 0; i < tidy.size(); ++i) EXPECT_EQ(points(tidy[i]), points(wide[i]));
}

TEST(TableReader, RowsComeInOrderOfTimeReplicatesInOrderOfTheTable) {
  const auto series = read("time,glow\n5,1\n2,4\n5,3\n2,2\n");
  EXPECT_EQ(points(series[0]), (Points{{2, 4}, {2, 2}, {5, 1}, {5, 3}}));
}

TEST(TableReader, APointMayHaveAnSdOfItsOwn) {
  const auto series = read("time,glow,sd glow\n1,5,0.2\n2,6,\n");
  EXPECT_EQ(series[0].points[0].point.sd, 0.2);
  EXPECT_TRUE(std::isnan(series[0].points[1].point.sd));
}

TEST(TableReader, AReasonLeavesAllOfARowOut) {
  const auto series = read("time,glow,dim,left_out\n1,5,6,bubble\n2,6,7,\n");
  EXPECT_EQ(series[0].points[0].point.left_out, "bubble");
  EXPECT_EQ(series[1].points[0].point.left_out, "bubble");
  EXPECT_EQ(series[0].points[1].point.left_out, "");
}

TEST(TableReader, RowsWithoutAnythingAreLeftByASpreadsheet) {
  EXPECT_EQ(points(read("time,glow\n1,5\n,\nNA,\n2,6\n")[0]), (Points{{1, 5}, {2, 6}}));
}

TEST(TableReader, AnExperimentMayBeginBeforeZero) {
  TableContext early = kContext;
  early.begins = -5.0;
  EXPECT_EQ(points(read("time,glow\n-5,1\n", early)[0]), (Points{{-5, 1}}));
}

}  // namespace
}  // namespace gainsay::cli
