#include "gainsay/cli/report_html.h"

#include "gainsay/testing/chromium.h"
#include "gainsay/testing/judgement_fixture.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using gainsay::testing::Chromium;
using gainsay::testing::JudgementFixture;
using gainsay::testing::Visited;
using gainsay::testing::with_reader;
using gainsay::testing::without_scripts;
using ::testing::HasSubstr;
using ::testing::Not;

std::string page_of_three() {
  JudgementFixture fixture;
  return report_html(fixture.three());
}

std::string title_of(const Visited& visited) {
  const std::size_t begin = visited.dom.find("<title>") + 7;
  return visited.dom.substr(begin, visited.dom.find("</title>") - begin);
}

TEST(ReportHtml, IsEqualForEqualJudgements) { EXPECT_EQ(page_of_three(), page_of_three()); }

TEST(ReportHtml, HasItsSectionsInOrder) {
  const std::string html = page_of_three();
  std::size_t last = 0;
  for (const char* id : {"verdicts", "reasons", "undecided", "fits", "residuals", "mechanisms",
                         "equations", "unknowns", "search", "tables", "method"}) {
    const std::size_t at = html.find("<section id=\"" + std::string(id) + "\"");
    ASSERT_NE(at, std::string::npos) << id;
    EXPECT_GT(at, last) << id;
    last = at;
  }
}

TEST(ReportHtml, CarriesNoStyleAttributeAndNoAddress) {
  const std::string html = page_of_three();
  EXPECT_THAT(html, Not(HasSubstr(" style=")));
  for (const char* address : {" src=", " href=", "http://", "https://"}) {
    EXPECT_THAT(html, Not(HasSubstr(address)));
  }
}

TEST(ReportHtml, AllowsNothingButItsOwnStyleAndScript) {
  EXPECT_THAT(page_of_three(), HasSubstr("default-src &#39;none&#39;; style-src &#39;sha256-"));
  EXPECT_THAT(page_of_three(), Not(HasSubstr("unsafe")));
}

TEST(ReportHtml, ManagesAStudyOfOneWithoutAnyFit) {
  JudgementFixture fixture;
  fixture.add("nothing", stats::Decision::Undecided, stats::kNotComputed, 0.0);
  Outcome& outcome = fixture.judgement().outcomes[0];
  outcome.curves.clear();
  outcome.judged.search = {};
  outcome.judged.verdict.residuals.clear();
  outcome.judged.verdict.intervals.clear();
  EXPECT_THAT(report_html(fixture.judgement()),
              HasSubstr("The one mechanism judged is undecided."));
}

// Whatever the policy forbids, a request included, would be a message of the console.
TEST(ReportPage, OpensWithoutAnyMessage) {
  const Visited visited = Chromium().open(page_of_three());
  EXPECT_EQ(visited.status, 0);
  EXPECT_THAT(visited.log, Not(HasSubstr("CONSOLE")));
  EXPECT_THAT(visited.dom, HasSubstr("figure class=\"panel opens\""));  // the script ran
}

TEST(ReportPage, AnUnknownScriptIsRefusedAndSeen) {
  std::string html = page_of_three();
  html.insert(html.find("</body>"), "<script>document.title = \"caught\";</script>");
  const Visited visited = Chromium().open(html);
  EXPECT_THAT(visited.log, HasSubstr("CONSOLE"));
  EXPECT_NE(title_of(visited), "caught");
}

TEST(ReportPage, ShowsHostileNamesAsText) {
  const std::string name =
      "<script>document.title='caught'</script><img src=x onerror=\"document.title='caught'\">&\"'";
  const std::string look = R"js(
    const name = "<script>document.title='caught'</scr" + "ipt>" +
                 "<img src=x onerror=\"document.title='caught'\">&\"'";
    const caught = document.title === "caught";
    const places = {h1: ".study", name: ".verdicts .name", reason: ".reason", readout: "h3 b",
                    caption: "figcaption", species: "text.species", sentence: "dd p",
                    words: "td.words", unit: "text.x", file: ".numbers tbody th"};
    const missing = Object.keys(places).filter((place) =>
      ![...document.querySelectorAll(places[place])].some((e) => e.textContent.includes(name)));
    document.title = caught ? "it ran" : "missing:" + missing.join(" ");
  )js";
  const std::string html = report_html(JudgementFixture::named_throughout(name));
  const Visited visited = Chromium().open(with_reader(html, look));
  EXPECT_EQ(title_of(visited), "missing:");
  EXPECT_THAT(visited.log, Not(HasSubstr("CONSOLE")));
  EXPECT_THAT(html, Not(HasSubstr("<img")));
}

