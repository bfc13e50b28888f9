#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/estimation/noise.h"

#include <string>

namespace gainsay::estimation {

/// A scale or an offset: a number, one unknown for all experiments, or one for each.
struct Coefficient {
  enum class Kind { Fixed, Unknown, PerExperiment };
  Kind kind = Kind::Fixed;
  double value = 1.0;  ///< where fixed
  bool operator==(const Coefficient&) const = default;
};

/// What an instrument shows: scale * shows + offset.
struct Readout {
  std::string name;
  std::string title;  ///< shown on pages; the name if not said
  std::string unit;   ///< for labels of axes; may be empty
  core::Expression
      shows;  ///< of species, reactions, definitions, compartments, knowns, unknowns, inputs, t
  Coefficient scale{Coefficient::Kind::Fixed, 1.0};
  Coefficient offset{Coefficient::Kind::Fixed, 0.0};
  bool is_signed = false;  ///< an unknown scale may be negative
  Noise noise;
  bool logarithmic_axis = false;
};

}  // namespace gainsay::estimation
