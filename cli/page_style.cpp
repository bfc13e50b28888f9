#include "gainsay/cli/page_style.h"

#include "gainsay/cli/equations.h"
#include "gainsay/cli/hues.h"
#include "gainsay/cli/markup.h"
#include "gainsay/cli/math_font.h"

namespace gainsay::cli {
namespace {

constexpr const char* kType = R"css(
*{box-sizing:border-box}
html{background:var(--paper);color:var(--ink);-webkit-text-size-adjust:100%;text-size-adjust:100%}
body{margin:0 auto;max-width:77.5rem;padding:2.4rem 3.25rem 4rem;
font:400 1rem/1.5 "Palatino Linotype",Palatino,P052,"URW Palladio L","Book Antiqua",Georgia,serif;
font-variant-numeric:lining-nums;overflow-wrap:break-word}
h1{font-weight:400;font-size:1.9rem;line-height:1.2;letter-spacing:-.006em;margin:.15rem 0 .7rem;
max-width:36em;text-wrap:balance}
header .study{font-style:italic;color:var(--grey);margin:0}
header .fact{margin:0 0 .15rem;max-width:60rem;font-size:1.06rem;text-wrap:pretty}
header{padding-bottom:1.5rem}
h2{font:italic 400 1.18rem/1.3 inherit;font-family:inherit;font-style:italic;font-weight:400;
font-size:1.18rem;line-height:1.3;margin:0 0 .35rem}
h3{font-weight:400;font-size:.84rem;line-height:1.4;margin:0 0 .5rem}
h3 b,b.letter{font-weight:600}
p{margin:0 0 .6rem;max-width:42rem}
a{color:inherit}
main>section{display:grid;grid-template-columns:10.6rem minmax(0,1fr);column-gap:2.4rem;
border-top:1px solid var(--hair);padding:1.4rem 0 2.3rem}
.margin{color:var(--grey);font-size:.86rem;line-height:1.45}
.margin h2{color:var(--ink)}
.margin p{margin:0 0 .5rem}
.aside,.statistics{color:var(--grey);font-size:.86rem;line-height:1.5;max-width:none}
.statistics{margin:1rem 0 0}
.print-only{display:none}
.unseen{position:absolute;width:1px;height:1px;overflow:hidden;clip-path:inset(50%);white-space:nowrap}
.panel,h3,.ticks,table,.mechanism svg,summary,.reading-of{
font-family:"Gill Sans","Gill Sans Nova","Segoe UI",Seravek,"Noto Sans","DejaVu Sans",sans-serif;
font-variant-numeric:tabular-nums lining-nums}
b.letter{color:var(--hue);display:inline-block;min-width:1.15em}
:focus-visible{outline:2px solid var(--ink);outline-offset:3px;border-radius:2px}
)css";

constexpr const char* kTables = R"css(
table{border-collapse:collapse;font-size:.8rem;line-height:1.35}
th{font-weight:400;text-align:left}
th,td{padding:.2rem .9rem .2rem 0;vertical-align:baseline}
.n{text-align:right;white-space:nowrap}
thead th{color:var(--grey);font-size:.74rem;border-bottom:1px solid var(--hair)}
.wide{overflow-x:auto;max-height:26rem;overflow-y:auto;margin:.5rem 0 .8rem}
.numbers td.w{white-space:normal}
details{margin:.7rem 0 0}
summary{color:var(--grey);font-size:.76rem;cursor:pointer;width:fit-content}
summary:hover{color:var(--ink)}
table.verdicts{width:100%;table-layout:fixed;font-size:.84rem}
.verdicts th:first-child{width:33%}
.verdicts .drawn{width:31%;padding:0 .9rem 0 0;vertical-align:middle}
.verdicts .n{width:4.3rem}
.verdicts tbody th,.verdicts tbody td{padding-top:.42rem;padding-bottom:.42rem;vertical-align:middle}
.verdicts tbody td.drawn{padding-top:0;padding-bottom:0;height:2.6rem}
.verdicts .word{white-space:nowrap}
.verdicts svg{display:block;width:100%;height:2.6rem;overflow:visible}
.verdicts .who{display:block}
.verdicts .reason{display:block;color:var(--grey);font-size:.76rem;padding-left:1.5em}
.verdicts .letter{min-width:1.5em}
.verdicts .shape,.shape{display:inline-block;width:.72rem;height:.72rem;margin-right:.5em;
vertical-align:-.04em;overflow:visible}
.axis svg{height:1.2rem}
.axis text{fill:var(--grey);font-size:.7rem}
.limit{stroke:var(--ink);stroke-width:1}
.bar{stroke:var(--hue);stroke-width:2}
.other{stroke:var(--grey);stroke-width:1}
.full{fill:var(--hue);stroke:none}
.ring{fill:var(--paper);stroke:var(--hue);stroke-width:1.7}
.shape .full{fill:var(--hue)}
dl.reasons{margin:0;display:grid;grid-template-columns:minmax(0,14rem) minmax(0,1fr);gap:.7rem 2rem}
dl.reasons dt{padding-left:3.1em;text-indent:-3.1em}
dl.reasons dt *{text-indent:0}
dl.reasons dd{margin:0}
dl.reasons p{margin:0 0 .25rem}
)css";

