#include "gainsay/cli/study_summary.h"

#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using Names = std::vector<std::string>;

StudySummary summary() {
  testing::StudyFolder folder;
  folder.write(
      "study.toml",
      "title = 'Does A decay?'\n[readouts]\nglow = { shows = 'A', scale = 'unknown', noise = { sd "
      "= 0.1 } }\n[unknowns]\nk = { between = [0.01, 10], prior = { value = 1, sd = 0.5 } }\n");
  folder.write("hypotheses/other.toml",
               "base = 'loss.toml'\ntitle = 'Other'\nreactions.back = { equation = 'B <-> A', rate "
               "= 'k * B' "
               "}\n");
  folder.write("experiments/run.toml",
               "title = 'First run'\nstart = { A = { between = [1, 20] } }\n");
  folder.write("experiments/run.csv", "time,glow,left_out\n1,7.2,\n2,4.9,\n3,9.9,bubble\n");
  const StudyReading reading = folder.read();
  EXPECT_TRUE(reading.study.has_value()) << folder.messages();
  return reading.study ? summarize(*reading.study) : StudySummary{};
}

TEST(StudySummary, SaysWhatWasUnderstood) {
  const StudySummary all = summary();
  ASSERT_EQ(all.hypotheses.size(), 2U);
  const HypothesisSummary& other = all.hypotheses[1];
  EXPECT_EQ(other.letter, "B");
  EXPECT_EQ(other.base, "Loss");
  EXPECT_EQ(other.species, (Names{"A", "B"}));
  EXPECT_EQ(other.reactions, (Names{"loss: A -> B", "back: B <-> A"}));
  EXPECT_EQ(other.conserved, Names{"A + B"});
  EXPECT_EQ(other.kinetic, Names{"k"});
  EXPECT_EQ(other.initial, Names{"start.A[run]"});
  EXPECT_EQ(other.measurement, Names{"scale.glow"});
  EXPECT_EQ(other.data, 2U);
  EXPECT_EQ(other.priors, 1U);
  EXPECT_EQ(other.residuals(), 3U);
  EXPECT_EQ(other.unknowns(), 3U);
}

TEST(StudySummary, CountsReadingsOfEachExperiment) {
  const StudySummary all = summary();
  ASSERT_EQ(all.experiments.size(), 1U);
  ASSERT_EQ(all.experiments[0].readouts.size(), 1U);
  EXPECT_EQ(all.experiments[0].readouts[0].counted, 2U);
  EXPECT_EQ(all.experiments[0].readouts[0].left_out, 1U);
  EXPECT_EQ(all.experiments[0].first, 1.0);
  EXPECT_EQ(all.experiments[0].last, 3.0);
}

TEST(StudySummary, InWords) {
  EXPECT_EQ(summary_text(summary()),
            "Does A decay?\n"
            "\n"
            "2 hypotheses\n"
            "A  Loss  (hypotheses/loss.toml)\n"
            "   species      A, B\n"
            "   reactions    loss: A -> B\n"
            "   conserved    A + B\n"
            "   kinetic      k\n"
            "   initial      start.A[run]\n"
            "   measurement  scale.glow\n"
            "   counts       2 readings and 1 value from earlier work against 3 unknowns\n"
            "B  Other  (hypotheses/other.toml)\n"
            "   amends       Loss\n"
            "   species      A, B\n"
            "   reactions    loss: A -> B; back: B <-> A\n"
            "   conserved    A + B\n"
            "   kinetic      k\n"
            "   initial      start.A[run]\n"
            "   measurement  scale.glow\n"
            "   counts       2 readings and 1 value from earlier work against 3 unknowns\n"
            "\n"
            "1 experiment\n"
            "run  First run\n"
            "   readings     glow 2 (1 left out)\n"
            "   times        1 to 3\n");
}

}  // namespace
}  // namespace gainsay::cli
