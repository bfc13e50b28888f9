#include "gainsay/cli/figure_residuals.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

TEST(FigureResiduals, HasARowAHypothesisAndACellAReadout) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = figure_residuals(Page(judgement)).str();
  for (const char* row : {"class=\"of-A h3 d3\"", "class=\"of-B h1 d1\"", "class=\"of-C h2 d2\""}) {
    EXPECT_THAT(html, HasSubstr(row));
  }
  EXPECT_THAT(html, HasSubstr("Residuals of B in amide, the largest"));
  EXPECT_THAT(html, HasSubstr("1 low load; 2 high load."));
}

TEST(FigureResiduals, PutsWhatIsBeyondTheScaleAtItsEdge) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  for (Outcome& outcome : judgement.outcomes) {
    for (stats::StandardResidual& residual : outcome.judged.verdict.residuals) residual.r = 1.0;
  }
  EXPECT_THAT(figure_residuals(Page(judgement)).str(), Not(HasSubstr("class=\"beyond\"")));
  judgement.outcomes[1].judged.verdict.residuals[4].r = 40.0;
  EXPECT_THAT(figure_residuals(Page(judgement)).str(), HasSubstr("class=\"beyond\""));
}

TEST(FigureResiduals, StandsInNumbersBehind) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  judgement.outcomes[1].judged.verdict.residuals[4].r = -1.234;
  EXPECT_THAT(figure_residuals(Page(judgement)).str(), HasSubstr("\u22121.23"));
}

}  // namespace
}  // namespace gainsay::cli
