#include "gainsay/core/program.h"

#include "gainsay/core/compiled_system.h"
#include "gainsay/core/require.h"
#include "gainsay/core/rows.h"

#include <algorithm>
#include <utility>

namespace gainsay::core {

struct Program::Content {
  CompiledSystem compiled;
};

/// `factors` has room for the entries of one SlotMatrix.
class Program::Scratch {
 public:
  explicit Scratch(const CompiledSystem& compiled) : slots(compiled.first_slots) {
    std::size_t largest = 0;
    for (const Section* section : {&compiled.starts, &compiled.jumps, &compiled.jacobian,
                                   &compiled.rates_and_slopes, &compiled.readouts_and_slopes}) {
      largest =
          std::max({largest, section->by_states.slots.size(), section->by_unknowns.slots.size()});
    }
    factors.resize(largest);
  }

  void take(std::span<const double> values, std::size_t first_slot) {
    std::copy(values.begin(), values.end(), slots.begin() + first_slot);
  }

  /// Copies the entries of a matrix out of their slots; false if one is not finite.
  bool gather(const SlotMatrix& matrix) {
    for (std::size_t e = 0; e < matrix.slots.size(); ++e) factors[e] = slots[matrix.slots[e]];
    return all_finite({factors.data(), matrix.slots.size()});
  }

  /// Copies values out of their slots; false if one is not finite.
  bool give(const std::vector<std::uint32_t>& values, double* result) const {
    for (std::size_t i = 0; i < values.size(); ++i) result[i] = slots[values[i]];
    return all_finite({result, values.size()});
  }

