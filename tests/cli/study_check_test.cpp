#include "gainsay/cli/study_check.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

// Errors are listed in tests/programs/broken; here, what is a warning, and what is none.
TEST(StudyCheck, NamesThatNothingUsesAreWarnings) {
  StudyFolder folder;
  folder.write("study.toml",
               std::string(StudyFolder::kStudy) +
                   "spare = [1, 2]\n[knowns]\nc = 1\n[inputs]\nlight = { otherwise = 0 }\n");
  EXPECT_TRUE(folder.read().study.has_value());
  EXPECT_EQ(folder.messages(),
            "study.toml:6:1: warning: nothing uses the unknown 'spare'\n"
            "    to do: correct its name, or remove it\n"
            "study.toml:8:1: warning: nothing uses the known 'c'\n"
            "    to do: correct its name, or remove it\n"
            "study.toml:10:1: warning: nothing uses the input 'light'\n"
            "    to do: correct its name, or remove it\n");
}

TEST(StudyCheck, ASpeciesListedAsAbsentMayBeLacking) {
  StudyFolder folder;
  folder.write("hypotheses/other.toml",
               "base = 'loss.toml'\ntitle = 'Other'\nspecies.C = {}\n"
               "reactions.more = { equation = 'C ->', rate = 'k * C' }\n");
  folder.write("experiments/run.toml", "start = { A = 10, C = 2 }\nabsent = ['C']\n");
  EXPECT_EQ(folder.messages(), "");
}

TEST(StudyCheck, AnExperimentMayReplaceAKnown) {
  StudyFolder folder;
  folder.write("study.toml", std::string(StudyFolder::kStudy) + "[knowns]\nc = 1\n");
  folder.write("experiments/run.toml", "start = { A = 'c' }\nknowns.c = 5\n");
  folder.write("experiments/second.csv", StudyFolder::kTable);
  EXPECT_EQ(folder.messages(), "");
}

}  // namespace
}  // namespace gainsay::cli