TEST(ReportPage, ShowsWhatIsTicked) {
  const std::string tick = R"js(
    const drawn = (letter) =>
      [...document.querySelectorAll(".curve.of-" + letter)].filter((e) => e.checkVisibility()).length;
    const before = drawn("A");
    document.getElementById("tick-A").click();
    document.getElementById("tick-B").click();
    document.title = before + " " + drawn("A") + " " + drawn("B") + " " + drawn("C");
  )js";
  EXPECT_EQ(title_of(Chromium().open(with_reader(page_of_three(), tick))), "0 4 0 4");
}

TEST(ReportPage, CanBeTickedWithoutItsScript) {
  const std::string plain = without_scripts(page_of_three());
  std::string ticked = plain;
  const std::string box = "id=\"tick-A\"";
  ticked.insert(ticked.find(box) + box.size(), " checked");
  // The boxes themselves lie outside the picture: what differs are the pictures below them.
  const auto panels = [](std::string html) {
    html.insert(html.find("</style>"),
                "header,#verdicts,#reasons,#undecided,.ticks{height:0;overflow:hidden;"
                "padding:0!important;border:0!important;margin:0}");
    const std::size_t policy = html.find("<meta http-equiv=");
    return html.erase(policy, html.find('>', policy) + 1 - policy);
  };
  const Chromium chromium;
  const std::string before = chromium.picture(panels(plain), 1000, 700);
  EXPECT_FALSE(before.empty());
  EXPECT_EQ(before, chromium.picture(panels(plain), 1000, 700));
  EXPECT_NE(before, chromium.picture(panels(ticked), 1000, 700));
}

TEST(ReportPage, OpensAPanelByEnterAndClosesIt) {
  const std::string press = R"js(
    const panel = document.getElementById("p0-1");
    panel.focus();
    const key = new KeyboardEvent("keydown", {key: "Enter", bubbles: true, cancelable: true});
    const prevented = !panel.dispatchEvent(key);
    const dialog = document.querySelector("dialog");
    const was = dialog.open && dialog.querySelectorAll("circle.reading").length === 8;
    dialog.querySelector("button").click();
    document.title = [document.activeElement === panel, prevented, was, dialog.open].join(" ");
  )js";
  EXPECT_EQ(title_of(Chromium().open(with_reader(page_of_three(), press))), "true true true false");
}

TEST(ReportPage, ReadsNumbersAtThePointer) {
  const std::string point = R"js(
    const circle = document.querySelectorAll("#p0-1 circle.reading")[3];
    circle.scrollIntoView();
    const box = circle.getBoundingClientRect();
    circle.dispatchEvent(new PointerEvent("pointermove",
      {clientX: box.x + 2, clientY: box.y + 2, bubbles: true}));
    const tip = document.querySelector(".reading-of");
    document.title = tip.hidden + " " + tip.textContent.split("\n")[0] + " " +
      /\nB  /.test(tip.textContent) + " " + /\nA  /.test(tip.textContent);
  )js";
  EXPECT_EQ(title_of(Chromium().open(with_reader(page_of_three(), point))),
            "false t 30.00 min true false");
}

TEST(ReportPage, ClipsNothingOnAPhone) {
  const std::string measure = R"js(
    document.title = String(document.documentElement.scrollWidth <= innerWidth);
  )js";
  std::string html = with_reader(page_of_three(), measure);
  // Headless windows are 500 pixels wide at least; a frame is as narrow as it is made.
  html =
      "<!doctype html><title>none</title><iframe width=390 height=800></iframe><script>"
      "const frame=document.querySelector('iframe');frame.onload=()=>{const "
      "d=frame.contentDocument;"
      "document.title='width '+(d.documentElement.scrollWidth<=390);};frame.srcdoc=" +
      [&] {
        std::string text = "\"";
        for (const char c : html) {
          if (c == '"' || c == '\\') text += '\\';
          if (c == '\n') {
            text += "\\n";
          } else if (c == '<') {
            text += "\\u003c";
          } else {
            text += c;
          }
        }
        return text + '"';
      }() +
      ";</script>";
  EXPECT_EQ(title_of(Chromium().open(html)), "width true");
}

TEST(ReportPage, PrintsOnPaper) {
  const std::string pdf = Chromium().paper(page_of_three());
  EXPECT_EQ(pdf.substr(0, 5), "%PDF-");
}

}  // namespace
}  // namespace gainsay::cli
