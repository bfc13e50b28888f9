#pragma once

#include <cstddef>
#include <string>

namespace gainsay::cli {

/// The letter of hypothesis number n, counted from 0: A, B, ... Z, AA, AB, ...
std::string letter_of(std::size_t n);

}  // namespace gainsay::cli
