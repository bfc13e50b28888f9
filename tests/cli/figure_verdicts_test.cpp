#include "gainsay/cli/figure_verdicts.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

std::string drawn(const Judgement& judgement) { return figure_verdicts(Page(judgement)).str(); }

TEST(FigureVerdicts, SaysEachVerdictInAWordAndAsALength) {
  JudgementFixture fixture;
  const std::string html = drawn(fixture.three());
  EXPECT_THAT(html, HasSubstr("aria-label=\"B: not rejected, 0.479 times its limit\""));
  EXPECT_THAT(html, HasSubstr("aria-label=\"C: undecided, 0.678 times its limit\""));
  EXPECT_THAT(html, HasSubstr("aria-label=\"A: rejected, 2.33 times its limit\""));
  EXPECT_LT(html.find("enzyme lost"), html.find("plain"));
}

TEST(FigureVerdicts, HasMisfitLimitPAndReason) {
  JudgementFixture fixture;
  const std::string html = drawn(fixture.three());
  EXPECT_THAT(html, HasSubstr("data-head=\"misfit\">96.40<"));
  EXPECT_THAT(html, HasSubstr("data-head=\"limit\">41.30<"));
  EXPECT_THAT(html, HasSubstr("1.3\u202f·\u202f10⁻⁷"));
  EXPECT_THAT(html, HasSubstr("<span class=\"reason\">misfit 96 against 41.3</span>"));
}

TEST(FigureVerdicts, TicksTheLimitsThatDoNotDecide) {
  JudgementFixture fixture;
  Judgement judgement = fixture.three();
  EXPECT_THAT(drawn(judgement), HasSubstr("class=\"other\""));
  for (Outcome& outcome : judgement.outcomes)
    outcome.judged.verdict.full.value = stats::kNotComputed;
  EXPECT_THAT(drawn(judgement), Not(HasSubstr("class=\"other\"")));
}

TEST(FigureVerdicts, DrawsNoBarWhereNothingWasFitted) {
  JudgementFixture fixture;
  fixture.add("none", stats::Decision::Undecided, stats::kNotComputed, 0.0);
  const std::string html = drawn(fixture.judgement());
  EXPECT_THAT(html, Not(HasSubstr("class=\"bar\"")));
  EXPECT_THAT(html, HasSubstr("aria-label=\"A: undecided\""));
}

TEST(FigureVerdicts, MeasuresByPWhereTheNoiseIsUnknown) {
  JudgementFixture fixture;
  fixture.add("order", stats::Decision::Rejected, 30.0, 0.1);
  fixture.judgement().outcomes[0].judged.verdict.noise_unknown = true;
  fixture.judgement().outcomes[0].judged.verdict.p_value = 0.0125;
  const std::string html = drawn(fixture.judgement());
  EXPECT_THAT(html, HasSubstr("4.00 times alpha / P"));
  EXPECT_THAT(html, HasSubstr("data-head=\"misfit\">–<"));
}

}  // namespace
}  // namespace gainsay::cli
