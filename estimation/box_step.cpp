#include "gainsay/estimation/box_step.h"

#include "gainsay/core/require.h"

#include <Eigen/Cholesky>

#include <algorithm>
#include <cmath>
#include <vector>

namespace gainsay::estimation {
namespace {

using Indices = std::vector<Eigen::Index>;

enum class Place : char { Free, AtLow, AtHigh };

/// A multiplier counts as zero below this share of the sizes it is a difference of.
constexpr double kNoMultiplier = 1e-12;

/// One solution in progress: the point, and which of its coordinates are held at a bound.
struct ActiveSet {
  const Eigen::MatrixXd& A;
  const Eigen::VectorXd& g;
  const Eigen::VectorXd& low;
  const Eigen::VectorXd& high;
  Eigen::VectorXd p;
  std::vector<Place> places;

  Indices free() const {
    Indices all;
    for (Eigen::Index i = 0; i < p.size(); ++i) {
      if (places[static_cast<std::size_t>(i)] == Place::Free) all.push_back(i);
    }
    return all;
  }

  Eigen::VectorXd slope() const { return g + A * p; }

  /// The way to the minimiser over the free coordinates, the others staying where they are.
  Eigen::VectorXd way(const Indices& free) const {
    const Eigen::MatrixXd block = A(free, free);
    const Eigen::VectorXd right = -slope()(free);
    return block.ldlt().solve(right);
  }

  /// Goes that way as far as the box allows; holds the coordinate that stops it first. True if
  /// nothing did.
  bool advance(const Indices& free, const Eigen::VectorXd& way) {
    double share = 1.0;
    Eigen::Index stopper = -1;
    for (std::size_t k = 0; k < free.size(); ++k) {
      const Eigen::Index i = free[k];
      const double step = way[static_cast<Eigen::Index>(k)];
      if (step == 0.0) continue;
      const double room = (step > 0.0 ? high[i] - p[i] : low[i] - p[i]) / step;
      if (room < share) {
        share = room;
        stopper = i;
      }
    }
    for (std::size_t k = 0; k < free.size(); ++k) {
      const Eigen::Index i = free[k];
      const double to = p[i] + share * way[static_cast<Eigen::Index>(k)];
      if (i != stopper) p[i] = std::fmin(std::fmax(to, low[i]), high[i]);
    }
    if (stopper < 0) return true;
    const bool up = way[std::find(free.begin(), free.end(), stopper) - free.begin()] > 0.0;
    places[static_cast<std::size_t>(stopper)] = up ? Place::AtHigh : Place::AtLow;
    p[stopper] = up ? high[stopper] : low[stopper];
    return false;
  }

  /// Frees the held coordinate whose slope pulls hardest into the box; false if none does.
  bool release() {
    const Eigen::VectorXd pull = slope();
    double hardest = 0.0;
    Eigen::Index released = -1;
    for (Eigen::Index i = 0; i < p.size(); ++i) {
      const Place place = places[static_cast<std::size_t>(i)];
      if (place == Place::Free || low[i] == high[i]) continue;
      const double inward = place == Place::AtLow ? -pull[i] : pull[i];
      const double size = std::fabs(g[i]) + A.row(i).cwiseAbs().dot(p.cwiseAbs());
      // Compared in the units of the quadratic, so that coordinates of all sizes are alike.
      const double gain = inward * inward / A(i, i);
      if (inward > kNoMultiplier * size && gain > hardest) {
        hardest = gain;
        released = i;
      }
    }
    if (released < 0) return false;
    places[static_cast<std::size_t>(released)] = Place::Free;
    return true;
  }
};

}  // namespace

Eigen::VectorXd box_step(const Eigen::MatrixXd& A, const Eigen::VectorXd& g,
                         const Eigen::VectorXd& low, const Eigen::VectorXd& high) {
  const Eigen::Index n = g.size();
  GAINSAY_REQUIRE(A.rows() == n && A.cols() == n && low.size() == n && high.size() == n,
                  "the quadratic and the box have one size");
  GAINSAY_REQUIRE((low.array() <= 0.0).all() && (high.array() >= 0.0).all(),
                  "the box holds the origin");
  ActiveSet set{A,
                g,
                low,
                high,
                Eigen::VectorXd::Zero(n),
                std::vector<Place>(static_cast<std::size_t>(n), Place::Free)};
  // Each set is visited at most once in exact arithmetic, and few are in practice; the cap is for
  // rounding that makes one come back.
  const Eigen::Index rounds = 20 * (n + 1);
  for (Eigen::Index round = 0; round < rounds; ++round) {
    const Indices free = set.free();
    const bool arrived = free.empty() || set.advance(free, set.way(free));
    if (arrived && !set.release()) break;
  }
  return set.p;
}

}  // namespace gainsay::estimation