constexpr const char* kPictures = R"css(
.ticks{border:0;margin:0 0 1.3rem;padding:0;font-size:.84rem;line-height:1.9}
.ticks label{display:inline-block;margin-right:1.5rem;cursor:pointer}
.ticks input{accent-color:var(--hue);width:.95em;height:.95em;margin:0 .3em 0 0;vertical-align:-.1em}
.ticks details{margin:0}
.panels{display:grid;gap:1.1rem 1.3rem;margin-bottom:1.5rem}
.columns-1{grid-template-columns:minmax(0,30rem)}
.columns-2{grid-template-columns:repeat(2,minmax(0,1fr))}
.columns-3{grid-template-columns:repeat(3,minmax(0,1fr))}
.columns-4{grid-template-columns:repeat(4,minmax(0,1fr))}
.panel{margin:0;padding:0 1.35rem 1.25rem 2rem;min-width:0}
.panel figcaption{font-size:.78rem;line-height:1.35;margin:0 0 .45rem -2rem;color:var(--grey)}
.panels:not(.headed) figcaption{position:absolute;width:1px;height:1px;overflow:hidden;
clip-path:inset(50%)}
.panel>svg{display:block;width:100%;height:7.4rem;overflow:visible}
.panel text,.mechanism text{fill:var(--grey);font-size:.68rem}
.panel text.x{text-anchor:middle}
.panel text.y{text-anchor:end}
.panel text.end{fill:var(--hue);font-weight:600;font-size:.69rem}
.grid{stroke:var(--faint)}
.base,.zero{stroke:var(--hair)}
line.two,line.between,line.faint{stroke:var(--faint)}
.spot,.leaders,.panel .spot{overflow:visible}
.square{overflow:hidden}
.curve{fill:none;stroke:var(--hue);stroke-width:1.7;stroke-linejoin:round;
vector-effect:non-scaling-stroke}
.leader{fill:none;stroke:var(--hue);stroke-width:.8;opacity:.7;vector-effect:non-scaling-stroke}
.joined{fill:none;stroke:var(--hue);stroke-width:.9;opacity:.6;vector-effect:non-scaling-stroke}
.rest,.beyond{fill:var(--hue)}
.reading{fill:var(--ink)}
.sd{stroke:var(--ink);stroke-width:1}
.left-out{fill:none;stroke:var(--grey);stroke-width:1.4}
.below{fill:none;stroke:var(--ink);stroke-width:1.1}
.d2.curve{stroke-dasharray:7 3}
.d3.curve{stroke-dasharray:2 2.6}
.d4.curve{stroke-dasharray:8 3 2 3}
.d5.curve{stroke-dasharray:12 4}
.d6.curve{stroke-dasharray:6 2.5 1.5 2.5 1.5 2.5}
.residuals>svg{height:5rem}
.searches{display:grid;grid-template-columns:repeat(2,minmax(0,1fr));gap:1.4rem 2.4rem}
.search p{font-size:.86rem;line-height:1.45;color:var(--grey);margin:0}
.search .limit{stroke:var(--ink);stroke-dasharray:1.5 2.5}
.search text.limit{stroke:none;text-anchor:end}
.unknowns{margin-bottom:1.7rem}
.unknowns table{width:100%;table-layout:fixed}
.unknowns th:first-child{width:16%}
.unknowns .n{width:10%}
.unknowns .interval{width:17%}
.unknowns .words{width:23%}
.unknowns .edge{width:7%;color:var(--grey);font-size:.74rem;white-space:nowrap}
.unknowns td.n.edge{padding-right:.6rem}
.unknowns .drawn{padding-right:.6rem}
.unknowns td,.unknowns th{vertical-align:middle}
.unknowns svg{display:block;width:100%;height:.9rem;overflow:visible}
.unknowns .range{stroke:var(--hair);stroke-width:1}
.unknowns line.interval{stroke:var(--hue);stroke-width:3.2}
.unit{color:var(--grey)}
.mechanisms{display:grid;gap:1.8rem 2.4rem;align-items:start}
.two.mechanisms{grid-template-columns:repeat(2,minmax(0,1fr))}
.mechanism svg{max-width:100%;height:auto;display:block;margin:.2rem 0 .5rem}
.mechanism text.species{fill:var(--ink);font-size:13.5px;text-anchor:middle}
.mechanism text.input{font-size:12px;text-anchor:middle}
.mechanism text.step{font-size:11px;font-style:italic;text-anchor:middle}
.mechanism text.count{font-size:10px;text-anchor:middle}
.way{fill:none;stroke:var(--ink);stroke-width:1.25}
.head{fill:var(--ink)}
.influence .way{stroke:var(--grey);stroke-width:.9}
.influence circle{fill:var(--paper);stroke:var(--grey);stroke-width:.9}
.influence g path{fill:none;stroke:var(--grey);stroke-width:1.1}
.own .way,.own circle,.own g path{stroke:var(--hue)}
.own .way{stroke-width:1.7}
.own .head{fill:var(--hue)}
.mechanism .own text{fill:var(--hue)}
.systems{display:grid;gap:1.4rem 2.4rem}
.side-by-side.systems{grid-template-columns:repeat(2,minmax(0,1fr))}
.equations{font-size:.92rem}
.equations h4{font-weight:400;color:var(--grey);font-size:.84rem}
.equations math{font:1.06rem/1.2 "Gainsay Math","STIX Two Math","Cambria Math",math}
)css";

