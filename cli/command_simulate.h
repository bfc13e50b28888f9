#pragma once

#include "gainsay/cli/console.h"
#include "gainsay/core/result.h"

#include <filesystem>
#include <map>
#include <optional>
#include <string>
#include <vector>

namespace gainsay::cli {

struct SimulateOptions {
  std::filesystem::path study = ".";
  std::string hypothesis;  ///< letter or title
  std::optional<std::string> experiment;
  std::map<std::string, double> values;  ///< by --set
  std::optional<double> until;           ///< else the experiment's own times
  std::optional<double> every;           ///< else 100 steps
  bool sensitivities = false;
};

/// `NAME=VALUE` texts of --set, by name.
core::Result<std::map<std::string, double>> read_settings(const std::vector<std::string>& settings);

/// Writes states, readouts and, if asked for, derivatives of the states by the unknowns, as CSV on
/// `out`. Statuses: 0 done, 2 something is wrong or missing, or the hypothesis cannot be integrated
/// with these values.
int run_simulate(const SimulateOptions& options, const Console& console);

}  // namespace gainsay::cli
