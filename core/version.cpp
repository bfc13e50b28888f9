#include "gainsay/core/version.h"

#include <Eigen/Core>
#include <fmt/format.h>
#include <sundials/sundials_version.h>

#include <array>

namespace gainsay::core {

std::string version() { return GAINSAY_VERSION; }

std::vector<std::string> libraries() {
  std::array<char, 32> sundials{};
  SUNDIALSGetVersion(sundials.data(), static_cast<int>(sundials.size()));
  return {
      fmt::format("SUNDIALS {}", sundials.data()),
      fmt::format("Eigen {}.{}.{}", EIGEN_WORLD_VERSION, EIGEN_MAJOR_VERSION, EIGEN_MINOR_VERSION)};
}

}  // namespace gainsay::core