constexpr const char* kScripted = R"css(
.panel.opens>svg{cursor:zoom-in}
dialog{width:min(64rem,94vw);max-width:none;border:1px solid var(--hair);background:var(--paper);
color:var(--ink);padding:1.4rem 1.8rem}
dialog::backdrop{background:var(--ink);opacity:.28}
dialog .panel>svg{height:min(60vh,34rem)}
dialog .panel figcaption{font-size:1rem;position:static;width:auto;height:auto;clip-path:none}
dialog .panel text{font-size:.86rem}
dialog .panel{padding:0 2.2rem 2rem 3rem}
dialog button{float:right;font:inherit;color:inherit;background:none;border:0;cursor:pointer;
text-decoration:underline;text-decoration-color:var(--hair)}
.reading-of{position:fixed;left:0;top:0;z-index:2;pointer-events:none;background:var(--paper);
border:1px solid var(--hair);padding:.3rem .55rem;font-size:.74rem;line-height:1.45;white-space:pre}
.reading.near{r:3.6px}
)css";

constexpr const char* kPhone = R"css(
@media screen and (max-width:960px){
body{padding:1.6rem 1.6rem 3rem}
main>section{grid-template-columns:minmax(0,1fr)}
.margin{margin-bottom:1rem}
.columns-3,.columns-4{grid-template-columns:repeat(2,minmax(0,1fr))}
.panels figcaption,.panels:not(.headed) figcaption{position:static;width:auto;height:auto;
clip-path:none}
.gap{display:none}
.two.mechanisms,.side-by-side.systems{grid-template-columns:minmax(0,1fr)}
}
@media screen and (max-width:600px){
body{padding:1.1rem 1.1rem 2.5rem}
h1{font-size:1.5rem}
.panels,.searches{grid-template-columns:minmax(0,1fr)}
.residuals{padding-right:.4rem}
.verdicts,.verdicts tbody{display:block}
.verdicts thead,.verdicts .axis{display:none}
.verdicts tbody tr{display:grid;grid-template-columns:minmax(0,1fr) auto;column-gap:1rem;
padding:.7rem 0 .6rem;border-bottom:1px solid var(--hair)}
.verdicts tbody tr th:first-child{grid-area:1/1;width:auto;padding:0}
.verdicts tbody tr td.word{grid-area:1/2;padding:0;align-self:start}
.verdicts tbody tr td.drawn{grid-area:2/1/3/3;width:auto;height:1.9rem;padding:0}
.verdicts tbody tr td.drawn svg{height:1.9rem}
.verdicts tbody tr td.n{grid-row:3;grid-column:1/3;width:auto;padding:0;text-align:left}
.verdicts tbody tr td.n+td.n{padding-left:7.2em}
.verdicts tbody tr td.n+td.n+td.n{padding-left:13em}
.verdicts td.n::before{content:attr(data-head) " ";color:var(--grey)}
dl.reasons{grid-template-columns:minmax(0,1fr);gap:.2rem}
dl.reasons dd{margin-bottom:.8rem}
.unknowns thead{display:none}
.unknowns table,.unknowns tbody{display:block}
.unknowns tr{display:grid;grid-template-columns:auto minmax(0,1fr) auto;column-gap:.6rem;
padding:.45rem 0;border-bottom:1px solid var(--faint)}
.unknowns tr>*{width:auto!important;padding:0}
.unknowns tr>th{grid-area:1/1/2/3}
.unknowns tr>td.n{grid-area:1/3}
.unknowns tr>td.interval{grid-area:3/1/4/3;text-align:left;color:var(--grey);white-space:normal}
.unknowns tr>td.n.edge{grid-area:2/1;text-align:left}
.unknowns tr>td.drawn{grid-area:2/2}
.unknowns tr>td.edge{grid-area:2/3}
.unknowns tr>td.words{grid-area:4/1/5/4}
.ticks label{display:block}
}
)css";

