#pragma once

#include <array>
#include <string_view>

namespace gainsay::cli {

/// Paper, ink and the hues of the first six hypotheses, by daylight and in the dark. The hues were
/// chosen by their least distance in OKLab (Ottosson 2020) over normal sight and the three
/// dichromacies (Machado, Oliveira & Fernandes 2009), and by their contrast with the paper.
struct Palette {
  std::string_view paper;
  std::string_view ink;
  std::string_view grey;   ///< letters
  std::string_view hair;   ///< hairlines
  std::string_view faint;  ///< grid of pictures
  std::array<std::string_view, 6> hues;
};

/// Indigo, ochre, sky, oxblood, fir, mauve.
inline constexpr Palette kLight = {
    "#fbfaf7", "#22252a", "#6b6f74",
    "#d8d6cf", "#ebe9e3", {"#3d3b8b", "#b87018", "#2d95d3", "#5e2028", "#1f7a6b", "#a1709f"}};
inline constexpr Palette kDark = {
    "#16191c", "#e6e4df", "#9a9ea3",
    "#383c40", "#25292c", {"#7d82e0", "#f0c070", "#7cc4f0", "#d9787c", "#a6f2dc", "#a86494"}};

}  // namespace gainsay::cli
