#pragma once

#include "gainsay/core/schedule.h"
#include "gainsay/estimation/experiment.h"

#include <cstddef>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace gainsay::estimation {

/// The course of an input in an experiment, or null where the experiment does not give it.
const InputCourse* find_course(const Experiment& experiment, std::string_view input);

/// The value of an input at a time: that of the last step at or before it. Requires such a step.
double value_at(const InputCourse& course, double time);

/// Whether an input keeps the value it has at `begins`.
bool is_constant(const InputCourse& course, double begins);

/// The course of an experiment in time: `inputs` by name, in the order in which events number them;
/// `jumps` as (time, number), in that order at equal times; `outputs` in any order, with doubles. A
/// step that changes nothing is no event.
core::Schedule schedule(const Experiment& experiment, const std::vector<std::string>& inputs,
                        const std::vector<std::pair<double, std::size_t>>& jumps,
                        std::vector<double> outputs);

}  // namespace gainsay::estimation
