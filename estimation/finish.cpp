#include "gainsay/estimation/finish.h"

#include "gainsay/estimation/approach.h"
#include "gainsay/estimation/ceres_solve.h"

#include <limits>
#include <utility>

namespace gainsay::estimation {
namespace {

/// Within this share of the range from a bound an unknown counts as on it.
constexpr double kOnBound = 1e-6;
/// A held unknown is released where the quadratic model promises more than this, in units of V.
constexpr double kWorthReleasing = 1e-4;
/// Who converged must not leave more than this to the quadratic model, in units of V. Refused
/// points shrink Ceres' steps until it takes them for converged.
constexpr double kPromiseLeft = 0.01;
/// Rounds of holding and releasing.
constexpr int kRounds = 10;

enum class Side { Low, Between, High };

Side side(const Box& box, const Eigen::VectorXd& x, Eigen::Index i) {
  const double near = kOnBound * (box.high[i] - box.low[i]);
  if (x[i] - box.low[i] <= near) return Side::Low;
  return box.high[i] - x[i] <= near ? Side::High : Side::Between;
}

/// True if going inward from its side lowers the objective.
bool wants_back(Side side, double gradient) {
  return side == Side::Low ? gradient < 0.0 : side == Side::High && gradient > 0.0;
}

/// The unknowns held on bounds while the others move, and how that changes from round to round.
/// Methods (21).
class Holding {
 public:
  Holding(const Box& box, Eigen::Index unknowns)
      : box_(box), held_(static_cast<std::size_t>(unknowns), false) {}

  /// Holds the unknowns that lie next to a bound and would go beyond it, and puts them on it. True
  /// if any was free before.
  bool hold(Eigen::VectorXd& x, const LocalModel& here) {
    const std::vector<bool> on = on_bound(box_, x, here.gradient);
    bool any = false;
    for (std::size_t i = 0; i < held_.size(); ++i) {
      if (!on[i] || held_[i]) continue;
      const auto k = static_cast<Eigen::Index>(i);
      x[k] = side(box_, x, k) == Side::Low ? box_.low[k] : box_.high[k];
      held_[i] = any = true;
    }
    return any;
  }

  /// Releases the held unknowns that want back where that pays. True if there were any.
  bool release(const Eigen::VectorXd& x, const LocalModel& here) {
    bool any = false;
    for (std::size_t i = 0; i < held_.size(); ++i) {
      const auto k = static_cast<Eigen::Index>(i);
      const double slope = here.gradient[k];
      if (!held_[i] || !wants_back(side(box_, x, k), slope)) continue;
      if (slope * slope <= kWorthReleasing * here.curvature(k, k)) continue;
      held_[i] = false;
      any = true;
    }
    return any;
  }

  std::vector<Eigen::Index> free() const {
    std::vector<Eigen::Index> all;
    for (std::size_t i = 0; i < held_.size(); ++i)
      if (!held_[i]) all.push_back(static_cast<Eigen::Index>(i));
    return all;
  }

 private:
  const Box& box_;
  std::vector<bool> held_;
};

/// What Ceres says of the free unknowns; where there is none, the signs of the gradient say it all.
CeresEnd solve_free(Workbench& bench, const Holding& holding) {
  bench.set_free(holding.free());
  if (bench.free().empty()) return {true, "every unknown is held at a bound"};
  return solve_with_ceres(bench);
}

FinishEnd ended(Workbench& bench, const Box& box, bool converged, std::string why) {
  FinishEnd end;
  end.x = bench.x();
  end.why = std::move(why);
  const Evaluation* here = bench.evaluate();
  if (here == nullptr) return end;
  end.evaluation = *here;
  const LocalModel model = local_model(*here);
  end.on_bound = on_bound(box, end.x, model.gradient);
  end.converged = converged;
  if (converged && promise(model, end.x, box) > kPromiseLeft) {
    end.converged = false;
    end.why = "points beyond its end cannot be evaluated";
  }
  return end;
}

std::string words(RegionEnd::Why why) {
  switch (why) {
    case RegionEnd::Why::Settled:
      return "no step promises a gain";
    case RegionEnd::Why::Stuck:
      return "steps that promised a gain brought none";
    case RegionEnd::Why::NoModelsLeft:
      return "still gaining after the last step allowed";
    case RegionEnd::Why::Closed:
      return "nothing more was to be evaluated";
    case RegionEnd::Why::BadStart:
      return "the point cannot be integrated";
  }
  return "";
}

}  // namespace

std::vector<bool> on_bound(const Box& box, const Eigen::VectorXd& x,
                           const Eigen::VectorXd& gradient) {
  std::vector<bool> on(static_cast<std::size_t>(x.size()));
  for (Eigen::Index i = 0; i < x.size(); ++i) {
    const Side at = side(box, x, i);
    on[static_cast<std::size_t>(i)] =
        at != Side::Between && gradient[i] != 0.0 && !wants_back(at, gradient[i]);
  }
  return on;
}

FinishEnd finish(Allowance& allowance, const Box& box, const Eigen::VectorXd& from) {
  Workbench bench(allowance, box, from);
  Holding holding(box, from.size());
  const auto settle = [&] {  // true if what is held changed
    const Evaluation* here = bench.evaluate();
    if (here == nullptr) return false;
    const LocalModel model = local_model(*here);
    Eigen::VectorXd x = bench.x();
    const bool held = holding.hold(x, model);
    const bool released = holding.release(x, model);
    bench.move_to(x);
    return held || released;
  };
  settle();
  for (int round = 0; round < kRounds; ++round) {
    const CeresEnd solved = solve_free(bench, holding);
    if (allowance.closed()) return ended(bench, box, false, "nothing more was to be evaluated");
    if (!settle()) return ended(bench, box, solved.converged, solved.why);
  }
  return ended(bench, box, false, "unknowns kept going to bounds and back");
}

FinishEnd finish_in_region(Allowance& allowance, const Box& box, const Eigen::VectorXd& from,
                           Aim aim) {
  const Stage stage{.aim = aim};
  Objective objective(allowance, stage);
  RegionPlan plan{.unit = units_of(allowance.problem())};
  plan.enough = allowance.problem().relative_accuracy;
  RegionEnd descended{.x = from};
  bool converged = false;
  double before = std::numeric_limits<double>::infinity();
  // A region that rejections have made small settles too early: only one that was opened anew and
  // found nothing counts. Methods (22).
  for (int round = 0; round < kRounds && !converged; ++round) {
    descended = descend_in_region(objective, box, descended.x, plan);
    if (descended.why != RegionEnd::Why::Settled) break;
    converged = before - descended.here->value < plan.enough;
    before = descended.here->value;
  }
  FinishEnd end;
  end.x = descended.x;
  end.why = words(descended.why);
  end.evaluation = allowance.evaluate(end.x, Evaluator::Want::ResidualsAndJacobian, stage);
  if (end.evaluation) {
    end.converged = converged;
    end.on_bound = on_bound(box, end.x, local_model(*end.evaluation).gradient);
  }
  return end;
}

}  // namespace gainsay::estimation
