#include "gainsay/stats/dependence.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/starts.h"

#include <gmock/gmock.h>

#include <cmath>
#include <string>
#include <vector>

namespace gainsay::stats {
namespace {

using testing::ElementsAre;

/// Readings by time (rows) and readout (columns); NaN where there is none.
using Readings = std::vector<std::vector<double>>;

estimation::FittedExperiment experiment_of(const Readings& readings) {
  estimation::FittedExperiment experiment;
  experiment.series.resize(readings.front().size());
  for (std::size_t j = 0; j < experiment.series.size(); ++j) {
    experiment.series[j].readout_number = j;
    for (std::size_t i = 0; i < readings.size(); ++i) {
      if (std::isnan(readings[i][j])) continue;
      estimation::Datum datum;
      datum.output = i;
      datum.value = readings[i][j];
      experiment.series[j].data.push_back(datum);
    }
  }
  return experiment;
}

estimation::Problem problem_of(const std::vector<Readings>& experiments, double sd) {
  estimation::Problem problem;
  for (std::size_t j = 0; j < experiments.front().front().size(); ++j)
    problem.readouts.push_back("y" + std::to_string(j + 1));
  for (const Readings& readings : experiments) {
    problem.experiments.push_back(experiment_of(readings));
    for (estimation::FittedSeries& series : problem.experiments.back().series) {
      series.noise.sd_unknown = std::isnan(sd);
      for (estimation::Datum& datum : series.data) datum.sd = sd;
    }
  }
  if (std::isnan(sd)) problem.noise_groups = problem.readouts;
  return problem;
}

std::optional<Dependence> found_in(const std::vector<Readings>& experiments, double sd) {
  const estimation::Problem problem = problem_of(experiments, sd);
  return dependent_readouts(problem, Eigen::VectorXd::Constant(problem.residuals(), sd));
}

constexpr double kUnknown = estimation::kNotGiven;

// Fuguitt & Hawkins (1947), alpha-pinene at 189.5 degrees: per cent of pinene, dipentene,
// allo-ocimene, pyronene, dimer. Box, Hunter, MacGregor & Erjavec (1973) found that pyronene was
// not measured but taken as 3 % of the conversion, and that the sum was closed.
const Readings kPinene = {{88.35, 7.3, 2.3, 0.4, 1.75}, {76.4, 15.6, 4.5, 0.7, 2.8},
                          {65.1, 23.1, 5.3, 1.1, 5.8},  {50.4, 32.9, 6, 1.5, 9.3},
                          {37.5, 42.7, 6, 1.9, 12},     {25.9, 49.1, 5.9, 2.2, 17},
                          {14, 57.4, 5.1, 2.6, 21},     {4.5, 63.1, 3.8, 2.9, 25.7}};

TEST(DependentReadouts, AreFoundInTheIsomerizationOfPinene) {
  const std::optional<Dependence> found = found_in({kPinene}, kUnknown);
  ASSERT_TRUE(found);
  EXPECT_THAT(found->readouts, testing::IsSupersetOf({"y1", "y4"}));
}

TEST(DependentReadouts, AreFoundWhereTheNoiseIsKnown) { EXPECT_TRUE(found_in({kPinene}, 0.75)); }

/// Decay of y1 into y2, measured with noise; y3 as told.
Readings decay(std::uint64_t number, double sd, double step, bool closed) {
  estimation::Draws draws(1, 77, number);
  const auto printed = [step](double value) { return std::round(value / step) * step; };
  Readings readings;
  for (int i = 0; i < 12; ++i) {
    const double left = 100 * std::exp(-0.2 * i);
    const double a = printed(left + sd * draws.normal());
    const double b = printed(0.6 * (100 - left) + sd * draws.normal());
    const double c = closed ? 100 - a - b : printed(0.4 * (100 - left) + sd * draws.normal());
    readings.push_back({a, b, c});
  }
  return readings;
}

TEST(DependentReadouts, AreFoundWhereASumWasClosed) {
  const std::optional<Dependence> found = found_in({decay(1, 2.0, 0.1, true)}, 2.0);
  ASSERT_TRUE(found);
  EXPECT_THAT(found->readouts, ElementsAre("y1", "y2", "y3"));
}

TEST(DependentReadouts, AreFoundInUnroundedNumbers) {
  EXPECT_TRUE(found_in({decay(1, 2.0, 1e-12, true)}, 2.0));
  EXPECT_TRUE(found_in({decay(2, 2.0, 1e-12, true)}, kUnknown));
}

TEST(DependentReadouts, MayHaveAConstantOfEachExperiment) {
  Readings other = decay(3, 2.0, 0.1, true);
  for (std::vector<double>& row : other) row[2] += 20.0;
  EXPECT_TRUE(found_in({decay(2, 2.0, 0.1, true), other}, 2.0));
}

TEST(DependentReadouts, AreNotSeenWhereARelationHoldsInOneExperimentAlone) {
  EXPECT_FALSE(found_in({decay(2, 2.0, 0.1, true), decay(3, 2.0, 0.1, false)}, 2.0));
}

TEST(DependentReadouts, AreNotSeenWhereTheTruthIsConservedAndTheNoiseIndependent) {
  for (std::uint64_t number = 0; number < 50; ++number) {
    EXPECT_FALSE(found_in({decay(number, 2.0, 0.1, false)}, 2.0)) << number;
    EXPECT_FALSE(found_in({decay(number, 0.1, 0.1, false)}, 0.1)) << number;
    EXPECT_FALSE(found_in({decay(number, 2.0, 0.1, false)}, kUnknown)) << number;
    EXPECT_FALSE(found_in({decay(number, 2.0, 1e-12, false)}, kUnknown)) << number;
  }
}

TEST(DependentReadouts, AreFoundAmongTimesThatAllShare) {
  Readings readings = decay(4, 2.0, 0.1, true);
  readings[3][1] = kUnknown;
  readings[7][2] = kUnknown;
  EXPECT_TRUE(found_in({readings}, 2.0));
}

TEST(DependentReadouts, NeedTwoThatVaryAndEnoughRows) {
  const Readings constant = {{1, 5}, {2, 5}, {4, 5}, {3, 5}, {7, 5}, {9, 5}};
  EXPECT_FALSE(found_in({constant}, 0.5));
  EXPECT_FALSE(found_in({{{1, 9}, {3, 7}}}, 0.5));
  EXPECT_FALSE(found_in({{{1}, {2}, {3}, {4}}}, 0.5));
}

TEST(DependentReadouts, WantAnSdForEachDatum) {
  const estimation::Problem problem = problem_of({kPinene}, 1.0);
  EXPECT_THROW(dependent_readouts(problem, Eigen::VectorXd::Ones(3)), core::BrokenPromise);
}

TEST(PrintedStep, IsThatOfTheMiddleValue) {
  EXPECT_EQ(printed_step({88.35, 76.4, 65.1, 14, 4.5}), 0.1);
  EXPECT_EQ(printed_step({1200, 300, 5600}), 100.0);
  EXPECT_EQ(printed_step({0.0012, 0.0035, 0, 0}), 1e-4);
  EXPECT_EQ(printed_step({0, 0}), 1.0);
  EXPECT_EQ(printed_step({1.0 / 3.0, 2.0 / 7.0, 0.1 * std::sqrt(2.0)}), 1e-10 / 3.0);
}

}  // namespace
}  // namespace gainsay::stats
