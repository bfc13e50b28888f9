#include "gainsay/cli/manual.h"

#include "gainsay/cli/options.h"

#include <gmock/gmock.h>

namespace gainsay::cli {
namespace {

using ::testing::HasSubstr;

TEST(Manual, HoldsEveryCommand) {
  const std::string page = manual_page();
  for (const Command& command : all_commands()) EXPECT_THAT(page, HasSubstr(".SS " + command.name));
  EXPECT_THAT(page, HasSubstr("EXIT STATUS"));
}

TEST(Manual, NoLineIsTakenForAMacroByMistake) {
  const std::string page = manual_page();
  for (std::size_t at = page.find("\n."); at != std::string::npos; at = page.find("\n.", at + 1)) {
    const bool macro = std::isupper(static_cast<unsigned char>(page[at + 2])) != 0;
    const bool fill = page.compare(at, 4, "\n.nf") == 0 || page.compare(at, 4, "\n.fi") == 0;
    EXPECT_TRUE(macro || fill) << page.substr(at, 40);
  }
}

TEST(Completion, EveryShellKnowsEveryCommandAndOption) {
  for (const char* shell : {"bash", "zsh", "fish"}) {
    const std::string script = completion_script(shell);
    for (const Command& command : all_commands()) {
      EXPECT_THAT(script, HasSubstr(command.name)) << shell;
      for (const Option& option : command.options) {
        if (option.positional()) continue;
        EXPECT_THAT(script, HasSubstr(option.name.substr(2))) << shell;
      }
    }
  }
}

}  // namespace
}  // namespace gainsay::cli
