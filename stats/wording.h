#pragma once

#include "gainsay/stats/verdict.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::stats {

/// A number for reading: `digits` significant ones, 2e-9 rather than 2e-09, the same in every
/// locale.
std::string readable(double number, int digits);
std::string shown_V(double V);        ///< four digits
std::string shown_P(double p_value);  ///< two digits
std::string percent(double part);     ///< 0.414 as "41 %"

/// "1 datum", "72 data".
std::string counted(std::size_t count, const std::string& one, const std::string& many);

/// "a", "a and b", "a, b and c".
std::string listed(const std::vector<std::string>& names);

/// Where a share of V comes from: "acid in run-02", "earlier work".
std::string place_of(const Share& share);

/// The share that carries most of V; null where all of V comes from one place.
const Share* largest_share(const Verdict& verdict);

/// Names of the unknowns whose bounds were moved out, each once.
std::vector<std::string> moved_unknowns(const Verdict& verdict);

}  // namespace gainsay::stats
