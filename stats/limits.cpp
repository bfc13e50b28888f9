#include "gainsay/stats/limits.h"

#include "gainsay/core/require.h"
#include "gainsay/stats/tails.h"

namespace gainsay::stats {
namespace {

constexpr std::size_t kLeastDataForReduced = 12;
constexpr std::size_t kDataPerUnknownForReduced = 3;

Limit chi_square_limit(double V, std::size_t freedom, double level) {
  GAINSAY_REQUIRE(0.0 < level && level < 1.0, "the level of a limit lies between 0 and 1");
  Limit limit;
  limit.V = V;
  limit.freedom = static_cast<double>(freedom);
  limit.value = chi_square_quantile(level, limit.freedom);
  limit.p_value = chi_square_upper_tail(V, limit.freedom);
  return limit;
}

}  // namespace

Limit full_limit(double least_V, std::size_t N, double level) {
  GAINSAY_REQUIRE(N > 0, "a limit needs data");
  return chi_square_limit(least_V, N, level);
}

Limit reduced_limit(double V, std::size_t N, std::size_t k, double level) {
  if (N <= k) {
    Limit limit;
    limit.V = V;
    limit.not_offered = "no more data than free unknowns";
    return limit;
  }
  return chi_square_limit(V, N - k, level);
}

WhichLimit which_decides(std::optional<WhichLimit> stated, std::size_t N, std::size_t k) {
  if (stated) return *stated;
  const bool enough = N >= kLeastDataForReduced && N >= kDataPerUnknownForReduced * k;
  return enough ? WhichLimit::Reduced : WhichLimit::Full;
}

}  // namespace gainsay::stats
