#include "gainsay/cli/command_check.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

struct Ran {
  int status = -1;
  std::string out;
  std::string messages;
};

Ran check(const StudyFolder& folder, bool json = false) {
  std::ostringstream out, messages;
  const int status = run_check({folder.path(), json}, {out, messages});
  return {status, out.str(), messages.str()};
}

TEST(CommandCheck, ASoundStudyIsSummedUp) {
  const Ran run = check(StudyFolder());
  EXPECT_EQ(run.status, kDone);
  EXPECT_NE(run.out.find("A  Loss  (hypotheses/loss.toml)\n"), std::string::npos) << run.out;
  EXPECT_NE(run.out.find("counts       2 readings against 1 unknown\n"), std::string::npos)
      << run.out;
  EXPECT_EQ(run.messages, "");
}

TEST(CommandCheck, AWrongStudyEndsWithTwoAndPrintsNoResult) {
  const Ran run = check({{"experiments/run.csv", "time,glow\n1,x\n"}});
  EXPECT_EQ(run.status, kWrongInput);
  EXPECT_EQ(run.out, "");
  EXPECT_NE(run.messages.find("experiments/run.csv:2:3: error:"), std::string::npos)
      << run.messages;
}

TEST(CommandCheck, WhatJudgingNeedsIsAsked) {
  const Ran run = check({{"experiments/run.csv", "time,glow,sd glow\n1,7,0.1\n"}});
  EXPECT_EQ(run.status, kDone);
  EXPECT_NE(run.messages.find("warning: what the sds of 'glow' belong to is not said"),
            std::string::npos)
      << run.messages;
  EXPECT_NE(run.messages.find("add to readouts.glow in study.toml: sd_of = \"mean\""),
            std::string::npos);
}

TEST(CommandCheck, WarningsOfMechanismsComeWithTheOthers) {
  const Ran run = check({{"hypotheses/same.toml", "base = 'loss.toml'\ntitle = 'Same'\n"}});
  EXPECT_EQ(run.status, kDone);
  EXPECT_NE(run.messages.find("'Same' is the same system as 'Loss'"), std::string::npos);
}

TEST(CommandCheck, JsonHoldsTheSameFacts) {
  const auto json = nlohmann::json::parse(
      check({{"hypotheses/same.toml", "base = 'loss.toml'\ntitle = 'Same'\n"}}, true).out);
  EXPECT_EQ(json["title"], "Does A decay?");
  EXPECT_EQ(json["hypotheses"].size(), 2U);
  EXPECT_EQ(json["hypotheses"][0]["base"], nullptr);
  EXPECT_EQ(json["hypotheses"][1]["base"], "Loss");
  EXPECT_EQ(json["hypotheses"][0]["unknowns"]["kinetic"][0], "k");
  EXPECT_EQ(json["hypotheses"][0]["data"], 2);
  EXPECT_EQ(json["experiments"][0]["readings"][0]["counted"], 2);
  EXPECT_EQ(json["warnings"].size(), 1U);
  EXPECT_EQ(json["errors"].size(), 0U);
}

TEST(CommandCheck, JsonOfAWrongStudyHoldsItsErrors) {
  const Ran run = check({{"experiments/run.csv", "time,glow\n1,\xFF\n"}}, true);
  EXPECT_EQ(run.status, kWrongInput);
  const auto json = nlohmann::json::parse(run.out);
  EXPECT_EQ(json["errors"][0]["file"], "experiments/run.csv");
  EXPECT_EQ(json["errors"][0]["line"], 2);
  EXPECT_EQ(json["errors"][0]["column"], 3);
}

}  // namespace
}  // namespace gainsay::cli