constexpr const char* kPrint = R"css(
@media print{
html{font-size:9.5pt;background:none}
:root{--paper:#fff}
body{max-width:none;padding:0}
main>section{grid-template-columns:8.2rem minmax(0,1fr);column-gap:1.4rem;padding:.9rem 0 1.1rem}
h1{font-size:1.6rem}
.print-only{display:block}
.screen-only,.ticks,details,dialog,.reading-of{display:none}
#fits{break-before:page;border-top:0}
.panel,.mechanism,.search,.unknowns tr,dl.reasons dd,h3{break-inside:avoid}
h2,h3{break-after:avoid}
.panel>svg{height:6.2rem}
.residuals>svg{height:4.2rem}
.equations .equation{overflow:visible}
.verdicts th:first-child{width:31%}
.verdicts .drawn{width:20%}
.verdicts th.n{width:3.1rem}
.verdicts th.n:nth-child(5){width:4.9rem}
.verdicts tbody td.drawn,.verdicts svg{height:2.1rem}
.verdicts tbody th,.verdicts tbody td{padding-top:.22rem;padding-bottom:.22rem}
.axis svg{height:1.1rem}
dl.reasons{font-size:.9rem;gap:.45rem 1.2rem;grid-template-columns:minmax(0,9.5rem) minmax(0,1fr)}
dl.reasons p{display:inline}
dl.reasons p::after{content:" "}
.statistics{margin-top:.5rem}
}
)css";

std::string colours(const Palette& palette) {
  const auto name = [](const char* key, std::string_view value) {
    return std::string("--") + key + ":" + std::string(value) + ";";
  };
  std::string out = ":root{" + name("paper", palette.paper) + name("ink", palette.ink) +
                    name("grey", palette.grey) + name("hair", palette.hair) +
                    name("faint", palette.faint);
  for (std::size_t i = 0; i < palette.hues.size(); ++i) {
    out += name(("h" + std::to_string(i + 1)).c_str(), palette.hues[i]);
  }
  return out + "}\n";
}

/// A part of STIX Math under the SIL Open Font License.
std::string mathematics() {
  return "@font-face{font-family:\"" + std::string(kMathFamily) +
         "\";src:url(\"data:font/woff2;base64," + std::string(math_font()) +
         "\") format(\"woff2\")}\n" + std::string(equations_css()) + "\n";
}

std::string hue_classes() {
  std::string out = ":root,.h0{--hue:var(--grey)}\n";
  for (int i = 1; i <= kHues; ++i) {
    const std::string number = std::to_string(i);
    out += ".h" + number + "{--hue:var(--h" + number + ")}";
  }
  return out + "\n";
}

/// Shown where its box is ticked; a browser without :has() shows everything.
std::string ticking(const Page& page) {
  std::string out;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    out += "body:not(:has(#tick-" + contender.letter + ":checked)) .of-" + contender.letter +
           "{display:none}\n";
  }
  return out;
}

std::string paper_footer(const Page& page) {
  const std::string& title = page.study().title;
  std::string fingerprint;
  if (!page.judgement.fingerprints.empty()) {
    fingerprint = page.judgement.fingerprints.front().sha256.substr(0, 12);
  }
  const std::string type = "font:8pt Georgia,serif;color:#6b6f74;";
  return "@page{size:A4;margin:16mm 15mm 18mm;@bottom-left{" + type +
         "content:" + css_string(title + ", this look alone") + "}@bottom-center{" + type +
         "content:" + css_string(fingerprint) + "}@bottom-right{" + type +
         "content:\"page \" counter(page) \" of \" counter(pages)}}\n";
}

}  // namespace

std::string page_style(const Page& page) {
  return "\n:root{color-scheme:light dark}\n" + colours(kLight) +
         "@media screen and (prefers-color-scheme:dark){" + colours(kDark) + "}\n" + hue_classes() +
         mathematics() + kType + kTables + kPictures + kScripted + kPhone + kPrint + ticking(page) +
         paper_footer(page);
}

}  // namespace gainsay::cli
