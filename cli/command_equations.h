#pragma once

#include "gainsay/cli/console.h"

#include <filesystem>
#include <optional>
#include <string>

namespace gainsay::cli {

enum class EquationsForm { Text, Latex, Html };

struct EquationsOptions {
  std::filesystem::path study = ".";
  std::optional<std::string> hypothesis;  ///< letter or title; else all
  EquationsForm form = EquationsForm::Text;
};

/// Writes the state-space form of one hypothesis, or of all, on `out`. Statuses: 0 done, 2 the
/// study is wrong or has no such hypothesis.
int run_equations(const EquationsOptions& options, const Console& console);

}  // namespace gainsay::cli
