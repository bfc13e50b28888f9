#include "gainsay/stats/order.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/starts.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace gainsay::stats {
namespace {

constexpr std::uint64_t kStream = 0x6f72646572;  // the letters of "order"
constexpr std::size_t kDrawsAtOnce = 256;        // so many rows of R stay in the cache
constexpr double kStandardErrors = 3.0;
// T of residuals that can only move along one line differs between draws by rounding alone: by less
// than 1e3 additions of relative error 1e-16, with room for cancellation in the projection.
constexpr double kSameT = 1e-9;

/// Null draws of the statistics, counted against those of the data.
class NullLaw {
 public:
  NullLaw(const OrderStatistics& observed, const Eigen::MatrixXd& Q, const OrderLayout& layout,
          std::uint64_t seed)
      : observed_(observed), Q_(Q), layout_(layout), seed_(seed) {}

  void draw_until(std::size_t draws) {
    while (drawn_ < draws) count(residuals_of(std::min(kDrawsAtOnce, draws - drawn_)));
  }

  std::size_t drawn() const { return drawn_; }
  double p_value() const { return p_value(smaller_T_); }
  double runs_p() const { return p_value(fewer_runs_); }
  double ljung_box_p() const { return p_value(larger_ljung_box_); }
  bool one_value_only() const { return largest_T_ - smallest_T_ <= kSameT * largest_T_; }

 private:
  double p_value(Eigen::Index against) const {
    return static_cast<double>(against + 1) / static_cast<double>(drawn_ + 1);
  }

  /// (I - Q Q') e of the next draws, one a row.
  Eigen::MatrixXd residuals_of(std::size_t draws) const {
    Eigen::MatrixXd R(draws, layout_.residuals);
    for (std::size_t i = 0; i < draws; ++i) {
      estimation::Draws source(seed_, kStream, drawn_ + i);
      for (Eigen::Index j = 0; j < R.cols(); ++j) R(i, j) = source.normal();
    }
    const Eigen::MatrixXd along_columns = R * Q_;
    R.noalias() -= along_columns * Q_.transpose();
    return R;
  }

  void count(const Eigen::MatrixXd& R) {
    const OrderStatistics drawn = order_statistics(R, layout_);
    smaller_T_ += (drawn.T <= observed_.T[0]).count();
    fewer_runs_ += (drawn.runs <= observed_.runs[0]).count();
    larger_ljung_box_ += (drawn.ljung_box >= observed_.ljung_box[0]).count();
    smallest_T_ = std::min(smallest_T_, drawn.T.minCoeff());
    largest_T_ = std::max(largest_T_, drawn.T.maxCoeff());
    drawn_ += static_cast<std::size_t>(R.rows());
  }

  const OrderStatistics& observed_;
  const Eigen::MatrixXd& Q_;
  const OrderLayout& layout_;
  std::uint64_t seed_;
  std::size_t drawn_ = 0;
  Eigen::Index smaller_T_ = 0;
  Eigen::Index fewer_runs_ = 0;
  Eigen::Index larger_ljung_box_ = 0;
  double smallest_T_ = std::numeric_limits<double>::infinity();
  double largest_T_ = 0.0;
};

/// The standard error is that of P where its true value is the share.
bool within_standard_errors(double p_value, double share, std::size_t draws) {
  const double error = std::sqrt(share * (1.0 - share) / static_cast<double>(draws));
  return std::abs(p_value - share) <= kStandardErrors * error;
}

std::string why_not_counted(const OrderLayout& layout, const Eigen::MatrixXd& Q,
                            const OrderPlan& plan) {
  if (layout.series.empty()) return "no series has two points";
  if (Q.rows() - Q.cols() <= 1) return "the fit leaves one degree of freedom at most";
  if (1.0 / static_cast<double>(plan.most_draws + 1) > plan.share)
    return "its share of the significance is too small to be reached";
  return {};
}

}  // namespace

OrderTest test_order(const Eigen::VectorXd& r, const Eigen::MatrixXd& Q, const OrderLayout& layout,
                     const OrderPlan& plan) {
  GAINSAY_REQUIRE(Q.rows() == r.size(), "the free columns are as long as the residuals");
  OrderTest test;
  test.not_counted = why_not_counted(layout, Q, plan);
  if (!test.counts()) return test;

  const OrderStatistics observed = order_statistics(r.transpose(), layout);
  test.T = observed.T[0];
  if (!std::isfinite(test.T)) {
    test.not_counted = "the residuals are all zero";
    return test;
  }
  NullLaw law(observed, Q, layout, plan.seed);
  for (std::size_t draws = plan.least_draws; draws <= plan.most_draws; draws = 10 * draws + 9) {
    law.draw_until(draws);
    test.close = within_standard_errors(law.p_value(), plan.share, draws);
    if (!test.close) break;
  }
  test.draws = law.drawn();
  if (law.one_value_only()) {
    test.not_counted = "its statistic cannot vary after this fit";
    test.close = false;
    return test;
  }
  test.p_value = law.p_value();
  test.runs_p = law.runs_p();
  test.ljung_box_p = law.ljung_box_p();
  return test;
}

}  // namespace gainsay::stats
