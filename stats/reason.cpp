#include "gainsay/stats/reason.h"

#include "gainsay/stats/wording.h"

#include <fmt/format.h>

namespace gainsay::stats {
namespace {

std::string reason_of_misfit(const Verdict& verdict) {
  const Share* largest = largest_share(verdict);
  if (largest == nullptr)
    return fmt::format("misfit {} passes its limit {}", shown_V(verdict.deciding_limit().V),
                       shown_V(verdict.deciding_limit().value));
  return fmt::format("misses {} ({} of misfit)", place_of(*largest),
                     percent(largest->V / verdict.V));
}

std::string reason_of_few_starts(const Conviction& conviction) {
  const std::string count = fmt::format("{} of {} random starts", conviction.random_starts,
                                        conviction.starts_for_rejection);
  if (conviction.interrupted) return "interrupted after " + count;
  if (conviction.out_of_budget) return "budget ended after " + count;
  return "would be rejected, but " + count;
}

}  // namespace

std::string reason_of(const Verdict& verdict, const Conviction& conviction) {
  if (verdict.only_within_range)
    return "only within the range of " + listed(moved_unknowns(verdict));
  switch (verdict.ground) {
    case Ground::MisfitAboveLimit:
      return reason_of_misfit(verdict);
    case Ground::ResidualsInOrder:
      return "residuals follow each other";
    case Ground::NothingSpeaksAgainst:
      return verdict.V_counts() ? "as close as the noise allows" : "residuals without order";
    case Ground::CannotBeIntegrated:
      return "no start could be integrated";
    case Ground::ReadoutsDepend:
      return "readouts depend on each other";
    case Ground::NoFreedom:
      return fmt::format("cannot be tested: {}, {}", counted(verdict.N, "datum", "data"),
                         counted(verdict.k, "unknown", "unknowns"));
    case Ground::NothingToTest:
      return "cannot be tested: noise unknown";
    case Ground::NoConvergence:
      return "no descent converged";
    case Ground::TooFewStarts:
      return reason_of_few_starts(conviction);
    case Ground::MisfitTooNearLimit:
      return "misfit too near its limit";
    case Ground::FailsAtTighterControl:
      return "accuracy of its misfit not known";
    case Ground::OrderTooNearShare:
      return "order too near its share to call";
  }
  return {};
}

}  // namespace gainsay::stats
