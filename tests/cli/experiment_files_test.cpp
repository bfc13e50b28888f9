#include "gainsay/cli/experiment_files.h"

#include "gainsay/testing/reading.h"
#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

StudyTop top() {
  StudyTop top;
  top.is_understood = true;
  top.readouts.emplace_back().readout.name = "glow";
  return top;
}

ReadExperiments read(const testing::ScratchFolder& folder, std::string& said) {
  StudyFiles files(folder.path());
  Diagnostics diagnostics;
  ReadExperiments all = read_experiments(files, top(), {}, diagnostics);
  said = testing::said_briefly(diagnostics);
  return all;
}

TEST(ExperimentFiles, ATableLiesBesideItsFileOrIsNamed) {
  const testing::ScratchFolder folder;
  folder.write("experiments/b.toml", "");
  folder.write("experiments/b.csv", "time,glow\n1,2\n");
  folder.write("experiments/a.toml", "data = '../data/a-2024.csv'\n");
  folder.write("data/a-2024.csv", "time,glow\n1,2\n2,3\n");
  std::string said;
  const ReadExperiments all = read(folder, said);
  ASSERT_EQ(all.experiments.size(), 2U) << said;
  EXPECT_EQ(all.experiments[0].experiment.name, "a");
  EXPECT_EQ(all.experiments[0].series[0].points.size(), 2U);
  EXPECT_EQ(all.experiments[1].series[0].points.size(), 1U);
}

TEST(ExperimentFiles, ATableAloneIsAnExperiment) {
  const testing::ScratchFolder folder;
  folder.write("experiments/run-07.csv", "time,glow\n1,2\n");
  std::string said;
  const ReadExperiments all = read(folder, said);
  ASSERT_EQ(all.experiments.size(), 1U) << said;
  EXPECT_EQ(all.experiments[0].experiment.name, "run-07");
}

TEST(ExperimentFiles, AnExperimentMayHaveNoTable) {
  const testing::ScratchFolder folder;
  folder.write("experiments/planned.toml", "");
  std::string said;
  EXPECT_TRUE(read(folder, said).experiments[0].series.empty());
  EXPECT_EQ(said, "");
}

TEST(ExperimentFiles, AFileThatCannotBeReadKeepsItsTable) {
  const testing::ScratchFolder folder;
  folder.write("experiments/a.toml", "title = x\n");
  folder.write("experiments/a.csv", "time,glow\n1,2\n");
  std::string said;
  const ReadExperiments all = read(folder, said);
  EXPECT_TRUE(all.experiments.empty());
  EXPECT_FALSE(all.all_read);
}

}  // namespace
}  // namespace gainsay::cli
