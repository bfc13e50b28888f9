#include "gainsay/estimation/problem.h"
#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using testing::between;
using ::testing::ElementsAre;
using ::testing::IsEmpty;
using testing::Mechanism;
using testing::per_experiment;
using testing::shows;

std::vector<std::string> names_of(const std::vector<Unknown>& unknowns) {
  std::vector<std::string> names;
  for (const auto& unknown : unknowns) names.push_back(unknown.name);
  return names;
}

class AssembleTest : public ::testing::Test {
 protected:
  Problem assembled(AssemblyOptions options = {}) const {
    auto made = assemble(hypothesis_, declared_, readouts_, experiments_, options);
    if (made) return std::move(made).value();
    ADD_FAILURE() << made.failure().what;
    return {};
  }

  core::Hypothesis hypothesis_ =
      Mechanism("decay")
          .species("A", "a0 * dilution")
          .rate("loss", {{"A", 1}}, {}, "(k + kd * feed) * A")
          .known("dilution", 0.5)
          .unknowns({"k", "kd", "a0", "background", "idle", "foreign", "dose"})
          .inputs({"feed"});
  std::vector<DeclaredUnknown> declared_{
      between("idle", 1, 2),    between("background", 1, 2),
      between("a0", 1, 4),      per_experiment(between("kd", 0.1, 1)),
      between("k", 1, 2),       between("k", 5, 6),
      between("foreign", 1, 2), between("dose", 1, 2)};
  std::vector<Readout> readouts_{shows("glow", "A + background"), shows("spare", "2 * A"),
                                 shows("rate", "loss")};
  std::vector<Experiment> experiments_{Bench("r1")
                                           .input("feed", {{0, 0}, {5, 1}})
                                           .data("glow", {{1, 10}, {2, 20}, {2, 21}})
                                           .data("rate", {{0, 3}, {2, 1}}),
                                       Bench("plan").input("feed", {{0, 1}}),
                                       Bench("r2")
                                           .input("feed", {{0, 1}})
                                           .start("A", between("", 1, 9).unknown)
                                           .add(3, "A", "dose")
                                           .data("glow", {{4, 7}})};

  void SetUp() override {
    readouts_[0].scale.kind = Coefficient::Kind::PerExperiment;
    readouts_[0].offset.kind = Coefficient::Kind::Unknown;
    declared_[6].own = false;
  }
};

TEST_F(AssembleTest, UnknownsThatSomethingDependsOnInOrderOfDeclaration) {
  const Problem problem = assembled();
  EXPECT_THAT(names_of(problem.unknowns),
              ElementsAre("background", "a0", "kd[r1]", "kd[r2]", "k", "dose", "start.A[r2]",
                          "scale.glow[r1]", "scale.glow[r2]", "offset.glow"));
  EXPECT_THAT(problem.unused, ElementsAre("idle")) << "'foreign' is the study's, not its own";
  EXPECT_EQ(problem.unknowns[4].low, 1) << "the first of equal names holds";
}

TEST_F(AssembleTest, KindsFollowFromUse) {
  std::vector<UnknownKind> kinds;
  for (const auto& unknown : assembled().unknowns) kinds.push_back(unknown.kind);
  using enum UnknownKind;
  EXPECT_THAT(kinds, ElementsAre(Measurement, Initial, Kinetic, Kinetic, Kinetic, Initial, Initial,
                                 Measurement, Measurement, Measurement));
}

TEST_F(AssembleTest, EachProgramNumbersItsOwnUnknowns) {
  const Problem problem = assembled();
  ASSERT_EQ(problem.experiments.size(), 2U) << "'plan' has no data";
  for (const auto& experiment : problem.experiments) {
    const auto& own = experiment.program->system().unknowns;
    ASSERT_EQ(own.size(), experiment.unknown_numbers.size());
    for (std::size_t j = 0; j < own.size(); ++j)
      EXPECT_EQ(own[j], problem.unknowns[experiment.unknown_numbers[j]].name);
  }
  EXPECT_THAT(problem.experiments[1].unknown_numbers, ElementsAre(0, 3, 4, 5, 6, 8, 9));
  EXPECT_THAT(problem.experiments[0].program->system().inputs, ElementsAre("feed"));
  EXPECT_THAT(problem.experiments[1].program->system().inputs, IsEmpty()) << "it never changes";
}

