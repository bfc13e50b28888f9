#pragma once

#include "gainsay/core/stepper.h"
#include "gainsay/core/sundials_memory.h"

#include <cstddef>

namespace gainsay::core {

/// What both engines share: one CVODES solver (BDF; Hindmarsh et al. 2005) that prints nothing, and
/// what its answers mean.
class CvodesStepper : public Stepper {
 public:
  End advance(double until, double stop, long steps) final;
  long steps_since_restart() const final;
  double time() const final { return time_; }
  std::size_t hardest_state() final;

 protected:
  /// `states` is the vector that the solver integrates, `columns` values to each state; it and
  /// everything that is handed to solver() must outlive this object's use of them.
  CvodesStepper(Motion& motion, SUNContext context, N_Vector states, std::size_t columns);

  void* solver() const { return solver_.get(); }
  /// Throws BrokenPromise if a set-up call did not succeed.
  static void require(int flag);
  void restarted(double t);
  /// Called when the solver's states have come to time(): the place to fetch what lies beside them.
  virtual void arrived() {}

  Motion& motion_;

 private:
  SolverPointer solver_;
  N_Vector states_;
  std::size_t columns_;
  VectorPointer errors_, weights_;
  double time_ = 0.0;
  bool fresh_ = true;
};

}  // namespace gainsay::core
