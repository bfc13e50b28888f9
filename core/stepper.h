#pragma once

#include "gainsay/core/integrator.h"
#include "gainsay/core/program.h"

#include <sundials/sundials_context.h>

#include <cstddef>
#include <memory>
#include <optional>
#include <span>
#include <vector>

namespace gainsay::core {

/// Where and how an evaluation last went wrong.
struct Trouble {
  double time = 0.0;
  std::optional<std::size_t> state;  ///< the first whose rate or slope is not finite
  bool infinite = false;             ///< too large, else not a number
};

/// What is integrated, as the solver's callbacks see it. Owned by the Integrator.
struct Motion {
  const Program* program = nullptr;
  Program::Scratch* scratch = nullptr;
  double relative = 0.0;         ///< tolerances of one step
  std::vector<double> absolute;  ///< n
  std::vector<double> scale;     ///< of the moving unknowns
  std::optional<Trouble> trouble;

  /// dZ/dt for Z = [y, s_1, ..., s_q], row-major with `columns` = 1 + q; q = 0: states alone. False
  /// where it is not finite; trouble says where.
  bool derivative(double t, const double* Z, std::size_t columns, double* dZ_dt);
  /// df/dy, column-major; false as above.
  bool jacobian(double t, const double* y, double* df_dy);
};

/// One solver of an Integrator: steps over a stretch of time in which inputs are constant and
/// nothing jumps. Holds Z = [y, s_1, ..., s_q], n x (1 + q), row-major.
class Stepper {
 public:
  enum class End { Reached, StepLimit, Evaluation, Error, Convergence, Other };

  virtual ~Stepper() = default;
  virtual std::span<double> Z() = 0;
  /// Begins anew at time t from what Z() holds now.
  virtual void restart(double t) = 0;
  /// Brings Z() to time `until`, in at most `steps` more steps, evaluating nothing later than
  /// `stop`. Needs until <= stop.
  virtual End advance(double until, double stop, long steps) = 0;
  virtual long steps_since_restart() const = 0;
  virtual double time() const = 0;  ///< how far the solver came
  /// The state whose estimated local error is largest within the last step.
  virtual std::size_t hardest_state() = 0;
};

/// The stacked form: Z in one vector, I - gamma df/dy factored once for all columns. Methods
/// (50)-(53). `columns` is 1, or 1 + the moving unknowns.
std::unique_ptr<Stepper> make_stacked_stepper(Motion& motion, std::size_t columns,
                                              SUNContext context);

/// CVODES' forward-sensitivity module: simultaneous corrector, error control on, all right-hand
/// sides at once.
std::unique_ptr<Stepper> make_reference_stepper(Motion& motion, std::size_t columns,
                                                SUNContext context);

}  // namespace gainsay::core
