#pragma once

#include "gainsay/cli/study.h"
#include "gainsay/core/network.h"
#include "gainsay/estimation/curves.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/stats/judge.h"

#include <cstddef>
#include <memory>
#include <string>
#include <vector>

namespace gainsay::cli {

/// One hypothesis after judging: all that the report, JSON, CSV and the terminal are written from.
struct Outcome {
  std::size_t hypothesis = 0;  ///< number in Study::hypotheses
  std::shared_ptr<const estimation::Problem> problem;
  stats::Judged judged;
  core::Network network;                  ///< of its mechanism: for the graph
  std::vector<estimation::Curve> curves;  ///< of the best fit; empty where it cannot be integrated
  double weight = stats::kNotComputed;    ///< among those not rejected
};

struct Fingerprint {
  std::string file;  ///< relative to the study
  std::string sha256;
};

struct Judgement {
  Study study;
  std::vector<Outcome> outcomes;  ///< in order of Study::hypotheses
  std::vector<core::Warning> warnings;
  std::vector<Fingerprint> fingerprints;  ///< of every file read, sorted
  std::string version;                    ///< of gainsay
  std::vector<std::string> libraries;     ///< "SUNDIALS 6.4.1", ...
};

}  // namespace gainsay::cli
