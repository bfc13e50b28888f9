#include "gainsay/cli/experiment_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

ExperimentReading read(const std::string& text) {
  StudyTop top;
  top.is_understood = true;
  top.inputs = {{"light", 0.0, {}}};
  const auto file = testing::source(text, "experiments/run-03.toml");
  Diagnostics diagnostics;
  const auto document = read_toml(file, diagnostics);
  ExperimentReading reading =
      read_experiment(document.value_or(TomlValue{}), "run-03", whole(file), top, diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return reading;
}

TEST(ExperimentReader, NothingSaidIsAnExperimentFromZero) {
  const ExperimentReading reading = read("");
  EXPECT_EQ(reading.experiment.name, "run-03");
  EXPECT_EQ(reading.experiment.title, "run-03");
  EXPECT_EQ(reading.experiment.begins, 0.0);
  EXPECT_EQ(reading.data, "");
  EXPECT_EQ(reading.experiment.inputs.size(), 1U);
}

TEST(ExperimentReader, AllKeysOfTheTop) {
  const ExperimentReading reading = read(
      "title = 'High load'\ndata = 'x.csv'\nbegins = -5\nabsent = ['depot']\nignore = ['who']\n"
      "knowns.fill0 = 0.8\ninputs.light = 2\n");
  EXPECT_EQ(reading.experiment.title, "High load");
  EXPECT_EQ(reading.experiment.begins, -5.0);
  EXPECT_EQ(reading.data, "x.csv");
  EXPECT_EQ(reading.experiment.absent, std::vector<std::string>{"depot"});
  EXPECT_EQ(reading.ignored_columns, std::vector<std::string>{"who"});
  EXPECT_EQ(reading.experiment.knowns.at("fill0"), 0.8);
  EXPECT_EQ(reading.experiment.inputs[0].steps[0].second, 2.0);
}

TEST(ExperimentReader, StartValuesOfAllKinds) {
  const ExperimentReading reading = read(
      "[start]\na = 40\nb = '0.98 * weighed'\nc = { value = 1.0, sd = 0.05 }\n"
      "d = { between = [1, 2] }\n");
  const auto& starts = reading.experiment.starts;
  ASSERT_EQ(starts.size(), 4U);
  EXPECT_TRUE(starts[0].value.is_number(40.0));
  EXPECT_EQ(starts[1].value, core::Expression(0.98) * core::Expression::symbol("weighed"));
  EXPECT_EQ(starts[2].unknown->name, "start.c[run-03]");
  EXPECT_EQ(starts[2].unknown->prior->sd, 0.05);
  EXPECT_EQ(starts[3].unknown->name, "start.d[run-03]");
  EXPECT_EQ(reading.expressions.size(), 2U);
  EXPECT_EQ(reading.species.size(), 4U);
}

TEST(ExperimentReader, DosesComeInOrderOfTime) {
  const ExperimentReading reading = read(
      "[[doses]]\nat = 60\nadd = { a = 10 }\n[[doses]]\nat = 30\nraise = { a = 'c', b = 1 }\n");
  const auto& doses = reading.experiment.doses;
  ASSERT_EQ(doses.size(), 2U);
  EXPECT_EQ(doses[0].at, 30.0);
  EXPECT_EQ(doses[0].raise.size(), 2U);
  EXPECT_EQ(doses[1].add[0].first, "a");
  EXPECT_TRUE(doses[1].add[0].second.is_number(10.0));
  EXPECT_EQ(reading.dose_sizes.size(), 3U);
}

}  // namespace
}  // namespace gainsay::cli
