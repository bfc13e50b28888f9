#include "gainsay/cli/interruption.h"

#include <gtest/gtest.h>
#include <signal.h>
#include <unistd.h>

#include <thread>

namespace gainsay::cli {
namespace {

TEST(Interruption, ASignalAsksForAStopAndTheProcessGoesOn) {
  const Interruption interruption;
  EXPECT_FALSE(interruption.happened());
  ASSERT_EQ(kill(getpid(), SIGINT), 0);
  while (!interruption.token().stop_requested()) std::this_thread::yield();
  EXPECT_TRUE(interruption.happened());
}

TEST(Interruption, WithoutASignalNothingIsAskedFor) {
  std::stop_token token;
  {
    const Interruption interruption;
    token = interruption.token();
  }
  EXPECT_FALSE(token.stop_requested());
}

}  // namespace
}  // namespace gainsay::cli
