#include "gainsay/cli/report_html.h"

#include "gainsay/cli/figure_fits.h"
#include "gainsay/cli/figure_mechanism.h"
#include "gainsay/cli/figure_residuals.h"
#include "gainsay/cli/figure_search.h"
#include "gainsay/cli/figure_unknowns.h"
#include "gainsay/cli/figure_verdicts.h"
#include "gainsay/cli/page.h"
#include "gainsay/cli/page_script.h"
#include "gainsay/cli/page_style.h"
#include "gainsay/cli/report_sections.h"
#include "gainsay/cli/sha256.h"
#include "gainsay/cli/verdict_words.h"

#include <algorithm>

namespace gainsay::cli {
namespace {

/// Nothing is fetched, and only the style and the script that stand in the page are taken.
std::string policy(const std::string& style, const std::string& script) {
  return "default-src 'none'; style-src 'sha256-" + sha256_base64(style) +
         "'; script-src 'sha256-" + sha256_base64(script) +
         "'; font-src data:; base-uri 'none'; form-action 'none'";
}

Markup head(const Page& page, const std::string& style, const std::string& script) {
  const std::string title = verdict_sentence(page.judgement);
  return tag("head", void_tag("meta", {{"charset", "utf-8"}}) +
                         void_tag("meta", {{"http-equiv", "Content-Security-Policy"},
                                           {"content", policy(style, script)}}) +
                         void_tag("meta", {{"name", "viewport"},
                                           {"content", "width=device-width, initial-scale=1"}}) +
                         tag("title", text(page.study().title + ": " + title)) +
                         tag("style", Markup::raw(style))) +
         Markup::raw("\n");
}

Markup opening(const Page& page) {
  Markup content = tag("p", {{"class", "study"}}, text(page.study().title)) +
                   tag("h1", text(verdict_sentence(page.judgement)));
  for (const std::string& fact : facts(page.judgement)) {
    content += tag("p", {{"class", "fact"}}, text(fact));
  }
  content += tag("p", {{"class", "aside print-only"}}, text(caution()));
  return tag("header", content) + Markup::raw("\n");
}

Markup verdicts(const Page& page) {
  return section(
      {"verdicts", "Verdicts",
       paragraph("The bar runs from the limit that decides to the misfit; small ticks are the "
                 "other limits. Filled: not rejected. Open: rejected. Half filled: undecided."),
       figure_verdicts(page) +
           tag("p", {{"class", "statistics"}}, text(statisticians_line(page.judgement)))});
}

Markup pictures(const Page& page) {
  Markup all =
      section({"fits", "Data and fits",
               paragraph("Points are readings over time, with one standard deviation; crosses were "
                         "left out. Letters stand at the ends of the curves.") +
                   tag("p", {{"class", "screen-only"}},
                       text("Tick a hypothesis to lay it over the data; open a panel by a "
                            "tap, a click or Enter.")),
               tick_boxes(page) + figure_fits(page)});
  all += section(
      {"residuals", "Residuals",
       paragraph("Reading minus what the hypothesis shows, in standard deviations, joined in "
                 "order of time and evenly spaced; one stretch an experiment. Drift to one side "
                 "speaks against a hypothesis even where the misfit is small."),
       figure_residuals(page)});
  all += section(
      {"mechanisms", "Mechanisms",
       paragraph("An arrow is a reaction and carries its name. A thin line ends at the step it "
                 "acts on: + speeds it, \u2212 slows it. A short open end is the outside. In "
                 "colour: what sets a hypothesis apart from its base."),
       figure_mechanism(page)});
  all += equations(page);
  all += section(
      {"unknowns", "Unknowns",
       paragraph("Linear intervals: from the curvature at the best fit, on the scale that was "
                 "searched. The thin line is the range searched. Undetermined ones stand first."),
       figure_unknowns(page)});
  all += section(
      {"search", "Was the search thorough?",
       paragraph("Every start, best first. A step is an optimum at which several starts ended; "
                 "the dotted line is the limit."),
       figure_search(page)});
  return all;
}

}  // namespace

std::string report_html(const Judgement& judgement) {
  const Page page(judgement);
  const std::string style = page_style(page);
  const std::string script(page_script());
  const Markup data = tag("script", {{"type", "application/json"}, {"id", "numbers"}},
                          Markup::raw(json_for_script(panel_numbers(page))));
  const Markup body = tag("body", opening(page) +
                                      tag("main", verdicts(page) + reasons(page) + pictures(page) +
                                                      tables(page) + method(page)) +
                                      data + tag("script", Markup::raw(script)));
  return "<!doctype html>\n" +
         tag("html", {{"lang", "en"}}, head(page, style, script) + body).str() + "\n";
}

}  // namespace gainsay::cli
