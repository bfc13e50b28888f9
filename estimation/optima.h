#pragma once

#include "gainsay/estimation/fit.h"

#include <cstddef>
#include <functional>
#include <vector>

namespace gainsay::estimation {

/// Descents that ended alike: V within 0.01 and every prediction within 0.1 sd.
struct Optimum {
  std::size_t best_descent = 0;  ///< number in SearchResult::descents
  std::size_t found = 0;         ///< how many random starts ended here
  bool operator==(const Optimum&) const = default;
};

/// True where two ends are one optimum; never by their unknowns, which a flat valley leaves free.
/// Where V says nothing (noise unknown) or is not what was lowered (sd by the model), the objective
/// stands for it. Methods (25).
bool are_one_optimum(const Fit& a, const Fit& b);

/// True where `a` is to be preferred: converged before not, then the lower objective.
bool is_better(const Fit& a, const Fit& b);

/// The distinct optima of a list of fits, best first. A fit belongs to the first optimum whose best
/// it is one with; only ends that converged found one. `is_random` says which fits count.
std::vector<Optimum> distinct_optima(const std::vector<const Fit*>& fits,
                                     const std::function<bool(std::size_t)>& is_random);

}  // namespace gainsay::estimation
