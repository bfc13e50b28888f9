#include "gainsay/stats/decide.h"

#include <cmath>

namespace gainsay::stats {
namespace {

Decided undecided(Ground ground) { return {Decision::Undecided, ground}; }

Decided against(Ground ground, const Conviction& conviction) {
  if (!conviction.converged) return undecided(Ground::NoConvergence);
  if (!conviction.convincing()) return undecided(Ground::TooFewStarts);
  return {Decision::Rejected, ground};
}

/// The test that speaks louder, by the P of each against its share.
Ground louder(const Verdict& verdict) {
  if (!verdict.order_speaks_against()) return Ground::MisfitAboveLimit;
  if (!verdict.V_speaks_against()) return Ground::ResidualsInOrder;
  const double by_V = verdict.deciding_limit().p_value / verdict.share_of_V;
  const double by_order = verdict.order.p_value / verdict.share_of_order;
  return by_V <= by_order ? Ground::MisfitAboveLimit : Ground::ResidualsInOrder;
}

}  // namespace

Decided decide(const Verdict& verdict, const Conviction& conviction) {
  if (!conviction.integrated) return undecided(Ground::CannotBeIntegrated);
  if (verdict.dependence) return undecided(Ground::ReadoutsDepend);
  if (verdict.N <= verdict.k) return undecided(Ground::NoFreedom);
  if (!verdict.V_counts() && !verdict.order_counts()) return undecided(Ground::NothingToTest);
  if (verdict.V_speaks_against() || verdict.order_speaks_against())
    return against(louder(verdict), conviction);
  if (verdict.V_counts() && std::isnan(verdict.V_tighter))
    return undecided(Ground::FailsAtTighterControl);
  if (verdict.V_counts() && verdict.V_too_near_limit())
    return undecided(Ground::MisfitTooNearLimit);
  if (verdict.order_counts() && verdict.order.close) return undecided(Ground::OrderTooNearShare);
  return {Decision::NotRejected, Ground::NothingSpeaksAgainst};
}

double chance_of_a_miss(std::size_t random_starts) {
  return 1.0 - std::pow(0.05, 1.0 / static_cast<double>(random_starts));
}

}  // namespace gainsay::stats
