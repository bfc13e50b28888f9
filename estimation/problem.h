#pragma once

#include "gainsay/core/hypothesis.h"
#include "gainsay/core/program.h"
#include "gainsay/core/result.h"
#include "gainsay/core/schedule.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/readout.h"
#include "gainsay/estimation/unknown.h"

#include <cstddef>
#include <memory>
#include <optional>
#include <span>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// One residual's datum: which output of which readout it belongs to.
struct Datum {
  std::size_t output = 0;   ///< number of Schedule::outputs
  std::size_t readout = 0;  ///< number of System::readouts of this experiment's program
  double value = 0.0;
  double sd =
      kNotGiven;  ///< its own, or the constant part of its readout's noise where that is all
  std::size_t point = 0;  ///< number in the Series it comes from
};

/// Data of one readout in one experiment, fitted points alone, ascending in time.
struct FittedSeries {
  std::string readout;             ///< name
  std::size_t readout_number = 0;  ///< in Problem::readouts
  std::vector<Datum> data;
  Noise noise;                  ///< holds for data without an sd of their own
  std::size_t noise_group = 0;  ///< data that share one unknown sd; one group a readout
};

/// Where a readout's scale and offset are unknowns: their numbers in Problem::unknowns. The exact
/// elimination of these two will act here.
struct LinearUnknowns {
  std::optional<std::size_t> scale;
  std::optional<std::size_t> offset;
  std::size_t readout = 0;  ///< number of System::readouts in the program
};

struct FittedExperiment {
  std::string name;
  std::shared_ptr<const core::Program> program;  ///< immutable, shared by copies of the problem
  core::Schedule schedule;
  std::vector<double> absolute;  ///< tolerance of each state
  std::vector<std::size_t>
      unknown_numbers;  ///< program's unknown j is Problem::unknowns[unknown_numbers[j]]
  std::vector<FittedSeries> series;
  std::vector<LinearUnknowns> linear;
};

/// One hypothesis against all experiments: everything that a fit needs. Residuals are numbered by
/// experiment, series and datum in this order; priors come last, in order of unknowns.
struct Problem {
  std::string hypothesis;         ///< title
  std::vector<Unknown> unknowns;  ///< those that something depends on
  std::vector<std::string>
      unused;  ///< declared by the hypothesis itself, but nothing depends on them
  std::vector<FittedExperiment> experiments;
  std::vector<std::string> readouts;      ///< names of all readouts, in the order given
  std::vector<std::string> noise_groups;  ///< readouts whose constant sd is unknown, by name
  double relative_accuracy = 1e-6;
  std::size_t residuals() const;  ///< N, priors included
  std::size_t priors() const;
  bool noise_unknown() const { return !noise_groups.empty(); }
  bool noise_depends_on_model() const;
};

struct AssemblyOptions {
  double relative_accuracy = 1e-6;
  double negligible =
      1e-8;  ///< of a species: times the largest start, addition or reading of its kind (1 if none)
  /// Keeps experiments without a fitted point and gives every program all readouts, in the order
  /// given: for simulating. Else each program shows the readouts that have data in it, and
  /// experiments without data are left out.
  bool to_simulate = false;
};

/// Puts a hypothesis and the experiments together. `declared` holds the study's and the hypothesis'
/// own unknowns (own ones first where names are equal). Unknowns named as shown in format:
/// `kd[run-03]`, `scale.glow`, `scale.glow[run-03]`, `offset.glow`, `start.enzyme[run-03]`. Default
/// ranges, m the largest |value| of the readout (1 if 0): scale 1e-6 m to 1e6 m, logarithmic
/// (signed: -1e6 m to 1e6 m, linear); offset -10 m to 10 m, linear. Fails where a name means
/// nothing in this hypothesis, a species is missing, or a known is given by nobody.
core::Result<Problem> assemble(const core::Hypothesis& hypothesis,
                               std::span<const DeclaredUnknown> declared,
                               std::span<const Readout> readouts,
                               std::span<const Experiment> experiments,
                               const AssemblyOptions& options);

/// The same problem with `low`/`high` of one unknown replaced (a bound moved out).
Problem with_range(const Problem& problem, std::size_t unknown, double low, double high);

}  // namespace gainsay::estimation
