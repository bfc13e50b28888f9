#include "gainsay/core/integrator.h"

#include "gainsay/core/require.h"
#include "gainsay/core/stepper.h"
#include "gainsay/core/sundials_memory.h"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <optional>
#include <string>
#include <utility>

namespace gainsay::core {

namespace {

// The error that steps of a method of order q leave behind goes as tol^(q / (q + 1)) of their
// tolerance tol, not as tol itself (Hairer, Norsett & Wanner 1993, II.4). So that a promise ten
// times stricter is kept ten times better, steps are controlled beyond it where it is stricter than
// usual, with the order 5 that BDF has there. Methods (55).
constexpr double kUsualRelative = 1e-6;
constexpr double kLeastRelative = 1e-14;  // some fifty roundings: beyond it a step cannot be judged

double step_tolerance(double relative) {
  const double corrected = relative * std::pow(relative / kUsualRelative, 1.0 / 5.0);
  return std::min(relative, std::max(corrected, kLeastRelative));
}

void require_in_order(const Program& program, const Schedule& schedule) {
  const auto& [begins, inputs, events, outputs] = schedule;
  GAINSAY_REQUIRE(inputs.size() == program.inputs(), "a schedule gives every input a value");
  double last = begins;
  for (const Event& event : events) {
    GAINSAY_REQUIRE(event.time >= last, "events ascend, none before the beginning");
    last = event.time;
    for (const auto& [input, value] : event.settings) {
      GAINSAY_REQUIRE(input < program.inputs(), "events set inputs that there are");
    }
    for (const std::size_t jump : event.jumps) {
      GAINSAY_REQUIRE(jump < program.system().jumps.size(), "events name jumps that there are");
    }
  }
  for (std::size_t i = 0; i < outputs.size(); ++i) {
    GAINSAY_REQUIRE(i == 0 ? outputs[i] >= begins : outputs[i] > outputs[i - 1],
                    "outputs ascend and are distinct, none before the beginning");
  }
}

Trajectory make_trajectory(const Program& program, std::size_t times, bool derivatives) {
  Trajectory result;
  result.times.reserve(times);
  result.states.resize(program.states(), times);
  result.shown.resize(program.readouts(), times);
  if (derivatives) {
    result.dstates_dp.assign(times, Eigen::MatrixXd::Zero(program.states(), program.unknowns()));
    result.dshown_dp.assign(times, Eigen::MatrixXd::Zero(program.readouts(), program.unknowns()));
  }
  return result;
}

}  // namespace

struct Integrator::Content {
  Content(const Program& program_given, Schedule schedule_given, const Accuracy& accuracy);

  using Failed = std::optional<IntegrationFailure>;

  void set_accuracy(const Accuracy& accuracy);
  Stepper& stepper(bool derivatives);
  Failed begin(std::span<const double> unknowns, std::span<const double> scale_of_each);
  Failed follow(const Observer& observer);
  Failed show_until(double stop, bool last, const Observer& observer);
  Failed advance(double until, double stop);
  Failed show(double t);
  Failed happen(const Event& event);
  void restart(double t);
  void fetch_from_stepper();
  IntegrationFailure failure_of(Stepper::End end);
  std::string state_name(std::optional<std::size_t> state) const;
  long steps_since_restart() const { return current ? current->steps_since_restart() : 0; }
  double* dy_dp_or_null() { return with_derivatives ? dy_dp.data() : nullptr; }

  const Program& program;
  Schedule schedule;
  Program::ScratchPointer scratch;
  ContextPointer context = make_context();
  Motion motion;
  long step_limit = 0;
  Engine engine = Engine::Stacked;
  std::unique_ptr<Stepper> states_alone, with_sensitivities;
  Trajectory trajectory_alone, trajectory_with_derivatives;

