#pragma once

#include "gainsay/cli/console.h"

#include <optional>
#include <string>

namespace gainsay::cli {

struct LawsOptions {
  std::optional<std::string> name;  ///< one law; else all
  bool json = false;
  bool markdown = false;  ///< as docs/rate-laws.md
};

/// Lists the rate laws, or explains one. Statuses: 0 done, 2 there is no law of this name.
int run_laws(const LawsOptions& options, const Console& console);

}  // namespace gainsay::cli
