#pragma once

#include "gainsay/estimation/fit.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/estimation/residuals.h"
#include "gainsay/stats/order_statistics.h"
#include "gainsay/stats/verdict.h"

#include <cstddef>
#include <cstdint>
#include <optional>

namespace gainsay::stats {

/// What a hypothesis is tested by.
struct TestPlan {
  double alpha = 0.05;
  std::optional<WhichLimit> decides;  ///< what the study says
  std::uint64_t seed = 1;             ///< of the draws of order
};

/// Applies the tests to fits of one problem, one fit at a time; the search and the decision are not
/// its business. Owns an evaluator.
class Examiner {
 public:
  /// `problem` must outlive the examiner.
  Examiner(const estimation::Problem& problem, const TestPlan& plan);

  /// Whether a test is about to speak against the fit, so that a rejection hangs on the search: V
  /// above its deciding limit, or P of order at its share or too near it after the first draws. A
  /// fit that ended nowhere is about to be rejected, too.
  bool about_to_be_rejected(const estimation::Fit& fit);

  /// Every test and table at `fit`, all but the decision. The full limit is asked of `least`, the
  /// fit of the least V, which differs where sds depend on the modelled value. Nothing where one of
  /// them cannot be evaluated.
  std::optional<Verdict> examine(const estimation::Fit& fit, const estimation::Fit& least);

  /// The least V of its own descent from the fit; the fit itself where sds do not depend on the
  /// modelled value (its V is the least) or the descent ends higher.
  estimation::Fit least_V_from(const estimation::Fit& fit);

 private:
  struct Tested;
  std::optional<Tested> test(const estimation::Fit& fit, double least_V, std::size_t most_draws);
  double V_at_tighter_control(const estimation::Fit& fit);

  const estimation::Problem& problem_;
  TestPlan plan_;
  estimation::Evaluator evaluator_;
  OrderLayout layout_;
};

}  // namespace gainsay::stats
