#pragma once

#include "gainsay/cli/judgement.h"

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::cli {

inline constexpr int kHues =
    6;  ///< the first so many of the line-up have a hue, all others are grey

/// How one hypothesis appears on all pages and pictures. Colour and dash say who it is, never how
/// it fares: that is said by a shape and a word.
struct Contender {
  std::string letter;
  std::string name;
  int hue = 0;   ///< 1 to kHues; 0 is grey
  int dash = 1;  ///< 1 to kHues, of its curves
  bool shown_at_first = false;
  const StudyHypothesis* hypothesis = nullptr;
  const Outcome* outcome = nullptr;  ///< null where it was not judged
};

/// All hypotheses of a study in the order in which pages list them: those not rejected by distance
/// from their limit, undecided ones, then the rejected, the closest first; those not judged last.
/// Shown at first: what is not rejected (six at most) and the closest of the others.
/// Points into `judgement`, which must outlive it.
std::vector<Contender> line_up(const Judgement& judgement);

/// The limit that decides.
const stats::Limit& deciding_limit(const stats::Verdict& verdict);

/// How far a hypothesis is from its limit: misfit / deciding limit, above 1 where it is passed.
/// With unknown noise, where the misfit says nothing: alpha / P. NaN where there is neither.
double distance(const stats::Verdict& verdict);

bool rejected(const Contender& contender);
bool not_rejected(const Contender& contender);
bool undecided(const Contender& contender);

/// Classes of an element that belongs to this hypothesis alone and is shown where it is ticked:
/// "of-B h2 d2".
std::string classes(const Contender& contender);

}  // namespace gainsay::cli
