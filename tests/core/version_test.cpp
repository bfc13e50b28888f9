#include "gainsay/core/version.h"

#include <gtest/gtest.h>

#include <fstream>
#include <regex>
#include <string>

namespace gainsay::core {
namespace {

TEST(Version, IsTheOneOfTheBuildFile) {
  std::ifstream file(GAINSAY_SOURCE_DIR "/CMakeLists.txt");
  const std::string text{std::istreambuf_iterator<char>(file), {}};
  std::smatch found;
  ASSERT_TRUE(std::regex_search(text, found, std::regex(R"(project\(gainsay VERSION ([0-9.]+))")));
  EXPECT_EQ(version(), found[1].str());
}

}  // namespace
}  // namespace gainsay::core
