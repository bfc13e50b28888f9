#include "gainsay/cli/command_judge.h"

#include "gainsay/cli/table_text.h"

#include <gmock/gmock.h>

#include <sstream>

namespace gainsay::cli {
namespace {

using ::testing::HasSubstr;

Judgement one_rejected(const std::string& title, const std::string& reason) {
  Judgement judgement;
  judgement.study.hypotheses.resize(1);
  judgement.study.hypotheses[0].letter = "A";
  judgement.study.hypotheses[0].mechanism.title = title;
  judgement.outcomes.resize(1);
  stats::Verdict& verdict = judgement.outcomes[0].judged.verdict;
  verdict.decision = stats::Decision::Rejected;
  verdict.V = 505.73;
  verdict.reduced.value = 167.3;
  verdict.p_value = 1.4e-43;
  verdict.reason = reason;
  return judgement;
}

std::vector<std::string> lines_of(const std::string& text) {
  std::istringstream stream(text);
  std::vector<std::string> lines;
  for (std::string line; std::getline(stream, line);) lines.push_back(line);
  return lines;
}

TEST(VerdictTable, FitsEightyColumns) {
  const Judgement judgement =
      one_rejected(std::string(60, 'x'), std::string(40, 'y') + " " + std::string(60, 'z'));
  for (const std::string& line : lines_of(verdict_table(judgement)))
    EXPECT_LE(columns(line), 80U) << line;
}

TEST(VerdictTable, HoldsLetterNameFiguresVerdictAndReason) {
  const std::string table = verdict_table(one_rejected("Plain", "misses amide in run 2"));
  EXPECT_THAT(table, HasSubstr("A  Plain"));
  EXPECT_THAT(table, HasSubstr("505.7    167.3  1.4e-43  rejected:"));
  EXPECT_THAT(table, HasSubstr("\n   misses amide in run 2\n"));
}

TEST(VerdictTable, ATailBelowTheSmallestNumberIsABound) {
  Judgement judgement = one_rejected("Plain", "");
  judgement.outcomes[0].judged.verdict.p_value = 0.0;
  EXPECT_THAT(verdict_table(judgement), HasSubstr("<1e-300"));
}

TEST(VerdictTable, HostileTitlesCannotSteerTheTerminal) {
  const std::string table = verdict_table(one_rejected("bad\033[2Jtitle", "a\nb"));
  EXPECT_EQ(table.find('\033'), std::string::npos);
  EXPECT_EQ(lines_of(table).size(), 2U);
}

}  // namespace
}  // namespace gainsay::cli
