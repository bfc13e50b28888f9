#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/readout.h"
#include "gainsay/estimation/unknown.h"

#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::estimation {

/// Names of a readout's scale and offset in one experiment where they are unknowns: `scale.glow`,
/// `offset.glow[run-03]`; none where they are numbers.
std::optional<std::string> scale_name(const Readout& readout, std::string_view experiment);
std::optional<std::string> offset_name(const Readout& readout, std::string_view experiment);

/// scale * shows + offset, the two as numbers or as symbols of the names above. Methods (6).
core::Expression measurement(const Readout& readout, const core::Expression& shows,
                             std::string_view experiment);

/// The largest |value| among the fitted points of a readout; 1 if all are 0 or there are none.
double largest_reading(const Readout& readout, std::span<const Experiment> experiments);

/// The unknown scales and offsets of all readouts, in order of readouts, then experiments, in their
/// default ranges. With m the largest |value| of the readout: scale 1e-6 m to 1e6 m, logarithmic
/// (signed: -1e6 m to 1e6 m, linear); offset -10 m to 10 m, linear.
std::vector<Unknown> measurement_unknowns(std::span<const Readout> readouts,
                                          std::span<const Experiment> experiments);

}  // namespace gainsay::estimation
