#include "gainsay/cli/diagnostics.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <sstream>
#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using testing::said;
using testing::source;

std::string printed(const std::vector<Diagnostic>& diagnostics, bool colour) {
  std::ostringstream out;
  print(out, diagnostics, colour);
  return out.str();
}

TEST(Diagnostics, AMessageIsPlaceThenWhatThenExpectedThenToDo) {
  const Diagnostic error{Severity::Error, "study.toml",   3,           7,
                         "unknown name",  "another name", "correct it"};
  EXPECT_EQ(printed({error}, false),
            "study.toml:3:7: error: unknown name\n"
            "    expected another name\n"
            "    to do: correct it\n");
}

TEST(Diagnostics, AWholeFileHasNoLineAndWhatIsEmptyIsLeftOut) {
  const Diagnostic warning{Severity::Warning, "run.toml", 0, 0, "no readings", "", ""};
  EXPECT_EQ(printed({warning}, false), "run.toml: warning: no readings\n");
}

TEST(Diagnostics, ColourIsUsedOnlyWhereAsked) {
  const Diagnostic error{Severity::Error, "a", 1, 1, "b", "", ""};
  EXPECT_EQ(printed({error}, false).find('\x1b'), std::string::npos);
  EXPECT_NE(printed({error}, true).find('\x1b'), std::string::npos);
}

TEST(Diagnostics, QuotedTextCannotSteerATerminal) {
  const Diagnostic error{Severity::Error, "a\x1b[2J", 1, 1, "name '\x1b[31m\a'", "", ""};
  EXPECT_EQ(printed({error}, false), "a?[2J:1:1: error: name '?[31m?'\n");
}

TEST(Diagnostics, TheyComeInOrderOfFileLineAndColumnWithoutDoubles) {
  Diagnostics diagnostics;
  const auto a = source("", "a.toml");
  const auto b = source("", "b.toml");
  diagnostics.error({b, 1, 1}, {"fourth", "", ""});
  diagnostics.warning({a, 2, 1}, {"third", "", ""});
  diagnostics.error({a, 1, 9}, {"second", "", ""});
  diagnostics.error({a, 1, 2}, {"first", "", ""});
  diagnostics.error({a, 1, 2}, {"first", "", ""});
  EXPECT_EQ(said(diagnostics),
            "a.toml:1:2: error: first\na.toml:1:9: error: second\n"
            "a.toml:2:1: warning: third\nb.toml:1:1: error: fourth\n");
}

TEST(Diagnostics, WarningsAreNoErrors) {
  Diagnostics diagnostics;
  diagnostics.warning({}, {"careful", "", ""});
  EXPECT_FALSE(diagnostics.has_errors());
  EXPECT_FALSE(has_errors(diagnostics.collected()));
  diagnostics.error({}, {"wrong", "", ""});
  EXPECT_TRUE(diagnostics.has_errors());
  EXPECT_TRUE(has_errors(diagnostics.collected()));
}

TEST(Diagnostics, AFileThatIsWrongAllOverIsCutShort) {
  Diagnostics diagnostics;
  const auto table = source("", "t.csv");
  for (std::size_t line = 1; line <= Diagnostics::kMostOfOneFile + 5; ++line) {
    diagnostics.error({table, line, 1}, {"no number", "", ""});
  }
  const std::vector<Diagnostic> all = diagnostics.collected();
  EXPECT_EQ(all.size(), Diagnostics::kMostOfOneFile + 1);
  EXPECT_EQ(all.front().what, "5 more errors in this file are not shown");
}

TEST(PrintFailure, ItHasNoPlace) {
  std::ostringstream out, messages;
  const Console console{out, messages};
  print_failure(console, {"no such hypothesis", "A or B", "correct it", {}});
  EXPECT_EQ(messages.str(),
            "error: no such hypothesis\n    expected A or B\n    to do: correct it\n");
  EXPECT_EQ(out.str(), "");
}

}  // namespace
}  // namespace gainsay::cli
