#include "gainsay/cli/figure_fits.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

std::size_t count(const std::string& text, const std::string& part) {
  std::size_t n = 0;
  for (std::size_t at = text.find(part); at != std::string::npos; at = text.find(part, at + 1)) ++n;
  return n;
}

std::string drawn(const Judgement& judgement) { return figure_fits(Page(judgement)).str(); }

TEST(FigureFits, HasAPanelASeriesWithEveryReadingAndEveryCurve) {
  JudgementFixture fixture;
  const std::string html = drawn(fixture.three());
  EXPECT_EQ(count(html, "<figure"), 4U);
  EXPECT_EQ(count(html, "class=\"reading\""), 31U);
  EXPECT_EQ(count(html, "class=\"left-out\""), 1U);
  EXPECT_EQ(count(html, "class=\"curve of-A"), 4U);
  EXPECT_EQ(count(html, "class=\"end of-B"), 4U);
}

TEST(FigureFits, GivesTheReasonOfWhatWasLeftOut) {
  JudgementFixture fixture;
  const std::string html = drawn(fixture.three());
  EXPECT_THAT(html, HasSubstr("<title>left out: bubble</title>"));
  EXPECT_THAT(html, HasSubstr("Crosses: one reading left out (bubble)."));
}

TEST(FigureFits, MarksReadingsThatALogarithmCannotShow) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  EXPECT_THAT(drawn(judgement), Not(HasSubstr("at the lower edge")));
  judgement.study.experiments[0].series[1].points[1].value = -0.5;
  const std::string html = drawn(judgement);
  EXPECT_THAT(html, HasSubstr("log; readings at or below zero at the lower edge"));
  EXPECT_EQ(count(html, "class=\"below\""), 1U);
}

TEST(FigureFits, SaysWhereScalesOfARowDiffer) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  EXPECT_THAT(drawn(judgement), Not(HasSubstr("scales differ")));
  for (estimation::Point& point : judgement.study.experiments[1].series[0].points)
    point.value *= 100;
  EXPECT_THAT(drawn(judgement), HasSubstr("<b>amide</b>, mmol/L, scales differ"));
}

TEST(FigureFits, KeepsTheColumnsWhereAnExperimentLacksAReadout) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.study.experiments[0].series.pop_back();
  EXPECT_EQ(count(drawn(judgement), "class=\"gap\""), 1U);
}

TEST(TickBoxes, TickWhatIsShownAtFirstAndFoldWhatComesAfterSix) {
  JudgementFixture fixture;
  for (int i = 0; i < 8; ++i) {
    fixture.add("h", i == 0 ? stats::Decision::NotRejected : stats::Decision::Rejected, 60.0 + i,
                0.1);
  }
  const std::string html = tick_boxes(Page(fixture.judgement())).str();
  EXPECT_EQ(count(html, "type=\"checkbox\""), 8U);
  EXPECT_EQ(count(html, "checked"), 2U);
  EXPECT_EQ(count(html.substr(html.find("<details>")), "type=\"checkbox\""), 2U);
}

TEST(PanelNumbers, AreThoseOfThePanelsInTheirOrder) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const auto numbers = nlohmann::json::parse(panel_numbers(Page(judgement)));
  ASSERT_EQ(numbers.size(), 4U);
  EXPECT_EQ(numbers["p0-0"]["t"].size(), 7U);  // one was left out
  EXPECT_EQ(numbers["p0-1"]["t"].size(), 8U);
  EXPECT_EQ(numbers["p0-1"]["t"][3], "30.00");
  EXPECT_EQ(numbers["p0-1"]["shown"]["A"].size(), 8U);
  EXPECT_EQ(numbers["p0-1"]["unit"], "mmol/L");
}

}  // namespace
}  // namespace gainsay::cli
