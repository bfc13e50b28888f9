#include "gainsay/stats/sentences.h"

#include "gainsay/stats/wording.h"

#include <fmt/format.h>

#include <string>
#include <utility>
#include <vector>

namespace gainsay::stats {
namespace {

constexpr int kDigitsOfRange = 6;

std::string name_of_limit(const Verdict& verdict) {
  return verdict.decides == WhichLimit::Full ? "full" : "reduced";
}

std::string sentence_on_V(const Verdict& verdict) {
  if (!verdict.V_counts())
    return "The noise is unknown and estimated from the fit, so the size of the misfit tells "
           "nothing: order is judged alone, with all of the significance.";
  const Limit& limit = verdict.deciding_limit();
  const std::string unknowns = verdict.decides == WhichLimit::Full
                                   ? ""
                                   : ", " + counted(verdict.k, "free unknown", "free unknowns");
  return fmt::format("The misfit {} {} the {} limit {} ({}{}; P = {}).", shown_V(limit.V),
                     limit.passed() ? "passes" : "stays below", name_of_limit(verdict),
                     shown_V(limit.value), counted(verdict.N, "datum", "data"), unknowns,
                     shown_P(limit.p_value));
}

std::string sentence_on_order(const Verdict& verdict) {
  if (!verdict.order_counts())
    return fmt::format("Order among the residuals is not judged: {}.", verdict.order.not_counted);
  return fmt::format("The residuals {} (lag-1 statistic {}, P = {}).",
                     verdict.order_speaks_against() ? "follow each other instead of scattering"
                                                    : "scatter without order",
                     readable(verdict.order.T, 3), shown_P(verdict.order.p_value));
}

std::string moves(const Verdict& verdict) {
  std::vector<std::string> ends;
  for (const MovedBound& bound : verdict.moved)
    ends.push_back(fmt::format(
        "{} {} {} instead of {}", bound.unknown, bound.lower ? "down to" : "up to",
        readable(bound.moved_to, kDigitsOfRange), readable(bound.stated, kDigitsOfRange)));
  return listed(ends);
}

std::string sentence_on_range(const Verdict& verdict) {
  if (verdict.range_untried)
    return "Its best fit lies on a bound, and the budget ended before that bound was moved out "
           "and searched thoroughly: the rejection holds within the ranges searched.";
  const std::string V = shown_V(verdict.moved.front().V);
  if (verdict.only_within_range)
    return fmt::format(
        "It is rejected only within the range of {}: searched {}, the misfit is {} and it would "
        "not be rejected.",
        listed(moved_unknowns(verdict)), moves(verdict), V);
  return fmt::format("Its best fit lies on a bound; searched {}, it is still rejected (misfit {}).",
                     moves(verdict), V);
}

std::string sentence_on_search(const Verdict& verdict, const Conviction& conviction) {
  const std::string chance = percent(chance_of_a_miss(conviction.random_starts));
  if (!verdict.V_speaks_against())
    return fmt::format(
        "It is the best fit of {} random starts: with 95 % confidence another one would do better "
        "with probability below {}.",
        conviction.random_starts, chance);
  return fmt::format(
      "None of {} random starts came below the limit: with 95 % confidence another one would with "
      "probability below {}.",
      conviction.random_starts, chance);
}

std::string sentence_on_departure(const Verdict& verdict) {
  if (!verdict.V_counts())
    return "Not rejected is not proven: a wrong curve without order, or one drowned in noise, "
           "would have gone unseen.";
  return fmt::format(
      "Not rejected is not proven: all {} off by less than {} sd may have gone unseen (so much is "
      "caught nine times in ten).",
      counted(verdict.N, "datum", "data"), readable(verdict.departure_sd, 2));
}

std::string sentence_undecided(const Verdict& verdict, const Conviction& conviction) {
  switch (verdict.ground) {
    case Ground::CannotBeIntegrated:
      return "No start could be integrated to the last datum, so there is no fit to judge.";
    case Ground::ReadoutsDepend:
      return fmt::format(
          "The readings of {} depend on each other linearly, within the rounding of their digits: "
          "they share noise that is not stated, and no limit holds for them.",
          listed(verdict.dependence->readouts));
    case Ground::NoFreedom:
      return fmt::format("It cannot be tested: {} for {}.", counted(verdict.N, "datum", "data"),
                         counted(verdict.k, "free unknown", "free unknowns"));
    case Ground::NothingToTest:
      return "It cannot be tested: the noise is unknown, and order cannot be judged.";
    case Ground::NoConvergence:
      return "Something speaks against it, but the descent to its best fit did not converge.";
    case Ground::TooFewStarts:
      return fmt::format(
          "Something speaks against it, but a rejection asks for {} random starts, and {}.",
          conviction.starts_for_rejection,
          conviction.interrupted
              ? fmt::format("the run was interrupted after {}", conviction.random_starts)
          : conviction.out_of_budget
              ? fmt::format("the budget ended after {}", conviction.random_starts)
              : fmt::format("there were {}", conviction.random_starts));
    case Ground::MisfitTooNearLimit:
      return "The misfit is nearer to its limit than the integration is accurate: tighten "
             "`relative` under [accuracy].";
    case Ground::FailsAtTighterControl:
      return "The best fit cannot be integrated at tolerances 100 times tighter, so the accuracy "
             "of its misfit is not known.";
    case Ground::OrderTooNearShare:
      return fmt::format("After {} draws P of order is still too near its share {} to call.",
                         verdict.order.draws, readable(verdict.share_of_order * verdict.alpha, 2));
    case Ground::MisfitAboveLimit:
    case Ground::ResidualsInOrder:
    case Ground::NothingSpeaksAgainst:
      break;
  }
  return {};
}

void add_tests(const Verdict& verdict, std::vector<std::string>& sentences) {
  const Share* largest = largest_share(verdict);
  std::string on_V = sentence_on_V(verdict);
  if (verdict.V_speaks_against() && largest != nullptr)
    on_V += fmt::format(" The largest part of it comes from {} ({}).", place_of(*largest),
                        percent(largest->V / verdict.V));
  std::string on_order = sentence_on_order(verdict);
  if (verdict.ground == Ground::ResidualsInOrder) std::swap(on_V, on_order);
  sentences.push_back(std::move(on_V));
  sentences.push_back(std::move(on_order));
}

void add_undetermined(const Verdict& verdict, std::vector<std::string>& sentences) {
  std::vector<std::string> names;
  for (const Interval& interval : verdict.intervals)
    if (!interval.determined && !interval.on_bound) names.push_back(interval.unknown);
  if (!names.empty())
    sentences.push_back(fmt::format("These data do not determine {}.", listed(names)));
}

}  // namespace

std::vector<std::string> sentences_of(const Verdict& verdict, const Conviction& conviction) {
  std::vector<std::string> sentences;
  if (verdict.decision == Decision::Undecided)
    sentences.push_back(sentence_undecided(verdict, conviction));
  if (verdict.N > verdict.k && conviction.integrated) add_tests(verdict, sentences);
  if (verdict.decision == Decision::Rejected)
    sentences.push_back(sentence_on_search(verdict, conviction));
  if (!verdict.moved.empty() || verdict.range_untried)
    sentences.push_back(sentence_on_range(verdict));
  if (verdict.decision == Decision::NotRejected)
    sentences.push_back(sentence_on_departure(verdict));
  add_undetermined(verdict, sentences);
  return sentences;
}

}  // namespace gainsay::stats
