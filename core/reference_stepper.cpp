#include "gainsay/core/cvodes_stepper.h"

#include <cvodes/cvodes_ls.h>
#include <nvector/nvector_serial.h>
#include <sunlinsol/sunlinsol_dense.h>
#include <sunmatrix/sunmatrix_dense.h>

#include <algorithm>
#include <vector>

namespace gainsay::core {

namespace {

/// What the callbacks see: the module keeps states and sensitivities in separate vectors, Program
/// wants them in one matrix.
struct View {
  Motion& motion;
  std::size_t columns;
  std::vector<double> Z;  // n x columns, row-major
  std::vector<double> dZ_dt;
};

View& view(void* data) { return *static_cast<View*>(data); }

void gather(N_Vector column, std::size_t number, View& seen) {
  const double* const from = NV_DATA_S(column);
  for (std::size_t i = 0; i * seen.columns < seen.Z.size(); ++i) {
    seen.Z[i * seen.columns + number] = from[i];
  }
}

void scatter(const std::vector<double>& matrix, std::size_t columns, std::size_t number,
             N_Vector column) {
  double* const to = NV_DATA_S(column);
  for (std::size_t i = 0; i * columns < matrix.size(); ++i) to[i] = matrix[i * columns + number];
}

int derivative(realtype t, N_Vector y, N_Vector dydt, void* data) {
  return view(data).motion.derivative(t, NV_DATA_S(y), 1, NV_DATA_S(dydt)) ? 0 : 1;
}

int sensitivity_derivatives(int, realtype t, N_Vector y, N_Vector, N_Vector* s, N_Vector* ds_dt,
                            void* data, N_Vector, N_Vector) {
  View& seen = view(data);
  gather(y, 0, seen);
  for (std::size_t j = 1; j < seen.columns; ++j) gather(s[j - 1], j, seen);
  if (!seen.motion.derivative(t, seen.Z.data(), seen.columns, seen.dZ_dt.data())) return 1;
  for (std::size_t j = 1; j < seen.columns; ++j) {
    scatter(seen.dZ_dt, seen.columns, j, ds_dt[j - 1]);
  }
  return 0;
}

int jacobian(realtype t, N_Vector y, N_Vector, SUNMatrix df_dy, void* data, N_Vector, N_Vector,
             N_Vector) {
  return view(data).motion.jacobian(t, NV_DATA_S(y), SM_DATA_D(df_dy)) ? 0 : 1;
}

VectorPointer make_vector(std::size_t n, SUNContext context) {
  VectorPointer vector(require_memory(N_VNew_Serial(static_cast<sunindextype>(n), context)));
  N_VEnableFusedOps_Serial(vector.get(), SUNTRUE);  // before it is cloned
  return vector;
}

/// The members that the solver leans on, made before it and freed after it.
struct ReferenceParts {
  ReferenceParts(Motion& motion, std::size_t columns, SUNContext context)
      : seen{motion, columns, std::vector<double>(motion.program->states() * columns),
             std::vector<double>(motion.program->states() * columns)},
        y(make_vector(motion.program->states(), context)),
        absolute(require_memory(N_VClone(y.get()))),
        M(require_memory(SUNDenseMatrix(static_cast<sunindextype>(motion.program->states()),
                                        static_cast<sunindextype>(motion.program->states()),
                                        context))),
        linear_solver(require_memory(SUNLinSol_Dense(y.get(), M.get(), context))) {
    std::copy(motion.absolute.begin(), motion.absolute.end(), NV_DATA_S(absolute.get()));
    for (std::size_t j = 1; j < columns; ++j) {
      owned.emplace_back(require_memory(N_VClone(y.get())));
      N_VConst(0.0, owned.back().get());
      s.push_back(owned.back().get());
      absolute_each.push_back(absolute.get());
    }
  }

  View seen;
  VectorPointer y;
  VectorPointer absolute;
  MatrixPointer M;
  LinearSolverPointer linear_solver;
  std::vector<VectorPointer> owned;
  std::vector<N_Vector> s;
  std::vector<N_Vector> absolute_each;
};

class ReferenceStepper final : private ReferenceParts, public CvodesStepper {
 public:
  ReferenceStepper(Motion& motion, std::size_t columns, SUNContext context)
      : ReferenceParts(motion, columns, context), CvodesStepper(motion, context, y.get(), 1) {
    const double relative = motion.relative;
    require(CVodeInit(solver(), derivative, 0.0, y.get()));
    require(CVodeSetUserData(solver(), &seen));
    require(CVodeSVtolerances(solver(), relative, absolute.get()));
    require(CVodeSetLinearSolver(solver(), linear_solver.get(), M.get()));
    require(CVodeSetJacFn(solver(), jacobian));
    if (s.empty()) return;
    require(CVodeSensInit(solver(), static_cast<int>(s.size()), CV_SIMULTANEOUS,
                          sensitivity_derivatives, s.data()));
    require(CVodeSensSVtolerances(solver(), relative, absolute_each.data()));
    require(CVodeSetSensErrCon(solver(), SUNTRUE));
  }

  std::span<double> Z() override { return seen.Z; }

  void restart(double t) override {
    scatter(seen.Z, seen.columns, 0, y.get());
    require(CVodeReInit(solver(), t, y.get()));
    if (!s.empty()) {
      for (std::size_t j = 1; j < seen.columns; ++j) scatter(seen.Z, seen.columns, j, s[j - 1]);
      require(CVodeSensReInit(solver(), CV_SIMULTANEOUS, s.data()));
    }
    restarted(t);
  }

 private:
  void arrived() override {
    double t = 0.0;
    if (!s.empty() && CVodeGetSens(solver(), &t, s.data()) != CV_SUCCESS) return;
    gather(y.get(), 0, seen);
    for (std::size_t j = 1; j < seen.columns; ++j) gather(s[j - 1], j, seen);
  }
};

}  // namespace

std::unique_ptr<Stepper> make_reference_stepper(Motion& motion, std::size_t columns,
                                                SUNContext context) {
  return std::make_unique<ReferenceStepper>(motion, columns, context);
}

}  // namespace gainsay::core
