#include "gainsay/estimation/weighing.h"

#include <algorithm>
#include <cmath>

namespace gainsay::estimation {

Weighed weigh(const Scatter& scatter, double shown, double observed, Aim aim) {
  double variance = scatter.constant + scatter.relative_squared * shown * shown;
  double dvariance = 2.0 * scatter.relative_squared * shown;
  if (variance < scatter.floor) {
    variance = scatter.floor;
    dvariance = 0.0;
  }
  Weighed weighed;
  weighed.sd = std::sqrt(variance);
  const double r = (shown - observed) / weighed.sd;
  const double dsd = dvariance / (2.0 * weighed.sd);
  weighed.r = r;
  weighed.objective = r * r;
  if (aim == Aim::Misfit) {
    const double dr = 1.0 - r * dsd;
    weighed.slope = r * dr;
    weighed.curvature = dr * dr;
  } else {
    const double least = std::max(scatter.constant, scatter.floor);
    weighed.objective += scatter.relative_squared > 0.0 ? std::log(variance / least) : 0.0;
    weighed.slope = r + dsd * (1.0 - r * r);
    weighed.curvature = 1.0 + 2.0 * dsd * dsd;
  }
  return weighed;
}

double NoiseGroup::variance() const {
  return floor * floor + sum_squares / static_cast<double>(count);
}

double NoiseGroup::objective() const {
  const double number = static_cast<double>(count);
  return number * std::log1p(sum_squares / (number * floor * floor));
}

}  // namespace gainsay::estimation
