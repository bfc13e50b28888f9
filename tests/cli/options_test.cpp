#include "gainsay/cli/options.h"

#include "gainsay/cli/command_line.h"

#include <gmock/gmock.h>

#include <regex>
#include <set>
#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

TEST(Options, NamesAreLegalAndNotDoubled) {
  const std::regex legal("--[a-z][a-z-]*|[A-Z]+");
  std::set<std::string> commands;
  for (const Command& command : all_commands()) {
    EXPECT_TRUE(commands.insert(command.name).second) << command.name;
    std::set<std::string> options;
    for (const Option& option : command.options) {
      EXPECT_TRUE(std::regex_match(option.name, legal)) << option.name;
      EXPECT_TRUE(options.insert(option.name).second) << command.name << " " << option.name;
      EXPECT_FALSE(option.brief.empty()) << command.name << " " << option.name;
    }
  }
}

TEST(Options, EveryCommandHasAnExample) {
  for (const Command& command : all_commands())
    EXPECT_FALSE(command.examples.empty()) << command.name;
}

// The words of an example up to a redirection or a pipe, as a shell would split them.
std::vector<std::string> words_of(const std::string& example) {
  std::istringstream stream(example);
  std::vector<std::string> words;
  for (std::string word; stream >> word && word != ">" && word != "|";) words.push_back(word);
  return words;
}

TEST(Options, ExamplesAreLegalCommandLines) {
  for (const Command& command : all_commands()) {
    for (const Example& example : command.examples) {
      std::vector<std::string> words = words_of(example.command);
      if (words.front() != "gainsay") continue;
      words.erase(words.begin());
      EXPECT_TRUE(read_command_line(words)) << example.command;
    }
  }
}

TEST(Options, ACommandIsFoundByName) {
  ASSERT_NE(find_command("judge"), nullptr);
  EXPECT_EQ(find_command("judge")->name, "judge");
  EXPECT_EQ(find_command("justice"), nullptr);
}

}  // namespace
}  // namespace gainsay::cli
