#include "gainsay/stats/dependence.h"

#include "gainsay/core/require.h"
#include "gainsay/stats/limits.h"
#include "gainsay/stats/standardized.h"
#include "gainsay/stats/tails.h"

#include <Eigen/SVD>

#include <algorithm>
#include <cmath>
#include <limits>
#include <map>
#include <set>
#include <tuple>

namespace gainsay::stats {
namespace {

constexpr double kRoundingTail = 0.01;
constexpr double kNoiseTail = 0.001;
constexpr double kLeastStep = 1e-10;
constexpr int kMostDecimals = 15;

struct Reading {
  double value = 0.0;
  double variance = 0.0;  // of its noise; NaN where unknown
};

/// Readings taken together: by readout.
using Row = std::map<std::size_t, Reading>;
/// Experiment, output, number among the replicates there.
using Place = std::tuple<std::size_t, std::size_t, std::size_t>;
using Rows = std::map<Place, Row>;
using Readouts = std::set<std::size_t>;

Rows rows_of(const estimation::Problem& problem, const Eigen::VectorXd& sd) {
  Rows rows;
  Eigen::Index i = 0;
  for (std::size_t e = 0; e < problem.experiments.size(); ++e) {
    for (const estimation::FittedSeries& series : problem.experiments[e].series) {
      std::size_t replicate = 0;
      for (std::size_t d = 0; d < series.data.size(); ++d, ++i) {
        const estimation::Datum& datum = series.data[d];
        replicate = d > 0 && series.data[d - 1].output == datum.output ? replicate + 1 : 0;
        const double variance = has_unknown_sd(series, datum) ? kNotComputed : sd[i] * sd[i];
        rows[{e, datum.output, replicate}][series.readout_number] = {datum.value, variance};
      }
    }
  }
  return rows;
}

/// The sets of readouts that were read together somewhere, the largest first.
std::vector<Readouts> candidates(const Rows& rows) {
  std::set<Readouts> sets;
  for (const auto& [place, row] : rows) {
    Readouts together;
    for (const auto& [readout, reading] : row) together.insert(readout);
    if (together.size() >= 2) sets.insert(together);
  }
  std::vector<Readouts> ordered(sets.begin(), sets.end());
  std::stable_sort(ordered.begin(), ordered.end(),
                   [](const Readouts& a, const Readouts& b) { return a.size() > b.size(); });
  return ordered;
}

/// Readings in units of the sd of rounding, centred within each experiment.
struct Table {
  std::vector<std::size_t> readouts;
  Eigen::MatrixXd centred;         // rows x readouts
  Eigen::VectorXd noise_variance;  // of each readout, mean over rows, same units squared
  Eigen::Index experiments = 0;
};

void centre(Table& table, const std::vector<std::size_t>& experiment_of_row) {
  Eigen::Index first = 0;
  const auto count = static_cast<Eigen::Index>(experiment_of_row.size());
  for (Eigen::Index next = 1; next <= count; ++next) {
    if (next < count && experiment_of_row[next] == experiment_of_row[first]) continue;
    auto block = table.centred.middleRows(first, next - first);
    block.rowwise() -= block.colwise().mean().eval();
    ++table.experiments;
    first = next;
  }
}

Table table_of(const Rows& rows, const Readouts& readouts,
               const std::map<std::size_t, double>& step) {
  std::vector<const Row*> complete;
  std::vector<std::size_t> experiment_of_row;
  for (const auto& [place, row] : rows) {
    if (!std::all_of(readouts.begin(), readouts.end(),
                     [&row = row](std::size_t readout) { return row.contains(readout); }))
      continue;
    complete.push_back(&row);
    experiment_of_row.push_back(std::get<0>(place));
  }
  Table table;
  table.readouts.assign(readouts.begin(), readouts.end());
  table.centred.resize(complete.size(), readouts.size());
  table.noise_variance = Eigen::VectorXd::Zero(readouts.size());
  for (std::size_t j = 0; j < table.readouts.size(); ++j) {
    const std::size_t readout = table.readouts[j];
    const double rounding_sd = step.at(readout) / std::sqrt(12.0);
    for (std::size_t i = 0; i < complete.size(); ++i) {
      const Reading& reading = complete[i]->at(readout);
      table.centred(i, j) = reading.value / rounding_sd;
      table.noise_variance[j] += reading.variance / (rounding_sd * rounding_sd);
    }
  }
  table.noise_variance /= static_cast<double>(complete.size());
  centre(table, experiment_of_row);
  return table;
}

std::optional<Dependence> relation_in(const Table& table, const estimation::Problem& problem) {
  const Eigen::Index readouts = table.centred.cols();
  const Eigen::Index freedom = table.centred.rows() - table.experiments - (readouts - 1);
  if (freedom < 1) return {};
  const Eigen::JacobiSVD<Eigen::MatrixXd> svd(table.centred, Eigen::ComputeThinV);
  const double least = svd.singularValues()[readouts - 1];
  const Eigen::VectorXd direction = svd.matrixV().col(readouts - 1);
  const auto degrees = static_cast<double>(freedom);
  const double rounding = chi_square_quantile(kRoundingTail, degrees);
  if (least * least > rounding) return {};
  const double noise = direction.cwiseAbs2().dot(table.noise_variance);
  if (least * least > noise * chi_square_quantile(1.0 - kNoiseTail, degrees)) return {};

  // A readout takes part if the relation would not hold without its variation.
  Dependence dependence;
  for (Eigen::Index j = 0; j < readouts; ++j)
    if (std::abs(direction[j]) * table.centred.col(j).norm() > std::sqrt(rounding))
      dependence.readouts.push_back(problem.readouts.at(table.readouts[j]));
  if (dependence.readouts.size() < 2) return {};
  return dependence;
}

int decimals(double value) {
  for (int count = -kMostDecimals; count < kMostDecimals; ++count) {
    const double shifted = value * std::pow(10.0, count);
    const double rounding = 4.0 * std::numeric_limits<double>::epsilon() * std::abs(shifted);
    if (std::abs(shifted) >= 0.5 && std::abs(shifted - std::round(shifted)) <= rounding)
      return count;
  }
  return kMostDecimals;
}

std::map<std::size_t, double> printed_steps(const Rows& rows) {
  std::map<std::size_t, std::vector<double>> values;
  for (const auto& [place, row] : rows)
    for (const auto& [readout, reading] : row) values[readout].push_back(reading.value);
  std::map<std::size_t, double> steps;
  for (const auto& [readout, all] : values) steps[readout] = printed_step(all);
  return steps;
}

}  // namespace

double printed_step(const std::vector<double>& values) {
  std::vector<int> counts;
  double largest = 0.0;
  for (const double value : values) {
    if (value == 0.0) continue;
    counts.push_back(decimals(value));
    largest = std::max(largest, std::abs(value));
  }
  if (counts.empty()) return 1.0;
  std::sort(counts.begin(), counts.end());
  return std::max(std::pow(10.0, -counts[counts.size() / 2]), kLeastStep * largest);
}

std::optional<Dependence> dependent_readouts(const estimation::Problem& problem,
                                             const Eigen::VectorXd& sd) {
  GAINSAY_REQUIRE(static_cast<std::size_t>(sd.size()) + problem.priors() == problem.residuals(),
                  "an sd for each datum");
  const Rows rows = rows_of(problem, sd);
  const std::map<std::size_t, double> steps = printed_steps(rows);
  for (const Readouts& readouts : candidates(rows)) {
    std::optional<Dependence> found = relation_in(table_of(rows, readouts, steps), problem);
    if (found) return found;
  }
  return {};
}

}  // namespace gainsay::stats
