#pragma once

#include "gainsay/stats/decide.h"
#include "gainsay/stats/verdict.h"

namespace gainsay::testing {

/// 72 data, 5 free unknowns, alpha 0.05: V = 60 is below the reduced limit 88.57 (n = 67; the full
/// one, n = 72, is 94.32; both as n (1 - 2 / (9 n) + z sqrt(2 / (9 n)))^3 says, z = 1.7507: Wilson
/// & Hilferty 1931), and the residuals scatter.
inline stats::Verdict passing_verdict() {
  stats::Verdict verdict;
  verdict.N = 72;
  verdict.k = 5;
  verdict.V = 60.0;
  verdict.V_tighter = 60.001;
  verdict.full = stats::full_limit(60.0, 72, 0.04);
  verdict.reduced = stats::reduced_limit(60.0, 72, 5, 0.04);
  verdict.order.T = 1.9;
  verdict.order.p_value = 0.43;
  verdict.order.draws = 9999;
  verdict.shares = {{"run-01", "acid", 30, 15.0}, {"run-02", "acid", 42, 45.0}};
  verdict.departure_sd = 0.6;
  return verdict;
}

/// The same with V = 131.2, above the limit.
inline stats::Verdict misfitting_verdict() {
  stats::Verdict verdict = passing_verdict();
  verdict.V = 131.2;
  verdict.V_tighter = 131.201;
  verdict.full = stats::full_limit(131.2, 72, 0.04);
  verdict.reduced = stats::reduced_limit(131.2, 72, 5, 0.04);
  verdict.shares = {{"run-01", "acid", 30, 77.408}, {"run-02", "acid", 42, 53.792}};
  return verdict;
}

/// The passing one with residuals that follow each other.
inline stats::Verdict drifting_verdict() {
  stats::Verdict verdict = passing_verdict();
  verdict.order.T = 0.42;
  verdict.order.p_value = 1e-4;
  return verdict;
}

/// Unknown noise: order has all of alpha.
inline stats::Verdict verdict_of_unknown_noise() {
  stats::Verdict verdict = passing_verdict();
  verdict.noise_unknown = true;
  verdict.share_of_V = 0.0;
  verdict.share_of_order = 1.0;
  verdict.full = {};
  verdict.reduced = {};
  verdict.full.not_offered = verdict.reduced.not_offered = "the noise is unknown";
  verdict.V_tighter = verdict.departure_sd = stats::kNotComputed;
  return verdict;
}

inline stats::Conviction convinced() {
  stats::Conviction conviction;
  conviction.random_starts = 59;
  conviction.integrated = true;
  conviction.converged = true;
  return conviction;
}

}  // namespace gainsay::testing
