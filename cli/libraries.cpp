#include "gainsay/cli/libraries.h"

#include "gainsay/stats/version.h"

#include <fmt/format.h>
#include <gnu/libc-version.h>

namespace gainsay::cli {
namespace {

std::string processor_features() {
  std::string features = "processor with";
  if (__builtin_cpu_supports("sse4.2")) features += " sse4.2";
  if (__builtin_cpu_supports("avx2")) features += " avx2";
  if (__builtin_cpu_supports("fma")) features += " fma";
  if (__builtin_cpu_supports("avx512f")) features += " avx512f";
  return features;
}

}  // namespace

std::vector<std::string> libraries() {
  std::vector<std::string> all = stats::libraries();
  all.push_back(fmt::format("GNU C library {}", gnu_get_libc_version()));
  all.push_back(fmt::format("g++ {}.{}.{}", __GNUC__, __GNUC_MINOR__, __GNUC_PATCHLEVEL__));
  all.push_back(processor_features());
  return all;
}

}  // namespace gainsay::cli
