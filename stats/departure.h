#pragma once

#include <cstddef>

namespace gainsay::stats {

/// How large a departure the test of V catches nine times in ten: the least L with
/// P(chi-square(freedom, noncentrality L) > limit) = 0.9. Methods (67). 0 where even no departure
/// passes the limit that often.
double least_noncentrality(double limit, double freedom);

/// The same said of the data: sqrt(L / N), 'all N points off by so many sd'.
double departure_in_sds(double limit, double freedom, std::size_t N);

}  // namespace gainsay::stats
