#include "gainsay/cli/math_font.h"

#include <gtest/gtest.h>

#include <fstream>
#include <string>

namespace gainsay::cli {
namespace {

// "wOF2" in base64: the signature of W3C's WOFF File Format 2.0, and 4 letters for each 3 bytes.
TEST(MathFont, IsWoff2InBase64) {
  EXPECT_EQ(math_font().substr(0, 5), "d09GM");
  EXPECT_EQ(math_font().size() % 4, 0U);
}

TEST(MathFont, HasItsLicenceBesideIt) {
  std::ifstream file(GAINSAY_SOURCE_DIR "/cli/math_font.LICENSE");
  const std::string licence{std::istreambuf_iterator<char>(file), {}};
  EXPECT_NE(licence.find("SIL OPEN FONT LICENSE Version 1.1"), std::string::npos);
  EXPECT_NE(licence.find(kMathFamily), std::string::npos);
}

}  // namespace
}  // namespace gainsay::cli
