#include "gainsay/core/stacked_solver.h"

#include "gainsay/core/factor.h"
#include "gainsay/core/stacked_vector.h"

#include <algorithm>
#include <new>
#include <vector>

namespace gainsay::core {

namespace {

using Square = std::vector<double>;

Factor& factor(SUNLinearSolver solver) { return *static_cast<Factor*>(solver->content); }

SUNLinearSolver_Type direct(SUNLinearSolver) { return SUNLINEARSOLVER_DIRECT; }

int initialize(SUNLinearSolver) { return SUNLS_SUCCESS; }

int setup(SUNLinearSolver solver, SUNMatrix M) {
  const Square& square = *static_cast<Square*>(M->content);
  std::copy(square.begin(), square.end(), factor(solver).matrix());
  return factor(solver).factorize() ? SUNLS_SUCCESS : SUNLS_LUFACT_FAIL;
}

int solve(SUNLinearSolver solver, SUNMatrix, N_Vector x, N_Vector b, realtype) {
  factor(solver).solve(stacked_data(b), stacked_data(x), stacked_columns(b));
  return SUNLS_SUCCESS;
}

int free_solver(SUNLinearSolver solver) {
  if (solver == nullptr) return SUNLS_SUCCESS;
  delete static_cast<Factor*>(solver->content);
  solver->content = nullptr;
  SUNLinSolFreeEmpty(solver);
  return SUNLS_SUCCESS;
}

SUNMatrix_ID own_kind(SUNMatrix) { return SUNMATRIX_CUSTOM; }

void free_matrix(SUNMatrix matrix) {
  if (matrix == nullptr) return;
  delete static_cast<Square*>(matrix->content);
  matrix->content = nullptr;
  SUNMatFreeEmpty(matrix);
}

}  // namespace

SUNLinearSolver make_stacked_solver(std::size_t rows, SUNContext context) {
  SUNLinearSolver solver = SUNLinSolNewEmpty(context);
  if (solver == nullptr) return nullptr;
  try {
    solver->content = new Factor(rows);
  } catch (const std::bad_alloc&) {
    SUNLinSolFreeEmpty(solver);
    return nullptr;
  }
  solver->ops->gettype = direct;
  solver->ops->initialize = initialize;
  solver->ops->setup = setup;
  solver->ops->solve = solve;
  solver->ops->free = free_solver;
  return solver;
}

SUNMatrix make_square_matrix(std::size_t rows, SUNContext context) {
  SUNMatrix matrix = SUNMatNewEmpty(context);
  if (matrix == nullptr) return nullptr;
  try {
    matrix->content = new Square(rows * rows);
  } catch (const std::bad_alloc&) {
    SUNMatFreeEmpty(matrix);
    return nullptr;
  }
  matrix->ops->getid = own_kind;
  matrix->ops->destroy = free_matrix;
  return matrix;
}

double* square_data(SUNMatrix matrix) { return static_cast<Square*>(matrix->content)->data(); }

}  // namespace gainsay::core
