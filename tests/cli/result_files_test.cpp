#include "gainsay/cli/result_files.h"

#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <iterator>

namespace gainsay::cli {
namespace {

namespace fs = std::filesystem;

auto files_in(const fs::path& folder) {
  return std::distance(fs::directory_iterator(folder), fs::directory_iterator());
}

TEST(ResultFiles, AreWrittenWholeAndLeaveNothingBeside) {
  const gainsay::testing::ScratchFolder scratch;
  ASSERT_TRUE(write_files(scratch.path() / "results", {{"a.csv", "1\n"}, {"b.json", "{}"}}));
  EXPECT_EQ(scratch.read("results/a.csv"), "1\n");
  EXPECT_EQ(scratch.read("results/b.json"), "{}");
  EXPECT_EQ(files_in(scratch.path() / "results"), 2);
}

TEST(ResultFiles, ReplaceOldOnes) {
  const gainsay::testing::ScratchFolder scratch;
  scratch.write("results/a.csv", "an old and longer text");
  ASSERT_TRUE(write_files(scratch.path() / "results", {{"a.csv", "new"}}));
  EXPECT_EQ(scratch.read("results/a.csv"), "new");
}

TEST(ResultFiles, AFailureLeavesTheOldFilesAndNothingElse) {
  const gainsay::testing::ScratchFolder scratch;
  scratch.write("results/a.csv", "old");
  // A folder stands where the second file would be written beside its place.
  fs::create_directories(scratch.path() / "results" / ".b.json.part");
  const auto written =
      write_files(scratch.path() / "results", {{"a.csv", "new"}, {"b.json", "{}"}});
  ASSERT_FALSE(written);
  EXPECT_NE(written.failure().what.find("cannot write"), std::string::npos);
  EXPECT_EQ(scratch.read("results/a.csv"), "old");
  EXPECT_FALSE(fs::exists(scratch.path() / "results" / ".a.csv.part"));
}

TEST(ResultFiles, AFileInPlaceOfTheFolderIsAFailure) {
  const gainsay::testing::ScratchFolder scratch;
  scratch.write("results", "not a folder");
  EXPECT_FALSE(write_files(scratch.path() / "results", {{"a.csv", "1"}}));
}

}  // namespace
}  // namespace gainsay::cli
