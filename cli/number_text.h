#pragma once

#include <cstddef>
#include <string>

namespace gainsay::cli {

/// Numbers as pages print them, independent of the locale: a minus sign, not a hyphen; powers of
/// ten for what is below 0.001 or from 1,000,000 on; an en dash for what was not computed.
std::string significant(double value, int digits);

/// The same without zeros at the end: for labels and for numbers that somebody wrote.
std::string short_number(double value, int digits);

/// With so many digits after the point.
std::string fixed(double value, int decimals);

/// A P value: two significant digits; "below 10^-300" (raised) where it is 0 in double precision.
std::string p_text(double p_value);

/// Words with their powers of ten set as on pages: "P = 2.7e-12" has a raised -12.
std::string with_raised_powers(const std::string& words);

/// "12 %" with a thin space; one decimal below 10 %.
std::string percent_text(double share);

/// Whole numbers in words up to twelve, else in figures.
std::string count_words(std::size_t count);

/// "four experiments", "1 experiment" in words, with the plural where it is due.
std::string counted(std::size_t count, const std::string& one, const std::string& many);

/// First letter as a capital (ASCII).
std::string capitalized(std::string words);

/// Coordinates of pictures: two decimals at most, no trailing zeros.
std::string coordinate(double value);

/// A share of a length as SVG takes it: 0.25 is "25%".
std::string share_text(double share);

}  // namespace gainsay::cli
