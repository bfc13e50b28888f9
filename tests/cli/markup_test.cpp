#include "gainsay/cli/markup.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

TEST(Markup, EscapesWhatCouldEndATextOrAnAttribute) {
  EXPECT_EQ(text("<b> & \"x\" 'y'").str(), "&lt;b&gt; &amp; &quot;x&quot; &#39;y&#39;");
  EXPECT_EQ(tag("a", {{"title", "\"><script>"}}, {}).str(),
            "<a title=\"&quot;&gt;&lt;script&gt;\"></a>");
}

TEST(Markup, LeavesControlCharactersOutAndOtherLettersAlone) {
  EXPECT_EQ(text("a\x01\x7f\nb µ").str(), "a\nb µ");
}

TEST(Markup, NestsAndJoins) {
  const Markup cells = tag("td", text("1")) + tag("td", text("2"));
  EXPECT_EQ(tag("tr", cells).str(), "<tr><td>1</td><td>2</td></tr>");
  EXPECT_EQ(void_tag("input", {{"type", "checkbox"}}).str(), "<input type=\"checkbox\">");
}

TEST(JsonForScript, HoldsNoTag) {
  EXPECT_EQ(json_for_script(R"({"a":"</script>"})"), R"({"a":"\u003c/script>"})");
}

TEST(CssString, EscapesWhatCouldEndAStringOrTheStyleSheet) {
  EXPECT_EQ(css_string("a \"</style>\\"), R"("a \22 \3c \2f style\3e \5c ")");
}

}  // namespace
}  // namespace gainsay::cli
