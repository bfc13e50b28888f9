#pragma once

namespace gainsay::stats {

/// P(X > x), X chi-square with `freedom` degrees, computed as an upper tail: it keeps its digits
/// down to the smallest double, where 1 - P(X <= x) would be 0. 1 for x <= 0.
double chi_square_upper_tail(double x, double freedom);

/// The x with P(X > x) = tail, 0 < tail < 1.
double chi_square_quantile(double tail, double freedom);

/// P(X > x), X noncentral chi-square with `freedom` degrees and noncentrality L.
double noncentral_chi_square_upper_tail(double x, double freedom, double L);

/// The x with P(X > x) = tail, X standard normal.
double normal_quantile(double tail);

/// The x with P(X > x) = tail, X by Student's t with `freedom` degrees.
double student_t_quantile(double tail, double freedom);

}  // namespace gainsay::stats
