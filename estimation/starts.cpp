#include "gainsay/estimation/starts.h"

#include "gainsay/estimation/coordinates.h"

#include <algorithm>
#include <cmath>
#include <numbers>
#include <string_view>

namespace gainsay::estimation {
namespace {

struct Product {
  std::uint64_t high;
  std::uint64_t low;
};

/// The full 128-bit product, by halves.
Product multiply(std::uint64_t a, std::uint64_t b) {
  constexpr std::uint64_t kHalf = 0xffffffffu;
  const std::uint64_t low = (a & kHalf) * (b & kHalf);
  const std::uint64_t middle = (a >> 32) * (b & kHalf) + (low >> 32);
  const std::uint64_t other = (a & kHalf) * (b >> 32) + (middle & kHalf);
  return {(a >> 32) * (b >> 32) + (middle >> 32) + (other >> 32), a * b};
}

/// Fowler, Noll & Vo's hash FNV-1a, 64 bits: the same on every machine, unlike std::hash.
std::uint64_t stream_of(std::string_view name) {
  std::uint64_t hash = 0xcbf29ce484222325u;
  for (const char letter : name) {
    hash = (hash ^ static_cast<unsigned char>(letter)) * 0x100000001b3u;
  }
  return hash;
}

double in_range(const Unknown& unknown, double value) {
  return std::clamp(value, unknown.low, unknown.high);
}

double middle_of(const Unknown& unknown) {
  if (unknown.prior) return in_range(unknown, unknown.prior->value);
  return unknown.linear ? 0.5 * (unknown.low + unknown.high)
                        : std::sqrt(unknown.low) * std::sqrt(unknown.high);
}

}  // namespace

std::array<std::uint64_t, 4> philox(const std::array<std::uint64_t, 2>& key,
                                    const std::array<std::uint64_t, 4>& counter) {
  // Multipliers and Weyl steps as published (Salmon et al. 2011).
  constexpr std::uint64_t kMultiplier0 = 0xd2e7470ee14c6c93u, kMultiplier1 = 0xca5a826395121157u;
  constexpr std::uint64_t kWeyl0 = 0x9e3779b97f4a7c15u, kWeyl1 = 0xbb67ae8584caa73bu;
  constexpr int kRounds = 10;
  std::array<std::uint64_t, 4> x = counter;
  std::array<std::uint64_t, 2> k = key;
  for (int round = 0; round < kRounds; ++round) {
    const Product a = multiply(kMultiplier0, x[0]);
    const Product b = multiply(kMultiplier1, x[2]);
    x = {b.high ^ x[1] ^ k[0], b.low, a.high ^ x[3] ^ k[1], a.low};
    k = {k[0] + kWeyl0, k[1] + kWeyl1};
  }
  return x;
}

Draws::Draws(std::uint64_t seed, std::uint64_t stream, std::uint64_t number)
    : key_{seed, stream}, counter_{0, number, 0, 0} {}

std::uint64_t Draws::next() {
  if (left_ == 0) {
    buffer_ = philox(key_, counter_);
    ++counter_[0];
    left_ = buffer_.size();
  }
  return buffer_[buffer_.size() - left_--];
}

double Draws::uniform() {
  // 52 bits and a half: all of them exact, neither 0 nor 1 among them.
  return (static_cast<double>(next() >> 12) + 0.5) * 0x1p-52;
}

double Draws::normal() {
  if (has_spare_) {
    has_spare_ = false;
    return spare_normal_;
  }
  const double radius = std::sqrt(-2.0 * std::log(uniform()));
  const double angle = 2.0 * std::numbers::pi * uniform();
  spare_normal_ = radius * std::sin(angle);
  has_spare_ = true;
  return radius * std::cos(angle);
}

Eigen::VectorXd nth_start(std::span<const Unknown> unknowns, std::uint64_t seed, std::uint64_t n) {
  const Eigen::VectorXd low = lower_bounds(unknowns);
  const Eigen::VectorXd high = upper_bounds(unknowns);
  Eigen::VectorXd x(low.size());
  for (Eigen::Index i = 0; i < x.size(); ++i) {
    const double share =
        Draws(seed, stream_of(unknowns[static_cast<std::size_t>(i)].name), n).uniform();
    x[i] = std::clamp(low[i] + share * (high[i] - low[i]), low[i], high[i]);
  }
  return x;
}

Eigen::VectorXd middle(std::span<const Unknown> unknowns) {
  std::vector<double> values;
  for (const Unknown& unknown : unknowns) values.push_back(middle_of(unknown));
  return to_coordinates(unknowns, values);
}

std::vector<Eigen::VectorXd> first_guesses(std::span<const Unknown> unknowns) {
  std::size_t count = 0;
  for (const Unknown& unknown : unknowns) count = std::max(count, unknown.first.size());
  std::vector<Eigen::VectorXd> guesses;
  for (std::size_t n = 0; n < count; ++n) {
    std::vector<double> values;
    for (const Unknown& unknown : unknowns) {
      const std::vector<double>& first = unknown.first;
      values.push_back(first.empty() ? middle_of(unknown)
                                     : in_range(unknown, first[std::min(n, first.size() - 1)]));
    }
    guesses.push_back(to_coordinates(unknowns, values));
  }
  return guesses;
}

}  // namespace gainsay::estimation
