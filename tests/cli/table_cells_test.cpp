#include "gainsay/cli/table_cells.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <optional>
#include <string>

namespace gainsay::cli {
namespace {

std::optional<double> number(const std::string& text, std::string* said = nullptr) {
  const CsvTable table{testing::source("", "t.csv"), {}, {}};
  Diagnostics diagnostics;
  const auto value = number_in(table, {text, 2, 3}, "value", " of 'glow'", diagnostics);
  if (said != nullptr) *said = testing::said_briefly(diagnostics);
  EXPECT_EQ(value.has_value(), !diagnostics.has_errors());
  return value;
}

std::string said(const std::string& text) {
  std::string words;
  EXPECT_FALSE(number(text, &words).has_value());
  return words;
}

TEST(TableCells, Numbers) {
  EXPECT_EQ(number("2"), 2.0);
  EXPECT_EQ(number("-2.5e-3"), -0.0025);
  EXPECT_EQ(number("+4"), 4.0);
  EXPECT_EQ(number(".5"), 0.5);
  EXPECT_EQ(number("5."), 5.0);
}

TEST(TableCells, WhatIsNoNumberIsSaid) {
  EXPECT_EQ(said("1.5x"), "2:3: the value '1.5x' of 'glow' is no number\n");
  EXPECT_EQ(said("++4"), "2:3: the value '++4' of 'glow' is no number\n");
  EXPECT_EQ(said("0x10"), "2:3: the value '0x10' of 'glow' is no number\n");
  EXPECT_EQ(said("1,5"), "2:3: the value '1,5' of 'glow' has a decimal comma\n");
  EXPECT_EQ(said("inf"), "2:3: the value 'inf' of 'glow' is not finite\n");
  EXPECT_EQ(said("nan"), "2:3: the value 'nan' of 'glow' is not finite\n");
  EXPECT_EQ(said("1e999"), "2:3: the value '1e999' of 'glow' is not finite\n");
  EXPECT_EQ(said("<0.1"), "2:3: not yet: '<0.1' is not read by this version\n");
  EXPECT_EQ(said("60+"), "2:3: not yet: '60+' is not read by this version\n");
}

TEST(TableCells, Missing) {
  EXPECT_TRUE(is_missing({"", 1, 1}));
  EXPECT_TRUE(is_missing({"NA", 1, 1}));
  EXPECT_FALSE(is_missing({"0", 1, 1}));
}

}  // namespace
}  // namespace gainsay::cli
