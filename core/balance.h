#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/hypothesis.h"

#include <cstddef>
#include <vector>

namespace gainsay::core {

/// How many of a species one turn of a reaction makes (+) or uses (-): products minus reactants.
/// Exactly 0 for what stands on both sides alike.
double stoichiometric_coefficient(const Reaction& reaction, std::size_t species);

/// dy/dt of every species with reactions and compartments by name, as an author would write it:
/// `hydration - hydrolysis`, what makes it first. Methods (1)-(3), with F_j the flow of reaction j
/// [amount/time], v_j its rate [concentration/time], V the volume of the species' compartment:
///   concentration: sum nu_ij v_j + (1/V) sum nu_ij F_j,
///   amount:        V sum nu_ij v_j + sum nu_ij F_j,
///   held:          0.
/// A volume that is the number 1 is not written.
std::vector<Expression> balance_by_name(const Hypothesis& hypothesis);

/// The same in species, unknowns, knowns, inputs and t alone: compartments, reactions and
/// definitions written out.
std::vector<Expression> balance(const Hypothesis& hypothesis);

}  // namespace gainsay::core
