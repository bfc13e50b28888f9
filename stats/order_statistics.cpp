#include "gainsay/stats/order_statistics.h"

#include "gainsay/core/require.h"
#include "gainsay/stats/standardized.h"

#include <algorithm>
#include <cmath>

namespace gainsay::stats {
namespace {

constexpr Eigen::Index kMostLags = 10;
constexpr Eigen::Index kPlacesPerLag = 5;

OrderedSeries in_order(const estimation::FittedSeries& series, std::size_t first_residual) {
  OrderedSeries ordered;
  for (std::size_t i = 0; i < series.data.size(); ++i) {
    const bool replicate = i > 0 && series.data[i].output == series.data[i - 1].output;
    if (!replicate) ordered.places.emplace_back();
    ordered.places.back().push_back(first_residual + i);
  }
  return ordered;
}

/// sets x places.
Eigen::ArrayXXd gathered(const Eigen::MatrixXd& R, const OrderedSeries& series) {
  Eigen::ArrayXXd at_places = Eigen::ArrayXXd::Zero(R.rows(), series.places.size());
  for (std::size_t place = 0; place < series.places.size(); ++place) {
    const std::vector<std::size_t>& replicates = series.places[place];
    for (const std::size_t i : replicates) at_places.col(place) += R.col(i).array();
    at_places.col(place) /= std::sqrt(static_cast<double>(replicates.size()));
  }
  return at_places;
}

/// Each set divided by the sds that it gives to the groups of fitted sd.
Eigen::MatrixXd in_units_of_fitted_sd(const Eigen::MatrixXd& R, const OrderLayout& layout) {
  Eigen::MatrixXd scaled = R;
  for (const std::vector<std::size_t>& group : layout.noise_groups) {
    Eigen::ArrayXd squares = Eigen::ArrayXd::Zero(R.rows());
    for (const std::size_t i : group) squares += R.col(i).array().square();
    const Eigen::ArrayXd sd = (squares / static_cast<double>(group.size())).sqrt();
    for (const std::size_t i : group) scaled.col(i).array() /= sd;
  }
  return scaled;
}

Eigen::ArrayXd sum_of_squares(const Eigen::ArrayXXd& r) {
  Eigen::ArrayXd sum = Eigen::ArrayXd::Zero(r.rows());
  for (Eigen::Index i = 0; i < r.cols(); ++i) sum += r.col(i).square();
  return sum;
}

Eigen::ArrayXd sum_of_squared_steps(const Eigen::ArrayXXd& r) {
  Eigen::ArrayXd sum = Eigen::ArrayXd::Zero(r.rows());
  for (Eigen::Index i = 1; i < r.cols(); ++i) sum += (r.col(i) - r.col(i - 1)).square();
  return sum;
}

Eigen::ArrayXd runs(const Eigen::ArrayXXd& r) {
  Eigen::ArrayXd count = Eigen::ArrayXd::Ones(r.rows());
  for (Eigen::Index i = 1; i < r.cols(); ++i)
    count += ((r.col(i) < 0.0) != (r.col(i - 1) < 0.0)).cast<double>();
  return count;
}

Eigen::ArrayXd ljung_box(const Eigen::ArrayXXd& r, const Eigen::ArrayXd& squares) {
  const Eigen::Index n = r.cols();
  const Eigen::Index lags = std::clamp<Eigen::Index>(n / kPlacesPerLag, 1, kMostLags);
  Eigen::ArrayXd sum = Eigen::ArrayXd::Zero(r.rows());
  for (Eigen::Index h = 1; h <= lags; ++h) {
    Eigen::ArrayXd products = Eigen::ArrayXd::Zero(r.rows());
    for (Eigen::Index i = h; i < n; ++i) products += r.col(i) * r.col(i - h);
    sum += (products / squares).square() / static_cast<double>(n - h);
  }
  return static_cast<double>(n * (n + 2)) * sum;
}

}  // namespace

OrderLayout order_layout(const estimation::Problem& problem) {
  OrderLayout layout;
  layout.noise_groups.resize(problem.noise_groups.size());
  for (const estimation::FittedExperiment& experiment : problem.experiments) {
    for (const estimation::FittedSeries& series : experiment.series) {
      OrderedSeries ordered = in_order(series, layout.residuals);
      for (std::size_t i = 0; i < series.data.size(); ++i)
        if (has_unknown_sd(series, series.data[i]))
          layout.noise_groups[series.noise_group].push_back(layout.residuals + i);
      layout.residuals += series.data.size();
      if (ordered.places.size() >= 2) layout.series.push_back(std::move(ordered));
    }
  }
  layout.residuals += problem.priors();
  return layout;
}

OrderStatistics order_statistics(const Eigen::MatrixXd& R, const OrderLayout& layout) {
  GAINSAY_REQUIRE(static_cast<std::size_t>(R.cols()) == layout.residuals,
                  "order is asked of all residuals");
  GAINSAY_REQUIRE(!layout.series.empty(), "order needs a series of two places");
  const Eigen::ArrayXd zero = Eigen::ArrayXd::Zero(R.rows());
  OrderStatistics statistics{zero, zero, zero};
  Eigen::ArrayXd steps = zero;
  Eigen::ArrayXd squares = zero;
  const Eigen::MatrixXd scaled = in_units_of_fitted_sd(R, layout);
  for (const OrderedSeries& series : layout.series) {
    const Eigen::ArrayXXd r = gathered(scaled, series);
    const Eigen::ArrayXd own_squares = sum_of_squares(r);
    steps += sum_of_squared_steps(r);
    squares += own_squares;
    statistics.runs += runs(r);
    statistics.ljung_box += ljung_box(r, own_squares);
  }
  statistics.T = steps / squares;
  return statistics;
}

}  // namespace gainsay::stats
