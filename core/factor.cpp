#include "gainsay/core/factor.h"

#include "gainsay/core/rows.h"

#include <algorithm>
#include <cmath>
#include <numeric>
#include <span>

namespace gainsay::core {

Factor::Factor(std::size_t n) : n_(n), matrix_(n * n), order_(n), nonzeros_(n), inverse_pivots_(n) {
  for (Triangle* triangle : {&lower_, &upper_}) {
    triangle->first.assign(n + 1, 0);
    triangle->columns.resize(n * n / 2);
    triangle->factors.resize(n * n / 2);
  }
}

bool Factor::factorize() {
  std::iota(order_.begin(), order_.end(), 0u);
  for (std::size_t k = 0; k < n_; ++k) {
    if (!pivot(k)) return false;
    eliminate(k);
  }
  compress();
  return true;
}

bool Factor::pivot(std::size_t k) {
  std::size_t best = k;
  for (std::size_t i = k + 1; i < n_; ++i) {
    if (std::abs(matrix_[i * n_ + k]) > std::abs(matrix_[best * n_ + k])) best = i;
  }
  if (best != k) {
    std::swap_ranges(&matrix_[k * n_], &matrix_[k * n_] + n_, &matrix_[best * n_]);
    std::swap(order_[k], order_[best]);
  }
  const double found = matrix_[k * n_ + k];
  inverse_pivots_[k] = 1.0 / found;
  return std::isfinite(found) && found != 0.0;
}

void Factor::eliminate(std::size_t k) {
  const double* const row = &matrix_[k * n_];
  std::size_t count = 0;
  for (std::size_t j = k + 1; j < n_; ++j) {
    if (row[j] != 0.0) nonzeros_[count++] = static_cast<std::uint32_t>(j);
  }
  for (std::size_t i = k + 1; i < n_; ++i) {
    double* const other = &matrix_[i * n_];
    if (other[k] == 0.0) continue;
    const double multiple = other[k] * inverse_pivots_[k];
    other[k] = multiple;
    for (std::size_t e = 0; e < count; ++e) other[nonzeros_[e]] -= multiple * row[nonzeros_[e]];
  }
}

void Factor::compress() {
  std::uint32_t lower = 0;
  std::uint32_t upper = 0;
  for (std::size_t i = 0; i < n_; ++i) {
    for (std::size_t j = 0; j < n_; ++j) {
      const double factor = matrix_[i * n_ + j];
      if (factor == 0.0 || i == j) continue;
      Triangle& triangle = j < i ? lower_ : upper_;
      std::uint32_t& place = j < i ? lower : upper;
      triangle.columns[place] = static_cast<std::uint32_t>(j);
      triangle.factors[place] = -factor;
      ++place;
    }
    lower_.first[i + 1] = lower;
    upper_.first[i + 1] = upper;
  }
}

void Factor::solve(const double* B, double* X, std::size_t columns) const {
  const auto substitute = [&](const Triangle& triangle, std::size_t i) {
    const std::uint32_t first = triangle.first[i];
    const std::span factors(triangle.factors.data() + first, triangle.first[i + 1] - first);
    add_rows(X + i * columns, factors, triangle.columns.data() + first, X, columns);
  };
  for (std::size_t i = 0; i < n_; ++i) {
    std::copy_n(B + order_[i] * columns, columns, X + i * columns);
    substitute(lower_, i);
  }
  for (std::size_t i = n_; i-- > 0;) {
    substitute(upper_, i);
    double* const row = X + i * columns;
    const double factor = inverse_pivots_[i];
    for (std::size_t c = 0; c < columns; ++c) row[c] *= factor;
  }
}

}  // namespace gainsay::core
