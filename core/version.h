#pragma once

#include <string>
#include <vector>

namespace gainsay::core {

/// The version of the project, as in its CMakeLists.txt.
std::string version();

/// Name and version of the libraries that this layer computes with.
std::vector<std::string> libraries();

}  // namespace gainsay::core
