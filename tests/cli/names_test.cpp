#include "gainsay/cli/names.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

TEST(Names, TheFirstMeaningHolds) {
  Diagnostics diagnostics;
  NameSpace names;
  const auto file = testing::source("", "h.toml");
  names.declare({"A", NameKind::Species, {file, 3, 1}}, diagnostics);
  names.declare({"A", NameKind::Unknown, {file, 9, 1}}, diagnostics);
  EXPECT_EQ(names.find("A")->kind, NameKind::Species);
  EXPECT_EQ(testing::said_briefly(diagnostics),
            "9:1: the name 'A' is an unknown here and a species in h.toml:3\n");
}

TEST(Names, CaseMatters) {
  Diagnostics diagnostics;
  NameSpace names;
  names.declare({"a", NameKind::Known, {}}, diagnostics);
  names.declare({"A", NameKind::Known, {}}, diagnostics);
  EXPECT_FALSE(diagnostics.has_errors());
  EXPECT_EQ(names.all(), (std::vector<std::string>{"A", "a"}));
}

TEST(Names, EveryUnknownNameIsSaidAtItsPlace) {
  Diagnostics diagnostics;
  NameSpace names;
  names.declare({"nitrile", NameKind::Species, {}}, diagnostics);
  const auto file = testing::source("", "h.toml");
  WrittenExpression written;
  written.role = "the rate of 'hydration'";
  written.names = {{"nitril", {file, 2, 5}}, {"nitrile", {file, 2, 9}}, {"zzz", {file, 2, 20}}};
  check_names(written, names, " for hypothesis 'one'", diagnostics);
  EXPECT_EQ(
      testing::said(diagnostics),
      "h.toml:2:5: error: unknown name 'nitril' in the rate of 'hydration' for hypothesis 'one'\n"
      "    expected a species, a reaction, an input, a known, an unknown, a name under [where] or "
      "a function; nearest known name: 'nitrile'\n"
      "    to do: correct the name, or add 'nitril' under [species], [where] or [unknowns]\n"
      "h.toml:2:20: error: unknown name 'zzz' in the rate of 'hydration' for hypothesis 'one'\n"
      "    expected a species, a reaction, an input, a known, an unknown, a name under [where] or "
      "a function\n"
      "    to do: correct the name, or add 'zzz' under [species], [where] or [unknowns]\n");
}

TEST(Names, KindsInWords) {
  EXPECT_EQ(with_a(NameKind::Unknown), "an unknown");
  EXPECT_EQ(with_a(NameKind::Definition), "a name under [where]");
  EXPECT_EQ(word_for(NameKind::Compartment), "compartment");
}

}  // namespace
}  // namespace gainsay::cli
