#include "gainsay/cli/figure_search.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

std::string drawn(const Judgement& judgement) { return figure_search(Page(judgement)).str(); }

TEST(FigureSearch, ShowsEveryStartAndCountsOptima) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Rejected, 96.0, 0.3);
  const std::string html = drawn(fixture.judgement());
  EXPECT_THAT(html, HasSubstr("Ends of 20 starts of A, from 96.00 to 211.0"));
  EXPECT_THAT(html,
              HasSubstr("20 random starts, two distinct optima; the best was found 15 times."));
  EXPECT_THAT(html, Not(HasSubstr("fits in two ways")));
}

TEST(FigureSearch, ShowsBothWaysInWhichAHypothesisFits) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::NotRejected, 15.0, 0.0);  // second optimum at 33, limit 41.3
  const std::string html = drawn(fixture.judgement());
  EXPECT_THAT(html, HasSubstr("the hypothesis fits in two ways"));
  EXPECT_THAT(html, HasSubstr("misfit 33.00"));
}

TEST(FigureSearch, SaysWhyItEndedEarly) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Undecided, 96.0, 0.3);
  fixture.judgement().outcomes[0].judged.search.out_of_budget = true;
  fixture.judgement().outcomes[0].judged.search.replaced_starts = 2;
  const std::string html = drawn(fixture.judgement());
  EXPECT_THAT(html, HasSubstr("(two further ones could not be integrated)"));
  EXPECT_THAT(html, HasSubstr("The budget of integrations ended first."));
}

TEST(FigureSearch, ManagesWithoutAnyEnd) {
  JudgementFixture fixture;
  fixture.add("a", stats::Decision::Undecided, 96.0, 0.3);
  estimation::SearchResult& search = fixture.judgement().outcomes[0].judged.search;
  search.descents.clear();
  search.optima.clear();
  EXPECT_THAT(drawn(fixture.judgement()), HasSubstr("No start could be brought to an end."));
}

}  // namespace
}  // namespace gainsay::cli
