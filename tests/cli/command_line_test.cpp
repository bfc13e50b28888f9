#include "gainsay/cli/command_line.h"

#include <gmock/gmock.h>

namespace gainsay::cli {
namespace {

using ::testing::ElementsAre;
using ::testing::HasSubstr;
using ::testing::StartsWith;

TEST(CommandLine, TakesPositionalsAndOptionsInAnyOrder) {
  const auto line = read_command_line({"judge", "--seed", "7", "my-study", "--threads", "2"});
  ASSERT_TRUE(line);
  ASSERT_TRUE(line->invocation);
  EXPECT_EQ(line->invocation->command, "judge");
  EXPECT_EQ(line->invocation->text("STUDY"), "my-study");
  EXPECT_EQ(line->invocation->whole_number("--seed"), 7);
  EXPECT_EQ(line->invocation->whole_number("--threads"), 2);
  EXPECT_FALSE(line->invocation->has("--json"));
}

TEST(CommandLine, RepeatedOptionsKeepAllValuesInOrder) {
  const auto line = read_command_line({"simulate", "--set", "k=1", "study", "--hypothesis", "A",
                                       "--set", "Km=0.5", "--until", "10"});
  ASSERT_TRUE(line) << line.failure().what;
  EXPECT_THAT(line->invocation->texts("--set"), ElementsAre("k=1", "Km=0.5"));
  EXPECT_EQ(line->invocation->text("STUDY"), "study");
  EXPECT_EQ(line->invocation->number("--until"), 10.0);
}

TEST(CommandLine, AFlagIsThereOrNot) {
  const auto line = read_command_line({"check", "--json"});
  ASSERT_TRUE(line);
  EXPECT_TRUE(line->invocation->has("--json"));
  EXPECT_FALSE(line->invocation->text("STUDY"));
}

TEST(CommandLine, AnUnknownCommandNamesTheNearest) {
  const auto line = read_command_line({"juge", "study"});
  ASSERT_FALSE(line);
  EXPECT_EQ(line.failure().what, "unknown command 'juge'");
  EXPECT_EQ(line.failure().expected, "perhaps 'judge'");
}

TEST(CommandLine, AnUnknownOptionNamesTheNearest) {
  const auto line = read_command_line({"judge", "--thread", "2"});
  ASSERT_FALSE(line);
  EXPECT_EQ(line.failure().what, "unknown argument '--thread'");
  EXPECT_EQ(line.failure().expected, "perhaps '--threads'");
  EXPECT_EQ(line.failure().to_do, "see 'gainsay judge --help'");
}

TEST(CommandLine, WrongValuesSayWhatWasExpected) {
  const auto number = read_command_line({"judge", "--seed", "many"});
  ASSERT_FALSE(number);
  EXPECT_THAT(number.failure().what, HasSubstr("'many': expected a whole number"));
  const auto choice = read_command_line({"equations", "--as", "word"});
  ASSERT_FALSE(choice);
  EXPECT_THAT(choice.failure().what, HasSubstr("expected one of text, latex, html"));
}

TEST(CommandLine, WhatIsRequiredIsAskedFor) {
  const auto line = read_command_line({"simulate", "study"});
  ASSERT_FALSE(line);
  EXPECT_THAT(line.failure().what, HasSubstr("--hypothesis"));
}

TEST(CommandLine, HelpOfACommandHoldsItsExamples) {
  const auto line = read_command_line({"judge", "--help"});
  ASSERT_TRUE(line);
  EXPECT_FALSE(line->invocation);
  EXPECT_THAT(line->text, HasSubstr("Examples:"));
  EXPECT_THAT(line->text, HasSubstr("--budget"));
}

TEST(CommandLine, NoWordsAtAllGiveTheHelp) {
  const auto line = read_command_line({});
  ASSERT_TRUE(line);
  EXPECT_THAT(line->text, HasSubstr("judge"));
}

TEST(CommandLine, VersionIsOneLine) {
  const auto line = read_command_line({"--version"});
  ASSERT_TRUE(line);
  EXPECT_THAT(line->text, StartsWith("gainsay "));
}

}  // namespace
}  // namespace gainsay::cli
