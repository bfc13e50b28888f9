#include "gainsay/cli/figure_mechanism.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using gainsay::testing::Mechanism;
using ::testing::ElementsAre;
using ::testing::HasSubstr;
using ::testing::IsEmpty;

TEST(FigureMechanism, DrawsWordsNamedArrowsAndSignedInfluences) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = figure_mechanism(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("class=\"species\""));
  EXPECT_THAT(html, HasSubstr(">hydration</text>"));
  EXPECT_THAT(html, HasSubstr("class=\"influence\""));
  EXPECT_THAT(html, HasSubstr("M-3 0H3M0-3V3"));  // +
  EXPECT_THAT(html, HasSubstr("M-3 0H3\""));      // -
}

TEST(FigureMechanism, SaysWhatSetsAHypothesisApartAndShowsItInItsHue) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = figure_mechanism(Page(judgement)).str();
  EXPECT_THAT(html, HasSubstr("As A, but with inactivation."));
  EXPECT_THAT(html, HasSubstr("As A, but with another rate of hydrolysis and with inactivation."));
  EXPECT_THAT(html, HasSubstr("class=\"reaction own\""));
  EXPECT_THAT(html, HasSubstr("class=\"influence own\""));
}

TEST(FigureMechanism, PlacesEachWordAlikeForAllHypotheses) {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  const std::string html = figure_mechanism(Page(judgement)).str();
  const std::size_t end = html.find(">amide</text>");
  const std::size_t begin = html.rfind("<text", end);
  const std::string word = html.substr(begin, end - begin);
  std::size_t count = 0;
  for (std::size_t at = html.find(word); at != std::string::npos; at = html.find(word, at + 1))
    ++count;
  EXPECT_EQ(count, 3U);
}

TEST(ReactionInWords, HasCoefficientsBothWaysAndTheOutside) {
  Mechanism written("m");
  written.species("A").species("B");
  written.rate("r1", {{"A", 2}}, {{"B", 1}}, "k * A", "k * B").rate("r2", {}, {{"A", 1}}, "k");
  const core::Hypothesis& m = written;
  EXPECT_EQ(reaction_in_words(m, m.reactions[0]), "2 A ⇌ B");
  EXPECT_EQ(reaction_in_words(m, m.reactions[1]), "→ A");
}

TEST(Differences, NameWhatWasAddedChangedAndRemoved) {
  Mechanism base("base");
  base.species("A").species("B");
  base.rate("making", {{"A", 1}}, {{"B", 1}}, "k * A").rate("loss", {{"B", 1}}, {}, "d * B");
  Mechanism other("other");
  other.species("A").species("B");
  other.rate("making", {{"A", 1}}, {{"B", 2}}, "k * A").rate("feed", {}, {{"A", 1}}, "f");
  EXPECT_THAT(differences(other, base),
              ElementsAre("making is A → 2 B", "with feed", "without loss"));
  EXPECT_THAT(differences(base, base), IsEmpty());
}

// Definitions written out: `v` means something else here.
TEST(Differences, SeeRatesThroughTheirDefinitions) {
  Mechanism base("base");
  base.species("A").where("v", "k * A").rate("loss", {{"A", 1}}, {}, "v");
  Mechanism other("other");
  other.species("A").where("v", "k * A / (1 + A)").rate("loss", {{"A", 1}}, {}, "v");
  EXPECT_THAT(differences(other, base), ElementsAre("with another rate of loss"));
}

}  // namespace
}  // namespace gainsay::cli
