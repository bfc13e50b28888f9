#include "gainsay/core/tape.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <array>
#include <utility>

namespace gainsay::core {

namespace {

/// What has to be computed for some values, and who waits for whom.
struct Work {
  std::vector<Value> needed;                // ascending: operands before results
  std::vector<std::vector<Value>> waiting;  // by value: those that use it
  std::vector<std::uint8_t> missing;        // by value: operands not yet computed
};

Work collect(const ValueList& list, const std::vector<Value>& wanted, const Slots& slots) {
  Work work{.needed = {},
            .waiting = std::vector<std::vector<Value>>(list.size()),
            .missing = std::vector<std::uint8_t>(list.size())};
  std::vector<bool> seen(list.size());
  const auto visit = [&](Value value) {
    if (slots[value] != kNoSlot || seen[value]) return;
    seen[value] = true;
    work.needed.push_back(value);
  };
  for (const Value value : wanted) visit(value);
  for (std::size_t next = 0; next < work.needed.size(); ++next) {
    const Value value = work.needed[next];
    GAINSAY_REQUIRE(operand_count(list[value].code) > 0, "constants and variables have slots");
    for (const Value operand : list.operands(value)) {
      visit(operand);
      if (slots[operand] != kNoSlot) continue;
      work.waiting[operand].push_back(value);
      ++work.missing[value];
    }
  }
  std::sort(work.needed.begin(), work.needed.end());
  return work;
}

}  // namespace

Tape::Tape(const ValueList& list, const std::vector<Value>& wanted, Slots& slots,
           std::uint32_t first_free)
    : end_(first_free) {
  GAINSAY_REQUIRE(slots.size() == list.size(), "every value of the list has a place in slots");
  Work work = collect(list, wanted, slots);
  std::array<std::vector<Value>, kCodes> ready;
  const auto make_ready = [&](Value value) {
    ready[static_cast<std::size_t>(list[value].code)].push_back(value);
  };
  for (const Value value : work.needed) {
    if (work.missing[value] == 0) make_ready(value);
  }
  const auto longest = [&] {
    return std::max_element(ready.begin(), ready.end(),
                            [](const auto& a, const auto& b) { return a.size() < b.size(); });
  };
  for (auto next = longest(); !next->empty(); next = longest()) {
    const std::vector<Value> taken = std::exchange(*next, {});
    runs_.push_back({.code = static_cast<Code>(next - ready.begin()),
                     .first = static_cast<std::uint32_t>(instructions_.size()),
                     .count = static_cast<std::uint32_t>(taken.size()),
                     .result = end_});
    for (const Value value : taken) {
      const ValueList::Entry& entry = list[value];
      const std::size_t count = operand_count(entry.code);
      instructions_.push_back({.a = slots[entry.a],
                               .b = count > 1 ? slots[entry.b] : 0,
                               .c = count > 2 ? slots[entry.c] : 0});
      slots[value] = end_++;
    }
    for (const Value value : taken) {
      for (const Value user : work.waiting[value]) {
        if (--work.missing[user] == 0) make_ready(user);
      }
    }
  }
}

namespace {

/// One run: results side by side, none an operand of another.
template <class Instruction, class Operation>
void run(const Instruction* instruction, std::uint32_t count, double* result, const double* slots,
         Operation operation) {
#pragma GCC ivdep
  for (std::uint32_t i = 0; i < count; ++i) {
    result[i] =
        operation(slots[instruction[i].a], slots[instruction[i].b], slots[instruction[i].c]);
  }
}

}  // namespace

void Tape::evaluate(double* slots) const {
  for (const Run& next : runs_) {
    const Instruction* const first = instructions_.data() + next.first;
    double* const result = slots + next.result;
    const auto each = [&](auto operation) { run(first, next.count, result, slots, operation); };
    switch (next.code) {
      case Code::Add:
        each([](double a, double b, double) { return a + b; });
        break;
      case Code::Subtract:
        each([](double a, double b, double) { return a - b; });
        break;
      case Code::Multiply:
        each([](double a, double b, double) { return a * b; });
        break;
      case Code::Negate:
        each([](double a, double, double) { return -a; });
        break;
      case Code::Inverse:
        each([](double a, double, double) { return 1.0 / a; });
        break;
      default:
        each([code = next.code](double a, double b, double c) { return compute(code, a, b, c); });
    }
  }
}

}  // namespace gainsay::core
