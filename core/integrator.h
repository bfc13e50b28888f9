#pragma once

#include "gainsay/core/program.h"
#include "gainsay/core/result.h"
#include "gainsay/core/schedule.h"
#include "gainsay/core/trajectory.h"

#include <cstddef>
#include <functional>
#include <memory>
#include <span>
#include <vector>

namespace gainsay::core {

/// How the sensitivities are carried: `Stacked` in one vector with the states (default), or by
/// CVODES' own forward-sensitivity module (the reference). Both control the same errors and agree
/// to the tolerance.
enum class Engine { Stacked, Reference };

/// A state may lie this many absolute tolerances below zero and still count as 0 in powers and
/// roots: the error that the solver was allowed.
inline constexpr double kGuardInTolerances = 10.0;

struct Accuracy {
  double relative = 1e-6;
  std::vector<double> absolute;  ///< n, in units of the states
  long step_limit = 20000;       ///< steps of the solver for one run
  Engine engine = Engine::Stacked;
};

enum class Sensitivities { No, Yes };

/// Told after each output: its number and the readouts there (m); false ends the run early.
using Observer = std::function<bool(std::size_t output, std::span<const double> shown)>;

/// Integrates one Program over one Schedule, again and again with other unknowns: CVODES, BDF,
/// restarted exactly at each event. Owns its solver memory and the last trajectory; one for each
/// worker; allocates nothing after its first run.
class Integrator {
 public:
  /// `program` must outlive the integrator.
  Integrator(const Program& program, Schedule schedule, const Accuracy& accuracy);
  ~Integrator();
  Integrator(Integrator&&) noexcept;
  Integrator& operator=(Integrator&&) noexcept;

  /// `unknowns` (p) in natural units. `scale` (p, positive): the size in which each sensitivity is
  /// controlled, s_j = scale_j dy/dp_j having the absolute tolerance of the state: p_j where the
  /// search is logarithmic, the width of the range where linear. The trajectory is lent until the
  /// next run; its derivatives are plain dy/dp. With Sensitivities::No the states alone are
  /// integrated.
  Result<const Trajectory*, IntegrationFailure> run(std::span<const double> unknowns,
                                                    std::span<const double> scale,
                                                    Sensitivities sensitivities,
                                                    const Observer& observer = {});

  /// Replaces the accuracy (kept memory is rebuilt where needed).
  void set_accuracy(const Accuracy& accuracy);
  const Schedule& schedule() const;
  long steps_of_last_run() const;

 private:
  struct Content;
  std::unique_ptr<Content> content_;
};

}  // namespace gainsay::core
