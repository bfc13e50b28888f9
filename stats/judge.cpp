#include "gainsay/stats/judge.h"

#include "gainsay/stats/decide.h"
#include "gainsay/stats/examiner.h"
#include "gainsay/stats/moved_bounds.h"
#include "gainsay/stats/reason.h"
#include "gainsay/stats/sentences.h"

#include <algorithm>
#include <cstdint>
#include <optional>
#include <utility>
#include <vector>

namespace gainsay::stats {
namespace {

using estimation::Fit;
using estimation::Problem;
using estimation::SearchPlan;
using estimation::SearchResult;

constexpr int kMostMoves = 3;
constexpr std::uint64_t kFreshStarts = 0x9e3779b97f4a7c15;  // 2^64 / golden ratio, an odd number

/// A search and what the tests say of the fit that it led to.
struct Trial {
  SearchResult search;
  Fit fit;
  Conviction conviction;
  Verdict verdict;
};

bool speaks_against(const Verdict& verdict) {
  return verdict.V_speaks_against() || verdict.order_speaks_against();
}

estimation::NeedsMore while_a_rejection_hangs_on_it(Examiner& examiner,
                                                    const JudgeOptions& options) {
  // The best fit changes a few times only; what was found for it holds until then.
  return [&examiner, &options, objective = kNotComputed, hangs = true](
             const Fit& best, std::size_t random_starts) mutable {
    if (!options.until_convincing || random_starts >= options.plan.starts_for_rejection)
      return false;
    if (best.objective != objective) hangs = examiner.about_to_be_rejected(best);
    objective = best.objective;
    return hangs;
  };
}

/// The tests at `fit`; where the full limit, asked of the least V near it, would reject the
/// hypothesis, the other optima are asked for a lower V, too.
std::optional<Verdict> examined(Examiner& examiner, const SearchResult& search, const Fit& fit) {
  Fit least = examiner.least_V_from(fit);
  std::optional<Verdict> verdict = examiner.examine(fit, least);
  if (!verdict || verdict->decides != WhichLimit::Full || !verdict->full.passed()) return verdict;
  const double near_fit = least.V;
  for (const estimation::Optimum& optimum : search.optima) {
    const Fit other = examiner.least_V_from(search.descents[optimum.best_descent].fit);
    if (other.V < least.V) least = other;
  }
  return least.V < near_fit ? examiner.examine(fit, least) : verdict;
}

/// The lowest of the fits that did not converge, where it is below the best that did.
const Fit* lower_without_convergence(const SearchResult& search) {
  const Fit* lowest = &search.best;
  for (const estimation::Descent& descent : search.descents) {
    const bool converged = descent.fit.stopped == estimation::Stopped::Converged;
    if (!converged && descent.fit.ended() && descent.fit.V < lowest->V) lowest = &descent.fit;
  }
  return lowest == &search.best ? nullptr : lowest;
}

void take(Trial& trial, const Fit& fit, std::optional<Verdict> verdict) {
  trial.fit = fit;
  trial.conviction.integrated = verdict.has_value();
  trial.conviction.converged = fit.stopped == estimation::Stopped::Converged;
  if (verdict) trial.verdict = std::move(*verdict);
}

Trial tried(const Problem& problem, const JudgeOptions& options, const SearchPlan& plan,
            const estimation::SearchObserver& observer) {
  Examiner examiner(problem, {options.alpha, options.decides, options.plan.seed});
  Trial trial;
  trial.search =
      estimation::search(problem, plan, while_a_rejection_hangs_on_it(examiner, options), observer);
  trial.conviction.random_starts = trial.search.random_starts;
  trial.conviction.starts_for_rejection = options.plan.starts_for_rejection;
  trial.conviction.out_of_budget = trial.search.out_of_budget;
  trial.conviction.interrupted = trial.search.interrupted;
  trial.verdict.alpha = options.alpha;
  const Fit& best = trial.search.best;
  if (!best.ended()) return trial;
  take(trial, best, examined(examiner, trial.search, best));

  const Fit* lower = lower_without_convergence(trial.search);
  if (lower != nullptr && trial.verdict.V_speaks_against()) {
    std::optional<Verdict> verdict = examiner.examine(*lower, *lower);
    if (verdict && !verdict->deciding_limit().passed()) {
      take(trial, *lower, std::move(verdict));
      trial.search.best = trial.fit;
    }
  }
  return trial;
}

Problem with_first_guess(Problem problem, const std::vector<double>& values) {
  for (std::size_t u = 0; u < values.size(); ++u) problem.unknowns[u].first = {values[u]};
  return problem;
}

/// Whether a rejection stays where the bounds that the fit lies on are moved out.
void try_wider_ranges(const Problem& problem, const JudgeOptions& options,
                      const estimation::SearchObserver& observer, Trial& stated) {
  const long experiments = static_cast<long>(std::max<std::size_t>(problem.experiments.size(), 1));
  Verdict& verdict = stated.verdict;
  SearchPlan plan = options.plan;
  plan.budget -= stated.search.integrations / experiments;
  Problem wider = problem;
  Fit fit = stated.fit;
  for (int move = 0; move < kMostMoves; ++move) {
    const std::vector<Bound> bounds = movable_bounds(wider, fit.values, fit.on_bound);
    if (bounds.empty()) return;
    verdict.range_untried = true;
    if (plan.budget <= 0) return;
    wider = with_first_guess(moved_out(wider, bounds), fit.values);
    plan.seed += kFreshStarts;
    const Trial trial = tried(wider, options, plan, observer);
    if (!trial.conviction.integrated) return;
    verdict.moved = moved_bounds(problem, wider, trial.verdict.V);
    verdict.only_within_range = !speaks_against(trial.verdict);
    verdict.range_untried = !verdict.only_within_range && !trial.conviction.convincing();
    if (verdict.only_within_range || verdict.range_untried) return;
    plan.budget -= trial.search.integrations / experiments;
    fit = trial.fit;
  }
}

}  // namespace

Judged judge(const Problem& problem, const JudgeOptions& options,
             const estimation::SearchObserver& observer) {
  Trial trial = tried(problem, options, options.plan, observer);
  Verdict& verdict = trial.verdict;
  const Decided decided = decide(verdict, trial.conviction);
  verdict.decision = decided.decision;
  verdict.ground = decided.ground;
  if (verdict.decision == Decision::Rejected) try_wider_ranges(problem, options, observer, trial);
  verdict.reason = reason_of(verdict, trial.conviction);
  verdict.sentences = sentences_of(verdict, trial.conviction);
  return {std::move(trial.search), std::move(trial.verdict)};
}

}  // namespace gainsay::stats
