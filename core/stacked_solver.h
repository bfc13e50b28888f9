#pragma once

#include <sundials/sundials_linearsolver.h>
#include <sundials/sundials_matrix.h>

#include <cstddef>

namespace gainsay::core {

/// A direct linear solver for stacked vectors: factors the n x n matrix M = I - gamma df/dy once
/// and solves M X = B for all columns of a stacked vector, states and sensitivities alike.
/// Methods (52). `columns` is the largest number of them. Null if memory runs out.
SUNLinearSolver make_stacked_solver(std::size_t rows, SUNContext context);

/// The matrix that goes with it, n x n: only a place to hold M, without operations.
SUNMatrix make_square_matrix(std::size_t rows, SUNContext context);
double* square_data(SUNMatrix matrix);  ///< row-major

}  // namespace gainsay::core
