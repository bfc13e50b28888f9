#pragma once

#include "gainsay/core/result.h"
#include "gainsay/core/system.h"
#include "gainsay/core/tape.h"

#include <cstddef>
#include <cstdint>
#include <vector>

namespace gainsay::core {

/// A sparse matrix whose entries lie in slots: those of row i are first[i] to first[i + 1].
struct SlotMatrix {
  std::vector<std::uint32_t> first{0};
  std::vector<std::uint32_t> columns;
  std::vector<std::uint32_t> slots;
};

/// A tape, and where it leaves the values asked for and their derivatives.
struct Section {
  Tape tape;
  std::vector<std::uint32_t> values;
  SlotMatrix by_states;
  SlotMatrix by_unknowns;
};

/// What Program evaluates. The slots of a worker are, in this order: time, states, unknowns,
/// inputs, guards, constants, the prologue's values, and what the last section left.
struct CompiledSystem {
  System system;
  std::vector<std::size_t> moving;  ///< numbers of the unknowns that move the states
  std::vector<double> first_slots;  ///< what a worker's slots hold at first

  Tape prologue;                ///< what depends on unknowns, inputs and guards alone
  Section starts;               ///< by moving unknowns
  Section jumps;                ///< by moving unknowns; a row for each jump
  Section rates;                ///< f alone
  Section jacobian;             ///< df/dy alone
  Section rates_and_slopes;     ///< f, df/dy, and df/dp by moving unknowns
  Section readouts;             ///< values alone
  Section readouts_and_slopes;  ///< by states, and by all unknowns

  std::size_t time_slot() const { return 0; }
  std::size_t state_slot() const { return 1; }
  std::size_t unknown_slot() const { return state_slot() + system.states.size(); }
  std::size_t input_slot() const { return unknown_slot() + system.unknowns.size(); }
  std::size_t guard_slot() const { return input_slot() + system.inputs.size(); }
  std::size_t constant_slot() const { return guard_slot() + system.states.size(); }
};

/// Fails where an expression names what the system has not, or where a start value or a jump
/// depends on states or time.
Result<CompiledSystem> compile_system(const System& system);

}  // namespace gainsay::core
