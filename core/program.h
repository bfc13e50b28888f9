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
  std::unique_ptr<Scratch, void (*)(Scratch*)> make_scratch() const;

  /// Takes unknowns (p) and inputs and runs the prologue; to be called whenever either changes.
  void set(Scratch& scratch, std::span<const double> unknowns,
           std::span<const double> inputs) const;

  // Every call below returns false where a value is not finite or an argument lies outside a
  // function's domain; powers, roots and logarithms take a slightly negative state (down to -guard
  // of that state) as 0.
  void set_guards(Scratch& scratch,
                  std::span<const double> guards) const;  ///< n, in units of the states
  bool start(Scratch& scratch, double* y,
             double* dy_dp) const;  ///< dy_dp: n x moving, column-major, or null
  bool jump(Scratch& scratch, std::span<const std::size_t> jumps, double* y,
            double* dy_dp) const;  ///< adds to both
  bool rates(Scratch& scratch, double t, const double* y, double* dydt) const;
  /// df/dy, n x n column-major.
  bool jacobian(Scratch& scratch, double t, const double* y, double* df_dy) const;
  /// f and, for each moving unknown j, df/dy s_j + df/dp_j scale_j; s and ds_dt are n x moving,
  /// column-major, with s_j = scale_j dy/dp_j.
  bool rates_and_sensitivities(Scratch& scratch, double t, const double* y, const double* s,
                               std::span<const double> scale, double* dydt, double* ds_dt) const;
  /// Readouts (m) and, if dshown_dp is not null, their total derivatives by all p unknowns (m x p,
  /// column-major) from dy_dp (n x moving).
  bool show(Scratch& scratch, double t, const double* y, const double* dy_dp, double* shown,
            double* dshown_dp) const;

 private:
  struct Content;
  explicit Program(std::unique_ptr<const Content> content);
  std::unique_ptr<const Content> content_;
};

}  // namespace gainsay::core
