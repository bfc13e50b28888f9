#include "gainsay/estimation/coordinates.h"

#include <cmath>

namespace gainsay::estimation {
namespace {

double width(const Unknown& unknown) { return unknown.high - unknown.low; }

double coordinate(const Unknown& unknown, double value) {
  return unknown.linear ? value / width(unknown) : std::log(value);
}

template <class Value>
Eigen::VectorXd each(std::span<const Unknown> unknowns, Value value) {
  Eigen::VectorXd all(static_cast<Eigen::Index>(unknowns.size()));
  for (std::size_t i = 0; i < unknowns.size(); ++i) all[static_cast<Eigen::Index>(i)] = value(i);
  return all;
}

}  // namespace

Eigen::VectorXd to_coordinates(std::span<const Unknown> unknowns, std::span<const double> values) {
  return each(unknowns, [&](std::size_t i) { return coordinate(unknowns[i], values[i]); });
}

std::vector<double> from_coordinates(std::span<const Unknown> unknowns, const Eigen::VectorXd& x) {
  std::vector<double> values(unknowns.size());
  for (std::size_t i = 0; i < unknowns.size(); ++i) {
    const double xi = x[static_cast<Eigen::Index>(i)];
    values[i] = unknowns[i].linear ? xi * width(unknowns[i]) : std::exp(xi);
  }
  return values;
}

Eigen::VectorXd scale_at(std::span<const Unknown> unknowns, std::span<const double> values) {
  return each(unknowns,
              [&](std::size_t i) { return unknowns[i].linear ? width(unknowns[i]) : values[i]; });
}

Eigen::VectorXd lower_bounds(std::span<const Unknown> unknowns) {
  return each(unknowns, [&](std::size_t i) { return coordinate(unknowns[i], unknowns[i].low); });
}

Eigen::VectorXd upper_bounds(std::span<const Unknown> unknowns) {
  return each(unknowns, [&](std::size_t i) { return coordinate(unknowns[i], unknowns[i].high); });
}

}  // namespace gainsay::estimation
