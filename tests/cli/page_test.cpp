#include "gainsay/cli/page.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

TEST(Section, IsNamedByItsHeading) {
  const std::string html = section({"fits", "Data & fits", Markup(), text("x")}).str();
  EXPECT_THAT(html, HasSubstr("<section id=\"fits\" aria-labelledby=\"fits-name\">"));
  EXPECT_THAT(html, HasSubstr("<h2 id=\"fits-name\">Data &amp; fits</h2>"));
}

TEST(Table, HeadsRowsAndColumns) {
  const std::string html = table({"", {"name", "V"}, {true, false}, {{"<a>", "1"}}}).str();
  EXPECT_THAT(html, HasSubstr("<th scope=\"col\" class=\"n\">V</th>"));
  EXPECT_THAT(html,
              HasSubstr("<th scope=\"row\" class=\"w\">&lt;a&gt;</th><td class=\"n\">1</td>"));
}

TEST(VerdictShape, IsFilledOpenHalfFilledOrAbsent) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::vector<Contender> line = line_up(judgement);  // not rejected, undecided, rejected
  EXPECT_THAT(verdict_shape(line[0]).str(), HasSubstr("full"));
  EXPECT_THAT(verdict_shape(line[0]).str(), Not(HasSubstr("ring")));
  EXPECT_THAT(verdict_shape(line[1]).str(), HasSubstr("ring"));
  EXPECT_THAT(verdict_shape(line[1]).str(), HasSubstr("full"));
  EXPECT_THAT(verdict_shape(line[2]).str(), Not(HasSubstr("full")));
  EXPECT_TRUE(verdict_shape(Contender()).empty());
}

TEST(VerdictWord, IsThatOfTheVerdict) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::vector<Contender> line = line_up(judgement);
  EXPECT_EQ(verdict_word(line[0]), "not rejected");
  EXPECT_EQ(verdict_word(line[1]), "undecided");
  EXPECT_EQ(verdict_word(line[2]), "rejected");
  EXPECT_EQ(verdict_word(Contender()), "not judged");
}

}  // namespace
}  // namespace gainsay::cli
