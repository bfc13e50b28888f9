#include "gainsay/estimation/course.h"

#include "gainsay/core/require.h"

#include <algorithm>
#include <map>

namespace gainsay::estimation {

const InputCourse* find_course(const Experiment& experiment, std::string_view input) {
  const auto found = std::find_if(experiment.inputs.begin(), experiment.inputs.end(),
                                  [&](const InputCourse& course) { return course.input == input; });
  return found == experiment.inputs.end() ? nullptr : &*found;
}

double value_at(const InputCourse& course, double time) {
  const auto next =
      std::upper_bound(course.steps.begin(), course.steps.end(), time,
                       [](double moment, const auto& step) { return moment < step.first; });
  GAINSAY_REQUIRE(next != course.steps.begin(),
                  "the first step of input '" + course.input + "' is at or before the time asked");
  return std::prev(next)->second;
}

bool is_constant(const InputCourse& course, double begins) {
  const double first = value_at(course, begins);
  return std::all_of(course.steps.begin(), course.steps.end(), [&](const auto& step) {
    return step.first <= begins || step.second == first;
  });
}

core::Schedule schedule(const Experiment& experiment, const std::vector<std::string>& inputs,
                        const std::vector<std::pair<double, std::size_t>>& jumps,
                        std::vector<double> outputs) {
  core::Schedule schedule;
  schedule.begins = experiment.begins;
  std::map<double, core::Event> events;
  for (std::size_t i = 0; i < inputs.size(); ++i) {
    const InputCourse* course = find_course(experiment, inputs[i]);
    GAINSAY_REQUIRE(course, "the experiment gives the input '" + inputs[i] + "'");
    double now = value_at(*course, experiment.begins);
    schedule.inputs.push_back(now);
    for (const auto& [time, value] : course->steps) {
      if (time <= experiment.begins || value == now) continue;
      events[time].settings.emplace_back(i, value);
      now = value;
    }
  }
  for (const auto& [time, number] : jumps) events[time].jumps.push_back(number);
  for (auto& [time, event] : events) {
    event.time = time;
    schedule.events.push_back(std::move(event));
  }
  std::sort(outputs.begin(), outputs.end());
  outputs.erase(std::unique(outputs.begin(), outputs.end()), outputs.end());
  schedule.outputs = std::move(outputs);
  return schedule;
}

}  // namespace gainsay::estimation
