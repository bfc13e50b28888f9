#pragma once

#include <sundials/sundials_nvector.h>

#include <cstddef>

namespace gainsay::core {

/// A vector of the solver that holds states and sensitivities together: the matrix
/// Z = [y, s_1, ..., s_q], `rows` x `columns` = n x (1 + q), row-major. Its weighted norm is the
/// largest of the columns' root mean squares, so that each sensitivity is controlled like the
/// states, as in the simultaneous corrector with error control (Maly & Petzold 1996; Hindmarsh et
/// al. 2005). Methods (51). Operations are our own: single loops, one result for every width of the
/// processor's vectors. Null if memory runs out.
N_Vector make_stacked_vector(std::size_t rows, std::size_t columns, SUNContext context);

double* stacked_data(N_Vector vector);
std::size_t stacked_rows(N_Vector vector);
std::size_t stacked_columns(N_Vector vector);

}  // namespace gainsay::core
