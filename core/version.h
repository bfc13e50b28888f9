#pragma once

namespace gainsay::core {

/// The version of the project, as in its CMakeLists.txt.
const char* version();

}  // namespace gainsay::core
