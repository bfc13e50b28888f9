#include "gainsay/cli/unknown_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using testing::said;
using testing::toml;

std::vector<ReadUnknown> unknowns(const char* text) {
  const TomlValue document = toml(std::string("[unknowns]\n") + text + "\n");
  Diagnostics diagnostics;
  const CheckedTable top(document, Section::Study, Section::Study, diagnostics);
  auto read = read_unknowns(top, Section::Study, diagnostics);
  EXPECT_EQ(said(diagnostics), "");
  return read;
}

TEST(UnknownReader, ARangeAloneIsSearchedInItsLogarithm) {
  const auto read = unknowns("Km = [0.01, 10]");
  ASSERT_EQ(read.size(), 1U);
  const estimation::Unknown& unknown = read[0].declared.unknown;
  EXPECT_EQ(unknown.name, "Km");
  EXPECT_EQ(unknown.low, 0.01);
  EXPECT_EQ(unknown.high, 10.0);
  EXPECT_FALSE(unknown.linear);
  EXPECT_FALSE(unknown.hard);
  EXPECT_FALSE(read[0].declared.per_experiment);
}

TEST(UnknownReader, AllKeysOfATable) {
  const auto read = unknowns(
      "x = { between = [-1, 3], unit = 'mV', linear = true, per = 'experiment', "
      "prior = { value = 1, sd = 0.5 }, first = [0, 2], hard = true }");
  ASSERT_EQ(read.size(), 1U);
  const estimation::Unknown& unknown = read[0].declared.unknown;
  EXPECT_EQ(unknown.low, -1.0);
  EXPECT_TRUE(unknown.linear);
  EXPECT_TRUE(unknown.hard);
  EXPECT_EQ(unknown.unit, "mV");
  EXPECT_EQ(unknown.first, (std::vector<double>{0.0, 2.0}));
  EXPECT_TRUE(read[0].declared.per_experiment);
  EXPECT_EQ(unknown.prior, (estimation::Prior{1.0, 0.5, std::nullopt}));
}

TEST(UnknownReader, APriorMayScatterGeometrically) {
  const auto read = unknowns("k = { between = [1, 9], prior = { value = 3, geometric_sd = 1.5 } }");
  EXPECT_EQ(read[0].declared.unknown.prior, (estimation::Prior{3.0, std::nullopt, 1.5}));
}

TEST(UnknownReader, KnownsAreNumbersOrTables) {
  const TomlValue document = toml("[knowns]\na = 2\nb = { value = 3, unit = 'L' }\n");
  Diagnostics diagnostics;
  const CheckedTable top(document, Section::Study, Section::Study, diagnostics);
  const auto knowns = read_knowns(top, Section::Study, diagnostics);
  ASSERT_EQ(knowns.size(), 2U);
  EXPECT_EQ(knowns[0].value, 2.0);
  EXPECT_EQ(knowns[1].name, "b");
  EXPECT_EQ(knowns[1].value, 3.0);
  EXPECT_EQ(knowns[1].place.line, 3U);
}

estimation::Unknown start(const char* table) {
  const TomlValue document = toml(std::string("x = ") + table + "\n");
  Diagnostics diagnostics;
  const auto read = read_uncertain_start(document.entries[0].value, diagnostics);
  EXPECT_EQ(said(diagnostics), "");
  return read.value_or(estimation::Unknown{});
}

TEST(UnknownReader, AStartAsWeighedInIsOneMoreMeasurement) {
  const estimation::Unknown unknown = start("{ value = 1.0, sd = 0.05 }");
  EXPECT_EQ(unknown.prior, (estimation::Prior{1.0, 0.05, std::nullopt}));
  EXPECT_TRUE(unknown.linear);
  EXPECT_DOUBLE_EQ(unknown.low, 0.75);
  EXPECT_DOUBLE_EQ(unknown.high, 1.25);
  EXPECT_EQ(unknown.first, std::vector<double>{1.0});
  EXPECT_EQ(unknown.kind, estimation::UnknownKind::Initial);
}

TEST(UnknownReader, AWeighedStartIsNotNegative) {
  EXPECT_EQ(start("{ value = 1.0, sd = 0.5 }").low, 0.0);
}

TEST(UnknownReader, AStartWithinARange) {
  const estimation::Unknown unknown = start("{ between = [0.1, 10], first = 2 }");
  EXPECT_EQ(unknown.low, 0.1);
  EXPECT_FALSE(unknown.linear);
  EXPECT_FALSE(unknown.prior.has_value());
  EXPECT_EQ(unknown.first, std::vector<double>{2.0});
}

TEST(UnknownReader, WhatIsWrongStaysNamed) {
  const TomlValue document = toml("[unknowns]\na = [3, 1]\nb = 'x'\n");
  Diagnostics diagnostics;
  const CheckedTable top(document, Section::Study, Section::Study, diagnostics);
  EXPECT_EQ(read_unknowns(top, Section::Study, diagnostics).size(), 2U);
  EXPECT_EQ(diagnostics.errors(), 2U);
}

}  // namespace
}  // namespace gainsay::cli
