#include "gainsay/cli/contenders.h"

#include <algorithm>
#include <cmath>
#include <tuple>

namespace gainsay::cli {
namespace {

bool decided_as(const Contender& contender, stats::Decision decision) {
  return contender.outcome != nullptr && contender.outcome->judged.verdict.decision == decision;
}

int rank_of(const Contender& contender) {
  if (not_rejected(contender)) return 0;
  if (undecided(contender)) return 1;
  return rejected(contender) ? 2 : 3;
}

/// Distances that are no numbers come last.
std::tuple<int, bool, double> place_of(const Contender& contender) {
  const double away = contender.outcome == nullptr ? stats::kNotComputed
                                                   : distance(contender.outcome->judged.verdict);
  const bool unknown = std::isnan(away);
  return {rank_of(contender), unknown, unknown ? 0.0 : away};
}

void choose_shown(std::vector<Contender>& contenders) {
  int shown = 0;
  for (Contender& contender : contenders) {
    if (not_rejected(contender) && shown < kHues) {
      contender.shown_at_first = true;
      ++shown;
    }
  }
  const auto rival = std::find_if(contenders.begin(), contenders.end(), [](const Contender& c) {
    return c.outcome != nullptr && !not_rejected(c);
  });
  if (rival == contenders.end()) return;
  rival->shown_at_first = true;
  if (shown == 0 && rival + 1 != contenders.end() && (rival + 1)->outcome != nullptr) {
    (rival + 1)->shown_at_first = true;
  }
}

}  // namespace

bool rejected(const Contender& c) { return decided_as(c, stats::Decision::Rejected); }
bool not_rejected(const Contender& c) { return decided_as(c, stats::Decision::NotRejected); }
bool undecided(const Contender& c) { return decided_as(c, stats::Decision::Undecided); }

const stats::Limit& deciding_limit(const stats::Verdict& verdict) {
  return verdict.decides == stats::WhichLimit::Full ? verdict.full : verdict.reduced;
}

double distance(const stats::Verdict& verdict) {
  if (verdict.noise_unknown) return verdict.alpha / verdict.p_value;
  const stats::Limit& limit = deciding_limit(verdict);
  return limit.V / limit.value;
}

std::vector<Contender> line_up(const Judgement& judgement) {
  std::vector<Contender> contenders;
  for (const StudyHypothesis& hypothesis : judgement.study.hypotheses) {
    Contender contender;
    contender.letter = hypothesis.letter;
    contender.name = hypothesis.mechanism.title;
    contender.hypothesis = &hypothesis;
    contenders.push_back(std::move(contender));
  }
  for (const Outcome& outcome : judgement.outcomes) {
    contenders.at(outcome.hypothesis).outcome = &outcome;
  }
  std::stable_sort(
      contenders.begin(), contenders.end(),
      [](const Contender& a, const Contender& b) { return place_of(a) < place_of(b); });
  for (std::size_t i = 0; i < contenders.size(); ++i) {
    const int place = static_cast<int>(i);
    contenders[i].hue = place < kHues ? place + 1 : 0;
    contenders[i].dash = place % kHues + 1;
  }
  choose_shown(contenders);
  return contenders;
}

std::string classes(const Contender& contender) {
  return "of-" + contender.letter + " h" + std::to_string(contender.hue) + " d" +
         std::to_string(contender.dash);
}

}  // namespace gainsay::cli
