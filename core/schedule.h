#pragma once

#include <cstddef>
#include <utility>
#include <vector>

namespace gainsay::core {

/// What happens at one time: inputs take new values, then states jump. Several events at one time
/// are one Event.
struct Event {
  double time = 0.0;
  std::vector<std::pair<std::size_t, double>> settings;  ///< (input number, its value from now on)
  std::vector<std::size_t> jumps;                        ///< numbers of System::jumps
};

/// The course of one experiment in time. Outputs at the time of an event show the state just before
/// it.
struct Schedule {
  double begins = 0.0;
  std::vector<double> inputs;   ///< value of each input at the beginning
  std::vector<Event> events;    ///< ascending in time, none before `begins`
  std::vector<double> outputs;  ///< ascending, distinct, none before `begins`
};

}  // namespace gainsay::core
