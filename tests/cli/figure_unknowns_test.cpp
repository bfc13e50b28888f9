#include "gainsay/cli/figure_unknowns.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;

TEST(FigureUnknowns, HasUndeterminedOnesFirst) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = figure_unknowns(Page(judgement)).str();
  EXPECT_LT(html.find("kd[run-1]"), html.find("k1"));
  EXPECT_THAT(html, HasSubstr("not determined by these data"));
}

// On a logarithmic range of 1e-4 to 10 a value of 0.1 lies at 3 of 5 decades.
TEST(FigureUnknowns, DrawsTheIntervalInsideTheRangeSearched) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  for (Outcome& outcome : judgement.outcomes) {
    stats::Interval& interval = outcome.judged.verdict.intervals[0];
    interval.estimate = 0.1;
    interval.low = 0.01;
    interval.high = 1.0;
  }
  const std::string html = figure_unknowns(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("<line class=\"interval\" x1=\"40%\" x2=\"80%\""));
  EXPECT_THAT(html, HasSubstr("<circle class=\"full\" cx=\"60%\""));
  EXPECT_THAT(html, HasSubstr("0.0100 to 1.00"));
}

TEST(FigureUnknowns, OfNothingIsNothing) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  for (Outcome& outcome : judgement.outcomes) outcome.judged.verdict.intervals.clear();
  EXPECT_TRUE(figure_unknowns(Page(judgement)).empty());
}

}  // namespace
}  // namespace gainsay::cli
