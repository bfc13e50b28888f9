#include "gainsay/estimation/workers.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <algorithm>
#include <atomic>
#include <chrono>
#include <numeric>
#include <stdexcept>
#include <thread>
#include <vector>

namespace gainsay::estimation {
namespace {

std::vector<std::size_t> settled_numbers(std::size_t count, unsigned threads,
                                         std::size_t stop_after) {
  std::vector<std::size_t> settled;
  in_order(
      count, threads,
      [](std::size_t number, unsigned) {
        // Uneven work, so that arrival differs from order.
        if (number % 3 == 0) std::this_thread::sleep_for(std::chrono::microseconds(300));
      },
      [&](std::size_t number) {
        settled.push_back(number);
        return settled.size() < stop_after;
      });
  return settled;
}

TEST(InOrder, SettlesEveryNumberAscending) {
  std::vector<std::size_t> all(100);
  std::iota(all.begin(), all.end(), 0);
  for (const unsigned threads : {0u, 1u, 2u, 5u})
    EXPECT_EQ(settled_numbers(100, threads, 1000), all);
}

TEST(InOrder, StopsWhereSettlingSaysSo) {
  for (const unsigned threads : {1u, 2u, 5u}) {
    EXPECT_THAT(settled_numbers(100, threads, 4), testing::ElementsAre(0, 1, 2, 3));
  }
}

TEST(InOrder, DoesNothingForNothing) { EXPECT_TRUE(settled_numbers(0, 3, 10).empty()); }

TEST(InOrder, ALoneWorkerBeginsNothingBeyondTheStop) {
  std::size_t begun = 0;
  in_order(
      50, 1, [&](std::size_t, unsigned) { ++begun; },
      [](std::size_t number) { return number < 2; });
  EXPECT_EQ(begun, 3u);
}

TEST(InOrder, RunsAheadOnlyALittle) {
  std::atomic<std::size_t> largest_begun = 0;
  std::atomic<std::size_t> settled = 0;
  std::atomic<std::size_t> largest_lead = 0;
  in_order(
      300, 3,
      [&](std::size_t number, unsigned) {
        if (number == 0) std::this_thread::sleep_for(std::chrono::milliseconds(20));
        largest_begun = std::max<std::size_t>(largest_begun, number);
        largest_lead = std::max<std::size_t>(largest_lead, number - settled);
      },
      [&](std::size_t number) {
        settled = number + 1;
        return true;
      });
  EXPECT_LE(largest_lead, 12u);
  EXPECT_EQ(largest_begun, 299u);
}

TEST(InOrder, NamesWorkersBelowTheNumberOfThreads) {
  std::atomic<bool> legal = true;
  in_order(
      60, 4, [&](std::size_t, unsigned worker) { legal = legal && worker < 4; },
      [](std::size_t) { return true; });
  EXPECT_TRUE(legal);
}

TEST(InOrder, RethrowsTheFailureThatIsFirstInOrder) {
  for (const unsigned threads : {1u, 4u}) {
    std::size_t settled = 0;
    const auto run = [&] {
      in_order(
          40, threads,
          [](std::size_t number, unsigned) {
            if (number == 7) std::this_thread::sleep_for(std::chrono::milliseconds(5));
            if (number == 7) throw std::runtime_error("seven");
            if (number == 9) throw std::runtime_error("nine");
          },
          [&](std::size_t) {
            ++settled;
            return true;
          });
    };
    try {
      run();
      ADD_FAILURE() << "no exception came through";
    } catch (const std::runtime_error& error) {
      EXPECT_STREQ(error.what(), "seven");
    }
    EXPECT_EQ(settled, 7u);
  }
}

TEST(InOrder, RethrowsWhatSettlingThrows) {
  EXPECT_THROW(in_order(
                   10, 2, [](std::size_t, unsigned) {},
                   [](std::size_t number) -> bool {
                     if (number == 3) throw std::runtime_error("three");
                     return true;
                   }),
               std::runtime_error);
}

}  // namespace
}  // namespace gainsay::estimation
