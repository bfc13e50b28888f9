#include "gainsay/cli/verdict_words.h"

#include "gainsay/cli/number_text.h"

#include <algorithm>
#include <cmath>
#include <set>

namespace gainsay::cli {
namespace {

struct Counts {
  std::size_t all = 0;
  std::size_t rejected = 0;
  std::size_t not_rejected = 0;
  std::size_t undecided = 0;
  std::size_t not_judged() const { return all - rejected - not_rejected - undecided; }
};

Counts count(const std::vector<Contender>& contenders) {
  Counts counts;
  counts.all = contenders.size();
  for (const Contender& contender : contenders) {
    counts.rejected += rejected(contender) ? 1 : 0;
    counts.not_rejected += not_rejected(contender) ? 1 : 0;
    counts.undecided += undecided(contender) ? 1 : 0;
  }
  return counts;
}

std::string are(std::size_t n, const std::string& what) {
  return count_words(n) + (n == 1 ? " is " : " are ") + what;
}

/// "a", "a and b", "a, b and c".
std::string enumerated(const std::vector<std::string>& parts) {
  std::string out;
  for (std::size_t i = 0; i < parts.size(); ++i) {
    if (i > 0) out += i + 1 == parts.size() ? " and " : ", ";
    out += parts[i];
  }
  return out;
}

std::string main_clause(const Counts& counts) {
  if (counts.all == 1) {
    if (counts.rejected == 1) return "The data contradict the one mechanism judged";
    if (counts.not_rejected == 1) return "The data do not contradict the one mechanism judged";
    return "The one mechanism judged is undecided";
  }
  const std::string all = count_words(counts.all);
  if (counts.undecided == counts.all) {
    return counts.all == 2 ? "Both mechanisms are undecided"
                           : "All " + all + " mechanisms are undecided";
  }
  if (counts.rejected == counts.all) {
    return counts.all == 2 ? "The data contradict both mechanisms"
                           : "The data contradict all " + all + " mechanisms";
  }
  if (counts.rejected == 0) {
    return counts.all == 2 ? "The data contradict neither of two mechanisms"
                           : "The data contradict none of " + all + " mechanisms";
  }
  return "The data contradict " + count_words(counts.rejected) + " of " + all + " mechanisms";
}

std::string data_fact(const Judgement& judgement, const std::vector<Contender>& contenders) {
  const Study& study = judgement.study;
  const std::string data =
      capitalized(counted(study.experiments.size(), "experiment", "experiments")) + ", " +
      counted(study.readouts.size(), "readout", "readouts") + ", " +
      std::to_string(fitted_points(study)) + " measurements.";
  const auto closest = std::find_if(contenders.begin(), contenders.end(), rejected);
  if (closest == contenders.end()) return data;
  const stats::Verdict& verdict = closest->outcome->judged.verdict;
  const double away = distance(verdict);
  if (verdict.noise_unknown || !(away > 1.0)) {
    return data + " The closest rejected hypothesis, " + closest->letter +
           ", has P = " + p_text(verdict.p_value) + ".";
  }
  return data + " The closest rejected hypothesis, " + closest->letter + ", passes its limit by " +
         percent_text(away - 1.0) + ".";
}

std::string not_proven_fact(const std::vector<Contender>& contenders) {
  double most = stats::kNotComputed;
  std::size_t points = 0;
  bool any = false;
  bool unknown = false;
  for (const Contender& contender : contenders) {
    if (!not_rejected(contender)) continue;
    const stats::Verdict& verdict = contender.outcome->judged.verdict;
    any = true;
    unknown = unknown || verdict.noise_unknown;
    points = std::max(points, verdict.N);
    most = std::fmax(most, verdict.departure_sd);
  }
  if (!any)
    return "A rejection holds within the ranges searched, for the noise that the study states.";
  if (unknown) {
    return "Not rejected is not proven: the noise is unknown, so that the size of the misfit tells "
           "nothing; the order of the residuals alone was tested.";
  }
  if (std::isnan(most)) return "Not rejected is not proven.";
  return "Not rejected is not proven: all " + std::to_string(points) + " points off by less than " +
         significant(most, 2) + " sd would have gone unseen.";
}

std::string range_text(std::set<std::size_t> numbers) {
  if (numbers.empty()) return significant(stats::kNotComputed, 1);
  if (numbers.size() == 1) return std::to_string(*numbers.begin());
  return std::to_string(*numbers.begin()) + " to " + std::to_string(*numbers.rbegin());
}

std::string noise_text(const Study& study) {
  std::set<std::string> kinds;
  for (const estimation::Readout& readout : study.readouts) {
    if (readout.noise.sd_unknown) {
      kinds.insert("unknown and fitted");
    } else if (readout.noise.depends_on_model()) {
      kinds.insert("stated, in part as a share of the modelled value");
    } else if (readout.noise.sd) {
      kinds.insert("stated as one sd a readout");
    } else {
      kinds.insert("stated point by point");
    }
  }
  return enumerated({kinds.begin(), kinds.end()});
}

}  // namespace

std::string limit_word(stats::WhichLimit which) {
  return which == stats::WhichLimit::Full ? "full" : "reduced";
}

std::size_t fitted_points(const Study& study) {
  std::size_t points = 0;
  for (const estimation::Experiment& experiment : study.experiments) {
    for (const estimation::Series& series : experiment.series) {
      points += static_cast<std::size_t>(
          std::count_if(series.points.begin(), series.points.end(),
                        [](const estimation::Point& point) { return point.left_out.empty(); }));
    }
  }
  return points;
}

std::string verdict_sentence(const Judgement& judgement) {
  const Counts counts = count(line_up(judgement));
  std::vector<std::string> rest;
  const bool one_sort = counts.all == 1 || counts.rejected == counts.all ||
                        counts.not_rejected == counts.all || counts.undecided == counts.all;
  if (!one_sort) {
    if (counts.not_rejected > 0) rest.push_back(are(counts.not_rejected, "not rejected"));
    if (counts.undecided > 0) rest.push_back(are(counts.undecided, "undecided"));
    if (counts.not_judged() > 0) rest.push_back(are(counts.not_judged(), "not yet judged"));
  }
  return main_clause(counts) + (rest.empty() ? "" : "; " + enumerated(rest)) + ".";
}

std::vector<std::string> facts(const Judgement& judgement) {
  const std::vector<Contender> contenders = line_up(judgement);
  return {data_fact(judgement, contenders), not_proven_fact(contenders)};
}

std::string statisticians_line(const Judgement& judgement) {
  std::set<std::size_t> N;
  std::set<std::size_t> k;
  std::set<std::string> decides;
  std::set<std::string> shares;
  for (const Outcome& outcome : judgement.outcomes) {
    const stats::Verdict& verdict = outcome.judged.verdict;
    N.insert(verdict.N);
    k.insert(verdict.k);
    decides.insert(verdict.noise_unknown ? "no limit (order alone)"
                                         : "the " + limit_word(verdict.decides) + " limit");
    shares.insert(short_number(verdict.alpha * verdict.share_of_V, 3) + " for the misfit and " +
                  short_number(verdict.alpha * verdict.share_of_order, 3) + " for the order");
  }
  return "N = " + range_text(N) + ", k = " + range_text(k) +
         "; α = " + short_number(judgement.study.significance, 3) + ", of which " +
         enumerated({shares.begin(), shares.end()}) + "; this look alone; decided by " +
         enumerated({decides.begin(), decides.end()}) + "; noise " + noise_text(judgement.study) +
         "; data of " + counted(judgement.study.experiments.size(), "experiment", "experiments") +
         ", as fingerprinted below.";
}

std::string caution() {
  return "A hypothesis that is not rejected is not thereby true. These results do not replace "
         "safety "
         "assessment, dosing decisions or licensed practice; local rules prevail.";
}

}  // namespace gainsay::cli
