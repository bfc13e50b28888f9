#include "gainsay/estimation/region.h"

#include "gainsay/estimation/box_step.h"

#include <algorithm>
#include <utility>

namespace gainsay::estimation {
namespace {

// The radius of the region, in units of the coordinates: chosen on fits of twelve kinetic models
// in logarithmic coordinates (docs/methods.md, "Descent").
constexpr double kFirstRadius = 0.5;
constexpr double kLargestRadius = 5.0;
constexpr int kRejectionsAtMost = 26;
/// Added to the curvature, as a share of its mean eigenvalue: makes flat directions solvable.
constexpr double kRidge = 1e-9;
/// A step counts as a success from this share of its promise on.
constexpr double kAcceptable = 1e-4;

struct Step {
  Eigen::VectorXd to;
  double longest = 0.0;    // |p|max in units of the coordinates
  double predicted = 0.0;  // gain
};

/// The best step of the local model in box and region. Methods (16).
Step best_step(const LocalModel& here, const Eigen::VectorXd& x, const Box& box, double radius,
               const Eigen::VectorXd& unit) {
  const Eigen::Index n = x.size();
  Eigen::MatrixXd A = here.curvature;
  A.diagonal().array() +=
      kRidge * A.trace() / static_cast<double>(n) + std::numeric_limits<double>::min();
  const Eigen::VectorXd low = (box.low - x).cwiseMax(-radius * unit).cwiseMin(0.0);
  const Eigen::VectorXd high = (box.high - x).cwiseMin(radius * unit).cwiseMax(0.0);
  const Eigen::VectorXd p = box_step(A, here.gradient, low, high);
  Step step;
  step.predicted = -(2.0 * here.gradient.dot(p) + p.dot(here.curvature * p));
  step.longest = p.cwiseQuotient(unit).cwiseAbs().maxCoeff();
  step.to = x + p;
  for (Eigen::Index i = 0; i < n; ++i) {  // x + (bound - x) need not be the bound
    if (p[i] == box.low[i] - x[i]) step.to[i] = box.low[i];
    if (p[i] == box.high[i] - x[i]) step.to[i] = box.high[i];
  }
  return step;
}

/// How the region grows and shrinks. Methods (18).
class Radius {
 public:
  double value() const { return value_; }
  void accepted(double rho, double longest) {
    if (rho > 0.7 && longest > 0.8 * value_) value_ = std::min(2.0 * value_, kLargestRadius);
    if (rho < 0.25) value_ = 0.5 * std::min(value_, longest);
  }
  void rejected(double longest) { value_ = 0.4 * std::min(value_, longest); }
  void rejected_badly(double longest) { value_ = 0.25 * std::min(value_, longest); }

 private:
  double value_ = kFirstRadius;
};

class RegionDescent {
 public:
  RegionDescent(Landscape& landscape, const Box& box, const RegionPlan& plan)
      : landscape_(landscape), box_(box), plan_(plan) {}

  RegionEnd run(const Eigen::VectorXd& from) {
    end_.x = from;
    end_.here = model(from);
    if (!end_.here)
      return ended(landscape_.closed() ? RegionEnd::Why::Closed : RegionEnd::Why::BadStart);
    if (from.size() == 0) return ended(RegionEnd::Why::Settled);
    while (end_.models < plan_.models) {
      const Step step = best_step(*end_.here, end_.x, box_, radius_.value(), plan_.unit);
      if (!(step.predicted > 0.0)) return ended(RegionEnd::Why::Settled);
      const double before = end_.here->value;
      const bool accepted = try_step(step);
      if (landscape_.closed()) return ended(RegionEnd::Why::Closed);
      if (accepted ? before - end_.here->value < plan_.enough && step.predicted < 2 * plan_.enough
                   : step.predicted < 0.1 * plan_.enough) {
        return ended(RegionEnd::Why::Settled);
      }
      rejections_ = accepted ? 0 : rejections_ + 1;
      if (rejections_ >= kRejectionsAtMost) return ended(RegionEnd::Why::Stuck);
    }
    return ended(RegionEnd::Why::NoModelsLeft);
  }

 private:
  /// Goes there if that lowers the objective enough; the radius follows.
  bool try_step(const Step& step) {
    const double before = end_.here->value;
    // The Jacobian is asked for at once where success is likely, else the value first.
    std::optional<LocalModel> there;
    std::optional<double> value;
    if (last_rho_ > 0.25) {
      there = model(step.to);
      if (there) value = there->value;
    } else {
      value = landscape_.value(step.to, before);
    }
    if (!value) {
      last_rho_ = -1.0;
      radius_.rejected_badly(step.longest);
      return false;
    }
    const double rho = (before - *value) / step.predicted;
    last_rho_ = rho;
    if (!(rho > kAcceptable)) {
      if (rho < -1.0)
        radius_.rejected_badly(step.longest);
      else
        radius_.rejected(step.longest);
      return false;
    }
    if (!there) there = model(step.to);
    // Sensitivities change the steps of the integrator and so the last digits of the value: what
    // was a gain by these alone is none.
    if (!there || there->value >= before) {
      radius_.rejected_badly(step.longest);
      return false;
    }
    end_.x = step.to;
    end_.here = std::move(there);
    radius_.accepted(rho, step.longest);
    return true;
  }

  std::optional<LocalModel> model(const Eigen::VectorXd& x) {
    ++end_.models;
    return landscape_.model(x);
  }

  RegionEnd ended(RegionEnd::Why why) {
    end_.why = why;
    return std::move(end_);
  }

  Landscape& landscape_;
  const Box& box_;
  const RegionPlan& plan_;
  RegionEnd end_;
  Radius radius_;
  double last_rho_ = 1.0;
  int rejections_ = 0;
};

}  // namespace

double promise(const LocalModel& here, const Eigen::VectorXd& x, const Box& box) {
  if (x.size() == 0) return 0.0;
  const double all = (box.high - box.low).maxCoeff();
  return best_step(here, x, box, all, Eigen::VectorXd::Ones(x.size())).predicted;
}

RegionEnd descend_in_region(Landscape& landscape, const Box& box, const Eigen::VectorXd& from,
                            const RegionPlan& plan) {
  return RegionDescent(landscape, box, plan).run(from);
}

}  // namespace gainsay::estimation
