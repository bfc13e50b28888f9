#include "gainsay/estimation/workers.h"

#include <algorithm>
#include <condition_variable>
#include <exception>
#include <map>
#include <mutex>
#include <thread>
#include <vector>

namespace gainsay::estimation {
namespace {

/// How far work may run ahead of what is settled, for each thread: enough that one slow number
/// holds nobody up, little enough that a stop wastes little.
constexpr std::size_t kAheadForEachThread = 4;

/// The state that the threads share: which number is next to begin, and which next to settle.
class Queue {
 public:
  Queue(std::size_t count, std::size_t ahead) : count_(count), ahead_(ahead) {}

  /// The next number to work on; `count` when there is nothing left to begin.
  std::size_t begin() {
    std::unique_lock lock(mutex_);
    room_.wait(lock, [&] { return stopped_ || begun_ >= count_ || begun_ < settled_ + ahead_; });
    return stopped_ || begun_ >= count_ ? count_ : begun_++;
  }

  /// Takes the end of one number's work, and settles all that are next in line. Settling happens
  /// under the lock: one thread at a time, ascending.
  void end(std::size_t number, std::exception_ptr failure,
           const std::function<bool(std::size_t)>& settle) {
    const std::lock_guard lock(mutex_);
    ended_.emplace(number, std::move(failure));
    while (!stopped_ && !ended_.empty() && ended_.begin()->first == settled_) {
      settle_first(settle);
      ++settled_;
    }
    room_.notify_all();
  }

  std::exception_ptr failure() const { return failure_; }

 private:
  void settle_first(const std::function<bool(std::size_t)>& settle) {
    failure_ = ended_.extract(ended_.begin()).mapped();
    if (!failure_) {
      try {
        stopped_ = !settle(settled_);
      } catch (...) {
        failure_ = std::current_exception();
      }
    }
    stopped_ = stopped_ || failure_;
  }

  std::mutex mutex_;
  std::condition_variable room_;
  std::map<std::size_t, std::exception_ptr> ended_;  // worked, not yet settled
  std::exception_ptr failure_;
  std::size_t count_;
  std::size_t ahead_;
  std::size_t begun_ = 0;
  std::size_t settled_ = 0;
  bool stopped_ = false;
};

}  // namespace

void in_order(std::size_t count, unsigned threads,
              const std::function<void(std::size_t, unsigned)>& work,
              const std::function<bool(std::size_t)>& settle) {
  const unsigned workers = std::max(1u, threads);
  // A lone worker settles each number before it begins the next.
  Queue queue(count, workers == 1 ? 1 : workers * kAheadForEachThread);
  const auto run = [&](unsigned worker) {
    for (std::size_t number = queue.begin(); number < count; number = queue.begin()) {
      std::exception_ptr failure;
      try {
        work(number, worker);
      } catch (...) {
        failure = std::current_exception();
      }
      queue.end(number, failure, settle);
    }
  };
  {
    std::vector<std::jthread> others;
    for (unsigned worker = 1; worker < workers; ++worker) others.emplace_back(run, worker);
    run(0);
  }
  if (queue.failure()) std::rethrow_exception(queue.failure());
}

}  // namespace gainsay::estimation