  // Of the run under way.
  bool with_derivatives = false;
  Stepper* current = nullptr;
  Trajectory* trajectory = nullptr;
  std::vector<double> unknowns_now, inputs_now;
  std::vector<double> y;      // n
  std::vector<double> dy_dp;  // n x moving, column-major
  std::size_t next_output = 0;
  long steps_before_restart = 0;
};

Integrator::Content::Content(const Program& program_given, Schedule schedule_given,
                             const Accuracy& accuracy)
    : program(program_given),
      schedule(std::move(schedule_given)),
      scratch(program.make_scratch()),
      unknowns_now(program.unknowns()),
      inputs_now(program.inputs()),
      y(program.states()),
      dy_dp(program.states() * program.moving_unknowns().size()) {
  require_in_order(program, schedule);
  motion.program = &program;
  motion.scratch = scratch.get();
  motion.scale.resize(program.moving_unknowns().size());
  trajectory_alone = make_trajectory(program, schedule.outputs.size(), false);
  trajectory_with_derivatives = make_trajectory(program, schedule.outputs.size(), true);
  set_accuracy(accuracy);
}

void Integrator::Content::set_accuracy(const Accuracy& accuracy) {
  GAINSAY_REQUIRE(accuracy.absolute.size() == program.states(), "one absolute tolerance a state");
  GAINSAY_REQUIRE(accuracy.relative > 0.0, "the relative tolerance is positive");
  for (const double absolute : accuracy.absolute) {
    GAINSAY_REQUIRE(absolute > 0.0, "absolute tolerances are positive");
  }
  std::vector<double> guards = accuracy.absolute;
  for (double& guard : guards) guard *= kGuardInTolerances;
  program.set_guards(*scratch, guards);
  motion.relative = step_tolerance(accuracy.relative);
  motion.absolute = accuracy.absolute;
  for (double& absolute : motion.absolute) absolute *= motion.relative / accuracy.relative;
  step_limit = accuracy.step_limit;
  engine = accuracy.engine;
  states_alone.reset();
  with_sensitivities.reset();
}

Stepper& Integrator::Content::stepper(bool derivatives) {
  std::unique_ptr<Stepper>& kept = derivatives ? with_sensitivities : states_alone;
  if (!kept) {
    const auto make = engine == Engine::Stacked ? make_stacked_stepper : make_reference_stepper;
    kept = make(motion, derivatives ? 1 + motion.scale.size() : 1, context.get());
  }
  return *kept;
}

void Integrator::Content::restart(double t) {
  if (current == nullptr) return;  // nothing moves
  const std::span<double> Z = current->Z();
  const std::size_t n = y.size();
  const std::size_t columns = Z.size() / n;
  for (std::size_t i = 0; i < n; ++i) {
    Z[i * columns] = y[i];
    for (std::size_t j = 1; j < columns; ++j) {
      Z[i * columns + j] = dy_dp[(j - 1) * n + i] * motion.scale[j - 1];
    }
  }
  current->restart(t);
}

void Integrator::Content::fetch_from_stepper() {
  const std::span<const double> Z = current->Z();
  const std::size_t n = y.size();
  const std::size_t columns = Z.size() / n;
  for (std::size_t i = 0; i < n; ++i) {
    y[i] = Z[i * columns];
    for (std::size_t j = 1; j < columns; ++j) {
      dy_dp[(j - 1) * n + i] = Z[i * columns + j] / motion.scale[j - 1];
    }
  }
}

Integrator::Content::Failed Integrator::Content::begin(std::span<const double> unknowns,
                                                       std::span<const double> scale_of_each) {
  std::copy(unknowns.begin(), unknowns.end(), unknowns_now.begin());
  for (std::size_t j = 0; j < motion.scale.size(); ++j) {
    motion.scale[j] = scale_of_each[program.moving_unknowns()[j]];
  }
  std::copy(schedule.inputs.begin(), schedule.inputs.end(), inputs_now.begin());
  motion.trouble.reset();
  trajectory->times.clear();
  trajectory->ended_early = false;
  next_output = 0;
  steps_before_restart = 0;

  program.set(*scratch, unknowns_now, inputs_now);
  if (program.start(*scratch, y.data(), dy_dp_or_null())) return std::nullopt;
  const auto bad = std::find_if_not(y.begin(), y.end(), [](double v) { return std::isfinite(v); });
  const std::string species =
      bad == y.end() ? "" : program.system().states[static_cast<std::size_t>(bad - y.begin())];
  return IntegrationFailure{
      .kind = IntegrationFailure::Kind::BadStart,
      .time = schedule.begins,
      .species = species,
      .words = species.empty() ? "a start value has no derivative"
                               : fmt::format("the start value of '{}' is not a number", species)};
}

// From event to event: outputs up to and at its time first, then what happens then.
Integrator::Content::Failed Integrator::Content::follow(const Observer& observer) {
  if (schedule.outputs.empty()) return std::nullopt;
  double t = schedule.begins;
  auto event = schedule.events.begin();
  while (next_output < schedule.outputs.size() && !trajectory->ended_early) {
    restart(t);
    const bool last = event == schedule.events.end() || event->time >= schedule.outputs.back();
    const double stop = last ? schedule.outputs.back() : event->time;
    if (Failed failed = show_until(stop, last, observer)) return failed;
    steps_before_restart += steps_since_restart();
    if (last || trajectory->ended_early) return std::nullopt;
    t = stop;
    if (Failed failed = happen(*event++)) return failed;
  }
  return std::nullopt;
}

Integrator::Content::Failed Integrator::Content::show_until(double stop, bool last,
                                                            const Observer& observer) {
  const std::vector<double>& outputs = schedule.outputs;
  for (; next_output < outputs.size() && outputs[next_output] <= stop; ++next_output) {
    const double t = outputs[next_output];
    if (Failed failed = advance(t, stop)) return failed;
    if (Failed failed = show(t)) return failed;
    if (!observer) continue;
    const std::span<const double> shown(trajectory->shown.col(next_output).data(),
                                        program.readouts());
    if (!observer(next_output, shown)) {
      trajectory->ended_early = true;
      return std::nullopt;
    }
  }
  return last ? std::nullopt : advance(stop, stop);
}

Integrator::Content::Failed Integrator::Content::advance(double until, double stop) {
  if (current == nullptr) return std::nullopt;
  const long used = steps_before_restart + current->steps_since_restart();
  const Stepper::End end = current->advance(until, stop, step_limit - used);
  if (end != Stepper::End::Reached) {
    steps_before_restart += current->steps_since_restart();
    return failure_of(end);
  }
  fetch_from_stepper();
  return std::nullopt;
}

Integrator::Content::Failed Integrator::Content::show(double t) {
  const auto column = static_cast<Eigen::Index>(next_output);
  double* const shown = trajectory->shown.col(column).data();
  double* const slopes = with_derivatives ? trajectory->dshown_dp[next_output].data() : nullptr;
  trajectory->times.push_back(t);
  std::copy(y.begin(), y.end(), trajectory->states.col(column).data());
  if (with_derivatives) {
    Eigen::MatrixXd& dstates_dp = trajectory->dstates_dp[next_output];
    for (std::size_t j = 0; j < motion.scale.size(); ++j) {
      std::copy_n(&dy_dp[j * y.size()], y.size(),
                  dstates_dp.col(static_cast<Eigen::Index>(program.moving_unknowns()[j])).data());
    }
  }
  if (program.show(*scratch, t, y.data(), dy_dp.data(), shown, slopes)) return std::nullopt;
  return IntegrationFailure{.kind = IntegrationFailure::Kind::OutsideDomain,
                            .time = t,
                            .species = "",
                            .words = fmt::format("a readout has no value at t = {}", t)};
}

Integrator::Content::Failed Integrator::Content::happen(const Event& event) {
  for (const auto& [input, value] : event.settings) inputs_now[input] = value;
  program.set(*scratch, unknowns_now, inputs_now);
  if (program.jump(*scratch, event.jumps, y.data(), dy_dp_or_null())) return std::nullopt;
  return IntegrationFailure{
      .kind = IntegrationFailure::Kind::OutsideDomain,
      .time = event.time,
      .species = "",
      .words = fmt::format("what is added at t = {} is not a number", event.time)};
}

std::string Integrator::Content::state_name(std::optional<std::size_t> state) const {
  return state ? program.system().states[*state] : "";
}

IntegrationFailure Integrator::Content::failure_of(Stepper::End end) {
  using Kind = IntegrationFailure::Kind;
  const double t = current->time();
  if (end == Stepper::End::Evaluation && motion.trouble) {
    const std::string name = state_name(motion.trouble->state);
    const bool infinite = motion.trouble->infinite;
    return {.kind = infinite ? Kind::BlowUp : Kind::OutsideDomain,
            .time = t,
            .species = name,
            .words = fmt::format("the rate of '{}' {} soon after t = {}", name,
                                 infinite ? "grows beyond all numbers" : "has no value", t)};
  }
  const std::string name = state_name(current->hardest_state());
  if (end == Stepper::End::StepLimit) {
    return {.kind = Kind::StepLimit,
            .time = t,
            .species = name,
            .words = fmt::format("{} steps reached t = {} only; '{}' was hardest to follow",
                                 step_limit, t, name)};
  }
  return {.kind = Kind::Solver,
          .time = t,
          .species = name,
          .words = fmt::format("no step from t = {} was small enough for '{}'", t, name)};
}

Integrator::Integrator(const Program& program, Schedule schedule, const Accuracy& accuracy)
    : content_(std::make_unique<Content>(program, std::move(schedule), accuracy)) {}
Integrator::~Integrator() = default;
Integrator::Integrator(Integrator&&) noexcept = default;
Integrator& Integrator::operator=(Integrator&&) noexcept = default;

Result<const Trajectory*, IntegrationFailure> Integrator::run(std::span<const double> unknowns,
                                                              std::span<const double> scale,
                                                              Sensitivities sensitivities,
                                                              const Observer& observer) {
  Content& content = *content_;
  GAINSAY_REQUIRE(unknowns.size() == content.program.unknowns(), "one value an unknown");
  GAINSAY_REQUIRE(scale.size() == content.program.unknowns(), "one scale an unknown");
  content.with_derivatives = sensitivities == Sensitivities::Yes;
  content.trajectory =
      content.with_derivatives ? &content.trajectory_with_derivatives : &content.trajectory_alone;
  content.current = content.y.empty() ? nullptr : &content.stepper(content.with_derivatives);
  Content::Failed failed = content.begin(unknowns, scale);
  if (!failed) failed = content.follow(observer);
  if (failed) return *failed;
  return content.trajectory;
}

void Integrator::set_accuracy(const Accuracy& accuracy) { content_->set_accuracy(accuracy); }
const Schedule& Integrator::schedule() const { return content_->schedule; }
long Integrator::steps_of_last_run() const { return content_->steps_before_restart; }

}  // namespace gainsay::core
