#include "gainsay/cli/report_csv.h"

#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <algorithm>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::StartsWith;

TEST(ReportCsv, HasARowAHypothesisInOrderOfTheReport) {
  JudgementFixture fixture;
  const std::string csv = report_csv(fixture.three()).at("verdicts.csv");
  EXPECT_THAT(csv, StartsWith("letter,name,file,verdict,reason,misfit,N,k,"));
  EXPECT_THAT(csv, HasSubstr("\nB,enzyme lost,hypotheses/2.toml,not rejected,"));
  EXPECT_EQ(std::count(csv.begin(), csv.end(), '\n'), 4);
  EXPECT_LT(csv.find("\nB,"), csv.find("\nA,"));
}

TEST(ReportCsv, LeavesEmptyWhatWasNotComputed) {
  JudgementFixture fixture;
  const std::string csv = report_csv(fixture.three()).at("unknowns.csv");
  EXPECT_THAT(csv, HasSubstr("\nA,k1,1/min,0.08,0.07,0.092,0.005,yes,no,0.0001,10,\n"));
  EXPECT_THAT(csv,
              HasSubstr("\nA,kd[run-1],,0.4,,,,no,no,0.0001,10,not determined by these data\n"));
}

TEST(ReportCsv, HasARowAResidualWithItsTime) {
  JudgementFixture fixture;
  const std::string csv = report_csv(fixture.three()).at("residuals.csv");
  EXPECT_EQ(std::count(csv.begin(), csv.end(), '\n'), 1 + 3 * 32);
  EXPECT_THAT(csv, HasSubstr("\nA,run-1,amide,30,"));
}

TEST(ReportCsv, QuotesWhatCsvWouldTakeApart) {
  const auto tables = report_csv(JudgementFixture::named_throughout("a,\"b\""));
  EXPECT_THAT(tables.at("verdicts.csv"), HasSubstr("\"a,\"\"b\"\"\""));
}

}  // namespace
}  // namespace gainsay::cli
