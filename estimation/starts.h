#pragma once

#include "gainsay/estimation/unknown.h"

#include <Eigen/Core>

#include <cstdint>
#include <span>

namespace gainsay::estimation {

/// Random numbers keyed by (seed, stream, number): counter-based, so that the n-th draw is the same
/// in any order and on any thread. Salmon, Moraes, Dror & Shaw (2011).
class Draws {
 public:
  Draws(std::uint64_t seed, std::uint64_t stream, std::uint64_t number);
  double uniform();  ///< open interval (0, 1)
  double normal();   ///< standard normal
 private:
  std::uint64_t key_[2];
  std::uint64_t counter_[2];
  std::uint64_t buffer_[2];
  int left_ = 0;
  std::uint64_t next();
};

/// Start number n: uniform in the box of search coordinates, keyed by (seed, n); each coordinate
/// has its own draws, keyed by the unknown's name, so that adding an unknown does not change the
/// others.
Eigen::VectorXd nth_start(std::span<const Unknown> unknowns, std::uint64_t seed, std::uint64_t n);

}  // namespace gainsay::estimation
