#pragma once

namespace gainsay::stats {

/// P(X > x), X chi-square with `freedom` degrees; accurate to the last digits down to the smallest
/// double. 1 for x <= 0.
double chi_square_upper_tail(double x, double freedom);

/// The x with P(X > x) = tail, 0 < tail < 1.
double chi_square_quantile(double tail, double freedom);

}  // namespace gainsay::stats
