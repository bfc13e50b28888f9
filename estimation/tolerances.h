#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/hypothesis.h"
#include "gainsay/core/system.h"
#include "gainsay/estimation/unknown.h"

#include <optional>
#include <span>
#include <string>
#include <vector>

namespace gainsay::estimation {

/// What a species' symbol stands for; sizes of one say nothing about the other.
enum class Kind { Concentration, Amount };
Kind kind_of(const core::Species& species);

/// The kind that `shows` (written out, knowns as numbers) is of: a species, or a sum of species of
/// one kind with numbers as factors; none for anything else.
std::optional<Kind> kind_shown(const core::Expression& shows, const core::Hypothesis& hypothesis);

/// A reading in the unit of a kind: what the instrument showed, scale and offset taken off.
struct Reading {
  Kind kind = Kind::Concentration;
  double size = 0.0;
};

/// Where an unknown may be expected before anything is fitted: its prior, else its first guess,
/// else the middle of its range (geometric where it is searched in its logarithm).
double expected_value(const Unknown& unknown);

/// The absolute tolerance of each state: the species' own `negligible`, else `negligible` times the
/// largest start, addition or reading of its kind (1 if there is none but 0). Unknowns in starts
/// and additions are taken at their expected values. Methods (9).
std::vector<double> absolute_tolerances(const core::Hypothesis& hypothesis,
                                        const core::System& system,
                                        std::span<const Unknown> unknowns,
                                        std::span<const Reading> readings, double negligible);

}  // namespace gainsay::estimation
