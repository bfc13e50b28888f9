#include "gainsay/cli/command_new.h"

#include "gainsay/cli/study_reader.h"
#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

struct Ran {
  int status = -1;
  std::string out;
  std::string messages;
};

Ran make(const std::filesystem::path& folder) {
  std::ostringstream out, messages;
  const int status = run_new({folder}, {out, messages});
  return {status, out.str(), messages.str()};
}

TEST(CommandNew, AFolderThatIsNotThereIsMade) {
  const testing::ScratchFolder scratch;
  const Ran run = make(scratch.path() / "deep/study");
  EXPECT_EQ(run.status, kDone) << run.messages;
  EXPECT_NE(run.out.find("next: gainsay judge "), std::string::npos);
  EXPECT_TRUE(read_study(scratch.path() / "deep/study").study.has_value());
}

TEST(CommandNew, AnEmptyFolderIsUsed) {
  const testing::ScratchFolder scratch;
  EXPECT_EQ(make(scratch.path()).status, kDone);
}

TEST(CommandNew, AFolderInUseIsLeftAlone) {
  const testing::ScratchFolder scratch;
  scratch.write("mine.txt", "keep");
  const Ran run = make(scratch.path());
  EXPECT_EQ(run.status, kWrongInput);
  EXPECT_EQ(run.out, "");
  EXPECT_NE(run.messages.find("it is not empty"), std::string::npos);
  EXPECT_FALSE(std::filesystem::exists(scratch.path() / "study.toml"));
}

TEST(CommandNew, AFileIsNoFolder) {
  const testing::ScratchFolder scratch;
  scratch.write("mine.txt", "keep");
  const Ran run = make(scratch.path() / "mine.txt");
  EXPECT_EQ(run.status, kWrongInput);
  EXPECT_EQ(scratch.read("mine.txt"), "keep");
}

}  // namespace
}  // namespace gainsay::cli
