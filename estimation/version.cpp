#include "gainsay/estimation/version.h"

#include "gainsay/core/version.h"

#include <ceres/version.h>

namespace gainsay::estimation {

std::vector<std::string> libraries() {
  std::vector<std::string> all = core::libraries();
  all.emplace_back("Ceres Solver " CERES_VERSION_STRING);
  return all;
}

}  // namespace gainsay::estimation
