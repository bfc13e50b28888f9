#include "gainsay/estimation/version.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

TEST(Version, LibrariesAreNamedWithTheirVersions) {
  for (const std::string& library : libraries()) {
    EXPECT_THAT(library, ::testing::MatchesRegex("[A-Za-z ]+ [0-9.]+")) << library;
  }
}

}  // namespace
}  // namespace gainsay::estimation
