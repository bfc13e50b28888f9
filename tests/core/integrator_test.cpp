#include "gainsay/core/integrator.h"

#include "gainsay/testing/systems.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <cmath>
#include <memory>

namespace gainsay::core {
namespace {

using testing::all_exact_systems;
using testing::ExactSystem;
using testing::read_system;

std::unique_ptr<const Program> compile(const System& system) {
  return std::move(Program::compile(system)).value();
}

Schedule with_outputs(const ExactSystem& exact, std::size_t count) {
  Schedule schedule = exact.schedule;
  for (std::size_t i = 0; i <= count; ++i) {
    schedule.outputs.push_back(exact.last * static_cast<double>(i) / static_cast<double>(count));
  }
  return schedule;
}

Accuracy accuracy(const System& system, double relative, Engine engine = Engine::Stacked) {
  return {.relative = relative,
          .absolute = std::vector<double>(system.states.size(), relative * 1e-2),
          .engine = engine};
}

struct Errors {
  double states = 0.0;
  double sensitivities = 0.0;  // of p dy/dp
};

/// Largest errors over all outputs, in units of the largest value of each kind.
Errors errors_of(const ExactSystem& exact, double relative, Engine engine) {
  const auto program = compile(exact.system);
  Integrator integrator(*program, with_outputs(exact, 10),
                        accuracy(exact.system, relative, engine));
  const auto run = integrator.run(exact.unknowns, exact.unknowns, Sensitivities::Yes);
  EXPECT_TRUE(run) << run.failure().words;
  const Eigen::Map<const Eigen::RowVectorXd> p(exact.unknowns.data(),
                                               static_cast<Eigen::Index>(exact.unknowns.size()));
  Errors errors;
  Errors sizes;
  for (std::size_t i = 0; i < run.value()->times.size(); ++i) {
    const double t = run.value()->times[i];
    const Eigen::VectorXd y = exact.states(t);
    const Eigen::MatrixXd s = exact.derivatives(t).array().rowwise() * p.array();
    const Eigen::MatrixXd found = run.value()->dstates_dp[i].array().rowwise() * p.array();
    sizes.states = std::max(sizes.states, y.cwiseAbs().maxCoeff());
    sizes.sensitivities = std::max(sizes.sensitivities, s.cwiseAbs().maxCoeff());
    errors.states =
        std::max(errors.states,
                 (run.value()->states.col(static_cast<Eigen::Index>(i)) - y).cwiseAbs().maxCoeff());
    errors.sensitivities = std::max(errors.sensitivities, (found - s).cwiseAbs().maxCoeff());
  }
  return {errors.states / sizes.states, errors.sensitivities / sizes.sensitivities};
}

class Engines : public ::testing::TestWithParam<Engine> {};
INSTANTIATE_TEST_SUITE_P(Both, Engines, ::testing::Values(Engine::Stacked, Engine::Reference));

// With a method of order q the global error goes as relative^(q / (q + 1)), at least as its square
// root: a control 100 times tighter must give an error at least 10 times smaller.
TEST_P(Engines, ErrorsShrinkWithTheTolerance) {
  for (const ExactSystem& exact : all_exact_systems()) {
    for (const double relative : {1e-5, 1e-7, 1e-9}) {
      const Errors wide = errors_of(exact, relative, GetParam());
      const Errors tight = errors_of(exact, relative / 100, GetParam());
      EXPECT_LT(tight.states, wide.states / 10) << exact.title << " at " << relative;
      EXPECT_LT(tight.sensitivities, wide.sensitivities / 10) << exact.title << " at " << relative;
    }
  }
}

}  // namespace
}  // namespace gainsay::core
