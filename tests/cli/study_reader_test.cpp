#include "gainsay/cli/study_reader.h"

#include "gainsay/testing/broken_studies.h"
#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

TEST(StudyReader, APlainStudyIsUnderstood) {
  const StudyReading reading = StudyFolder().read();
  ASSERT_TRUE(reading.study.has_value());
  EXPECT_TRUE(reading.diagnostics.empty());
  const Study& study = *reading.study;
  EXPECT_EQ(study.title, "Does A decay?");
  EXPECT_EQ(study.significance, 0.05);
  EXPECT_FALSE(study.descents.has_value());
  ASSERT_EQ(study.hypotheses.size(), 1U);
  EXPECT_EQ(study.hypotheses[0].letter, "A");
  EXPECT_EQ(study.hypotheses[0].file, "hypotheses/loss.toml");
  const core::Hypothesis& loss = study.hypotheses[0].mechanism;
  EXPECT_EQ(loss.title, "Loss");
  ASSERT_EQ(loss.species.size(), 2U);
  EXPECT_EQ(loss.species[0].name, "A");
  EXPECT_EQ(loss.species[0].start, core::Expression(5.0));
  ASSERT_EQ(loss.reactions.size(), 1U);
  EXPECT_EQ(loss.reactions[0].reactants, (std::vector<core::Term>{{0, 1.0}}));
  EXPECT_EQ(loss.reactions[0].products, (std::vector<core::Term>{{1, 1.0}}));
  EXPECT_EQ(loss.reactions[0].forward,
            core::Expression::symbol("k") * core::Expression::symbol("A"));
  EXPECT_EQ(loss.unknowns, std::vector<std::string>{"k"});
  ASSERT_EQ(study.experiments.size(), 1U);
  EXPECT_EQ(study.experiments[0].name, "run");
  ASSERT_EQ(study.experiments[0].series.size(), 1U);
  EXPECT_EQ(study.experiments[0].series[0].readout, "glow");
  ASSERT_EQ(study.experiments[0].series[0].points.size(), 2U);
  EXPECT_EQ(study.experiments[0].series[0].points[1].value, 4.9);
  EXPECT_EQ(study.experiments[0].series[0].points[1].line, 3U);
}

TEST(StudyReader, EveryFileReadIsKept) {
  const StudyReading reading = StudyFolder().read();
  ASSERT_EQ(reading.texts.size(), 4U);
  EXPECT_EQ(reading.texts.at("experiments/run.csv"), StudyFolder::kTable);
}

TEST(StudyReader, AFolderThatHoldsNoStudyIsSaid) {
  const testing::ScratchFolder folder;
  const StudyReading reading = read_study(folder.path() / "nowhere");
  EXPECT_FALSE(reading.study.has_value());
  ASSERT_EQ(reading.diagnostics.size(), 1U);
  EXPECT_EQ(reading.diagnostics[0].file, "study.toml");
  EXPECT_NE(reading.diagnostics[0].what.find("holds no study"), std::string::npos);
}

TEST(StudyReader, WithoutATitleAStudyIsCalledByItsFolder) {
  StudyFolder folder;
  folder.write("study.toml", std::string(StudyFolder::kStudy).substr(24));
  const StudyReading reading = folder.read();
  ASSERT_TRUE(reading.study.has_value()) << folder.messages();
  EXPECT_EQ(reading.study->title, folder.path().filename().string());
}

class BrokenStudies : public ::testing::TestWithParam<testing::BrokenStudy> {};

TEST_P(BrokenStudies, SayWhatIsWrong) {
  StudyFolder folder;
  write(GetParam(), folder);
  EXPECT_FALSE(folder.read().study.has_value());
  EXPECT_EQ(folder.messages(), GetParam().says);
}

INSTANTIATE_TEST_SUITE_P(StudyReader, BrokenStudies, ::testing::ValuesIn(testing::broken_studies()),
                         [](const auto& tested) { return tested.param.name; });

}  // namespace
}  // namespace gainsay::cli
