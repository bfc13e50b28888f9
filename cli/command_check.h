#pragma once

#include "gainsay/cli/console.h"

#include <filesystem>

namespace gainsay::cli {

struct CheckOptions {
  std::filesystem::path study = ".";
  bool json = false;
};

/// Reads a study and says all that can be said of it without fitting: hypotheses, conserved sums,
/// unknowns by kind, counts of data; warnings and errors go to `messages`, and with `json` into the
/// JSON on `out` as well. Statuses: 0 the study can be read, 2 it is wrong.
int run_check(const CheckOptions& options, const Console& console);

}  // namespace gainsay::cli
