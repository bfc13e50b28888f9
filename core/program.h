#pragma once

#include "gainsay/core/result.h"
#include "gainsay/core/system.h"

#include <cstddef>
#include <memory>
#include <span>
#include <vector>

namespace gainsay::core {

/// A System compiled for evaluation: one value list with common subexpressions once, what depends
/// on unknowns and inputs alone in a prologue, equal operations in runs (docs/methods.md,
/// "Evaluation"). Immutable and shared by all workers; scratch memory is the caller's. Evaluation
/// allocates nothing.
class Program {
 public:
  /// Fails where an expression names what the system has not, or where a start value or a jump
  /// depends on states or time.
  static Result<std::unique_ptr<const Program>> compile(const System& system);
  ~Program();

  std::size_t states() const;
  std::size_t unknowns() const;
  std::size_t inputs() const;
  std::size_t readouts() const;
  const System& system() const;

  /// Numbers of the unknowns that move the states (by rates, starts or jumps), ascending; the
  /// others act on readouts alone and need no column in the integration.
  std::span<const std::size_t> moving_unknowns() const;

  class Scratch;  ///< values of one worker; made by make_scratch
  using ScratchPointer = std::unique_ptr<Scratch, void (*)(Scratch*)>;
  ScratchPointer make_scratch() const;

  /// Takes unknowns (p) and inputs and runs the prologue; to be called whenever either changes.
  void set(Scratch& scratch, std::span<const double> unknowns,
           std::span<const double> inputs) const;

  /// How far below zero each state (n) may lie, in its unit, and still be taken as 0 by powers and
  /// roots; 0 before the first call. Runs the prologue.
  void set_guards(Scratch& scratch, std::span<const double> guards) const;

  // Every call below returns false where a value is not finite or an argument lies outside a
  // function's domain; powers and roots take a slightly negative argument as 0, with derivative 0:
  // down to -sum |d argument / dy_i| guard_i. The derivative of a power below 1 at 0 is taken as 0.

  /// Start values (n) and, if dy_dp is not null, their derivatives (n x moving, column-major).
  bool start(Scratch& scratch, double* y, double* dy_dp) const;
  /// Adds the rises of these jumps to y (n) and, if dy_dp is not null, their derivatives to dy_dp
  /// (n x moving, column-major).
  bool jump(Scratch& scratch, std::span<const std::size_t> jumps, double* y, double* dy_dp) const;
  bool rates(Scratch& scratch, double t, const double* y, double* dydt) const;
  /// df/dy, n x n column-major.
  bool jacobian(Scratch& scratch, double t, const double* y, double* df_dy) const;
  /// States and sensitivities as one matrix Z = [y, s_1, ..., s_q], n x (1 + moving), row-major,
  /// with s_j = scale_j dy/dp_j; scale (moving) as well counts moving unknowns alone. Gives
  /// dZ/dt = [f, df/dy s_j + scale_j df/dp_j] in the same shape.
  bool rates_and_sensitivities(Scratch& scratch, double t, const double* Z,
                               std::span<const double> scale, double* dZ_dt) const;
  /// Readouts (m) and, if dshown_dp is not null, their total derivatives by all p unknowns (m x p,
  /// column-major) from dy_dp (n x moving, column-major).
  bool show(Scratch& scratch, double t, const double* y, const double* dy_dp, double* shown,
            double* dshown_dp) const;

 private:
  struct Content;
  explicit Program(std::unique_ptr<const Content> content);
  std::unique_ptr<const Content> content_;
};

}  // namespace gainsay::core
