#include "gainsay/cli/hypothesis_check.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

// What it says is listed in tests/programs/broken/hypotheses.txt; here, how names come together.
core::Hypothesis mechanism(const std::string& study, const std::string& hypothesis,
                           const std::string& experiment = StudyFolder::kRun) {
  StudyFolder folder;
  folder.write("study.toml", std::string(StudyFolder::kStudy) + study);
  folder.write("hypotheses/loss.toml", std::string(StudyFolder::kLoss) + hypothesis);
  folder.write("experiments/run.toml", experiment);
  const StudyReading reading = folder.read();
  EXPECT_TRUE(reading.study.has_value()) << folder.messages();
  return reading.study ? reading.study->hypotheses[0].mechanism : core::Hypothesis{};
}

TEST(HypothesisCheck, NamesOfTheStudyAreAdded) {
  const core::Hypothesis one = mechanism("[knowns]\nc = 2\n[inputs]\nlight = { otherwise = 1 }\n",
                                         "gain = { equation = '-> A', rate = 'c * light' }\n");
  EXPECT_EQ(one.knowns.at("c"), 2.0);
  EXPECT_EQ(one.unknowns, std::vector<std::string>{"k"});
  EXPECT_EQ(one.inputs, std::vector<std::string>{"light"});
}

TEST(HypothesisCheck, AKnownOfItsOwnFixesAnUnknownOfTheStudy) {
  const core::Hypothesis one = mechanism("", "[knowns]\nk = 0.3\n");
  EXPECT_EQ(one.knowns.at("k"), 0.3);
  EXPECT_TRUE(one.unknowns.empty());
}

TEST(HypothesisCheck, AnUnknownOfItsOwnReplacesAKnownOfTheStudy) {
  const core::Hypothesis one = mechanism("[knowns]\nc = 2\n",
                                         "gain = { equation = '-> A', rate = 'c' }\n"
                                         "[unknowns]\nc = [1, 3]\n");
  EXPECT_TRUE(one.knowns.empty());
  EXPECT_EQ(one.unknowns, (std::vector<std::string>{"k", "c"}));
}

TEST(HypothesisCheck, AKnownThatOnlyExperimentsGiveIsNotTheHypothesis) {
  const core::Hypothesis one =
      mechanism("", "gain = { equation = '-> A', rate = 'fill' }\n", "knowns.fill = 3\n");
  EXPECT_TRUE(one.knowns.empty());
}

TEST(HypothesisCheck, AVolumeMayLeanOnConstantsThroughWhere) {
  const core::Hypothesis one =
      mechanism("[knowns]\nc = 2\n",
                "[compartments]\ntank = { volume = 'whole' }\n[where]\nwhole = '2 * c'\n");
  EXPECT_EQ(one.compartments[0].volume, core::Expression::symbol("whole"));
}

}  // namespace
}  // namespace gainsay::cli
