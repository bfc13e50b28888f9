#include "gainsay/estimation/optima.h"

#include <algorithm>
#include <cmath>
#include <numeric>

namespace gainsay::estimation {
namespace {

constexpr double kSameV = 0.01;
constexpr double kSamePrediction = 0.1;  // in sds

}  // namespace

bool are_one_optimum(const Fit& a, const Fit& b) {
  if (!(std::fabs(a.objective - b.objective) <= kSameV)) return false;
  for (Eigen::Index i = 0; i < a.shown.size(); ++i) {
    if (!(std::fabs(a.shown[i] - b.shown[i]) <= kSamePrediction * std::fmin(a.sd[i], b.sd[i])))
      return false;
  }
  return true;
}

bool is_better(const Fit& a, const Fit& b) {
  const bool a_converged = a.stopped == Stopped::Converged;
  const bool b_converged = b.stopped == Stopped::Converged;
  if (a_converged != b_converged) return a_converged;
  if (a.ended() != b.ended()) return a.ended();
  return a.objective < b.objective;
}

std::vector<Optimum> distinct_optima(const std::vector<const Fit*>& fits,
                                     const std::function<bool(std::size_t)>& is_random) {
  std::vector<std::size_t> order(fits.size());
  std::iota(order.begin(), order.end(), std::size_t{0});
  std::stable_sort(order.begin(), order.end(),
                   [&](std::size_t a, std::size_t b) { return is_better(*fits[a], *fits[b]); });
  std::vector<Optimum> optima;
  for (const std::size_t number : order) {
    const Fit& fit = *fits[number];
    if (fit.stopped != Stopped::Converged) break;
    auto home = std::find_if(optima.begin(), optima.end(), [&](const Optimum& optimum) {
      return are_one_optimum(*fits[optimum.best_descent], fit);
    });
    if (home == optima.end()) home = optima.insert(home, Optimum{number, 0});
    if (is_random(number)) ++home->found;
  }
  return optima;
}

}  // namespace gainsay::estimation
