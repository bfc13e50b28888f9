#pragma once

#include <string_view>

namespace gainsay::cli {

/// The family name of the mathematical font that reports carry: a part of STIX Math, renamed; its
/// licence stands in math_font.LICENSE.
inline constexpr std::string_view kMathFamily = "Gainsay Math";

/// The font itself: WOFF2 in base64.
std::string_view math_font();

}  // namespace gainsay::cli
