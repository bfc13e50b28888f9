#pragma once

#include "gainsay/cli/console.h"

#include <chrono>
#include <cstddef>
#include <string>

namespace gainsay::cli {

/// One line on a terminal that says what is being done, how far it is, and about how long it still
/// takes; silent in a pipe.
class Progress {
 public:
  explicit Progress(const Console& console);
  ~Progress();  ///< wipes the line
  Progress(const Progress&) = delete;
  Progress& operator=(const Progress&) = delete;

  void begin(const std::string& what, std::size_t number, std::size_t of);
  void update(std::size_t done, std::size_t expected, double best_misfit);
  void clear();

 private:
  const Console& console_;
  std::string what_;
  std::size_t number_ = 0;
  std::size_t of_ = 1;
  std::chrono::steady_clock::time_point begun_;
  std::chrono::steady_clock::time_point shown_;
};

/// "12 s", "3 min", "2 h": a time left in words, rounded up to one unit.
std::string time_left(double seconds);

}  // namespace gainsay::cli
