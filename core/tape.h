#pragma once

#include "gainsay/core/value_list.h"

#include <cstddef>
#include <cstdint>
#include <vector>

namespace gainsay::core {

/// Where each value of a list lies in a worker's array of doubles; kNoSlot: nowhere.
using Slots = std::vector<std::uint32_t>;
inline constexpr std::uint32_t kNoSlot = static_cast<std::uint32_t>(-1);

/// Some values of a ValueList in an order fit for evaluation: runs of equal operations that do not
/// depend on one another, each one tight loop over operands anywhere and results side by side.
class Tape {
 public:
  /// Computes `wanted` from what already has slots; new slots are given from `first_free` on, and
  /// entered in `slots`. At each turn the operation with the most values ready is taken as a run
  /// (list scheduling: Graham 1966).
  Tape(const ValueList& list, const std::vector<Value>& wanted, Slots& slots,
       std::uint32_t first_free);
  Tape() = default;

  /// Computes every value of the tape in the array of slots.
  void evaluate(double* slots) const;

  std::uint32_t end() const { return end_; }  ///< one past the last slot given
  std::size_t runs() const { return runs_.size(); }
  std::size_t instructions() const { return instructions_.size(); }

 private:
  struct Instruction {
    std::uint32_t a, b, c;
  };
  struct Run {
    Code code;
    std::uint32_t first, count, result;  ///< instructions [first, first + count); first result
  };

  std::vector<Run> runs_;
  std::vector<Instruction> instructions_;
  std::uint32_t end_ = 0;
};

}  // namespace gainsay::core
