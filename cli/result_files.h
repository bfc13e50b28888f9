#pragma once

#include "gainsay/core/result.h"

#include <filesystem>
#include <map>
#include <string>

namespace gainsay::cli {

/// Writes texts by name into a folder, made where it is missing, so that each file is at any time
/// either the old one or the new one whole: written beside its place, forced to disk, then renamed.
/// All are written before the first is renamed. Fails (with nothing renamed) where one cannot be
/// written.
core::Result<bool> write_files(const std::filesystem::path& folder,
                               const std::map<std::string, std::string>& texts);

}  // namespace gainsay::cli
