#include "gainsay/stats/verdict.h"

#include "gainsay/stats/rivals.h"

#include <cmath>

namespace gainsay::stats {

const Limit& Verdict::deciding_limit() const {
  return decides == WhichLimit::Full ? full : reduced;
}

bool Verdict::V_too_near_limit() const {
  const Limit& limit = deciding_limit();
  const bool clear = std::abs(limit.V - limit.value) > std::abs(limit.V - V_tighter);
  return !clear;  // nor is it where one of them is not a number
}

bool Verdict::V_speaks_against() const {
  return V_counts() && deciding_limit().passed() && !V_too_near_limit();
}

bool Verdict::order_speaks_against() const {
  return order_counts() && !order.close && order.p_value <= share_of_order * alpha;
}

std::vector<double> weights(const std::vector<const Verdict*>& verdicts) {
  std::vector<double> criterion;
  for (const Verdict* verdict : verdicts) {
    const double own = verdict->fitted_noise.empty() ? verdict->AIC : verdict->AICc;
    criterion.push_back(verdict->decision == Decision::Rejected ? kNotComputed : own);
  }
  return akaike_weights(criterion);
}

}  // namespace gainsay::stats
