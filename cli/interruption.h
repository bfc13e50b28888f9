#pragma once

#include <atomic>
#include <stop_token>
#include <thread>

namespace gainsay::cli {

/// While it lives, Ctrl-C and SIGTERM ask for a stop through token() instead of ending the process;
/// a second one ends it at once. To be made before any other thread, since threads inherit which
/// signals they leave alone.
class Interruption {
 public:
  Interruption();
  ~Interruption();
  Interruption(const Interruption&) = delete;
  Interruption& operator=(const Interruption&) = delete;

  std::stop_token token() const { return source_.get_token(); }
  bool happened() const { return source_.stop_requested(); }

 private:
  void wait();
  std::stop_source source_;
  std::atomic<bool> over_ = false;
  std::thread waiter_;
};

}  // namespace gainsay::cli
