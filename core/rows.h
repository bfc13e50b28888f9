#pragma once

#include <cstddef>
#include <cstdint>
#include <span>

namespace gainsay::core {

/// result += sum over e of factors[e] * (row number rows[e] of matrix), the matrix row-major with
/// `width` columns; terms are added in their order, for every column alike, so that the sum of a
/// column does not depend on how many there are or how wide the processor's vectors. `result` is
/// none of the rows.
inline void add_rows(double* __restrict result, std::span<const double> factors,
                     const std::uint32_t* rows, const double* matrix, std::size_t width) {
  std::size_t e = 0;
  for (; e + 4 <= factors.size(); e += 4) {
    const double* const f = &factors[e];
    const double* const r0 = matrix + rows[e] * width;
    const double* const r1 = matrix + rows[e + 1] * width;
    const double* const r2 = matrix + rows[e + 2] * width;
    const double* const r3 = matrix + rows[e + 3] * width;
    for (std::size_t c = 0; c < width; ++c) {
      result[c] = result[c] + f[0] * r0[c] + f[1] * r1[c] + f[2] * r2[c] + f[3] * r3[c];
    }
  }
  for (; e + 2 <= factors.size(); e += 2) {
    const double* const f = &factors[e];
    const double* const r0 = matrix + rows[e] * width;
    const double* const r1 = matrix + rows[e + 1] * width;
    for (std::size_t c = 0; c < width; ++c) result[c] = result[c] + f[0] * r0[c] + f[1] * r1[c];
  }
  if (e < factors.size()) {
    const double f = factors[e];
    const double* const row = matrix + rows[e] * width;
    for (std::size_t c = 0; c < width; ++c) result[c] += f * row[c];
  }
}

/// Whether every number is finite.
inline bool all_finite(std::span<const double> numbers) {
  double spoilt = 0.0;  // 0 x is not a number where x is not finite
  for (const double number : numbers) spoilt += 0.0 * number;
  return spoilt == 0.0;
}

}  // namespace gainsay::core
