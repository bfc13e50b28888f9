#include "gainsay/cli/data_check.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

StudyFolder with_sds(const std::string& readout) {
  const std::string study =
      "[readouts]\nglow = { shows = 'A'" + readout + " }\n[unknowns]\nk = [0.01, 10]\n";
  return {{"experiments/run.csv", "time,glow,sd glow\n1,7.2,0.1\n2,4.9,0.2\n"},
          {"study.toml", study.c_str()}};
}

TEST(DataCheck, WhatSdsBelongToIsAskedByLookingAndNeededByJudging) {
  const StudyFolder folder = with_sds("");
  EXPECT_FALSE(folder.read(ReadFor::Judging).study.has_value());
  EXPECT_TRUE(folder.read(ReadFor::Looking).study.has_value());
  EXPECT_NE(folder.messages(ReadFor::Judging).find("error: what the sds of 'glow' belong to"),
            std::string::npos);
  EXPECT_NE(folder.messages(ReadFor::Looking).find("warning: what the sds of 'glow' belong to"),
            std::string::npos);
}

TEST(DataCheck, SaidOnceItIsAskedNoMore) {
  for (const char* words : {", sd_of = 'mean'", ", sd_of = 'reading'"}) {
    EXPECT_EQ(with_sds(words).messages(), "") << words;
  }
}

TEST(DataCheck, AStudyWithoutReadingsCanBeLookedAt) {
  StudyFolder folder{{"experiments/run.csv", "time,glow\n"}};
  std::filesystem::remove(folder.path() / "experiments/run.csv");
  EXPECT_FALSE(folder.read(ReadFor::Judging).study.has_value());
  EXPECT_TRUE(folder.read(ReadFor::Looking).study.has_value());
  std::filesystem::remove(folder.path() / "experiments/run.toml");
  EXPECT_TRUE(folder.read(ReadFor::Looking).study.has_value());
}

TEST(DataCheck, AReadoutOrAnExperimentWithoutReadingsIsAWarning) {
  StudyFolder folder{{"experiments/planned.toml", ""}};
  folder.write("study.toml",
               "[readouts]\nglow = { shows = 'A', noise = { sd = 0.1 } }\n"
               "dim = { shows = 'B' }\n[unknowns]\nk = [0.01, 10]\n");
  EXPECT_EQ(
      folder.messages(),
      "experiments/planned.toml: warning: the experiment 'planned' has no readings that count\n"
      "    to do: put its table beside it as planned.csv, or name it by data = \"...\"\n"
      "study.toml:3:1: warning: no experiment has readings of 'dim'\n"
      "    to do: add readings, or remove the readout\n");
}

TEST(DataCheck, AReadingThatIsLeftOutNeedsNoSd) {
  StudyFolder folder = with_sds(", sd_of = 'mean'");
  folder.write("experiments/run.csv", "time,glow,sd glow,left_out\n1,7.2,0.1,\n2,4.9,,bubble\n");
  EXPECT_EQ(folder.messages(), "");
}

}  // namespace
}  // namespace gainsay::cli
