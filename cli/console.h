#pragma once

#include <ostream>

namespace gainsay::cli {

/// Where a command writes: results to `out`, messages to `messages`; what it may assume of both.
struct Console {
  std::ostream& out;
  std::ostream& messages;
  bool out_is_terminal = false;
  bool messages_are_terminal = false;
  bool colour = false;  ///< terminal, and NO_COLOR is not set
};

/// Exit statuses of every command.
inline constexpr int kDone = 0;
inline constexpr int kWrongInput = 2;   ///< study or command line wrong, nothing was written
inline constexpr int kInterrupted = 3;  ///< what was finished is kept

}  // namespace gainsay::cli
