#include "gainsay/estimation/tolerances.h"

#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

using testing::between;
using ::testing::DoubleEq;
using ::testing::ElementsAre;
using testing::Mechanism;
using testing::written;

core::Hypothesis mixed() {
  return Mechanism("mixed").amount("depot").species("drug").species("trace");
}

core::System with_starts(std::vector<core::Expression> starts) {
  core::System system;
  system.starts = std::move(starts);
  return system;
}

TEST(KindShown, SumsOfSpeciesOfOneKind) {
  const core::Hypothesis hypothesis = mixed();
  EXPECT_EQ(kind_shown(written("drug"), hypothesis), Kind::Concentration);
  EXPECT_EQ(kind_shown(written("1000 * (drug - trace) / 2"), hypothesis), Kind::Concentration);
  EXPECT_EQ(kind_shown(written("-depot"), hypothesis), Kind::Amount);
  EXPECT_EQ(kind_shown(written("drug * 3"), hypothesis), Kind::Concentration);
}

TEST(KindShown, NothingElse) {
  const core::Hypothesis hypothesis = mixed();
  for (const char* text : {"drug + depot", "drug / trace", "k * drug", "drug + 1", "ln(drug)", "2"})
    EXPECT_EQ(kind_shown(written(text), hypothesis), std::nullopt) << text;
}

TEST(ExpectedValue, PriorThenFirstThenMiddle) {
  Unknown unknown = between("x", 1e-2, 1e4).unknown;
  EXPECT_DOUBLE_EQ(expected_value(unknown), 10);
  unknown.linear = true;
  EXPECT_DOUBLE_EQ(expected_value(unknown), 5000.005);
  unknown.first = {7, 8};
  EXPECT_EQ(expected_value(unknown), 7);
  unknown.prior = Prior{3, 0.1, std::nullopt};
  EXPECT_EQ(expected_value(unknown), 3);
}

TEST(AbsoluteTolerances, EachKindHasItsOwnLargest) {
  core::System system = with_starts({0.0, written("a0"), 0.5});
  system.jumps.push_back({0, written("2 * a0")});
  const std::vector<Unknown> unknowns{between("a0", 1, 100).unknown};
  EXPECT_THAT(absolute_tolerances(mixed(), system, unknowns, {}, 1e-8),
              ElementsAre(DoubleEq(20e-8), DoubleEq(10e-8), DoubleEq(10e-8)));
}

TEST(AbsoluteTolerances, ReadingsCountAndOneWhereThereIsNothing) {
  const core::System system = with_starts({0.0, 0.0, 0.0});
  const std::vector<Reading> readings{{Kind::Concentration, -40.0}};
  EXPECT_THAT(absolute_tolerances(mixed(), system, {}, readings, 1e-8),
              ElementsAre(DoubleEq(1e-8), DoubleEq(40e-8), DoubleEq(40e-8)));
}

TEST(AbsoluteTolerances, ASpeciesOwnWins) {
  core::Hypothesis hypothesis = mixed();
  hypothesis.species[2].negligible = 1e-16;
  const core::System system = with_starts({1.0, 1.0, 1.0});
  EXPECT_THAT(absolute_tolerances(hypothesis, system, {}, {}, 1e-8),
              ElementsAre(DoubleEq(1e-8), DoubleEq(1e-8), 1e-16));
}

}  // namespace
}  // namespace gainsay::estimation
