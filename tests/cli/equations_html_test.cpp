#include "gainsay/cli/equations.h"
#include "gainsay/testing/fed_batch.h"

#include <gmock/gmock.h>

#include <stack>

namespace gainsay::cli {
namespace {

using testing::fed_batch;
using testing::fed_batch_form;
using ::testing::HasSubstr;
using ::testing::Not;

/// Tags that are closed in another order than they were opened, or not at all.
std::string first_mismatch(const std::string& html) {
  std::stack<std::string> open;
  for (std::size_t at = html.find('<'); at != std::string::npos; at = html.find('<', at + 1)) {
    const std::string tag = html.substr(at + 1, html.find_first_of(" >", at) - at - 1);
    if (tag == "meta" || tag == "mspace" || tag.front() == '!') continue;
    if (tag.front() != '/') {
      open.push(tag);
    } else if (open.empty() || open.top() != tag.substr(1)) {
      return tag;
    } else {
      open.pop();
    }
  }
  return open.empty() ? "" : open.top();
}

TEST(EquationsHtml, IsMathMLThatIsWellFormed) {
  const std::string html = equations_html(fed_batch_form()).str();
  EXPECT_EQ(first_mismatch(html), "");
  EXPECT_THAT(html, HasSubstr("<mspace width=\"0.12em\"/><mi>S</mi></mrow><mrow>"));
  EXPECT_THAT(html, HasSubstr("2 S → R*"));
  EXPECT_THAT(html, HasSubstr("R* ⇌ 2 S"));
  EXPECT_THAT(html, HasSubstr("<h4>Kinetic unknowns</h4>"));
  EXPECT_THAT(html, HasSubstr("<mi>R*</mi>"));
}

TEST(EquationsHtml, StandsUnderAPolicyWithoutStylesOfItsOwn) {
  const std::string html = equations_html(fed_batch_form()).str();
  EXPECT_THAT(html, Not(HasSubstr(" style=")));
  EXPECT_THAT(html, Not(HasSubstr("<style")));
  EXPECT_THAT(html, Not(HasSubstr("<mtable"))) << "lines are aligned by width: engines differ";
}

TEST(EquationsHtml, HostileNamesAreText) {
  Study study = fed_batch();
  study.hypotheses[0].mechanism.title = "<script>alert(1)</script>";
  study.hypotheses[0].mechanism.species[1].shown_as = "\"><img>";
  study.experiments[0].name = "<b>'";
  const std::string page = equations_html_page({fed_batch_form(study)}, study.title);
  EXPECT_EQ(first_mismatch(page), "");
  for (const char* tag : {"<script", "<img", "<b>", "<slow>"})
    EXPECT_THAT(page, Not(HasSubstr(tag)));
  EXPECT_THAT(page, HasSubstr("&lt;script&gt;"));
}

TEST(EquationsHtml, ThePageStandsAlone) {
  const std::string page = equations_html_page({fed_batch_form()}, "Study");
  EXPECT_THAT(page, ::testing::StartsWith("<!doctype html>\n<html lang=\"en\">"));
  EXPECT_THAT(page, HasSubstr("<title>Study</title>"));
  EXPECT_THAT(page, Not(HasSubstr("http")));
}

}  // namespace
}  // namespace gainsay::cli
