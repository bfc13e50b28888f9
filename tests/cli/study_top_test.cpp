#include "gainsay/cli/study_top.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

StudyTop read(const std::string& text) {
  Diagnostics diagnostics;
  StudyTop top = read_study_top(testing::toml(text), {}, diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return top;
}

TEST(StudyTop, DefaultsHoldForWhatIsNotSaid) {
  const StudyTop top = read("");
  EXPECT_EQ(top.study.significance, 0.05);
  EXPECT_FALSE(top.study.decides.has_value());
  EXPECT_FALSE(top.study.descents.has_value());
  EXPECT_EQ(top.study.budget, 20000);
  EXPECT_EQ(top.study.seed, 1U);
  EXPECT_EQ(top.study.relative_accuracy, 1e-6);
  EXPECT_EQ(top.study.negligible, 1e-8);
}

TEST(StudyTop, AllKeysOfJudging) {
  const StudyTop top = read(
      "title = 'T'\nsignificance = 0.01\ndecides = 'full'\nignore = ['remarks']\n"
      "[search]\ndescents = 40\nbudget = 500\nseed = 7\n"
      "[accuracy]\nrelative = 1e-9\nnegligible = 1e-10\n");
  EXPECT_EQ(top.study.title, "T");
  EXPECT_EQ(top.study.significance, 0.01);
  EXPECT_EQ(top.study.decides, stats::WhichLimit::Full);
  EXPECT_EQ(top.study.descents, 40U);
  EXPECT_EQ(top.study.budget, 500);
  EXPECT_EQ(top.study.seed, 7U);
  EXPECT_EQ(top.study.relative_accuracy, 1e-9);
  EXPECT_EQ(top.study.negligible, 1e-10);
  EXPECT_EQ(top.ignored_columns, std::vector<std::string>{"remarks"});
}

TEST(StudyTop, UntilConvincingIsTheDefaultInWords) {
  EXPECT_FALSE(read("search.descents = 'until convincing'\n").study.descents.has_value());
  EXPECT_EQ(read("search.descents = 0\n").study.descents, 0U);
  EXPECT_EQ(read("decides = 'reduced'\n").study.decides, stats::WhichLimit::Reduced);
}

TEST(StudyTop, Inputs) {
  const StudyTop top = read("[inputs]\nlight = { otherwise = 2, unit = 'lx' }\nfeed = {}\n");
  ASSERT_EQ(top.inputs.size(), 2U);
  EXPECT_EQ(top.inputs[0].name, "light");
  EXPECT_EQ(top.inputs[0].otherwise, 2.0);
  EXPECT_FALSE(top.inputs[1].otherwise.has_value());
}

}  // namespace
}  // namespace gainsay::cli
