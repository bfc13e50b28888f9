#include "gainsay/cli/page_script.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

using ::testing::HasSubstr;
using ::testing::Not;

TEST(PageScript, IsSmallAndAsksNobody) {
  const std::string script(page_script());
  EXPECT_LT(script.size(), 6000U);
  for (const char* call : {"fetch(", "XMLHttpRequest", "eval(", "innerHTML", "import(", "http"}) {
    EXPECT_THAT(script, Not(HasSubstr(call)));
  }
}

TEST(PageScript, CannotEndItsElement) {
  EXPECT_EQ(page_script().find("</"), std::string_view::npos);
}

}  // namespace
}  // namespace gainsay::cli
