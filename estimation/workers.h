#pragma once

#include <cstddef>
#include <functional>

namespace gainsay::estimation {

/// Runs work(number, worker) for number = 0, 1, ... on `threads` threads and hands results on in
/// order of number, never of arrival: settle(number) is called by one thread at a time, ascending;
/// false from it stops the rest. Work that was begun beyond the stopping number is discarded by the
/// caller (its settle is never called); it runs at most a few numbers ahead. An exception of
/// work(number) is rethrown when the turn of that number comes, so it too is the same on any number
/// of threads; one of settle at once.
void in_order(std::size_t count, unsigned threads,
              const std::function<void(std::size_t number, unsigned worker)>& work,
              const std::function<bool(std::size_t number)>& settle);

}  // namespace gainsay::estimation
