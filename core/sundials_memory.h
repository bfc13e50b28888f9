#pragma once

#include <cvodes/cvodes.h>
#include <sundials/sundials_linearsolver.h>
#include <sundials/sundials_matrix.h>
#include <sundials/sundials_nvector.h>

#include <memory>
#include <new>
#include <type_traits>

namespace gainsay::core {

struct FreeVector {
  void operator()(N_Vector vector) const { N_VDestroy(vector); }
};
struct FreeMatrix {
  void operator()(SUNMatrix matrix) const { SUNMatDestroy(matrix); }
};
struct FreeLinearSolver {
  void operator()(SUNLinearSolver solver) const { SUNLinSolFree(solver); }
};
struct FreeSolver {
  void operator()(void* solver) const { CVodeFree(&solver); }
};
struct FreeContext {
  void operator()(SUNContext context) const { SUNContext_Free(&context); }
};

using VectorPointer = std::unique_ptr<std::remove_pointer_t<N_Vector>, FreeVector>;
using MatrixPointer = std::unique_ptr<std::remove_pointer_t<SUNMatrix>, FreeMatrix>;
using LinearSolverPointer =
    std::unique_ptr<std::remove_pointer_t<SUNLinearSolver>, FreeLinearSolver>;
using SolverPointer = std::unique_ptr<void, FreeSolver>;
using ContextPointer = std::unique_ptr<std::remove_pointer_t<SUNContext>, FreeContext>;

/// `pointer` if it is one; SUNDIALS returns null where memory runs out.
template <class Pointer>
Pointer require_memory(Pointer pointer) {
  if (pointer == nullptr) throw std::bad_alloc();
  return pointer;
}

inline ContextPointer make_context() {
  SUNContext context = nullptr;
  if (SUNContext_Create(nullptr, &context) != 0) throw std::bad_alloc();
  return ContextPointer(context);
}

}  // namespace gainsay::core
