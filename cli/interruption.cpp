#include "gainsay/cli/interruption.h"

#include <signal.h>
#include <unistd.h>

#include <ctime>

namespace gainsay::cli {
namespace {

sigset_t stop_signals() {
  sigset_t signals;
  sigemptyset(&signals);
  sigaddset(&signals, SIGINT);
  sigaddset(&signals, SIGTERM);
  return signals;
}

}  // namespace

Interruption::Interruption() {
  const sigset_t signals = stop_signals();
  pthread_sigmask(SIG_BLOCK, &signals, nullptr);
  waiter_ = std::thread([this] { wait(); });
}

Interruption::~Interruption() {
  over_ = true;
  waiter_.join();
  const sigset_t signals = stop_signals();
  pthread_sigmask(SIG_UNBLOCK, &signals, nullptr);
}

void Interruption::wait() {
  const sigset_t signals = stop_signals();
  const timespec a_while{.tv_sec = 0, .tv_nsec = 50'000'000};
  while (!over_) {
    const int signal = sigtimedwait(&signals, nullptr, &a_while);
    if (signal < 0) continue;
    if (source_.stop_requested()) _exit(128 + signal);
    source_.request_stop();
  }
}

}  // namespace gainsay::cli
