#include "gainsay/stats/shares.h"

#include "gainsay/core/require.h"

namespace gainsay::stats {

std::vector<Share> shares_of_V(const estimation::Problem& problem, const Standardized& all) {
  std::vector<Share> shares;
  Eigen::Index next = 0;
  const auto take = [&](std::string experiment, std::string readout, std::size_t points) {
    const auto count = static_cast<Eigen::Index>(points);
    shares.push_back({std::move(experiment), std::move(readout), points,
                      all.r.segment(next, count).squaredNorm()});
    next += count;
  };
  for (const estimation::FittedExperiment& experiment : problem.experiments)
    for (const estimation::FittedSeries& series : experiment.series)
      take(experiment.name, series.readout, series.data.size());
  if (problem.priors() > 0) take("", "earlier work", problem.priors());
  return shares;
}

std::vector<StandardResidual> standard_residuals(const estimation::Problem& problem,
                                                 const Standardized& all,
                                                 const Eigen::VectorXd& shown) {
  GAINSAY_REQUIRE(shown.size() == all.sd.size(), "a modelled value for each datum");
  std::vector<StandardResidual> residuals;
  Eigen::Index i = 0;
  for (std::size_t e = 0; e < problem.experiments.size(); ++e) {
    for (std::size_t s = 0; s < problem.experiments[e].series.size(); ++s) {
      for (std::size_t d = 0; d < problem.experiments[e].series[s].data.size(); ++d, ++i)
        residuals.push_back({e, s, d, shown[i], all.sd[i], -all.r[i]});
    }
  }
  return residuals;
}

}  // namespace gainsay::stats
