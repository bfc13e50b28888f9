#pragma once

#include <string>
#include <vector>

namespace gainsay::stats {

/// Name and version of the libraries that this layer and those below it compute with.
std::vector<std::string> libraries();

}  // namespace gainsay::stats
