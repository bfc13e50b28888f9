#include "gainsay/cli/toml_traps.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

// The traps that authors fall into are listed with their messages in
// tests/programs/broken/toml.txt; here, that whatever the parser says comes out as a message with
// its three parts.
TEST(TomlTraps, OtherWordsOfTheParserAreKept) {
  const Location at{testing::source("x\n"), 1, 1};
  const Message message =
      explain_syntax_error(at, "Error while parsing gizmo: expected 'a', saw 'b'");
  EXPECT_EQ(message.what, "not TOML: 'b' in a gizmo");
  EXPECT_EQ(message.expected, "'a'");
  EXPECT_EQ(message.to_do, "correct the line");
}

TEST(TomlTraps, WordsWithoutAnExpectationAreKeptToo) {
  const Location at{testing::source("x\n"), 1, 1};
  EXPECT_EQ(explain_syntax_error(at, "Error while parsing gizmo: too odd").what,
            "not TOML: gizmo: too odd");
}

TEST(TomlTraps, APlaceBehindTheEndOfTheTextIsBorne) {
  const Location at{testing::source("a ="), 1, 9};
  EXPECT_FALSE(explain_syntax_error(at, "Error while parsing value: could not determine value type")
                   .what.empty());
}

TEST(TomlTraps, ATextWithoutItsSourceIsBorne) {
  EXPECT_FALSE(explain_syntax_error({}, "anything").what.empty());
}

}  // namespace
}  // namespace gainsay::cli
