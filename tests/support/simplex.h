#pragma once

#include <Eigen/Core>

#include <algorithm>
#include <functional>
#include <numeric>
#include <vector>

namespace gainsay::testing {

/// The least value of a function near `from` by the simplex method of Nelder & Mead (1965), which
/// uses no derivatives: the slow and independent way that descents are checked against. Restarted
/// from its end with a fresh simplex until that brings nothing more.
inline Eigen::VectorXd minimised(const std::function<double(const Eigen::VectorXd&)>& function,
                                 Eigen::VectorXd from, double size = 0.1) {
  const auto n = static_cast<std::size_t>(from.size());
  struct Corner {
    Eigen::VectorXd x;
    double value;
  };
  const auto corner = [&](Eigen::VectorXd x) { return Corner{x, function(x)}; };
  const auto lower = [](const Corner& a, const Corner& b) { return a.value < b.value; };
  Corner best = corner(from);
  for (int restart = 0; restart < 20; ++restart, size *= 0.5) {
    std::vector<Corner> simplex = {best};
    for (std::size_t i = 0; i < n; ++i) {
      Eigen::VectorXd x = best.x;
      x[static_cast<Eigen::Index>(i)] += size;
      simplex.push_back(corner(x));
    }
    for (int step = 0; step < 2000; ++step) {
      std::sort(simplex.begin(), simplex.end(), lower);
      if ((simplex.front().x - simplex.back().x).cwiseAbs().maxCoeff() < 1e-12) break;
      Eigen::VectorXd centre = Eigen::VectorXd::Zero(from.size());
      for (std::size_t i = 0; i < n; ++i) centre += simplex[i].x / static_cast<double>(n);
      const auto along = [&](double t) { return corner(centre + t * (simplex[n].x - centre)); };
      const Corner reflected = along(-1.0);
      if (lower(reflected, simplex[0])) {
        const Corner expanded = along(-2.0);
        simplex[n] = lower(expanded, reflected) ? expanded : reflected;
      } else if (lower(reflected, simplex[n - 1])) {
        simplex[n] = reflected;
      } else {
        const Corner contracted = along(lower(reflected, simplex[n]) ? -0.5 : 0.5);
        if (lower(contracted, simplex[n])) {
          simplex[n] = contracted;
        } else {
          for (std::size_t i = 1; i <= n; ++i)
            simplex[i] = corner(simplex[0].x + 0.5 * (simplex[i].x - simplex[0].x));
        }
      }
    }
    best = *std::min_element(simplex.begin(), simplex.end(), lower);
  }
  return best.x;
}

}  // namespace gainsay::testing
