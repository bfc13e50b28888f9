#include "gainsay/core/conserved.h"

#include <boost/multiprecision/cpp_int.hpp>

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <initializer_list>
#include <optional>
#include <utility>

namespace gainsay::core {
namespace {

using Whole = boost::multiprecision::cpp_int;
using Row = std::vector<Whole>;

/// A species' row of S, and the weights with which rows of S were added up to it.
struct Combination {
  Row effect;  ///< on each reaction
  Row weights;
};

/// The simplest fraction that is the same double as `value`, by its continued fraction.
std::pair<Whole, Whole> simplest_fraction(double value) {
  const double size = std::abs(value);
  double rest = size;
  std::pair<Whole, Whole> before{0, 1};
  std::pair<Whole, Whole> now{1, 0};
  while (true) {
    const Whole whole(std::floor(rest));
    now = {std::exchange(before.first, now.first) + whole * now.first,
           std::exchange(before.second, now.second) + whole * now.second};
    const auto quotient = now.first.convert_to<double>() / now.second.convert_to<double>();
    if (quotient == size || rest == std::floor(rest)) break;
    rest = 1.0 / (rest - std::floor(rest));
  }
  return {value < 0.0 ? Whole(-now.first) : now.first, now.second};
}

/// Divides rows by their greatest common divisor; without it numbers double in length at each step.
void divide_out(std::initializer_list<Row*> rows) {
  Whole divisor = 0;
  for (const Row* row : rows)
    for (const auto& number : *row) divisor = gcd(divisor, number);
  if (divisor <= 1) return;
  for (Row* row : rows)
    for (auto& number : *row) number /= divisor;
}

/// p * a + q * b.
Combination combined(const Whole& p, const Combination& a, const Whole& q, const Combination& b) {
  Combination sum = a;
  for (std::size_t i = 0; i < sum.effect.size(); ++i)
    sum.effect[i] = p * a.effect[i] + q * b.effect[i];
  for (std::size_t i = 0; i < sum.weights.size(); ++i)
    sum.weights[i] = p * a.weights[i] + q * b.weights[i];
  divide_out({&sum.effect, &sum.weights});
  return sum;
}

/// [S | I] with each reaction's column multiplied by what makes it whole.
std::vector<Combination> tableau(const Eigen::MatrixXd& stoichiometry) {
  const auto species = static_cast<std::size_t>(stoichiometry.rows());
  std::vector<Combination> rows(species);
  for (std::size_t i = 0; i < species; ++i) {
    rows[i].weights.assign(species, 0);
    rows[i].weights[i] = 1;
  }
  for (const auto& column : stoichiometry.colwise()) {
    std::vector<std::pair<Whole, Whole>> fractions;
    Whole denominator = 1;
    for (const double coefficient : column) {
      fractions.push_back(simplest_fraction(coefficient));
      denominator = lcm(denominator, fractions.back().second);
    }
    for (std::size_t i = 0; i < species; ++i)
      rows[i].effect.push_back(fractions[i].first * (denominator / fractions[i].second));
  }
  return rows;
}

/// Gauss' elimination: every combination without effect that the rows span.
std::vector<Row> null_space(std::vector<Combination> rows) {
  const std::size_t reactions = rows.empty() ? 0 : rows.front().effect.size();
  for (std::size_t j = 0; j < reactions; ++j) {
    const auto pivot = std::find_if(rows.begin(), rows.end(),
                                    [&](const Combination& row) { return row.effect[j] != 0; });
    if (pivot == rows.end()) continue;
    const Combination used = *pivot;
    rows.erase(pivot);
    for (auto& row : rows)
      if (row.effect[j] != 0) row = combined(used.effect[j], row, -row.effect[j], used);
  }
  std::vector<Row> basis;
  for (auto& row : rows) basis.push_back(std::move(row.weights));
  return basis;
}

bool is_part_of(const Row& a, const Row& b) {
  for (std::size_t i = 0; i < a.size(); ++i)
    if (a[i] != 0 && b[i] == 0) return false;
  return true;
}

/// Keeps the rows whose species include no other row's.
void keep_minimal(std::vector<Combination>& rows) {
  std::vector<Combination> kept;
  for (std::size_t i = 0; i < rows.size(); ++i) {
    const bool larger = [&] {
      for (std::size_t k = 0; k < rows.size(); ++k) {
        if (k == i || !is_part_of(rows[k].weights, rows[i].weights)) continue;
        if (k < i || !is_part_of(rows[i].weights, rows[k].weights)) return true;
      }
      return false;
    }();
    if (!larger) kept.push_back(rows[i]);
  }
  rows = std::move(kept);
}

/// The extreme combinations with no negative weight and no effect, or none if the tableau grows out
/// of bounds on the way (their number can be exponential in that of species).
std::optional<std::vector<Row>> extreme_rays(std::vector<Combination> rows) {
  constexpr std::size_t kMostRows = 500;
  const std::size_t reactions = rows.empty() ? 0 : rows.front().effect.size();
  for (std::size_t j = 0; j < reactions; ++j) {
    std::vector<Combination> next;
    for (const auto& row : rows)
      if (row.effect[j] == 0) next.push_back(row);
    for (const auto& up : rows)
      for (const auto& down : rows)
        if (up.effect[j] > 0 && down.effect[j] < 0) {
          next.push_back(combined(-down.effect[j], up, up.effect[j], down));
          if (next.size() > kMostRows) return std::nullopt;
        }
    rows = std::move(next);
    keep_minimal(rows);
  }
  std::vector<Row> rays;
  for (auto& row : rows) rays.push_back(std::move(row.weights));
  return rays;
}

/// Adds a row to a basis kept in echelon form; false if it depends on what is there.
bool adds_to(std::vector<Row>& echelon, Row row) {
  for (const auto& earlier : echelon) {
    const auto lead = static_cast<std::size_t>(
        std::find_if(earlier.begin(), earlier.end(), [](const Whole& x) { return x != 0; }) -
        earlier.begin());
    if (row[lead] == 0) continue;
    const Whole factor = row[lead];
    for (std::size_t i = 0; i < row.size(); ++i)
      row[i] = row[i] * earlier[lead] - factor * earlier[i];
    divide_out({&row});
  }
  if (std::all_of(row.begin(), row.end(), [](const Whole& x) { return x == 0; })) return false;
  echelon.push_back(std::move(row));
  return true;
}

/// Fewest species first, then smallest weights, then in order of species.
bool is_simpler(const Row& a, const Row& b) {
  const auto count = [](const Row& row) {
    return std::count_if(row.begin(), row.end(), [](const Whole& x) { return x != 0; });
  };
  const auto total = [](const Row& row) {
    Whole sum = 0;
    for (const auto& number : row) sum += abs(number);
    return sum;
  };
  if (count(a) != count(b)) return count(a) < count(b);
  if (total(a) != total(b)) return total(a) < total(b);
  return a > b;
}

/// Weights as doubles, the first of them positive.
std::vector<double> as_numbers(const Row& row) {
  const auto first = std::find_if(row.begin(), row.end(), [](const Whole& x) { return x != 0; });
  const bool turn = first != row.end() && *first < 0;
  std::vector<double> numbers;
  for (const auto& number : row)
    numbers.push_back(number == 0 ? 0.0 : (turn ? -1.0 : 1.0) * number.convert_to<double>());
  return numbers;
}

}  // namespace

std::vector<std::vector<double>> conserved_weights(const Eigen::MatrixXd& stoichiometry) {
  const std::vector<Combination> rows = tableau(stoichiometry);
  std::vector<Row> candidates = extreme_rays(rows).value_or(std::vector<Row>{});
  std::sort(candidates.begin(), candidates.end(), is_simpler);
  for (auto& row : null_space(rows)) candidates.push_back(std::move(row));

  std::vector<Row> echelon;
  std::vector<std::vector<double>> basis;
  for (const auto& candidate : candidates)
    if (adds_to(echelon, candidate)) basis.push_back(as_numbers(candidate));
  std::stable_sort(basis.begin(), basis.end(), [](const auto& a, const auto& b) {
    const auto first = [](const auto& row) {
      return std::find_if(row.begin(), row.end(), [](double x) { return x != 0.0; }) - row.begin();
    };
    return first(a) < first(b);
  });
  return basis;
}

}  // namespace gainsay::core
