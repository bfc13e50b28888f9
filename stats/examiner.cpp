#include "gainsay/stats/examiner.h"

#include "gainsay/stats/departure.h"
#include "gainsay/stats/free_columns.h"
#include "gainsay/stats/rivals.h"
#include "gainsay/stats/shares_of_alpha.h"

#include <cmath>

namespace gainsay::stats {
namespace {

constexpr double kTighter = 0.01;
constexpr std::size_t kFirstDraws = OrderPlan{}.least_draws;
constexpr std::size_t kMostDraws = OrderPlan{}.most_draws;

std::optional<estimation::Evaluation> evaluated(estimation::Evaluator& evaluator,
                                                const Eigen::VectorXd& x) {
  // With sensitivities even where V alone is wanted: without them the integrator takes other steps.
  auto result = evaluator.evaluate(x, estimation::Evaluator::Want::ResidualsAndJacobian);
  if (!result) return {};
  return std::move(result).value();
}

void set_limits(Verdict& verdict, double least_V) {
  const double level = verdict.share_of_V * verdict.alpha;
  if (verdict.V_counts()) {
    verdict.full = full_limit(least_V, verdict.N, level);
    verdict.reduced = reduced_limit(verdict.V, verdict.N, verdict.k, level);
  } else {
    verdict.full.not_offered = "the noise is unknown";
    verdict.reduced.not_offered = "the noise is unknown";
  }
}

/// Normal where sds are known; without freedom the fitted sds say nothing.
IntervalLaw interval_law(const Verdict& verdict) {
  if (!verdict.noise_unknown) return {};
  IntervalLaw law;
  law.variance = std::numeric_limits<double>::infinity();
  if (verdict.N <= verdict.k) return law;
  law.freedom = static_cast<double>(verdict.N - verdict.k);
  law.variance = static_cast<double>(verdict.N) / law.freedom;
  return law;
}

void set_criteria(Verdict& verdict, const estimation::Problem& problem, const Standardized& all) {
  verdict.minus_two_ln_L = minus_two_ln_likelihood(problem, all);
  const Criteria by =
      criteria(verdict.minus_two_ln_L, verdict.N, verdict.k, verdict.fitted_noise.size());
  verdict.K = by.K;
  verdict.AIC = by.AIC;
  verdict.AICc = by.AICc;
  verdict.BIC = by.BIC;
}

}  // namespace

struct Examiner::Tested {
  estimation::Evaluation evaluation;
  Standardized all;
  FreeColumns free;
  Verdict verdict;
};

Examiner::Examiner(const estimation::Problem& problem, const TestPlan& plan)
    : problem_(problem), plan_(plan), evaluator_(problem), layout_(order_layout(problem)) {}

bool Examiner::about_to_be_rejected(const estimation::Fit& fit) {
  if (!fit.ended()) return true;
  const std::optional<Tested> tested = test(fit, fit.V, kFirstDraws);
  if (!tested) return true;
  const Verdict& verdict = tested->verdict;
  if (verdict.N <= verdict.k) return false;  // cannot be tested, however long the search
  const bool by_V = verdict.V_counts() && verdict.deciding_limit().passed();
  const bool by_order =
      verdict.order_counts() &&
      (verdict.order.close || verdict.order.p_value <= verdict.share_of_order * verdict.alpha);
  return by_V || by_order;
}

std::optional<Verdict> Examiner::examine(const estimation::Fit& fit, const estimation::Fit& least) {
  std::optional<Tested> tested = test(fit, least.V, kMostDraws);
  if (!tested) return {};
  Verdict& verdict = tested->verdict;
  const bool asked_of_least = verdict.decides == WhichLimit::Full;
  verdict.V_tighter = V_at_tighter_control(asked_of_least ? least : fit);
  if (verdict.V_counts() && verdict.deciding_limit().offered()) {
    const Limit& limit = verdict.deciding_limit();
    verdict.departure_sd = departure_in_sds(limit.value, limit.freedom, verdict.N);
  }
  verdict.dependence = dependent_readouts(problem_, tested->all.sd);
  verdict.shares = shares_of_V(problem_, tested->all);
  verdict.residuals = standard_residuals(problem_, tested->all, tested->evaluation.shown);
  verdict.intervals = linear_intervals(problem_.unknowns, fit.values, fit.on_bound, tested->free,
                                       interval_law(verdict));
  set_criteria(verdict, problem_, tested->all);
  return verdict;
}

std::optional<Examiner::Tested> Examiner::test(const estimation::Fit& fit, double least_V,
                                               std::size_t most_draws) {
  std::optional<estimation::Evaluation> evaluation = evaluated(evaluator_, fit.x);
  if (!evaluation) return {};
  Standardized all = standardized(problem_, *evaluation);
  FreeColumns free = free_columns(all.J, fit.on_bound);
  Tested tested{std::move(*evaluation), std::move(all), std::move(free), {}};
  Verdict& verdict = tested.verdict;
  verdict.V = tested.all.V;
  verdict.N = problem_.residuals();
  verdict.k = tested.free.rank;
  verdict.alpha = plan_.alpha;
  verdict.noise_unknown = problem_.noise_unknown();
  verdict.fitted_noise = tested.all.noise;
  verdict.decides = which_decides(plan_.decides, verdict.N, verdict.k);

  OrderPlan order;
  order.share = shares_of_alpha(!verdict.noise_unknown, true).order * plan_.alpha;
  order.seed = plan_.seed;
  order.most_draws = most_draws;
  verdict.order = test_order(tested.all.r, tested.free.Q, layout_, order);
  const SharesOfAlpha shares = shares_of_alpha(!verdict.noise_unknown, verdict.order.counts());
  verdict.share_of_V = shares.V;
  verdict.share_of_order = shares.order;
  set_limits(verdict, least_V);
  verdict.p_value = joint_p_value(shares, verdict.deciding_limit().p_value, verdict.order.p_value);
  return tested;
}

double Examiner::V_at_tighter_control(const estimation::Fit& fit) {
  evaluator_.set_relative_accuracy(kTighter * problem_.relative_accuracy, kTighter);
  const std::optional<estimation::Evaluation> evaluation = evaluated(evaluator_, fit.x);
  evaluator_.set_relative_accuracy(problem_.relative_accuracy);
  return evaluation ? standardized(problem_, *evaluation).V : kNotComputed;
}

estimation::Fit Examiner::least_V_from(const estimation::Fit& fit) {
  if (!problem_.noise_depends_on_model() || problem_.noise_unknown()) return fit;
  const estimation::Fit least = estimation::least_V(evaluator_, fit.x);
  return least.ended() && least.V < fit.V ? least : fit;
}

}  // namespace gainsay::stats
