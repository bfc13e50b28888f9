#pragma once

#include <string>
#include <vector>

namespace gainsay::cli {

/// What decides the last digits beside our own version: libraries with versions, compiler, and the
/// processor's features by which the mathematical library picks its code.
std::vector<std::string> libraries();

}  // namespace gainsay::cli
