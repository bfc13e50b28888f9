// Published derivatives of solutions by unknowns, met at `relative` = 1e-10 to 6 digits in every
// entry by both engines. Sources stand at the head of each table in sensitivities/.

#include "gainsay/core/integrator.h"
#include "gainsay/testing/digits.h"
#include "gainsay/testing/systems.h"
#include "gainsay/testing/table.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <limits>
#include <memory>
#include <optional>
#include <stdexcept>
#include <string>
#include <tuple>

namespace gainsay::core {
namespace {

using testing::digits;
using testing::read_system;
using testing::read_table;
using testing::SystemText;
using testing::Table;

constexpr double kRelative = 1e-10;
constexpr double kDigits = 6.0;
// Absolute tolerance, in units of the smallest number of the table: a thousandth of what 6 digits
// of it allow.
constexpr double kNegligible = 1e-9;
const std::string kFolder = GAINSAY_SOURCE_DIR "/tests/reference/sensitivities/";

struct Case {
  std::string table;  // columns t, STATE or dSTATE_dUNKNOWN
  SystemText system;
  std::vector<double> unknowns;
};

std::vector<Case> all_cases() {
  return {
      {.table = "consecutive",
       .system = {.states = {{"A", "-k1 * A", "A0"},
                             {"B", "k1 * A - k2 * B", "0"},
                             {"C", "k2 * B", "0"}},
                  .unknowns = {"k1", "k2", "A0"}},
       .unknowns = {0.5, 0.2, 10.0}},
      {.table = "michaelis_menten",
       .system = {.states = {{"S", "-Vm * S / (Km + S)", "S0"}}, .unknowns = {"Vm", "Km", "S0"}},
       .unknowns = {2.0, 0.5, 10.0}},
      {.table = "robertson",
       .system = {.states = {{"y1", "-k1 * y1 + k2 * y2 * y3", "1"},
                             {"y2", "k1 * y1 - k2 * y2 * y3 - k3 * y2^2", "0"},
                             {"y3", "k3 * y2^2", "0"}},
                  .unknowns = {"k1", "k2", "k3"}},
       .unknowns = {0.04, 1e4, 3e7}},
  };
}

/// A column of the table: a state, or its derivative by an unknown.
struct Quantity {
  std::size_t state = 0;
  std::optional<std::size_t> unknown;
};

Quantity read_quantity(const std::string& column, const SystemText& system) {
  for (std::size_t i = 0; i < system.states.size(); ++i) {
    if (column == system.states[i].name) return {i, std::nullopt};
    for (std::size_t j = 0; j < system.unknowns.size(); ++j) {
      if (column == "d" + system.states[i].name + "_d" + system.unknowns[j]) return {i, j};
    }
  }
  throw std::runtime_error("no quantity " + column);
}

class PublishedSensitivities : public ::testing::TestWithParam<std::tuple<Case, Engine>> {};

std::string name_of(const ::testing::TestParamInfo<std::tuple<Case, Engine>>& info) {
  const bool stacked = std::get<Engine>(info.param) == Engine::Stacked;
  return std::get<Case>(info.param).table + (stacked ? "_stacked" : "_reference");
}

INSTANTIATE_TEST_SUITE_P(Tables, PublishedSensitivities,
                         ::testing::Combine(::testing::ValuesIn(all_cases()),
                                            ::testing::Values(Engine::Stacked, Engine::Reference)),
                         name_of);

TEST_P(PublishedSensitivities, AreMet) {
  const auto& [chosen, engine] = GetParam();
  const Table table = read_table(kFolder + chosen.table + ".csv");
  const auto program = std::move(Program::compile(read_system(chosen.system))).value();
  std::vector<Quantity> quantities;
  for (const std::string& column : table.columns) {
    if (column != "t") quantities.push_back(read_quantity(column, chosen.system));
  }
  Schedule schedule;
  // Derivatives are controlled times their unknown.
  std::vector<double> absolute(program->states(), std::numeric_limits<double>::max());
  for (const std::vector<double>& row : table.rows) {
    schedule.outputs.push_back(row[0]);
    for (std::size_t q = 0; q < quantities.size(); ++q) {
      const auto [state, unknown] = quantities[q];
      const double size = unknown ? chosen.unknowns[*unknown] : 1.0;
      absolute[state] = std::min(absolute[state], kNegligible * size * std::abs(row[q + 1]));
    }
  }
  Integrator integrator(*program, schedule,
                        {.relative = kRelative, .absolute = absolute, .engine = engine});
  const auto run = integrator.run(chosen.unknowns, chosen.unknowns, Sensitivities::Yes);
  ASSERT_TRUE(run) << run.failure().words;
  for (std::size_t k = 0; k < table.rows.size(); ++k) {
    for (std::size_t q = 0; q < quantities.size(); ++q) {
      const auto [state, unknown] = quantities[q];
      const double found =
          unknown ? (*run)->dstates_dp[k](state, *unknown) : (*run)->states(state, k);
      EXPECT_GT(digits(found, table.rows[k][q + 1]), kDigits)
          << table.columns[q + 1] << " at t = " << table.rows[k][0];
    }
  }
}

}  // namespace
}  // namespace gainsay::core
