#include "gainsay/core/stepper.h"

#include <cmath>

namespace gainsay::core {

namespace {

/// What is not finite in a row-major matrix, if anything; not a number before too large.
std::optional<Trouble> find_trouble(double t, const double* matrix, std::size_t rows,
                                    std::size_t columns) {
  std::optional<Trouble> found;
  for (std::size_t i = 0; i < rows * columns; ++i) {
    if (std::isfinite(matrix[i])) continue;
    const bool infinite = std::isinf(matrix[i]);
    if (!found || (found->infinite && !infinite)) {
      found = Trouble{.time = t, .state = i / columns, .infinite = infinite};
    }
  }
  return found;
}

}  // namespace

bool Motion::derivative(double t, const double* Z, std::size_t columns, double* dZ_dt) {
  const bool finite = columns == 1 ? program->rates(*scratch, t, Z, dZ_dt)
                                   : program->rates_and_sensitivities(*scratch, t, Z, scale, dZ_dt);
  if (finite) return true;
  trouble = find_trouble(t, dZ_dt, program->states(), columns);
  if (!trouble) trouble = Trouble{.time = t, .state = std::nullopt, .infinite = false};
  return false;
}

bool Motion::jacobian(double t, const double* y, double* df_dy) {
  if (program->jacobian(*scratch, t, y, df_dy)) return true;
  const std::size_t n = program->states();
  trouble = find_trouble(t, df_dy, n, n);
  if (trouble && trouble->state) {
    // Column-major: the place found counts columns. Its row is the state whose rate is in trouble.
    const double* const column = df_dy + *trouble->state * n;
    trouble->state = find_trouble(t, column, n, 1)->state;
  }
  return false;
}

}  // namespace gainsay::core
