#include "gainsay/cli/equations.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/fed_batch.h"

#include <gmock/gmock.h>

namespace gainsay::cli {
namespace {

using testing::Bench;
using ::testing::ElementsAre;
using testing::fed_batch;
using testing::fed_batch_form;
using ::testing::IsEmpty;

std::string turnover(const Equation& equation) {
  if (!equation.turnover) return "";
  return equation_text(*equation.turnover, equation.turnover->reversible ? "<->" : "->",
                       [](std::string_view name) { return std::string(name); });
}

std::vector<std::string> lines(const StateSpace& form, const std::string& title) {
  std::vector<std::string> all;
  for (const auto& section : form.sections) {
    if (section.title != title) continue;
    for (const auto& equation : section.equations)
      all.push_back(equation.name + " = " + core::print_text(equation.right) + " | " +
                    turnover(equation) + " | " + equation.words);
    for (const auto& quantity : section.quantities)
      all.push_back(quantity.name + ": " + quantity.words);
  }
  return all;
}

TEST(StateSpace, DerivativesNameReactions) {
  const StateSpace form = fed_batch_form();
  EXPECT_THAT(lines(form, "Derivatives"),
              ElementsAre("S = 2 * relaxing - 2 * turnover + feeding / tank |  | ",
                          "R = turnover - relaxing |  | ", "H = 0 |  | held by the experimenter"));
  EXPECT_THAT(lines(form, "Reactions"),
              ElementsAre("turnover = kcat * S / brake | 2 S -> R | ",
                          "relaxing = kf * R - kb * S^2 | R <-> 2 S | ",
                          "feeding = feed * 200 | -> S | amount per time"));
  EXPECT_THAT(lines(form, "Where"),
              ElementsAre("tank = fill |  | volume", "brake = 1 + R / Ki |  | "));
}

TEST(StateSpace, StartsAndAdditionsSayInWhichExperiment) {
  const StateSpace form = fed_batch_form();
  EXPECT_THAT(lines(form, "Start values"), ElementsAre("S = 4 |  | in low", "S = c0 |  | in high",
                                                       "R = 0 |  | ", "H = 1e-7 |  | "));
  EXPECT_THAT(lines(form, "Additions"),
              ElementsAre("S = 10 / tank |  | at t = 60 in high", "S = 2 |  | at t = 70 in high"));
}

TEST(StateSpace, MeasurementEquationsCarryScaleOffsetAndNoise) {
  const StateSpace form = fed_batch_form();
  EXPECT_THAT(lines(form, "Measurement equations"),
              ElementsAre("glow = scale.glow[experiment] * R + offset.glow |  | "
                          "sd 0.05 and 3 % of the value",
                          "substrate = S |  | sd 2"));
}

TEST(StateSpace, UnknownsComeByKind) {
  const StateSpace form = fed_batch_form();
  EXPECT_THAT(lines(form, "Kinetic unknowns"),
              ElementsAre("kf: 0.1 to 1; earlier work: 0.5, sd 0.1", "kb: 0.1 to 1",
                          "kcat: 0.01 to 100 1/min"));
  EXPECT_THAT(lines(form, "Initial-condition unknowns"), ElementsAre("c0: 1 to 10"));
  EXPECT_THAT(
      lines(form, "Measurement unknowns"),
      ElementsAre("scale.glow[low]: 2e-6 to 2000000", "offset.glow: -20 to 20, on a linear scale"));
}

TEST(StateSpace, InputsAndKnownsAreGroupedByValue) {
  const StateSpace form = fed_batch_form();
  EXPECT_THAT(lines(form, "Inputs"), ElementsAre("feed: 0 in low; 0 from 0, 0.5 from 30 in high"));
  EXPECT_THAT(lines(form, "Knowns"), ElementsAre("Ki: 5", "fill: 0.8 in low; 1 in high"));
}

TEST(StateSpace, SectionsWithoutContentAreLeftOut) {
  cli::Study study = fed_batch();
  study.experiments.pop_back();
  EXPECT_THAT(lines(fed_batch_form(study), "Additions"), IsEmpty());
  for (const auto& section : fed_batch_form(study).sections)
    EXPECT_TRUE(!section.equations.empty() || !section.quantities.empty()) << section.title;
}

TEST(StateSpace, KnowsWhetherAllBeginAtZero) {
  cli::Study study = fed_batch();
  EXPECT_TRUE(fed_batch_form(study).begins_at_zero);
  study.experiments[0].begins = 0.5;
  EXPECT_FALSE(fed_batch_form(study).begins_at_zero);
}

}  // namespace
}  // namespace gainsay::cli
