#include "gainsay/cli/progress.h"

#include <gmock/gmock.h>

#include <sstream>

namespace gainsay::cli {
namespace {

using ::testing::EndsWith;
using ::testing::HasSubstr;

TEST(Progress, IsSilentInAPipe) {
  std::ostringstream out, messages;
  {
    const Console console{.out = out, .messages = messages};
    Progress progress(console);
    progress.begin("Plain", 0, 2);
    progress.update(5, 59, 12.0);
  }
  EXPECT_EQ(out.str() + messages.str(), "");
}

TEST(Progress, NamesTheWorkOnATerminalAndWipesItsLine) {
  std::ostringstream out, messages;
  {
    const Console console{.out = out, .messages = messages, .messages_are_terminal = true};
    Progress progress(console);
    progress.begin("Plain", 1, 6);
  }
  EXPECT_THAT(messages.str(), HasSubstr("2 of 6: Plain"));
  EXPECT_THAT(messages.str(), EndsWith("\r\033[K"));
  EXPECT_EQ(out.str(), "");
}

TEST(Progress, TimeLeftIsRoundedUpToOneUnit) {
  EXPECT_EQ(time_left(0.2), "1 s");
  EXPECT_EQ(time_left(12.1), "13 s");
  EXPECT_EQ(time_left(61.0), "2 min");
  EXPECT_EQ(time_left(3601.0), "2 h");
}

}  // namespace
}  // namespace gainsay::cli
