#include "gainsay/cli/fitted_series.h"

#include <algorithm>
#include <cmath>

namespace gainsay::cli {
namespace {

const estimation::Curve* find_curve(const Outcome& outcome, const std::string& experiment,
                                    const std::string& readout) {
  for (const estimation::Curve& curve : outcome.curves) {
    if (curve.experiment == experiment && curve.readout == readout) return &curve;
  }
  return nullptr;
}

/// Residuals carry numbers of the problem; the problem's data know which reading they are.
std::map<std::size_t, stats::StandardResidual> residuals_of(const Outcome& outcome,
                                                            const std::string& experiment,
                                                            const std::string& readout) {
  std::map<std::size_t, stats::StandardResidual> found;
  if (outcome.problem == nullptr) return found;
  for (const stats::StandardResidual& residual : outcome.judged.verdict.residuals) {
    const estimation::FittedExperiment& fitted =
        outcome.problem->experiments.at(residual.experiment);
    const estimation::FittedSeries& series = fitted.series.at(residual.series);
    if (fitted.name != experiment || series.readout != readout) continue;
    found.emplace(series.data.at(residual.datum).point, residual);
  }
  return found;
}

SeriesPicture picture_of(const Page& page, std::size_t readout, std::size_t experiment,
                         const estimation::Series& series) {
  SeriesPicture picture;
  picture.readout = readout;
  picture.experiment = experiment;
  const std::string& run = page.study().experiments[experiment].name;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    picture.fits.push_back({&contender, find_curve(*contender.outcome, run, series.readout),
                            residuals_of(*contender.outcome, run, series.readout)});
  }
  for (std::size_t i = 0; i < series.points.size(); ++i) {
    const estimation::Point& point = series.points[i];
    Reading reading{point.time, point.value, point.sd, point.left_out};
    for (const FitOfSeries& fit : picture.fits) {
      const auto residual = fit.residuals.find(i);
      if (std::isfinite(reading.sd) || residual == fit.residuals.end()) continue;
      reading.sd = residual->second.sd;
    }
    picture.readings.push_back(std::move(reading));
  }
  return picture;
}

}  // namespace

std::vector<SeriesPicture> series_pictures(const Page& page) {
  std::vector<SeriesPicture> pictures;
  const Study& study = page.study();
  for (std::size_t r = 0; r < study.readouts.size(); ++r) {
    for (std::size_t e = 0; e < study.experiments.size(); ++e) {
      for (const estimation::Series& series : study.experiments[e].series) {
        if (series.readout != study.readouts[r].name || series.points.empty()) continue;
        pictures.push_back(picture_of(page, r, e, series));
      }
    }
  }
  return pictures;
}

std::string panel_id(const SeriesPicture& picture) {
  return "p" + std::to_string(picture.readout) + "-" + std::to_string(picture.experiment);
}

std::string title_of(const estimation::Readout& readout) {
  return readout.title.empty() ? readout.name : readout.title;
}

std::string title_of(const estimation::Experiment& experiment) {
  return experiment.title.empty() ? experiment.name : experiment.title;
}

}  // namespace gainsay::cli
