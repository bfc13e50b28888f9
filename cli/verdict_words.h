#pragma once

#include "gainsay/cli/contenders.h"
#include "gainsay/cli/judgement.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// The verdict as one sentence: "The data contradict four of six mechanisms; two are not rejected."
std::string verdict_sentence(const Judgement& judgement);

/// What carries it, two lines: the data and the closest rejected hypothesis; what 'not rejected'
/// leaves open.
std::vector<std::string> facts(const Judgement& judgement);

/// N, k, alpha and its shares, the look, which limit decides, where the noise comes from, which
/// data: for those who judge the judging.
std::string statisticians_line(const Judgement& judgement);

/// Results replace no safety assessment: stands on every report.
std::string caution();

/// "full", "reduced".
std::string limit_word(stats::WhichLimit which);

/// Readings that are fitted.
std::size_t fitted_points(const Study& study);

}  // namespace gainsay::cli
