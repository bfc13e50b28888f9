#include "gainsay/core/cvodes_stepper.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace gainsay::core {

namespace {

void stay_silent(int, const char*, const char*, char*, void*) {}

/// Times closer than this are one: the solver refuses to start towards them.
bool nearly_equal(double a, double b) {
  const double size = std::max(std::abs(a), std::abs(b));
  return std::abs(a - b) <= 4.0 * std::numeric_limits<double>::epsilon() * size;
}

Stepper::End meaning(int flag) {
  switch (flag) {
    case CV_SUCCESS:
    case CV_TSTOP_RETURN:
      return Stepper::End::Reached;
    case CV_TOO_MUCH_WORK:
      return Stepper::End::StepLimit;
    case CV_RHSFUNC_FAIL:
    case CV_FIRST_RHSFUNC_ERR:
    case CV_REPTD_RHSFUNC_ERR:
    case CV_UNREC_RHSFUNC_ERR:
    case CV_SRHSFUNC_FAIL:
    case CV_FIRST_SRHSFUNC_ERR:
    case CV_REPTD_SRHSFUNC_ERR:
    case CV_UNREC_SRHSFUNC_ERR:
      return Stepper::End::Evaluation;
    case CV_TOO_MUCH_ACC:
    case CV_ERR_FAILURE:
      return Stepper::End::Error;
    case CV_CONV_FAILURE:
    case CV_LSETUP_FAIL:
      return Stepper::End::Convergence;
    default:
      return Stepper::End::Other;
  }
}

}  // namespace

CvodesStepper::CvodesStepper(Motion& motion, SUNContext context, N_Vector states,
                             std::size_t columns)
    : motion_(motion),
      solver_(require_memory(CVodeCreate(CV_BDF, context))),
      states_(states),
      columns_(columns),
      errors_(require_memory(N_VClone(states))),
      weights_(require_memory(N_VClone(states))) {
  require(CVodeSetErrHandlerFn(solver(), stay_silent, nullptr));
}

void CvodesStepper::require(int flag) {
  GAINSAY_REQUIRE(flag == CV_SUCCESS, "the solver is set up as its manual asks");
}

void CvodesStepper::restarted(double t) {
  time_ = t;
  fresh_ = true;
}

Stepper::End CvodesStepper::advance(double until, double stop, long steps) {
  if (fresh_ && nearly_equal(until, time_)) return End::Reached;
  fresh_ = false;
  require(CVodeSetStopTime(solver(), stop));
  require(CVodeSetMaxNumSteps(solver(), std::max(steps, 1L)));
  const End end = meaning(CVode(solver(), until, states_, &time_, CV_NORMAL));
  arrived();
  return end;
}

long CvodesStepper::steps_since_restart() const {
  long steps = 0;
  CVodeGetNumSteps(solver(), &steps);
  return steps;
}

std::size_t CvodesStepper::hardest_state() {
  CVodeGetEstLocalErrors(solver(), errors_.get());
  CVodeGetErrWeights(solver(), weights_.get());
  const double* const errors = N_VGetArrayPointer(errors_.get());
  const double* const weights = N_VGetArrayPointer(weights_.get());
  std::size_t hardest = 0;
  double largest = -1.0;
  for (std::size_t i = 0; i < motion_.program->states() * columns_; ++i) {
    const double size = std::abs(errors[i] * weights[i]);
    if (size <= largest) continue;  // what is not a number counts as largest
    largest = size;
    hardest = i / columns_;
  }
  return hardest;
}

}  // namespace gainsay::core
