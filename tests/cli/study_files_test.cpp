#include "gainsay/cli/study_files.h"

#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using Names = std::vector<std::string>;

TEST(StudyFiles, FilesAreListedInOrderOfName) {
  const testing::ScratchFolder folder;
  for (const char* name : {"h/b.toml", "h/a.toml", "h/a.csv", "h/.hidden.toml", "h/d.toml/x"})
    folder.write(name, "");
  const StudyFiles files(folder.path());
  EXPECT_EQ(files.list("h", ".toml"), (Names{"h/a.toml", "h/b.toml"}));
  EXPECT_EQ(files.list("missing", ".toml"), Names{});
}

TEST(StudyFiles, AFileIsReadOnceAndKept) {
  const testing::ScratchFolder folder;
  folder.write("h/a.toml", "x = 1\n");
  StudyFiles files(folder.path());
  std::string why;
  const auto first = files.read("h/a.toml", why);
  ASSERT_NE(first, nullptr);
  EXPECT_EQ(first->name, "h/a.toml");
  EXPECT_EQ(first->bytes, "x = 1\n");
  EXPECT_EQ(files.read("h/a.toml", why), first);
  EXPECT_EQ(files.texts().size(), 1U);
}

TEST(StudyFiles, WhatCannotBeReadSaysWhy) {
  const testing::ScratchFolder folder;
  folder.write("h/a.toml", "");
  StudyFiles files(folder.path());
  std::string why;
  EXPECT_EQ(files.read("h/b.toml", why), nullptr);
  EXPECT_EQ(why, "there is no such file");
  EXPECT_EQ(files.read("h", why), nullptr);
  EXPECT_EQ(why, "it is not a file");
}

TEST(StudyFiles, PathsAreRelativeToTheFileThatNamesThem) {
  EXPECT_EQ(StudyFiles::beside("experiments/run.toml", "run.csv"), "experiments/run.csv");
  EXPECT_EQ(StudyFiles::beside("experiments/run.toml", "../data/run.csv"), "data/run.csv");
  EXPECT_EQ(StudyFiles::beside("experiments/run.toml", "./x/../run.csv"), "experiments/run.csv");
}

}  // namespace
}  // namespace gainsay::cli
