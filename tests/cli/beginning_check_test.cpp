#include "gainsay/cli/beginning_check.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

std::string said(const std::string& readout, const std::string& experiment,
                 const std::string& table) {
  StudyFolder folder;
  folder.write("study.toml", "[readouts]\nglow = { " + readout +
                                 ", noise = { sd = 0.1 } }\n[unknowns]\nk = [0.01, 10]\n"
                                 "[knowns]\nA0 = 10\n");
  folder.write("experiments/run.toml", experiment);
  folder.write("experiments/run.csv", "time,glow,left_out\n" + table);
  std::string messages = folder.messages();
  const std::string unused =
      "study.toml:6:1: warning: nothing uses the known 'A0'\n"
      "    to do: correct its name, or remove it\n";
  if (messages.ends_with(unused)) messages.resize(messages.size() - unused.size());
  return messages;
}

constexpr const char* kWarning =
    "experiments/run.csv:2:3: warning: the reading of 'glow' at the beginning, 10, equals the "
    "start "
    "value that is given: it is no datum\n"
    "    to do: leave it out by a reason in a left_out column, or make the start value an "
    "unknown\n";

TEST(BeginningCheck, AReadingThatRepeatsAStartValueIsWarnedOf) {
  EXPECT_EQ(said("shows = 'A'", "start.A = 10\n", "0,10,\n1,7,\n"), kWarning);
  EXPECT_EQ(said("shows = 'A'", "start.A = 'A0'\n", "0,10.0,\n1,7,\n"), kWarning);
  EXPECT_EQ(said("shows = '2 * A'", "start.A = 5\n", "0,10,\n1,7,\n"), kWarning);
  EXPECT_EQ(said("shows = 'A', scale = 2, offset = 4", "start.A = 3\n", "0,10,\n1,7,\n"), kWarning);
  EXPECT_EQ(said("shows = '2 * A'", "", "0,10,\n1,7,\n"), kWarning);  // the hypothesis' own start
}

TEST(BeginningCheck, WhatIsADatumIsNot) {
  EXPECT_EQ(said("shows = 'A'", "start.A = 10\n", "0,10.1,\n1,7,\n"), "");
  EXPECT_EQ(said("shows = 'A'", "start.A = 10\n", "1,10,\n2,7,\n"), "");
  EXPECT_EQ(said("shows = 'A'", "start.A = 10\n", "0,10,weighed in\n1,7,\n"), "");
  EXPECT_EQ(said("shows = 'A', scale = 'unknown'", "start.A = 10\n", "0,10,\n1,7,\n"), "");
  EXPECT_EQ(said("shows = 'A'", "start.A = { between = [1, 20] }\n", "0,10,\n1,7,\n"), "");
  EXPECT_EQ(said("shows = 'k * A'", "start.A = 10\n", "0,10,\n1,7,\n"), "");
}

}  // namespace
}  // namespace gainsay::cli
