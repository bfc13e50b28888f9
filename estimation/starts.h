#pragma once

#include "gainsay/estimation/unknown.h"

#include <Eigen/Core>

#include <array>
#include <cstdint>
#include <span>
#include <vector>

namespace gainsay::estimation {

/// The counter-based generator Philox4x64-10 of Salmon, Moraes, Dror & Shaw (2011): four random
/// words that depend on key and counter alone.
std::array<std::uint64_t, 4> philox(const std::array<std::uint64_t, 2>& key,
                                    const std::array<std::uint64_t, 4>& counter);

/// Random numbers keyed by (seed, stream, number): the n-th draw is the same in any order and on
/// any thread.
class Draws {
 public:
  Draws(std::uint64_t seed, std::uint64_t stream, std::uint64_t number);
  double uniform();  ///< open interval (0, 1)
  double normal();   ///< standard normal; Box & Muller (1958)

 private:
  std::uint64_t next();
  std::array<std::uint64_t, 2> key_;
  std::array<std::uint64_t, 4> counter_;
  std::array<std::uint64_t, 4> buffer_{};
  std::size_t left_ = 0;
  double spare_normal_ = 0.0;
  bool has_spare_ = false;
};

/// Start number n: uniform in the box of search coordinates, keyed by (seed, n); each coordinate
/// has its own draws, keyed by the unknown's name, so that adding an unknown does not change the
/// others. Methods (24).
Eigen::VectorXd nth_start(std::span<const Unknown> unknowns, std::uint64_t seed, std::uint64_t n);

/// First guesses as starts, as many as the longest list of `first` has: guess n of each unknown
/// (its last where its list is shorter); for one without a list its prior's value, else the middle
/// of its range in search coordinates. Empty where no unknown has a first guess.
std::vector<Eigen::VectorXd> first_guesses(std::span<const Unknown> unknowns);

/// The middle of the box in search coordinates; a prior's value where there is one.
Eigen::VectorXd middle(std::span<const Unknown> unknowns);

}  // namespace gainsay::estimation
