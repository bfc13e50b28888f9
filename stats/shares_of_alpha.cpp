#include "gainsay/stats/shares_of_alpha.h"

#include <algorithm>

namespace gainsay::stats {

SharesOfAlpha shares_of_alpha(bool V_counts, bool order_counts) {
  if (V_counts && order_counts) return {0.8, 0.2};
  return {V_counts ? 1.0 : 0.0, order_counts ? 1.0 : 0.0};
}

double joint_p_value(const SharesOfAlpha& shares, double V_p_value, double order_p_value) {
  double p_value = 1.0;
  if (shares.V > 0.0) p_value = std::min(p_value, V_p_value / shares.V);
  if (shares.order > 0.0) p_value = std::min(p_value, order_p_value / shares.order);
  return p_value;
}

}  // namespace gainsay::stats
