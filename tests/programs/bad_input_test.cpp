// Studies that are wrong, through the program: it says every error with its place, ends with status
// 2 and writes nothing.

#include "gainsay/testing/broken_studies.h"
#include "gainsay/testing/program_run.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <set>
#include <string>

namespace gainsay {
namespace {

using testing::BrokenStudy;
using testing::StudyFolder;

std::set<std::string> files_of(const std::filesystem::path& folder) {
  std::set<std::string> names;
  for (const auto& entry : std::filesystem::recursive_directory_iterator(folder)) {
    names.insert(entry.path().string());
  }
  return names;
}

class BadInput : public ::testing::TestWithParam<BrokenStudy> {};

TEST_P(BadInput, IsSaidAndNothingIsWritten) {
  StudyFolder folder;
  write(GetParam(), folder);
  const std::set<std::string> before = files_of(folder.path());
  const testing::ProgramRun run = testing::run_gainsay({"judge", folder.path().string()});
  EXPECT_EQ(run.status, 2);
  EXPECT_EQ(run.messages, GetParam().says);
  EXPECT_EQ(run.out, "");
  EXPECT_EQ(files_of(folder.path()), before);
}

INSTANTIATE_TEST_SUITE_P(Programs, BadInput, ::testing::ValuesIn(testing::broken_studies()),
                         [](const auto& tested) { return tested.param.name; });

}  // namespace
}  // namespace gainsay
