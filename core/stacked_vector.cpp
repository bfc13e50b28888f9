#include "gainsay/core/stacked_vector.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <new>
#include <vector>

namespace gainsay::core {

namespace {

struct Content {
  std::size_t rows;
  std::size_t columns;
  std::vector<double> data;
};

Content& content(N_Vector vector) { return *static_cast<Content*>(vector->content); }
std::size_t size(N_Vector vector) { return content(vector).data.size(); }

/// result_i = operation(i) for all i. The result may be one of the operands, never a shifted one.
template <class Operation>
void each(N_Vector result, Operation operation) {
  double* const data = stacked_data(result);
  const std::size_t count = size(result);
#pragma GCC ivdep
  for (std::size_t i = 0; i < count; ++i) data[i] = operation(i);
}

void linear_sum(realtype a, N_Vector x, realtype b, N_Vector y, N_Vector z) {
  const double* const from_x = stacked_data(x);
  const double* const from_y = stacked_data(y);
  if (a == 1.0 && b == 1.0) {
    each(z, [=](std::size_t i) { return from_x[i] + from_y[i]; });
  } else if (a == 1.0 && b == -1.0) {
    each(z, [=](std::size_t i) { return from_x[i] - from_y[i]; });
  } else {
    each(z, [=](std::size_t i) { return a * from_x[i] + b * from_y[i]; });
  }
}

void fill(realtype value, N_Vector z) {
  each(z, [=](std::size_t) { return value; });
}

void scale(realtype factor, N_Vector x, N_Vector z) {
  const double* const from = stacked_data(x);
  if (factor == 1.0) {
    if (x != z) std::copy_n(from, size(z), stacked_data(z));
  } else {
    each(z, [=](std::size_t i) { return factor * from[i]; });
  }
}

void multiply(N_Vector x, N_Vector y, N_Vector z) {
  const double* const a = stacked_data(x);
  const double* const b = stacked_data(y);
  each(z, [=](std::size_t i) { return a[i] * b[i]; });
}

void divide(N_Vector x, N_Vector y, N_Vector z) {
  const double* const a = stacked_data(x);
  const double* const b = stacked_data(y);
  each(z, [=](std::size_t i) { return a[i] / b[i]; });
}

void absolute(N_Vector x, N_Vector z) {
  const double* const a = stacked_data(x);
  each(z, [=](std::size_t i) { return std::abs(a[i]); });
}

void invert(N_Vector x, N_Vector z) {
  const double* const a = stacked_data(x);
  each(z, [=](std::size_t i) { return 1.0 / a[i]; });
}

void add_constant(N_Vector x, realtype b, N_Vector z) {
  const double* const a = stacked_data(x);
  each(z, [=](std::size_t i) { return a[i] + b; });
}

realtype largest(N_Vector x) {
  double result = 0.0;
  for (const double number : content(x).data) result = std::max(result, std::abs(number));
  return result;
}

realtype least(N_Vector x) {
  double result = std::numeric_limits<double>::max();
  for (const double number : content(x).data) result = std::min(result, number);
  return result;
}

/// Sums of squares of `Width` neighbouring columns at once, each in order of the rows; the largest.
template <std::size_t Width>
double largest_sum(const double* x, const double* w, std::size_t rows, std::size_t columns) {
  std::array<double, Width> sums{};
  for (std::size_t row = 0; row < rows; ++row, x += columns, w += columns) {
    for (std::size_t c = 0; c < Width; ++c) {
      const double part = x[c] * w[c];
      sums[c] += part * part;
    }
  }
  double result = 0.0;
  for (const double sum : sums) {
    if (!(sum <= result)) result = sum;  // what is not a number stays so
  }
  return result;
}

realtype weighted_norm(N_Vector x, N_Vector w) {
  const auto& [rows, columns, data] = content(x);
  const double* const a = stacked_data(x);
  const double* const b = stacked_data(w);
  double result = 0.0;
  const auto take = [&](double sum) {
    if (!(sum <= result)) result = sum;
  };
  std::size_t c = 0;
  for (; c + 8 <= columns; c += 8) take(largest_sum<8>(a + c, b + c, rows, columns));
  for (; c + 2 <= columns; c += 2) take(largest_sum<2>(a + c, b + c, rows, columns));
  for (; c < columns; ++c) take(largest_sum<1>(a + c, b + c, rows, columns));
  return std::sqrt(result / static_cast<double>(rows));
}

/// z = sum over k of c_k X_k. The solver hands in z as X_0 at times, never as a later one.
int linear_combination(int count, realtype* c, N_Vector* X, N_Vector z) {
  scale(c[0], X[0], z);
  int k = 1;
  for (; k + 2 <= count; k += 2) {
    const double* const sum = stacked_data(z);
    const double* const a = stacked_data(X[k]);
    const double* const b = stacked_data(X[k + 1]);
    const double c0 = c[k];
    const double c1 = c[k + 1];
    each(z, [=](std::size_t i) { return sum[i] + c0 * a[i] + c1 * b[i]; });
  }
  if (k < count) linear_sum(1.0, z, c[k], X[k], z);
  return 0;
}

/// Z_k = a_k x + Y_k.
int scale_and_add(int count, realtype* a, N_Vector x, N_Vector* Y, N_Vector* Z) {
  for (int k = 0; k < count; ++k) linear_sum(a[k], x, 1.0, Y[k], Z[k]);
  return 0;
}

int scale_each(int count, realtype* c, N_Vector* X, N_Vector* Z) {
  for (int k = 0; k < count; ++k) scale(c[k], X[k], Z[k]);
  return 0;
}

sunindextype length(N_Vector vector) { return static_cast<sunindextype>(size(vector)); }

N_Vector clone(N_Vector vector) {
  return make_stacked_vector(content(vector).rows, content(vector).columns, vector->sunctx);
}

void destroy(N_Vector vector) {
  if (vector == nullptr) return;
  delete static_cast<Content*>(vector->content);
  vector->content = nullptr;
  N_VFreeEmpty(vector);
}

void set_operations(N_Vector vector) {
  vector->ops->nvclone = clone;
  vector->ops->nvdestroy = destroy;
  vector->ops->nvgetlength = length;
  vector->ops->nvgetarraypointer = stacked_data;
  vector->ops->nvlinearsum = linear_sum;
  vector->ops->nvconst = fill;
  vector->ops->nvscale = scale;
  vector->ops->nvprod = multiply;
  vector->ops->nvdiv = divide;
  vector->ops->nvabs = absolute;
  vector->ops->nvinv = invert;
  vector->ops->nvaddconst = add_constant;
  vector->ops->nvmaxnorm = largest;
  vector->ops->nvmin = least;
  vector->ops->nvwrmsnorm = weighted_norm;
  vector->ops->nvlinearcombination = linear_combination;
  vector->ops->nvscaleaddmulti = scale_and_add;
  vector->ops->nvscalevectorarray = scale_each;
}

}  // namespace

N_Vector make_stacked_vector(std::size_t rows, std::size_t columns, SUNContext context) {
  N_Vector vector = N_VNewEmpty(context);
  if (vector == nullptr) return nullptr;
  try {
    vector->content = new Content{rows, columns, std::vector<double>(rows * columns)};
  } catch (const std::bad_alloc&) {
    N_VFreeEmpty(vector);
    return nullptr;
  }
  set_operations(vector);
  return vector;
}

double* stacked_data(N_Vector vector) { return content(vector).data.data(); }
std::size_t stacked_rows(N_Vector vector) { return content(vector).rows; }
std::size_t stacked_columns(N_Vector vector) { return content(vector).columns; }

}  // namespace gainsay::core
