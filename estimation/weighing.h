#pragma once

#include <cstddef>

namespace gainsay::estimation {

/// What a descent lowers: -2 ln L, or V itself. The two differ where sds depend on the modelled
/// value.
enum class Aim { Likelihood, Misfit };

/// How one datum of known noise scatters: variance = constant + relative_squared f^2, but at least
/// `floor`; f the modelled value, units of the readout squared. Methods (11).
struct Scatter {
  double constant = 0.0;
  double relative_squared = 0.0;
  double floor = 0.0;
};

/// One datum weighed: its share of the objective, and what its row of J = (df/dx) / sd contributes
/// to the quadratic model of half the objective: J' slope to the gradient, J' J curvature to the
/// curvature. Methods (12)-(13).
struct Weighed {
  double r = 0.0;   ///< (shown - observed) / sd
  double sd = 0.0;  ///< at the modelled value
  double objective = 0.0;
  double slope = 0.0;
  double curvature = 0.0;
};

/// -2 ln L of a normal law is r^2 + ln variance; the logarithm counts from the least variance that
/// the datum can have, so that every share is at least 0 and a partial sum bounds the whole from
/// below. With model-dependent sd the curvature is Fisher's information.
Weighed weigh(const Scatter& scatter, double shown, double observed, Aim aim);

/// Data of one readout that share an unknown constant sd. Methods (14).
struct NoiseGroup {
  std::size_t count = 0;     ///< N_g
  double floor = 0.0;        ///< f, least sd, in units of the readout
  double sum_squares = 0.0;  ///< s, of shown - observed

  /// The likeliest variance, f^2 + s / N_g.
  double variance() const;
  /// -2 ln L at that variance, from a group that fits exactly: N_g ln(1 + s / (N_g f^2)).
  double objective() const;
};

}  // namespace gainsay::estimation
