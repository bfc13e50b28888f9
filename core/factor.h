#pragma once

#include <cstddef>
#include <cstdint>
#include <vector>

namespace gainsay::core {

/// P M = L U of a small square matrix, by rows with partial pivoting (Golub & Van Loan 2013, 3.4),
/// for solving many right-hand sides at once. Zeros of M, L and U are passed over, so that a matrix
/// with few entries costs little. Allocates nothing after construction.
class Factor {
 public:
  explicit Factor(std::size_t n);

  /// Takes M, row-major, into place for factorize().
  double* matrix() { return matrix_.data(); }
  /// False if a pivot is zero or not a number.
  bool factorize();
  /// X = M^-1 B for `columns` right-hand sides, both n x columns, row-major, B not X.
  void solve(const double* B, double* X, std::size_t columns) const;

 private:
  /// The entries of a triangle's rows: those of row i are first[i] to first[i + 1].
  struct Triangle {
    std::vector<std::uint32_t> first;
    std::vector<std::uint32_t> columns;
    std::vector<double> factors;
  };
  bool pivot(std::size_t k);
  void eliminate(std::size_t k);
  void compress();

  std::size_t n_;
  std::vector<double> matrix_;
  std::vector<std::uint32_t> order_;     // row of M in each place
  std::vector<std::uint32_t> nonzeros_;  // of the pivot's row
  std::vector<double> inverse_pivots_;
  Triangle lower_, upper_;  // negated: what is added in a substitution
};

}  // namespace gainsay::core
