#include "gainsay/core/compiled_system.h"

#include "gainsay/core/gradients.h"
#include "gainsay/core/lowering.h"
#include "gainsay/core/require.h"

#include <fmt/format.h>

#include <algorithm>
#include <limits>
#include <optional>
#include <string>
#include <utility>

namespace gainsay::core {

namespace {

constexpr double kNotSet = std::numeric_limits<double>::quiet_NaN();

/// Which parts of some values and their derivatives a section computes.
struct Parts {
  bool values = true;
  bool by_states = false;
  bool by_unknowns = false;
};

class Compiler {
 public:
  explicit Compiler(const System& system) { compiled_.system = system; }
  Result<CompiledSystem> run();

 private:
  // Variables come first in the list, in the order of their slots: a variable's number in the list
  // is its slot.
  void make_variables();
  void lower_all();
  std::vector<Value> lower(const std::vector<Expression>& expressions, const std::string& what);
  void require_still(const std::vector<Value>& values, const std::string& what);
  void find_moving();
  void give_constants_slots();
  void make_prologue();
  std::vector<Value> wanted(const std::vector<Value>& values, Parts parts);
  Section section(const std::vector<Value>& values, Parts parts,
                  const std::vector<std::size_t>& unknowns);

  bool is_state(Value variable) const {
    return variable >= compiled_.state_slot() && variable < compiled_.unknown_slot();
  }
  void fail(Failure failure) {
    if (!failure_) failure_ = std::move(failure);
  }

