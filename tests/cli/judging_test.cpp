#include "gainsay/cli/judging.h"

#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

// Invented readings of a first-order decay, k about 0.5, sd 0.02.
constexpr const char* kDecay =
    "time,A\n0.5,0.79\n1,0.61\n1.5,0.46\n2,0.38\n3,0.22\n4,0.14\n5,0.08\n6,0.06\n";

StudyReading decay_study(const gainsay::testing::ScratchFolder& folder) {
  folder.write("study.toml",
               "title = \"Decay\"\n[readouts]\nA = { shows = \"A\", noise = { sd = 0.02 } }\n");
  folder.write(
      "hypotheses/first.toml",
      "title = \"First order\"\nspecies.A = { start = 1 }\n"
      "reactions.decay = { equation = \"A ->\", rate = \"k * A\" }\nunknowns.k = [0.01, 10]\n");
  folder.write(
      "hypotheses/zeroth.toml",
      "title = \"Constant\"\nspecies.A = { start = 1 }\n"
      "reactions.decay = { equation = \"A ->\", rate = \"k\" }\nunknowns.k = [0.01, 10]\n");
  folder.write("experiments/run.csv", kDecay);
  return read_study(folder.path());
}

TEST(Judging, EveryHypothesisIsJudgedForItself) {
  const gainsay::testing::ScratchFolder folder;
  const StudyReading reading = decay_study(folder);
  ASSERT_TRUE(reading.study) << (reading.diagnostics.empty() ? ""
                                                             : reading.diagnostics.front().what);
  const Judgement judgement = judge_study(reading, {.threads = 2}, {});
  ASSERT_EQ(judgement.outcomes.size(), 2U);
  EXPECT_EQ(judgement.outcomes[0].judged.verdict.decision, stats::Decision::NotRejected);
  EXPECT_EQ(judgement.outcomes[1].judged.verdict.decision, stats::Decision::Rejected);
  EXPECT_EQ(judgement.outcomes[0].curves.size(), 1U);
  EXPECT_EQ(judgement.outcomes[0].weight, 1.0);
}

TEST(Judging, NamesWhatWasReadAndWithWhatItWasComputed) {
  const gainsay::testing::ScratchFolder folder;
  const Judgement judgement = judge_study(decay_study(folder), {}, {});
  ASSERT_EQ(judgement.fingerprints.size(), 4U);
  EXPECT_EQ(judgement.fingerprints[0].file, "experiments/run.csv");
  EXPECT_EQ(judgement.fingerprints[0].sha256.size(), 64U);
  EXPECT_FALSE(judgement.version.empty());
  EXPECT_FALSE(judgement.libraries.empty());
}

TEST(Judging, AStopKeepsWhatWasFinished) {
  const gainsay::testing::ScratchFolder folder;
  std::stop_source stop;
  const JudgingObserver stops_at_second = {.begins = [&](std::size_t number, const std::string&) {
    number == 1 ? stop.request_stop() : false;
  }};
  const Judgement judgement =
      judge_study(decay_study(folder), {.threads = 1, .stop = stop.get_token()}, stops_at_second);
  ASSERT_EQ(judgement.outcomes.size(), 1U);
  EXPECT_EQ(judgement.outcomes[0].hypothesis, 0U);
}

TEST(Judging, ToSimulateNeedsNoData) {
  const gainsay::testing::ScratchFolder folder;
  Study study = *decay_study(folder).study;
  study.experiments[0].series.clear();
  const auto problem = assemble_problem(study, 0, Purpose::Simulate);
  ASSERT_TRUE(problem) << problem.failure().what;
  EXPECT_EQ(problem->experiments.size(), 1U);
}

TEST(Judging, DecisionsHaveOneWordEach) {
  EXPECT_EQ(word(stats::Decision::Rejected), "rejected");
  EXPECT_EQ(word(stats::Decision::NotRejected), "not rejected");
  EXPECT_EQ(word(stats::Decision::Undecided), "undecided");
}

}  // namespace
}  // namespace gainsay::cli
