#include "gainsay/stats/version.h"

#include <gmock/gmock.h>

namespace gainsay::stats {
namespace {

TEST(Version, LibrariesAreNamedWithTheirVersions) {
  for (const std::string& library : libraries()) {
    EXPECT_THAT(library, ::testing::MatchesRegex("[A-Za-z ]+ [0-9.]+")) << library;
  }
}

}  // namespace
}  // namespace gainsay::stats
