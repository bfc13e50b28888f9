#include "gainsay/cli/page_style.h"

#include "gainsay/cli/hues.h"
#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <string>

namespace gainsay::cli {
namespace {

using gainsay::testing::JudgementFixture;
using ::testing::HasSubstr;
using ::testing::Not;

using Triple = std::array<double, 3>;
using Matrix = std::array<Triple, 3>;

Triple times(const Matrix& matrix, const Triple& v) {
  Triple out{};
  for (std::size_t i = 0; i < 3; ++i) {
    for (std::size_t j = 0; j < 3; ++j) out[i] += matrix[i][j] * v[j];
  }
  return out;
}

/// Linear light of a colour "#rrggbb" (IEC 61966-2-1).
Triple linear_light(std::string_view hex) {
  Triple out{};
  for (std::size_t i = 0; i < 3; ++i) {
    const double c = std::stoi(std::string(hex.substr(1 + 2 * i, 2)), nullptr, 16) / 255.0;
    out[i] = c <= 0.04045 ? c / 12.92 : std::pow((c + 0.055) / 1.055, 2.4);
  }
  return out;
}

/// OKLab of linear light: Ottosson (2020), "A perceptual color space for image processing".
Triple oklab(const Triple& light) {
  constexpr Matrix kToCones = {{{0.4122214708, 0.5363325363, 0.0514459929},
                                {0.2119034982, 0.6806995451, 0.1073969566},
                                {0.0883024619, 0.2817188376, 0.6299787005}}};
  constexpr Matrix kToLab = {{{0.2104542553, 0.7936177850, -0.0040720468},
                              {1.9779984951, -2.4285922050, 0.4505937099},
                              {0.0259040371, 0.7827717662, -0.8086757660}}};
  Triple cones = times(kToCones, light);
  for (double& cone : cones) cone = std::cbrt(cone);
  return times(kToLab, cones);
}

/// Normal sight, then protanopia, deuteranopia and tritanopia: Machado, Oliveira & Fernandes
/// (2009), table of severity 1.0, on linear light.
constexpr std::array<Matrix, 4> kSights = {{{{{1, 0, 0}, {0, 1, 0}, {0, 0, 1}}},
                                            {{{0.152286, 1.052583, -0.204868},
                                              {0.114503, 0.786281, 0.099216},
                                              {-0.003882, -0.048116, 1.051998}}},
                                            {{{0.367322, 0.860646, -0.227968},
                                              {0.280085, 0.672501, 0.047413},
                                              {-0.011820, 0.042940, 0.968881}}},
                                            {{{1.255528, -0.076749, -0.178779},
                                              {-0.078411, 0.930809, 0.147602},
                                              {0.004733, 0.691367, 0.303900}}}}};

Triple seen(std::string_view hex, const Matrix& sight) {
  Triple light = times(sight, linear_light(hex));
  for (double& c : light) c = std::clamp(c, 0.0, 1.0);
  return oklab(light);
}

double least_distance(const Palette& palette, std::size_t count) {
  double least = 1.0;
  for (const Matrix& sight : kSights) {
    for (std::size_t i = 0; i < count; ++i) {
      for (std::size_t j = 0; j < i; ++j) {
        const Triple a = seen(palette.hues[i], sight);
        const Triple b = seen(palette.hues[j], sight);
        least = std::min(least, std::hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]));
      }
    }
  }
  return least;
}

double luminance(std::string_view hex) {
  const Triple light = linear_light(hex);
  return 0.2126 * light[0] + 0.7152 * light[1] + 0.0722 * light[2];
}

/// Contrast ratio of WCAG 2.2.
double contrast(std::string_view a, std::string_view b) {
  const double brighter = std::max(luminance(a), luminance(b));
  const double darker = std::min(luminance(a), luminance(b));
  return (brighter + 0.05) / (darker + 0.05);
}

TEST(Hues, StayApartForEverySight) {
  EXPECT_GE(least_distance(kLight, 4), 0.168);
  EXPECT_GE(least_distance(kLight, 6), 0.079);
  EXPECT_GE(least_distance(kDark, 4), 0.158);
  EXPECT_GE(least_distance(kDark, 6), 0.099);
}

// WCAG 2.2: 3:1 for what is drawn (1.4.11), 4.5:1 for letters (1.4.3).
TEST(Hues, StandOutFromThePaper) {
  for (const Palette& palette : {kLight, kDark}) {
    for (const std::string_view hue : palette.hues)
      EXPECT_GE(contrast(hue, palette.paper), 3.0) << hue;
    EXPECT_GE(contrast(palette.grey, palette.paper), 4.5);
    EXPECT_GE(contrast(palette.ink, palette.paper), 7.0);
  }
}

std::string style_of_three() {
  JudgementFixture fixture;
  const Judgement judgement = fixture.three();
  return page_style(Page(judgement));
}

TEST(PageStyle, ShowsAHypothesisWhereItsBoxIsTicked) {
  EXPECT_THAT(style_of_three(), HasSubstr("body:not(:has(#tick-A:checked)) .of-A{display:none}"));
}

TEST(PageStyle, FetchesNothing) {
  const std::string style = style_of_three();
  EXPECT_THAT(style, Not(HasSubstr("@import")));
  EXPECT_THAT(style, Not(HasSubstr("http")));
  std::size_t at = 0;
  while ((at = style.find("url(", at)) != std::string::npos) {
    EXPECT_EQ(style.substr(at, 10), "url(\"data:");
    at += 4;
  }
}

TEST(PageStyle, KeepsNarrowRulesOffPaper) {
  const std::string style = style_of_three();
  EXPECT_THAT(style, Not(HasSubstr("@media (max-width")));
  EXPECT_THAT(style, HasSubstr("@media screen and (max-width:600px)"));
}

TEST(PageStyle, FooterOnPaperHasStudyLookFingerprintAndPage) {
  const std::string style = style_of_three();
  EXPECT_THAT(style, HasSubstr("this look alone"));
  EXPECT_THAT(style, HasSubstr("\"aaaaaaaaaaaa\""));
  EXPECT_THAT(style, HasSubstr("counter(page) \" of \" counter(pages)"));
}

TEST(PageStyle, ATitleCannotEndTheStyleSheet) {
  const Judgement judgement = JudgementFixture::named_throughout("</style>\"");
  EXPECT_EQ(page_style(Page(judgement)).find('<'), std::string::npos);
}

}  // namespace
}  // namespace gainsay::cli
