// Published initial-value problems through `gainsay simulate`, as a user would run them: each
// mechanism stands in models/, each table with its source in integration/ or sensitivities/.

#include "gainsay/testing/digits.h"
#include "gainsay/testing/program_run.h"
#include "gainsay/testing/scratch_folder.h"
#include "gainsay/testing/table.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <filesystem>
#include <regex>
#include <string>

namespace gainsay {
namespace {

using testing::digits;
using testing::read_table;
using testing::Table;

// Asked of an integration at relative = 1e-10: the global error of a stiff problem is some hundred
// to a thousand times the local control. Sensitivities are controlled like the states and lose
// about a digit on them.
constexpr double kDigitsOfStates = 7.0;
constexpr double kDigitsOfSensitivities = 6.0;

const std::string kFolder = GAINSAY_SOURCE_DIR "/tests/reference/";

// A study that holds one mechanism, and an experiment whose readings (of a clock) stand at the
// times of the table.
void write_study(const testing::ScratchFolder& study, const std::string& model,
                 const Table& published) {
  study.write(
      "study.toml",
      "title = \"Published solution\"\naccuracy = { relative = 1e-10, negligible = 1e-14 }\n"
      "[readouts]\nclock = { shows = \"t\", noise = { sd = 1 } }\n");
  std::filesystem::create_directories(study.path() / "hypotheses");
  std::filesystem::copy(kFolder + "models/" + model + ".toml", study.path() / "hypotheses");
  std::string rows = "time,clock\n";
  for (const auto& row : published.rows)
    rows += std::to_string(row[0]) + "," + std::to_string(row[0]) + "\n";
  study.write("experiments/published.csv", rows);
}

Table simulated(const std::string& model, const Table& published, bool sensitivities) {
  const testing::ScratchFolder study;
  write_study(study, model, published);
  std::vector<std::string> words = {"simulate", study.path().string(), "--hypothesis",
                                    "A",        "--experiment",        "published"};
  if (sensitivities) words.emplace_back("--sensitivities");
  const testing::ProgramRun run = testing::run_gainsay(words);
  EXPECT_EQ(run.status, 0) << run.messages;
  study.write("curves.csv", run.out);
  return read_table((study.path() / "curves.csv").string());
}

// "dA_dk1" of a table is "d A / d k1" of the program.
std::string name_of_column(const std::string& column) {
  return std::regex_replace(column, std::regex("^d(.+)_d(.+)$"), "d $1 / d $2");
}

void expect_agreement(const Table& found, const Table& published, double digits_asked) {
  ASSERT_EQ(found.rows.size(), published.rows.size());
  for (std::size_t column = 1; column < published.columns.size(); ++column) {
    const auto place = std::ranges::find(found.columns, name_of_column(published.columns[column]));
    ASSERT_NE(place, found.columns.end()) << published.columns[column];
    const auto found_column = static_cast<std::size_t>(place - found.columns.begin());
    for (std::size_t row = 0; row < published.rows.size(); ++row) {
      EXPECT_GE(digits(found.rows[row][found_column], published.rows[row][column]), digits_asked)
          << published.columns[column] << " at " << published.rows[row][0];
    }
  }
}

class SimulatedSolution : public ::testing::TestWithParam<const char*> {};

TEST_P(SimulatedSolution, MeetsThePublishedOne) {
  const Table published = read_table(kFolder + "integration/" + GetParam() + ".csv");
  expect_agreement(simulated(GetParam(), published, false), published, kDigitsOfStates);
}

INSTANTIATE_TEST_SUITE_P(Program, SimulatedSolution,
                         ::testing::Values("absorption", "brusselator", "consecutive", "hires",
                                           "logistic", "michaelis_menten", "oregonator",
                                           "robertson"),
                         [](const auto& info) { return info.param; });

class SimulatedSensitivity : public ::testing::TestWithParam<const char*> {};

TEST_P(SimulatedSensitivity, MeetsThePublishedOne) {
  const Table published = read_table(kFolder + "sensitivities/" + GetParam() + ".csv");
  expect_agreement(simulated(GetParam(), published, true), published, kDigitsOfSensitivities);
}

INSTANTIATE_TEST_SUITE_P(Program, SimulatedSensitivity,
                         ::testing::Values("consecutive", "michaelis_menten", "robertson"),
                         [](const auto& info) { return info.param; });

}  // namespace
}  // namespace gainsay
