#pragma once

namespace gainsay::stats {

/// The parts of alpha that the two tests may spend, fixed before the data are looked at.
struct SharesOfAlpha {
  double V = 0.8;      ///< 0 where the size of V tells nothing (noise unknown)
  double order = 0.2;  ///< 0 where order cannot count
};

/// 4/5 for V and 1/5 for order; one alone has all; none has nothing to test with. Methods (66).
SharesOfAlpha shares_of_alpha(bool V_counts, bool order_counts);

/// The P shown for the verdict: min(1, P_V / share, P_order / share), at most alpha exactly where
/// one of the tests rejects (Bonferroni with unequal weights: Rosenthal & Rubin 1983). P of a test
/// without a share is not looked at.
double joint_p_value(const SharesOfAlpha& shares, double V_p_value, double order_p_value);

}  // namespace gainsay::stats
