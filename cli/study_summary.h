#pragma once

#include "gainsay/cli/study.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::cli {

/// What was understood of one hypothesis.
struct HypothesisSummary {
  std::string letter;
  std::string title;
  std::string file;
  std::string base;                    ///< title of the hypothesis it amends; may be empty
  std::vector<std::string> species;    ///< names
  std::vector<std::string> reactions;  ///< "loss: A -> B"
  std::vector<std::string> conserved;  ///< "A + B"
  std::vector<std::string> kinetic;    ///< names of the unknowns to be fitted, by kind
  std::vector<std::string> initial;
  std::vector<std::string> measurement;
  std::size_t data = 0;    ///< readings that count
  std::size_t priors = 0;  ///< earlier work: one residual each
  std::size_t unknowns() const { return kinetic.size() + initial.size() + measurement.size(); }
  std::size_t residuals() const { return data + priors; }
};

struct ReadoutSummary {
  std::string name;
  std::size_t counted = 0;
  std::size_t left_out = 0;
};

struct ExperimentSummary {
  std::string name;
  std::string title;
  std::vector<ReadoutSummary> readouts;  ///< those it has readings of
  double first = 0.0;                    ///< time of the first and last reading
  double last = 0.0;
};

struct StudySummary {
  std::string title;
  std::vector<HypothesisSummary> hypotheses;
  std::vector<ExperimentSummary> experiments;
};

/// All that can be said of a study without fitting. `study` comes from read_study.
StudySummary summarize(const Study& study);

/// For people, lines of at most 80 columns where names allow.
std::string summary_text(const StudySummary& summary);

}  // namespace gainsay::cli
