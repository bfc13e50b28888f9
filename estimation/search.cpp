#include "gainsay/estimation/search.h"

#include "gainsay/estimation/starts.h"
#include "gainsay/estimation/workers.h"

#include <algorithm>
#include <map>
#include <memory>
#include <mutex>
#include <utility>

namespace gainsay::estimation {
namespace {

/// Descents that were run and are not settled yet, handed from the workers to the settling one.
class Tray {
 public:
  void put(std::size_t number, Fit fit) {
    const std::lock_guard lock(mutex_);
    fits_.emplace(number, std::move(fit));
  }
  Fit take(std::size_t number) {
    const std::lock_guard lock(mutex_);
    return std::move(fits_.extract(number).mapped());
  }

 private:
  std::mutex mutex_;
  std::map<std::size_t, Fit> fits_;
};

class Search {
 public:
  Search(const Problem& problem, const SearchPlan& plan, const NeedsMore& needs_more,
         const SearchObserver& observer)
      : problem_(problem),
        plan_(plan),
        needs_more_(needs_more),
        observer_(observer),
        guesses_(first_guesses(problem.unknowns)),
        budget_(plan.budget * static_cast<long>(problem.experiments.size())),
        evaluators_(std::max(1u, plan.threads)) {
    if (guesses_.empty() && plan.fixed == 0u) guesses_.push_back(middle(problem.unknowns));
  }

  SearchResult run() {
    // Replaced starts may need more numbers than there are starts; the budget bounds them, since
    // every descent integrates at least once.
    const std::size_t random = plan_.fixed == 0u ? 0 : static_cast<std::size_t>(budget_) + 1;
    in_order(
        guesses_.size() + random, plan_.threads,
        [this](std::size_t number, unsigned worker) { tray_.put(number, descent(number, worker)); },
        [this](std::size_t number) { return settle(number, tray_.take(number)); });
    list_optima();
    return std::move(result_);
  }

 private:
  /// The number of a random start; none for a first guess.
  std::optional<std::uint64_t> start_number(std::size_t number) const {
    if (number < guesses_.size()) return std::nullopt;
    return number - guesses_.size();
  }

  /// One descent; depends on the problem, the plan and its number alone.
  Fit descent(std::size_t number, unsigned worker) {
    std::unique_ptr<Evaluator>& evaluator = evaluators_[worker];
    if (!evaluator) evaluator = std::make_unique<Evaluator>(problem_);
    const std::optional<std::uint64_t> random = start_number(number);
    DescentPlan plan;
    plan.integrations_at_most = budget_;
    plan.stop = plan_.stop;
    plan.keep_guessed = !random;
    return descend(*evaluator,
                   random ? nth_start(problem_.unknowns, plan_.seed, *random) : guesses_[number],
                   plan);
  }

  /// Takes the end of one descent in; true if the next number is wanted.
  bool settle(std::size_t number, Fit fit) {
    if (fit.stopped == Stopped::Interrupted) {
      result_.interrupted = true;
      return false;
    }
    result_.integrations += fit.integrations;
    const std::optional<std::uint64_t> random = start_number(number);
    if (random && fit.stopped == Stopped::CannotIntegrate) {
      ++result_.replaced_starts;
    } else {
      if (random) ++result_.random_starts;
      if (result_.descents.empty() || is_better(fit, result_.best)) result_.best = fit;
      result_.descents.push_back({std::move(fit), random});
    }
    const bool more = wants_more(number);
    if (observer_) observer_(result_.descents.size(), expected(more), result_.best.V);
    if (!more) return false;
    result_.out_of_budget = result_.integrations >= budget_;
    result_.interrupted = plan_.stop.stop_requested();
    return !result_.out_of_budget && !result_.interrupted;
  }

  bool wants_more(std::size_t number) const {
    if (number + 1 < guesses_.size()) return true;
    if (result_.random_starts < plan_.fixed.value_or(plan_.least_starts)) return true;
    if (plan_.fixed || result_.random_starts >= plan_.starts_for_rejection) return false;
    return needs_more_ && needs_more_(result_.best, result_.random_starts);
  }

  std::size_t expected(bool more) const {
    if (!more) return result_.descents.size();
    const std::size_t least = plan_.fixed.value_or(plan_.least_starts);
    return guesses_.size() + (result_.random_starts < least ? least : plan_.starts_for_rejection);
  }

  void list_optima() {
    std::vector<const Fit*> fits;
    for (const Descent& descent : result_.descents) fits.push_back(&descent.fit);
    result_.optima = distinct_optima(fits, [this](std::size_t number) {
      return result_.descents[number].start_number.has_value();
    });
  }

  const Problem& problem_;
  const SearchPlan& plan_;
  const NeedsMore& needs_more_;
  const SearchObserver& observer_;
  std::vector<Eigen::VectorXd> guesses_;
  long budget_;
  std::vector<std::unique_ptr<Evaluator>> evaluators_;  // one for each worker
  Tray tray_;
  SearchResult result_;
};

}  // namespace

SearchResult search(const Problem& problem, const SearchPlan& plan, const NeedsMore& needs_more,
                    const SearchObserver& observer) {
  return Search(problem, plan, needs_more, observer).run();
}

}  // namespace gainsay::estimation
