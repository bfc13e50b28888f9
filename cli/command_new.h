#pragma once

#include "gainsay/cli/console.h"

#include <filesystem>

namespace gainsay::cli {

struct NewOptions {
  std::filesystem::path folder;  ///< to make; must not exist or be empty
};

/// Writes a commented starter study that judges as it is. Statuses: 0 done, 2 the folder is in use
/// or cannot be written to.
int run_new(const NewOptions& options, const Console& console);

}  // namespace gainsay::cli
