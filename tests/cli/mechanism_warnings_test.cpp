#include "gainsay/cli/mechanism_warnings.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

std::string said(const StudyFolder& folder) {
  const StudyReading reading = folder.read(ReadFor::Looking);
  EXPECT_TRUE(reading.study.has_value()) << folder.messages(ReadFor::Looking);
  if (!reading.study) return "";
  std::ostringstream out;
  print(out, as_diagnostics(mechanism_warnings(reading)), false);
  return out.str();
}

TEST(MechanismWarnings, ASoundStudyGivesNone) { EXPECT_EQ(said(StudyFolder()), ""); }

TEST(MechanismWarnings, TheyStandWhereTheNameIsDeclared) {
  StudyFolder folder;
  folder.write("hypotheses/loss.toml",
               std::string(StudyFolder::kLoss) +
                   "drain = { equation = 'A ->', rate = 'k2' }\n"
                   "[where]\nspare = 'A'\n[unknowns]\nk2 = [1, 2]\nk3 = [1, 2]\n");
  EXPECT_EQ(
      said(folder),
      "hypotheses/loss.toml:7:1: warning: the rate of 'drain' does not vanish when 'A' is used "
      "up: 'A' can go negative\n"
      "    to do: let it depend on 'A' so that it vanishes with it\n"
      "hypotheses/loss.toml:9:1: warning: nothing uses 'spare', which stands under [where]\n"
      "    to do: use it, or leave it out\n"
      "hypotheses/loss.toml:12:1: warning: nothing depends on the unknown 'k3'\n"
      "    to do: use it, or leave it out\n");
}

TEST(MechanismWarnings, TwoHypothesesThatAreTheSameSystem) {
  StudyFolder folder;
  folder.write("hypotheses/same.toml",
               "base = 'loss.toml'\ntitle = 'Same'\nreactions.loss.rate = '2 * A * k / 2'\n");
  EXPECT_EQ(
      said(folder),
      "hypotheses/same.toml: warning: 'Same' is the same system as 'Loss': no data can tell them "
      "apart\n"
      "    to do: correct one of the two, or remove it\n");
}

}  // namespace
}  // namespace gainsay::cli
