#include "gainsay/cli/libraries.h"

#include <gmock/gmock.h>

namespace gainsay::cli {
namespace {

using ::testing::Contains;
using ::testing::StartsWith;

TEST(Libraries, NameWhatDecidesTheLastDigits) {
  const auto all = libraries();
  for (const char* name :
       {"SUNDIALS ", "Eigen ", "Ceres Solver ", "Boost ", "GNU C library ", "g++ ", "processor"}) {
    EXPECT_THAT(all, Contains(StartsWith(name)));
  }
}

}  // namespace
}  // namespace gainsay::cli