TEST_F(AssembleTest, DataPointToOutputsAndReadouts) {
  const Problem problem = assembled();
  const FittedExperiment& r1 = problem.experiments[0];
  EXPECT_THAT(r1.schedule.outputs, ElementsAre(0, 1, 2));
  ASSERT_EQ(r1.series.size(), 2U);
  std::vector<std::size_t> outputs;
  for (const auto& series : r1.series)
    for (const auto& datum : series.data) outputs.push_back(datum.output);
  EXPECT_THAT(outputs, ElementsAre(1, 2, 2, 0, 2));
  EXPECT_EQ(r1.series[1].readout_number, 2U);
  EXPECT_EQ(problem.readouts[2], "rate");
  EXPECT_EQ(r1.series[1].data[0].readout, 1U) << "'spare' has no data and is not computed";
  EXPECT_EQ(problem.residuals(), 6U);
}

TEST_F(AssembleTest, ScalesAndOffsetsAreFoundAgain) {
  const Problem problem = assembled();
  const auto& linear = problem.experiments[1].linear;
  ASSERT_EQ(linear.size(), 1U);
  EXPECT_EQ(linear[0].scale, 8U);
  EXPECT_EQ(linear[0].offset, 9U);
  EXPECT_EQ(linear[0].readout, 0U);
}

TEST_F(AssembleTest, UnknownSdsAreGroupedByReadout) {
  for (auto& readout : readouts_)
    readout.noise = Noise{.sd = {}, .relative = {}, .sd_unknown = true};
  const Problem problem = assembled();
  EXPECT_TRUE(problem.noise_unknown());
  EXPECT_THAT(problem.noise_groups, ElementsAre("glow", "rate"));
  EXPECT_EQ(problem.experiments[0].series[1].noise_group, 1U);
  EXPECT_EQ(problem.experiments[1].series[0].noise_group, 0U);
}

TEST_F(AssembleTest, ReadoutsMayShareOneUnknownSd) {
  for (auto& readout : readouts_)
    readout.noise = Noise{.sd = {}, .relative = {}, .sd_unknown = true, .same_as = {}};
  readouts_[2].noise.same_as = "glow";
  const Problem problem = assembled();
  EXPECT_THAT(problem.noise_groups, ElementsAre("glow"));
  EXPECT_EQ(problem.experiments[0].series[1].noise_group, 0U);
}

TEST_F(AssembleTest, PointsWithSdsLeaveNoUnknownNoise) {
  for (auto& readout : readouts_)
    readout.noise = Noise{.sd = {}, .relative = {}, .sd_unknown = true};
  for (auto& experiment : experiments_)
    for (auto& series : experiment.series)
      for (auto& point : series.points) point.sd = 0.5;
  EXPECT_FALSE(assembled().noise_unknown());
}

TEST_F(AssembleTest, ToSimulateEveryExperimentShowsEveryReadout) {
  AssemblyOptions options;
  options.to_simulate = true;
  const Problem problem = assembled(options);
  ASSERT_EQ(problem.experiments.size(), 3U);
  EXPECT_EQ(problem.experiments[1].name, "plan");
  for (const auto& experiment : problem.experiments)
    EXPECT_EQ(experiment.program->readouts(), readouts_.size());
}

// Starts are expected at the geometric middle of their ranges: sqrt(1 * 4) * 0.5 = 1 in the first
// experiment, sqrt(1 * 9) = 3 in the second, whose dose is expected at sqrt(1 * 2). No reading
// shows the species alone.
TEST_F(AssembleTest, TolerancesFollowTheSizesOfTheExperiment) {
  const Problem problem = assembled();
  EXPECT_THAT(problem.experiments[0].absolute, ElementsAre(::testing::DoubleEq(1e-8)));
  EXPECT_THAT(problem.experiments[1].absolute, ElementsAre(::testing::DoubleEq(3e-8)));
}

TEST_F(AssembleTest, FailuresComeBackAsValues) {
  experiments_[2].inputs.clear();
  const auto made = assemble(hypothesis_, declared_, readouts_, experiments_, {});
  ASSERT_FALSE(made);
  EXPECT_EQ(made.failure().what,
            "hypothesis 'decay' with experiment 'r2': the input 'feed', used in the rate of change "
            "of 'A', is not set");
}

TEST_F(AssembleTest, APriorOnAStartIsAResidual) {
  experiments_[2].starts[0].unknown->prior = Prior{2.0, 0.1, std::nullopt};
  const Problem problem = assembled();
  EXPECT_EQ(problem.priors(), 1U);
  EXPECT_EQ(problem.residuals(), 7U);
}

}  // namespace
}  // namespace gainsay::estimation
