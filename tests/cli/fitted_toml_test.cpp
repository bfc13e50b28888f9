#include "gainsay/cli/fitted_toml.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gtest/gtest.h>
#include <toml++/toml.h>

#include <limits>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;

TEST(FittedToml, ReadsBackAsTheFittedValues) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.outcomes[1].judged.search.best.values = {1.0 / 3.0, 7.0};
  const toml::table all = toml::parse(fitted_toml(judgement));
  const toml::table& best = *all["fits"][0].as_table();  // the survivor stands first
  EXPECT_EQ(best["letter"].value<std::string>(), "B");
  EXPECT_EQ(best["verdict"].value<std::string>(), "not rejected");
  EXPECT_EQ(best["values"]["k1"].value_exact<double>(), 1.0 / 3.0);
  EXPECT_EQ(best["values"]["kd[run-1]"].value_exact<double>(), 7.0);
}

TEST(FittedToml, LeavesOutWhatHasNoFit) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.outcomes[0].judged.search.best.values.clear();
  EXPECT_EQ(toml::parse(fitted_toml(judgement))["fits"].as_array()->size(), 2U);
}

TEST(FittedToml, QuotesAnyName) {
  const std::string name = "\"\\\x01' = [x]\n#";
  const toml::table all = toml::parse(fitted_toml(JudgementFixture::named_throughout(name)));
  EXPECT_EQ(all["fits"][0]["name"].value<std::string>(), name);
}

TEST(TomlFloat, IsNeverAnInteger) {
  EXPECT_EQ(toml_float(2.0), "2.0");
  EXPECT_EQ(toml_float(1e-7), "1e-7");
  EXPECT_EQ(toml_float(-std::numeric_limits<double>::infinity()), "-inf");
  EXPECT_EQ(toml_float(std::numeric_limits<double>::quiet_NaN()), "nan");
}

}  // namespace
}  // namespace gainsay::cli
