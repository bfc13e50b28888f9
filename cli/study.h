#pragma once

#include "gainsay/core/hypothesis.h"
#include "gainsay/core/network.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/readout.h"
#include "gainsay/estimation/unknown.h"
#include "gainsay/stats/verdict.h"

#include <cstddef>
#include <cstdint>
#include <filesystem>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

/// A hypothesis of a study: its letter, its file, its mechanism, its own unknowns.
struct StudyHypothesis {
  std::string letter;  ///< A, B, ... Z, AA
  std::string file;    ///< relative to the study, with '/'
  core::Hypothesis mechanism;
  std::vector<estimation::DeclaredUnknown>
      unknowns;  ///< its own; they replace the study's of equal names
  std::optional<std::size_t>
      base;  ///< number of the hypothesis it amends, where that is judged too
};

/// A study folder as understood: plain values.
struct Study {
  std::filesystem::path folder;
  std::string title;
  double significance = 0.05;
  std::optional<stats::WhichLimit> decides;
  std::vector<std::string> inputs;
  std::vector<estimation::DeclaredUnknown> unknowns;
  std::vector<estimation::Readout> readouts;
  std::vector<StudyHypothesis> hypotheses;
  std::vector<estimation::Experiment> experiments;

  std::optional<std::size_t> descents;  ///< none: until convincing
  long budget = 20000;
  std::uint64_t seed = 1;
  double relative_accuracy = 1e-6;
  double negligible = 1e-8;
  std::string time_unit;  ///< label of time axes; may be empty
};

}  // namespace gainsay::cli
