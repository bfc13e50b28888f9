#include "gainsay/cli/fitted_series.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gtest/gtest.h>

#include <cmath>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;

TEST(SeriesPictures, GoByReadoutAndThenExperiment) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const Page page(judgement);
  const std::vector<SeriesPicture> pictures = series_pictures(page);
  ASSERT_EQ(pictures.size(), 4U);
  EXPECT_EQ(panel_id(pictures[0]), "p0-0");
  EXPECT_EQ(panel_id(pictures[1]), "p0-1");
  EXPECT_EQ(panel_id(pictures[2]), "p1-0");
}

TEST(SeriesPictures, BringReadingsFitsAndCurvesTogether) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const Page page(judgement);
  const SeriesPicture picture = series_pictures(page)[1];
  ASSERT_EQ(picture.fits.size(), 3U);
  EXPECT_EQ(picture.fits[0].contender->letter, "B");
  ASSERT_NE(picture.fits[0].curve, nullptr);
  EXPECT_EQ(picture.fits[0].curve->experiment, "run-2");
  ASSERT_EQ(picture.fits[0].residuals.size(), picture.readings.size());
  const stats::StandardResidual& residual = picture.fits[0].residuals.at(3);
  EXPECT_DOUBLE_EQ(residual.shown + residual.r * residual.sd, picture.readings[3].value);
}

TEST(SeriesPictures, TakeTheReadingsOwnSdBeforeThatOfAFit) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.study.experiments[0].series[0].points[1].sd = 7.0;
  const Page page(judgement);
  const SeriesPicture picture = series_pictures(page)[0];
  EXPECT_EQ(picture.readings[1].sd, 7.0);
  EXPECT_EQ(picture.readings[3].sd, 0.6);
}

TEST(SeriesPictures, LeaveOutExperimentsWithoutSuchReadings) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.study.experiments[1].series.pop_back();
  EXPECT_EQ(series_pictures(Page(judgement)).size(), 3U);
}

TEST(SeriesPictures, ManageWithoutAnyFit) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  for (Outcome& outcome : judgement.outcomes) {
    outcome.curves.clear();
    outcome.judged.verdict.residuals.clear();
  }
  const SeriesPicture picture = series_pictures(Page(judgement))[0];
  EXPECT_EQ(picture.fits[0].curve, nullptr);
  EXPECT_TRUE(std::isnan(picture.readings[0].sd));
}

}  // namespace
}  // namespace gainsay::cli
