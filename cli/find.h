#pragma once

#include "gainsay/cli/study.h"
#include "gainsay/core/result.h"

#include <cstddef>
#include <string_view>

namespace gainsay::cli {

/// Number of the hypothesis of this letter or title. Fails with the nearest title.
core::Result<std::size_t> find_hypothesis(const Study& study, std::string_view letter_or_title);

/// Number of the experiment of this name.
core::Result<std::size_t> find_experiment(const Study& study, std::string_view name);

}  // namespace gainsay::cli
