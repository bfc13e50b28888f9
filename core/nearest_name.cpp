#include "gainsay/core/nearest_name.h"

#include <algorithm>
#include <cctype>
#include <cstddef>
#include <vector>

namespace gainsay::core {
namespace {

// Costs in half steps, so that a change of case can count half.
constexpr int kStep = 2;
constexpr int kCase = 1;

int cost_of_change(char a, char b) {
  if (a == b) return 0;
  const auto lower = [](char c) { return std::tolower(static_cast<unsigned char>(c)); };
  return lower(a) == lower(b) ? kCase : kStep;
}

/// Edit distance in half steps with swaps of neighbours, each stretch edited once: row i column j
/// is the distance of the first i characters of `a` from the first j of `b`.
int distance(std::string_view a, std::string_view b) {
  std::vector<std::vector<int>> d(a.size() + 1, std::vector<int>(b.size() + 1));
  for (std::size_t i = 0; i <= a.size(); ++i) d[i][0] = kStep * static_cast<int>(i);
  for (std::size_t j = 0; j <= b.size(); ++j) d[0][j] = kStep * static_cast<int>(j);
  for (std::size_t i = 1; i <= a.size(); ++i) {
    for (std::size_t j = 1; j <= b.size(); ++j) {
      d[i][j] = std::min({d[i - 1][j] + kStep, d[i][j - 1] + kStep,
                          d[i - 1][j - 1] + cost_of_change(a[i - 1], b[j - 1])});
      if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) {
        d[i][j] = std::min(d[i][j], d[i - 2][j - 2] + kStep);
      }
    }
  }
  return d[a.size()][b.size()];
}

}  // namespace

std::optional<std::string> nearest_name(std::string_view name,
                                        std::span<const std::string> candidates) {
  // Beyond this length a text is no slip of a name, and the table of distances would grow with it.
  constexpr std::size_t kLongest = 200;
  std::optional<std::string> nearest;
  int least = 0;
  for (const std::string& candidate : candidates) {
    const std::size_t longer = std::max(name.size(), candidate.size());
    if (longer > kLongest) continue;
    const int allowed = kStep * std::max(1, static_cast<int>(longer / 3));
    const int d = distance(name, candidate);
    if (d > allowed || (nearest && d >= least)) continue;
    nearest = candidate;
    least = d;
  }
  return nearest;
}

}  // namespace gainsay::core
