// Published solutions of initial-value problems, met at `relative` = 1e-10 to 7 digits in every
// entry, the smallest included. Sources stand at the head of each table in integration/.

#include "gainsay/core/integrator.h"
#include "gainsay/testing/digits.h"
#include "gainsay/testing/systems.h"
#include "gainsay/testing/table.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <limits>
#include <memory>
#include <string>
#include <vector>

namespace gainsay::core {
namespace {

using testing::digits;
using testing::read_system;
using testing::read_table;
using testing::SystemText;
using testing::Table;

constexpr double kRelative = 1e-10;
constexpr double kDigits = 7.0;
const std::string kFolder = GAINSAY_SOURCE_DIR "/tests/reference/integration/";

struct Case {
  std::string table;
  SystemText system;
};

std::vector<Case> all_cases() {
  return {
      {"brusselator",
       {.states = {{"y1", "1 + y1^2 * y2 - 4 * y1", "1.5"}, {"y2", "3 * y1 - y1^2 * y2", "3"}}}},
      {"consecutive",
       {.states = {{"A", "-0.5 * A", "10"},
                   {"B", "0.5 * A - 0.2 * B", "0"},
                   {"C", "0.2 * B", "0"}}}},
      {"hires",
       {.states = {{"y1", "-1.71*y1 + 0.43*y2 + 8.32*y3 + 0.0007", "1"},
                   {"y2", "1.71*y1 - 8.75*y2", "0"},
                   {"y3", "-10.03*y3 + 0.43*y4 + 0.035*y5", "0"},
                   {"y4", "8.32*y2 + 1.71*y3 - 1.12*y4", "0"},
                   {"y5", "-1.745*y5 + 0.43*(y6 + y7)", "0"},
                   {"y6", "-280*y6*y8 + 0.69*y4 + 1.71*y5 - 0.43*y6 + 0.69*y7", "0"},
                   {"y7", "280*y6*y8 - 1.81*y7", "0"},
                   {"y8", "-280*y6*y8 + 1.81*y7", "0.0057"}}}},
      {"logistic", {.states = {{"y", "0.6 * y * (1 - y / 50)", "2"}}}},
      {"michaelis_menten",
       {.states = {{"S", "-2 * S / (0.5 + S)", "10"}, {"P", "2 * S / (0.5 + S)", "0"}}}},
      {"absorption", {.states = {{"G", "-1.5 * G", "320"}, {"C", "1.5 * G / 32 - 0.08 * C", "0"}}}},
      {"oregonator",
       {.states = {{"y1", "77.27 * (y2 + y1 * (1 - 8.375e-6 * y1 - y2))", "1"},
                   {"y2", "(y3 - (1 + y1) * y2) / 77.27", "2"},
                   {"y3", "0.161 * (y1 - y3)", "3"}}}},
      {"robertson",
       {.states = {{"y1", "-0.04 * y1 + 1e4 * y2 * y3", "1"},
                   {"y2", "0.04 * y1 - 1e4 * y2 * y3 - 3e7 * y2^2", "0"},
                   {"y3", "3e7 * y2^2", "0"}}}},
  };
}

class PublishedSolutions : public ::testing::TestWithParam<Case> {};

INSTANTIATE_TEST_SUITE_P(Tables, PublishedSolutions, ::testing::ValuesIn(all_cases()),
                         [](const auto& info) { return info.param.table; });

TEST_P(PublishedSolutions, AreMet) {
  const Table table = read_table(kFolder + GetParam().table + ".csv");
  const auto program = std::move(Program::compile(read_system(GetParam().system))).value();
  Schedule schedule;
  // What is negligible is measured by the smallest number in the table.
  std::vector<double> absolute(program->states(), std::numeric_limits<double>::max());
  for (const std::vector<double>& row : table.rows) {
    schedule.outputs.push_back(row[0]);
    for (std::size_t i = 0; i < absolute.size(); ++i) {
      absolute[i] = std::min(absolute[i], kRelative * std::abs(row[i + 1]));
    }
  }
  Integrator integrator(*program, schedule, {.relative = kRelative, .absolute = absolute});
  const auto run = integrator.run({}, {}, Sensitivities::No);
  ASSERT_TRUE(run) << run.failure().words;
  for (std::size_t k = 0; k < table.rows.size(); ++k) {
    for (std::size_t i = 0; i < absolute.size(); ++i) {
      const double found =
          (*run)->states(static_cast<Eigen::Index>(i), static_cast<Eigen::Index>(k));
      EXPECT_GT(digits(found, table.rows[k][i + 1]), kDigits)
          << table.columns[i + 1] << " at t = " << table.rows[k][0];
    }
  }
}

}  // namespace
}  // namespace gainsay::core
