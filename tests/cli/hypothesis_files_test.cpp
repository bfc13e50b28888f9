#include "gainsay/cli/hypothesis_files.h"

#include "gainsay/testing/reading.h"
#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

struct Read {
  ReadHypotheses all;
  std::string said;
};

Read read(const testing::ScratchFolder& folder) {
  StudyFiles files(folder.path());
  Diagnostics diagnostics;
  Read result{read_hypotheses(files, diagnostics), ""};
  result.said = testing::said_briefly(diagnostics);
  return result;
}

constexpr const char* kPlain =
    "title = 'Plain'\nspecies.A = {}\nreactions.loss = { equation = 'A ->', rate = 'k * A' }\n"
    "unknowns.k = [1, 2]\n";

TEST(HypothesisFiles, LettersFollowTheOrderOfFileNames) {
  const testing::ScratchFolder folder;
  folder.write("hypotheses/b.toml", "title = 'Second'\n");
  folder.write("hypotheses/a.toml", "title = 'First'\n");
  const Read result = read(folder);
  ASSERT_EQ(result.all.hypotheses.size(), 2U) << result.said;
  EXPECT_EQ(result.all.hypotheses[0].hypothesis.letter, "A");
  EXPECT_EQ(result.all.hypotheses[0].hypothesis.mechanism.title, "First");
  EXPECT_EQ(result.all.hypotheses[1].hypothesis.letter, "B");
}

TEST(HypothesisFiles, AnAmendmentInheritsAllButTheTitle) {
  const testing::ScratchFolder folder;
  folder.write("hypotheses/a.toml", kPlain);
  folder.write("hypotheses/b.toml", "base = 'a.toml'\nreactions.loss.rate = 'k * A^2'\n");
  const Read result = read(folder);
  ASSERT_EQ(result.all.hypotheses.size(), 2U) << result.said;
  const StudyHypothesis& amended = result.all.hypotheses[1].hypothesis;
  EXPECT_EQ(amended.mechanism.title, "b");
  EXPECT_EQ(amended.base, 0U);
  EXPECT_EQ(amended.mechanism.species.size(), 1U);
  EXPECT_EQ(amended.unknowns.size(), 1U);
  EXPECT_NE(amended.mechanism.reactions[0].forward,
            result.all.hypotheses[0].hypothesis.mechanism.reactions[0].forward);
}

TEST(HypothesisFiles, BasesChainAndThoseWithAnUnderscoreAreNotJudged) {
  const testing::ScratchFolder folder;
  folder.write("hypotheses/_root.toml", kPlain);
  folder.write("hypotheses/a.toml", "base = '_root.toml'\nspecies.B = {}\n");
  folder.write("hypotheses/_between.toml", "base = 'a.toml'\nspecies.C = {}\n");
  folder.write("hypotheses/b.toml", "base = '_between.toml'\n");
  const Read result = read(folder);
  ASSERT_EQ(result.all.hypotheses.size(), 2U) << result.said;
  EXPECT_FALSE(result.all.hypotheses[0].hypothesis.base.has_value());
  EXPECT_EQ(result.all.hypotheses[1].hypothesis.base, 0U);
  EXPECT_EQ(result.all.hypotheses[1].hypothesis.mechanism.species.size(), 3U);
  EXPECT_EQ(result.all.hypotheses[1].hypothesis.letter, "B");
}

TEST(HypothesisFiles, AFileThatCannotBeReadHidesOnlyWhatAmendsIt) {
  const testing::ScratchFolder folder;
  folder.write("hypotheses/a.toml", "title = Plain\n");
  folder.write("hypotheses/b.toml", "base = 'a.toml'\n");
  folder.write("hypotheses/c.toml", "title = 'C'\n");
  const Read result = read(folder);
  ASSERT_EQ(result.all.hypotheses.size(), 1U);
  EXPECT_FALSE(result.all.all_read);
  EXPECT_EQ(result.all.hypotheses[0].hypothesis.letter, "C");
  EXPECT_EQ(result.said, "1:9: this value is neither a number nor a text in quotes\n");
}

}  // namespace
}  // namespace gainsay::cli
