#include "gainsay/core/cvodes_stepper.h"
#include "gainsay/core/stacked_solver.h"
#include "gainsay/core/stacked_vector.h"

#include <cvodes/cvodes_ls.h>

#include <cmath>
#include <vector>

namespace gainsay::core {

namespace {

/// What the callbacks see.
struct View {
  Motion& motion;
  std::vector<double> y;      // n
  std::vector<double> df_dy;  // n x n, column-major, as last evaluated
};

View& view(void* data) { return *static_cast<View*>(data); }

int derivative(realtype t, N_Vector Z, N_Vector dZ_dt, void* data) {
  const bool finite =
      view(data).motion.derivative(t, stacked_data(Z), stacked_columns(Z), stacked_data(dZ_dt));
  return finite ? 0 : 1;
}

/// 1 / (relative |z| + absolute of the row).
int weights(N_Vector Z, N_Vector result, void* data) {
  const Motion& motion = view(data).motion;
  const double relative = motion.relative;
  const std::size_t columns = stacked_columns(Z);
  for (std::size_t i = 0; i < stacked_rows(Z); ++i) {
    const double absolute = motion.absolute[i];
    const double* const from = stacked_data(Z) + i * columns;
    double* const to = stacked_data(result) + i * columns;
    for (std::size_t c = 0; c < columns; ++c) {
      to[c] = 1.0 / (relative * std::abs(from[c]) + absolute);
    }
  }
  return 0;
}

/// M = I - gamma df/dy, row-major, df/dy as it was if the solver says that this still does.
int linear_system(realtype t, N_Vector Z, N_Vector, SUNMatrix M, booleantype still_good,
                  booleantype* evaluated, realtype gamma, void* data, N_Vector, N_Vector,
                  N_Vector) {
  auto& [motion, y, df_dy] = view(data);
  const std::size_t n = y.size();
  if (!still_good) {
    const std::size_t columns = stacked_columns(Z);
    for (std::size_t i = 0; i < n; ++i) y[i] = stacked_data(Z)[i * columns];
    if (!motion.jacobian(t, y.data(), df_dy.data())) return 1;
  }
  *evaluated = still_good ? SUNFALSE : SUNTRUE;
  double* const square = square_data(M);
  for (std::size_t i = 0; i < n; ++i) {
    for (std::size_t j = 0; j < n; ++j) {
      square[i * n + j] = (i == j ? 1.0 : 0.0) - gamma * df_dy[j * n + i];
    }
  }
  return 0;
}

/// The members that the solver leans on, made before it and freed after it.
struct StackedParts {
  StackedParts(Motion& motion, std::size_t columns, SUNContext context)
      : seen{motion, std::vector<double>(motion.program->states()),
             std::vector<double>(motion.program->states() * motion.program->states())},
        Z(require_memory(make_stacked_vector(motion.program->states(), columns, context))),
        M(require_memory(make_square_matrix(motion.program->states(), context))),
        linear_solver(require_memory(make_stacked_solver(motion.program->states(), context))) {}

  View seen;
  VectorPointer Z;
  MatrixPointer M;
  LinearSolverPointer linear_solver;
};

class StackedStepper final : private StackedParts, public CvodesStepper {
 public:
  StackedStepper(Motion& motion, std::size_t columns, SUNContext context)
      : StackedParts(motion, columns, context),
        CvodesStepper(motion, context, StackedParts::Z.get(), columns) {
    require(CVodeInit(solver(), derivative, 0.0, StackedParts::Z.get()));
    require(CVodeSetUserData(solver(), &seen));
    require(CVodeWFtolerances(solver(), weights));
    require(CVodeSetLinearSolver(solver(), linear_solver.get(), M.get()));
    require(CVodeSetLinSysFn(solver(), linear_system));
  }

  std::span<double> Z() override {
    return {stacked_data(StackedParts::Z.get()),
            stacked_rows(StackedParts::Z.get()) * stacked_columns(StackedParts::Z.get())};
  }

  void restart(double t) override {
    require(CVodeReInit(solver(), t, StackedParts::Z.get()));
    restarted(t);
  }
};

}  // namespace

std::unique_ptr<Stepper> make_stacked_stepper(Motion& motion, std::size_t columns,
                                              SUNContext context) {
  return std::make_unique<StackedStepper>(motion, columns, context);
}

}  // namespace gainsay::core
