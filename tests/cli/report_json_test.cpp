#include "gainsay/cli/report_json.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using Json = nlohmann::json;

TEST(ReportJson, HoldsTheVerdictsWithTheirTests) {
  JudgementFixture fixture;
  const Json all = Json::parse(report_json(fixture.three()));
  EXPECT_EQ(
      all["sentence"],
      "The data contradict one of three mechanisms; one is not rejected and one is undecided.");
  ASSERT_EQ(all["hypotheses"].size(), 3U);
  const Json& plain = all["hypotheses"][0];
  EXPECT_EQ(plain["letter"], "A");
  EXPECT_EQ(plain["verdict"], "rejected");
  EXPECT_EQ(plain["tests"]["misfit"], 96.4);
  EXPECT_EQ(plain["tests"]["reduced_limit"]["value"], 41.3);
  EXPECT_EQ(plain["tests"]["decides"], "reduced");
  EXPECT_EQ(plain["search"]["optima"][0]["found"], 15);
  EXPECT_EQ(plain["residuals"].size(), 32U);
}

TEST(ReportJson, HasNullForWhatWasNotComputed) {
  JudgementFixture fixture;
  const Json all = Json::parse(report_json(fixture.three()));
  EXPECT_TRUE(all["hypotheses"][0]["compared"]["weight"].is_null());
  EXPECT_TRUE(all["hypotheses"][0]["unknowns"][1]["low"].is_null());
}

TEST(ReportJson, SaysHowEachUnknownWasSearched) {
  JudgementFixture fixture;
  const Json unknown = Json::parse(report_json(fixture.three()))["hypotheses"][1]["unknowns"][0];
  EXPECT_EQ(unknown["name"], "k1");
  EXPECT_EQ(unknown["unit"], "1/min");
  EXPECT_EQ(unknown["searched"], Json::array({1e-4, 10.0}));
  EXPECT_EQ(unknown["scale"], "logarithmic");
}

TEST(ReportJson, TakesNamesThatAreNoUtf8) {
  EXPECT_TRUE(Json::accept(report_json(JudgementFixture::named_throughout("\xff\"\\"))));
}

}  // namespace
}  // namespace gainsay::cli
