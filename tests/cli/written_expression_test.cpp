#include "gainsay/cli/written_expression.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using testing::toml;

TEST(WrittenExpression, NamesKnowTheirPlacesInTheFile) {
  const TomlValue document = toml("rate = '''\n  k1 *\n  A'''\n");
  Diagnostics diagnostics;
  const auto written = read_expression(document.entries[0].value, "the rate of 'loss'",
                                       Leans::OnAnything, diagnostics);
  ASSERT_TRUE(written.has_value());
  ASSERT_EQ(written->names.size(), 2U);
  EXPECT_EQ(written->names[1].name, "A");
  EXPECT_EQ(written->names[1].place.line, 3U);
  EXPECT_EQ(written->names[1].place.column, 3U);
}

TEST(WrittenExpression, ANumberIsAnExpression) {
  const TomlValue document = toml("start = 2.5\n");
  Diagnostics diagnostics;
  const auto written =
      read_expression(document.entries[0].value, "", Leans::OnConstants, diagnostics);
  ASSERT_TRUE(written.has_value());
  EXPECT_TRUE(written->expression.is_number(2.5));
  EXPECT_TRUE(written->names.empty());
}

TEST(WrittenExpression, AFailureSaysWhereAndInWhat) {
  const TomlValue document = toml("rate = \"k1 ** A\"\n");
  Diagnostics diagnostics;
  EXPECT_FALSE(read_expression(document.entries[0].value, "the rate of 'loss'", Leans::OnAnything,
                               diagnostics));
  const auto all = diagnostics.collected();
  ASSERT_EQ(all.size(), 1U);
  EXPECT_EQ(all[0].column, 13U);
  EXPECT_NE(all[0].what.find("(in the rate of 'loss')"), std::string::npos);
}

TEST(WrittenExpression, MassActionTakesTheSideItIsGiven) {
  const TomlValue document = toml("rate = 'mass_action(k)'\n");
  Diagnostics diagnostics;
  const auto written = read_expression(document.entries[0].value, "", Leans::OnAnything,
                                       diagnostics, {core::Expression::symbol("A")});
  ASSERT_TRUE(written.has_value());
  EXPECT_EQ(written->expression, core::Expression::symbol("k") * core::Expression::symbol("A"));
}

}  // namespace
}  // namespace gainsay::cli
