#include "gainsay/core/value_list.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <bit>
#include <cmath>
#include <limits>

namespace gainsay::core {

namespace {

constexpr double kNaN = std::numeric_limits<double>::quiet_NaN();

double truth(bool condition) { return condition ? 1.0 : 0.0; }
bool either_nan(double a, double b) { return std::isnan(a) || std::isnan(b); }

double power(double a, double b) { return a >= 0.0 && !std::isnan(b) ? std::pow(a, b) : kNaN; }

double power_slope(double a, double b, double c) {
  if (a > 0.0) return b * c / a;
  if (a == 0.0) return b == 1.0 ? 1.0 : 0.0;
  return kNaN;
}

double power_log(double a, double b) {
  if (a > 0.0) return b * std::log(a);
  return a == 0.0 ? 0.0 : kNaN;
}

double both(double a, double b) {
  if (a == 0.0 || b == 0.0) return 0.0;
  return either_nan(a, b) ? kNaN : 1.0;
}

double any(double a, double b) {
  if ((a != 0.0 && !std::isnan(a)) || (b != 0.0 && !std::isnan(b))) return 1.0;
  return either_nan(a, b) ? kNaN : 0.0;
}

double guarded(double a, double b) {
  if (a >= 0.0) return a;
  return a >= -b ? 0.0 : kNaN;
}

}  // namespace

double compute(Code code, double a, double b, double c) {
  switch (code) {
    case Code::Constant:
    case Code::Variable:
      break;
    case Code::Negate:
      return -a;
    case Code::Inverse:
      return 1.0 / a;
    case Code::Add:
      return a + b;
    case Code::Subtract:
      return a - b;
    case Code::Multiply:
      return a * b;
    case Code::Power:
      return power(a, b);
    case Code::PowerSlope:
      return power_slope(a, b, c);
    case Code::PowerLog:
      return power_log(a, b);
    case Code::Exp:
      return std::exp(a);
    case Code::Ln:
      return std::log(a);
    case Code::Log10:
      return std::log10(a);
    case Code::Sqrt:
      return std::sqrt(a);
    case Code::Sin:
      return std::sin(a);
    case Code::Cos:
      return std::cos(a);
    case Code::Tan:
      return std::tan(a);
    case Code::Tanh:
      return std::tanh(a);
    case Code::Less:
      return either_nan(a, b) ? kNaN : truth(a < b);
    case Code::LessEqual:
      return either_nan(a, b) ? kNaN : truth(a <= b);
    case Code::Equal:
      return either_nan(a, b) ? kNaN : truth(a == b);
    case Code::And:
      return both(a, b);
    case Code::Or:
      return any(a, b);
    case Code::Select:
      return std::isnan(a) ? kNaN : (a != 0.0 ? b : c);
    case Code::Guarded:
      return guarded(a, b);
  }
  return kNaN;
}

std::size_t operand_count(Code code) {
  switch (code) {
    case Code::Constant:
    case Code::Variable:
      return 0;
    case Code::Add:
    case Code::Subtract:
    case Code::Multiply:
    case Code::Power:
    case Code::PowerLog:
    case Code::Less:
    case Code::LessEqual:
    case Code::Equal:
    case Code::And:
    case Code::Or:
    case Code::Guarded:
      return 2;
    case Code::PowerSlope:
    case Code::Select:
      return 3;
    default:
      return 1;
  }
}

bool ValueList::Same::operator()(const Entry& x, const Entry& y) const {
  return x.code == y.code && x.a == y.a && x.b == y.b && x.c == y.c &&
         std::bit_cast<std::uint64_t>(x.number) == std::bit_cast<std::uint64_t>(y.number);
}

std::size_t ValueList::Hash::operator()(const Entry& entry) const {
  std::uint64_t hash = std::bit_cast<std::uint64_t>(entry.number);
  for (const std::uint64_t part :
       {std::uint64_t{entry.a}, std::uint64_t{entry.b}, std::uint64_t{entry.c},
        static_cast<std::uint64_t>(entry.code)}) {
    hash = (hash ^ part) * 0x9E3779B97F4A7C15u;  // multiplicative hashing: Knuth 1973, 6.4
    hash ^= hash >> 32;
  }
  return hash;
}

Value ValueList::keep(const Entry& entry) {
  const auto [place, is_new] = known_.try_emplace(entry, static_cast<Value>(entries_.size()));
  if (is_new) entries_.push_back(entry);
  return place->second;
}

bool ValueList::is_constant(Value value, double number) const {
  return is_constant(value) && entries_[value].number == number;
}

std::vector<Value> ValueList::operands(Value value) const {
  const Entry& entry = entries_[value];
  std::vector<Value> result{entry.a, entry.b, entry.c};
  result.resize(operand_count(entry.code));
  return result;
}

Value ValueList::constant(double number) {
  return keep({.code = Code::Constant, .level = Level::Fixed, .number = number});
}

Value ValueList::variable(Level level) {
  entries_.push_back({.code = Code::Variable, .level = level});
  return static_cast<Value>(entries_.size() - 1);
}

Value ValueList::negate(Value a) {
  if (is(Code::Negate, a)) return entries_[a].a;
  if (is(Code::Subtract, a)) return subtract(entries_[a].b, entries_[a].a);
  return make(Code::Negate, a);
}

Value ValueList::inverse(Value a) {
  if (is_constant(a, 1.0)) return a;
  if (is(Code::Negate, a)) return negate(inverse(entries_[a].a));
  return make(Code::Inverse, a);
}

Value ValueList::add(Value a, Value b) {
  if (is_constant(a, 0.0)) return b;
  if (is_constant(b, 0.0)) return a;
  if (is(Code::Negate, b)) return subtract(a, entries_[b].a);
  if (is(Code::Negate, a)) return subtract(b, entries_[a].a);
  return make(Code::Add, std::min(a, b), std::max(a, b));
}

Value ValueList::subtract(Value a, Value b) {
  if (is_constant(b, 0.0)) return a;
  if (is_constant(a, 0.0)) return negate(b);
  if (is(Code::Negate, b)) return add(a, entries_[b].a);
  if (is(Code::Negate, a)) return negate(add(entries_[a].a, b));
  return make(Code::Subtract, a, b);
}

Value ValueList::multiply(Value a, Value b) {
  if (is_constant(a, 0.0) || is_constant(b, 1.0)) return a;
  if (is_constant(b, 0.0) || is_constant(a, 1.0)) return b;
  if (is_constant(a, -1.0)) return negate(b);
  if (is_constant(b, -1.0)) return negate(a);
  if (is(Code::Negate, a)) return negate(multiply(entries_[a].a, b));
  if (is(Code::Negate, b)) return negate(multiply(a, entries_[b].a));
  return make(Code::Multiply, std::min(a, b), std::max(a, b));
}

Value ValueList::divide(Value a, Value b) { return multiply(a, inverse(b)); }

Value ValueList::whole_power(Value a, long exponent) {
  if (exponent < 0) return inverse(whole_power(a, -exponent));
  if (exponent == 0) return constant(1.0);
  const Value half = exponent > 1 ? whole_power(a, exponent / 2) : constant(1.0);
  const Value even = multiply(half, half);
  return exponent % 2 == 0 ? even : multiply(even, a);
}

Value ValueList::select(Value condition, Value yes, Value no) {
  if (is_constant(condition)) {
    if (std::isnan(entries_[condition].number)) return condition;
    return entries_[condition].number != 0.0 ? yes : no;
  }
  return make(Code::Select, condition, yes, no);
}

Value ValueList::make(Code code, Value a, Value b, Value c) {
  const std::size_t count = operand_count(code);
  GAINSAY_REQUIRE(count > 0, "constants and variables have makers of their own");
  Entry entry{.code = code, .a = a, .b = count > 1 ? b : 0, .c = count > 2 ? c : 0};
  bool constants = true;
  for (std::size_t i = 0; i < count; ++i) {
    const Value operand = i == 0 ? a : i == 1 ? b : c;
    entry.level = std::max(entry.level, entries_[operand].level);
    constants = constants && is_constant(operand);
  }
  if (!constants) return keep(entry);
  return constant(compute(code, entries_[a].number, count > 1 ? entries_[b].number : 0.0,
                          count > 2 ? entries_[c].number : 0.0));
}

}  // namespace gainsay::core
