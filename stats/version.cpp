#include "gainsay/stats/version.h"

#include "gainsay/estimation/version.h"

#include <boost/version.hpp>
#include <fmt/format.h>

namespace gainsay::stats {

std::vector<std::string> libraries() {
  std::vector<std::string> all = estimation::libraries();
  all.push_back(fmt::format("Boost {}.{}", BOOST_VERSION / 100000, BOOST_VERSION / 100 % 1000));
  return all;
}

}  // namespace gainsay::stats