  std::vector<double> slots;
  std::vector<double> factors;
};

Program::Program(std::unique_ptr<const Content> content) : content_(std::move(content)) {}
Program::~Program() = default;

Result<std::unique_ptr<const Program>> Program::compile(const System& system) {
  Result<CompiledSystem> compiled = compile_system(system);
  if (!compiled) return compiled.failure();
  auto content = std::make_unique<const Content>(Content{std::move(compiled).value()});
  return std::unique_ptr<const Program>(new Program(std::move(content)));
}

std::size_t Program::states() const { return system().states.size(); }
std::size_t Program::unknowns() const { return system().unknowns.size(); }
std::size_t Program::inputs() const { return system().inputs.size(); }
std::size_t Program::readouts() const { return system().readouts.size(); }
const System& Program::system() const { return content_->compiled.system; }
std::span<const std::size_t> Program::moving_unknowns() const { return content_->compiled.moving; }

Program::ScratchPointer Program::make_scratch() const {
  return {new Scratch(content_->compiled), [](Scratch* scratch) { delete scratch; }};
}

void Program::set(Scratch& scratch, std::span<const double> unknowns,
                  std::span<const double> inputs) const {
  const CompiledSystem& compiled = content_->compiled;
  GAINSAY_REQUIRE(unknowns.size() == compiled.system.unknowns.size(), "one value an unknown");
  GAINSAY_REQUIRE(inputs.size() == compiled.system.inputs.size(), "one value an input");
  scratch.take(unknowns, compiled.unknown_slot());
  scratch.take(inputs, compiled.input_slot());
  compiled.prologue.evaluate(scratch.slots.data());
}

void Program::set_guards(Scratch& scratch, std::span<const double> guards) const {
  const CompiledSystem& compiled = content_->compiled;
  GAINSAY_REQUIRE(guards.size() == compiled.system.states.size(), "one guard a state");
  scratch.take(guards, compiled.guard_slot());
  compiled.prologue.evaluate(scratch.slots.data());
}

bool Program::start(Scratch& scratch, double* y, double* dy_dp) const {
  const Section& section = content_->compiled.starts;
  const std::size_t n = states();
  section.tape.evaluate(scratch.slots.data());
  if (!scratch.give(section.values, y)) return false;
  if (dy_dp == nullptr) return true;
  const SlotMatrix& slopes = section.by_unknowns;
  if (!scratch.gather(slopes)) return false;
  std::fill_n(dy_dp, n * content_->compiled.moving.size(), 0.0);
  for (std::size_t i = 0; i < n; ++i) {
    for (std::size_t e = slopes.first[i]; e < slopes.first[i + 1]; ++e) {
      dy_dp[slopes.columns[e] * n + i] = scratch.factors[e];
    }
  }
  return true;
}

bool Program::jump(Scratch& scratch, std::span<const std::size_t> jumps, double* y,
                   double* dy_dp) const {
  const Section& section = content_->compiled.jumps;
  const std::size_t n = states();
  section.tape.evaluate(scratch.slots.data());
  const SlotMatrix& slopes = section.by_unknowns;
  scratch.gather(slopes);
  for (const std::size_t number : jumps) {
    const std::size_t i = system().jumps[number].state;
    y[i] += scratch.slots[section.values[number]];
    if (!all_finite({&y[i], 1})) return false;
    if (dy_dp == nullptr) continue;
    for (std::size_t e = slopes.first[number]; e < slopes.first[number + 1]; ++e) {
      dy_dp[slopes.columns[e] * n + i] += scratch.factors[e];
      if (!all_finite({&scratch.factors[e], 1})) return false;
    }
  }
  return true;
}

bool Program::rates(Scratch& scratch, double t, const double* y, double* dydt) const {
  const CompiledSystem& compiled = content_->compiled;
  scratch.slots[compiled.time_slot()] = t;
  scratch.take({y, states()}, compiled.state_slot());
  compiled.rates.tape.evaluate(scratch.slots.data());
  return scratch.give(compiled.rates.values, dydt);
}

bool Program::jacobian(Scratch& scratch, double t, const double* y, double* df_dy) const {
  const CompiledSystem& compiled = content_->compiled;
  const std::size_t n = states();
  scratch.slots[compiled.time_slot()] = t;
  scratch.take({y, n}, compiled.state_slot());
  compiled.jacobian.tape.evaluate(scratch.slots.data());
  const SlotMatrix& slopes = compiled.jacobian.by_states;
  std::fill_n(df_dy, n * n, 0.0);
  for (std::size_t i = 0; i < n; ++i) {
    for (std::size_t e = slopes.first[i]; e < slopes.first[i + 1]; ++e) {
      df_dy[slopes.columns[e] * n + i] = scratch.slots[slopes.slots[e]];
    }
  }
  return scratch.gather(slopes);
}

bool Program::rates_and_sensitivities(Scratch& scratch, double t, const double* Z,
                                      std::span<const double> scale, double* dZ_dt) const {
  const CompiledSystem& compiled = content_->compiled;
  const Section& section = compiled.rates_and_slopes;
  const std::size_t n = states();
  const std::size_t width = 1 + compiled.moving.size();
  scratch.slots[compiled.time_slot()] = t;
  for (std::size_t i = 0; i < n; ++i) scratch.slots[compiled.state_slot() + i] = Z[i * width];
  section.tape.evaluate(scratch.slots.data());

  const SlotMatrix& df_dy = section.by_states;
  const SlotMatrix& df_dp = section.by_unknowns;
  bool finite = scratch.gather(df_dy);
  for (std::size_t i = 0; i < n; ++i) {
    double* const row = dZ_dt + i * width;
    const std::uint32_t first = df_dy.first[i];
    std::fill_n(row, width, 0.0);
    for (std::size_t e = df_dp.first[i]; e < df_dp.first[i + 1]; ++e) {
      const std::uint32_t j = df_dp.columns[e];
      row[1 + j] = scratch.slots[df_dp.slots[e]] * scale[j];
      finite = finite && all_finite({&row[1 + j], 1});
    }
    add_rows(row, {&scratch.factors[first], df_dy.first[i + 1] - first}, &df_dy.columns[first], Z,
             width);
    row[0] = scratch.slots[section.values[i]];
    finite = finite && all_finite({row, 1});
  }
  return finite;
}

bool Program::show(Scratch& scratch, double t, const double* y, const double* dy_dp, double* shown,
                   double* dshown_dp) const {
  const CompiledSystem& compiled = content_->compiled;
  const Section& section = dshown_dp ? compiled.readouts_and_slopes : compiled.readouts;
  const std::size_t n = states();
  const std::size_t m = readouts();
  scratch.slots[compiled.time_slot()] = t;
  scratch.take({y, n}, compiled.state_slot());
  section.tape.evaluate(scratch.slots.data());
  if (!scratch.give(section.values, shown)) return false;
  if (dshown_dp == nullptr) return true;

  // d shown / dp_j = partial + sum over states of d shown / dy_i dy_i / dp_j.
  std::fill_n(dshown_dp, m * unknowns(), 0.0);
  const SlotMatrix& partial = section.by_unknowns;
  if (!scratch.gather(partial)) return false;
  for (std::size_t r = 0; r < m; ++r) {
    for (std::size_t e = partial.first[r]; e < partial.first[r + 1]; ++e) {
      dshown_dp[partial.columns[e] * m + r] = scratch.factors[e];
    }
  }
  const SlotMatrix& by_states = section.by_states;
  if (!scratch.gather(by_states)) return false;
  for (std::size_t j = 0; j < compiled.moving.size(); ++j) {
    for (std::size_t r = 0; r < m; ++r) {
      double& sum = dshown_dp[compiled.moving[j] * m + r];
      for (std::size_t e = by_states.first[r]; e < by_states.first[r + 1]; ++e) {
        sum += scratch.factors[e] * dy_dp[j * n + by_states.columns[e]];
      }
    }
  }
  return true;
}

}  // namespace gainsay::core