  CompiledSystem compiled_;
  ValueList list_;
  Gradients gradients_{list_};
  Lowering lowering_{list_, gradients_};
  std::vector<Value> starts_, jumps_, rates_, readouts_;
  Slots slots_;             // of variables, constants and the prologue's values
  std::uint32_t free_ = 0;  // the first slot that none of them has
  std::optional<Failure> failure_;
};

void Compiler::make_variables() {
  const System& system = compiled_.system;
  lowering_.define("t", list_.variable(Level::Moving));
  for (const std::string& name : system.states) {
    lowering_.define(name, list_.variable(Level::Moving));
  }
  for (const std::string& name : system.unknowns) {
    lowering_.define(name, list_.variable(Level::Set));
  }
  for (const std::string& name : system.inputs) lowering_.define(name, list_.variable(Level::Set));
  for (std::size_t i = 0; i < system.states.size(); ++i) {
    lowering_.guard(static_cast<Value>(compiled_.state_slot() + i), list_.variable(Level::Set));
  }
  for (std::size_t v = compiled_.state_slot(); v < compiled_.input_slot(); ++v) {
    gradients_.derive_by(static_cast<Value>(v));
  }
}

std::vector<Value> Compiler::lower(const std::vector<Expression>& expressions,
                                   const std::string& what) {
  std::vector<Value> values;
  for (std::size_t i = 0; i < expressions.size(); ++i) {
    values.push_back(lowering_.of(expressions[i]));
    if (lowering_.unknown_name()) {
      fail({.what =
                fmt::format("unknown name '{}' in {} {}", *lowering_.unknown_name(), what, i + 1),
            .expected = "expected a state, an unknown, an input or t",
            .to_do = "give it a value or declare it",
            .place = std::nullopt});
    }
  }
  return values;
}

void Compiler::require_still(const std::vector<Value>& values, const std::string& what) {
  for (std::size_t i = 0; i < values.size(); ++i) {
    if (list_[values[i]].level != Level::Moving) continue;
    fail({.what = fmt::format("{} {} depends on states or time", what, i + 1),
          .expected = "expected unknowns, inputs and numbers alone",
          .to_do = "write it without species and t",
          .place = std::nullopt});
  }
}

void Compiler::lower_all() {
  const System& system = compiled_.system;
  std::vector<Expression> rises;
  for (const Jump& jump : system.jumps) rises.push_back(jump.rise);
  starts_ = lower(system.starts, "start value");
  jumps_ = lower(rises, "jump");
  rates_ = lower(system.rates, "rate");
  readouts_ = lower(system.readouts, "readout");
  require_still(starts_, "start value");
  require_still(jumps_, "jump");
}

void Compiler::find_moving() {
  std::vector<bool> moves(compiled_.system.unknowns.size());
  for (const std::vector<Value>* values : {&starts_, &jumps_, &rates_}) {
    for (const Value value : *values) {
      for (const auto& [variable, derivative] : gradients_.of(value)) {
        if (!is_state(variable)) moves[variable - compiled_.unknown_slot()] = true;
      }
    }
  }
  for (std::size_t i = 0; i < moves.size(); ++i) {
    if (moves[i]) compiled_.moving.push_back(i);
  }
}

void Compiler::give_constants_slots() {
  slots_.assign(list_.size(), kNoSlot);
  free_ = static_cast<std::uint32_t>(compiled_.constant_slot());
  compiled_.first_slots.assign(free_, kNotSet);
  for (std::size_t i = 0; i < compiled_.system.states.size(); ++i) {
    compiled_.first_slots[compiled_.guard_slot() + i] = 0.0;
  }
  for (Value value = 0; value < list_.size(); ++value) {
    if (value < compiled_.constant_slot()) slots_[value] = value;
    if (!list_.is_constant(value)) continue;
    slots_[value] = free_++;
    compiled_.first_slots.push_back(list_[value].number);
  }
}

// The prologue computes the largest values below Level::Moving that the moving ones lean on.
void Compiler::make_prologue() {
  std::vector<Value> open = wanted(rates_, {.by_states = true, .by_unknowns = true});
  const std::vector<Value> shown = wanted(readouts_, {.by_states = true, .by_unknowns = true});
  open.insert(open.end(), shown.begin(), shown.end());
  std::vector<bool> seen(list_.size());
  std::vector<Value> hoisted;
  while (!open.empty()) {
    const Value value = open.back();
    open.pop_back();
    if (seen[value]) continue;
    seen[value] = true;
    if (list_[value].level == Level::Moving) {
      const std::vector<Value> operands = list_.operands(value);
      open.insert(open.end(), operands.begin(), operands.end());
    } else if (slots_[value] == kNoSlot) {
      hoisted.push_back(value);
    }
  }
  std::sort(hoisted.begin(), hoisted.end());
  compiled_.prologue = Tape(list_, hoisted, slots_, free_);
  free_ = compiled_.prologue.end();
}

std::vector<Value> Compiler::wanted(const std::vector<Value>& values, Parts parts) {
  std::vector<Value> result;
  if (parts.values) result = values;
  for (const Value value : values) {
    for (const auto& [variable, derivative] : gradients_.of(value)) {
      if (is_state(variable) ? parts.by_states : parts.by_unknowns) result.push_back(derivative);
    }
  }
  return result;
}

Section Compiler::section(const std::vector<Value>& values, Parts parts,
                          const std::vector<std::size_t>& unknowns) {
  Section result;
  Slots slots = slots_;
  result.tape = Tape(list_, wanted(values, parts), slots, free_);
  if (result.tape.end() > compiled_.first_slots.size()) {
    compiled_.first_slots.resize(result.tape.end(), kNotSet);
  }
  for (const Value value : values) {
    if (parts.values) result.values.push_back(slots[value]);
    for (const auto& [variable, derivative] : gradients_.of(value)) {
      if (!(is_state(variable) ? parts.by_states : parts.by_unknowns)) continue;
      SlotMatrix& matrix = is_state(variable) ? result.by_states : result.by_unknowns;
      std::size_t column = variable - compiled_.state_slot();
      if (!is_state(variable)) {
        const std::size_t unknown = variable - compiled_.unknown_slot();
        column = static_cast<std::size_t>(
            std::lower_bound(unknowns.begin(), unknowns.end(), unknown) - unknowns.begin());
      }
      matrix.columns.push_back(static_cast<std::uint32_t>(column));
      matrix.slots.push_back(slots[derivative]);
    }
    for (SlotMatrix* matrix : {&result.by_states, &result.by_unknowns}) {
      matrix->first.push_back(static_cast<std::uint32_t>(matrix->slots.size()));
    }
  }
  return result;
}

Result<CompiledSystem> Compiler::run() {
  make_variables();
  lower_all();
  if (failure_) return *failure_;
  find_moving();
  std::vector<std::size_t> all(compiled_.system.unknowns.size());
  for (std::size_t i = 0; i < all.size(); ++i) all[i] = i;
  for (const Value value : readouts_) gradients_.of(value);  // the list is complete from here on
  give_constants_slots();
  make_prologue();

  const std::vector<std::size_t>& moving = compiled_.moving;
  const Parts values{.values = true};
  const Parts everything{.values = true, .by_states = true, .by_unknowns = true};
  compiled_.starts = section(starts_, everything, moving);
  compiled_.jumps = section(jumps_, everything, moving);
  compiled_.rates = section(rates_, values, moving);
  compiled_.jacobian = section(rates_, {.values = false, .by_states = true}, moving);
  compiled_.rates_and_slopes = section(rates_, everything, moving);
  compiled_.readouts = section(readouts_, values, all);
  compiled_.readouts_and_slopes = section(readouts_, everything, all);
  return std::move(compiled_);
}

}  // namespace

Result<CompiledSystem> compile_system(const System& system) {
  GAINSAY_REQUIRE(system.rates.size() == system.states.size(), "every state has a rate");
  GAINSAY_REQUIRE(system.starts.size() == system.states.size(), "every state has a start value");
  for (const Jump& jump : system.jumps) {
    GAINSAY_REQUIRE(jump.state < system.states.size(), "every jump has its state");
  }
  return Compiler(system).run();
}

}  // namespace gainsay::core
