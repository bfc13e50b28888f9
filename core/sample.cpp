#include "gainsay/core/sample.h"

#include <cmath>

namespace gainsay::core {
namespace {

std::uint64_t mixed(std::uint64_t z) {
  z += 0x9e3779b97f4a7c15ULL;
  z = (z ^ (z >> 30U)) * 0xbf58476d1ce4e5b9ULL;
  z = (z ^ (z >> 27U)) * 0x94d049bb133111ebULL;
  return z ^ (z >> 31U);
}

}  // namespace

double sample(std::string_view name, std::uint64_t number) {
  std::uint64_t key = mixed(number);
  for (const char letter : name) key = mixed(key ^ static_cast<unsigned char>(letter));
  const double uniform = static_cast<double>(key >> 11U) * 0x1.0p-53;
  const double decades = number % 2 == 0 ? 1.0 : 3.0;
  return std::pow(10.0, decades * (2.0 * uniform - 1.0));
}

Point sample_point(const std::set<std::string, std::less<>>& symbols, const Point& knowns,
                   std::uint64_t number) {
  Point point;
  for (const auto& name : symbols) {
    const auto known = knowns.find(name);
    point.emplace(name, known != knowns.end() ? known->second : sample(name, number));
  }
  return point;
}

}  // namespace gainsay::core
