#include "gainsay/cli/page.h"

namespace gainsay::cli {

Markup section(const Section& section) {
  const Markup margin =
      tag("h2", {{"id", section.id + "-name"}}, text(section.heading)) + section.note;
  return tag("section", {{"id", section.id}, {"aria-labelledby", section.id + "-name"}},
             tag("div", {{"class", "margin"}}, margin) +
                 tag("div", {{"class", "evidence"}}, section.evidence)) +
         Markup::raw("\n");
}

Markup table(const NumberTable& numbers) {
  Markup heads;
  for (std::size_t i = 0; i < numbers.heads.size(); ++i) {
    heads += tag("th", {{"scope", "col"}, {"class", numbers.words.at(i) ? "w" : "n"}},
                 text(numbers.heads[i]));
  }
  Markup rows;
  for (const std::vector<std::string>& row : numbers.rows) {
    Markup cells;
    for (std::size_t i = 0; i < row.size(); ++i) {
      const std::string kind = numbers.words.at(i) ? "w" : "n";
      cells += i == 0 ? tag("th", {{"scope", "row"}, {"class", kind}}, text(row[i]))
                      : tag("td", {{"class", kind}}, text(row[i]));
    }
    rows += tag("tr", cells);
  }
  const Markup caption = numbers.caption.empty() ? Markup() : tag("caption", text(numbers.caption));
  return tag("div", {{"class", "wide"}, {"tabindex", "0"}},
             tag("table", {{"class", "numbers"}},
                 caption + tag("thead", tag("tr", heads)) + tag("tbody", rows)));
}

Markup folded(const std::string& summary, const Markup& content) {
  return tag("details", tag("summary", text(summary)) + content);
}

Markup letter_and_name(const Contender& contender) {
  return tag("b", {{"class", "letter h" + std::to_string(contender.hue)}}, text(contender.letter)) +
         Markup::raw(" ") + tag("span", {{"class", "name"}}, text(contender.name));
}

Markup verdict_shape(const Contender& contender) {
  if (contender.outcome == nullptr) return {};
  const Attributes ring = {{"class", "ring"}, {"cx", "6"}, {"cy", "6"}, {"r", "4.6"}};
  Markup shape = tag("circle", ring, {});
  if (not_rejected(contender)) {
    shape = tag("circle", {{"class", "full"}, {"cx", "6"}, {"cy", "6"}, {"r", "5.2"}}, {});
  } else if (undecided(contender)) {
    shape += tag("path", {{"class", "full"}, {"d", "M6 1.4A4.6 4.6 0 0 0 6 10.6Z"}}, {});
  }
  return tag("svg",
             {{"class", "shape"},
              {"viewBox", "0 0 12 12"},
              {"width", "12"},
              {"height", "12"},
              {"aria-hidden", "true"}},
             shape);
}

std::string verdict_word(const Contender& contender) {
  if (contender.outcome == nullptr) return "not judged";
  if (not_rejected(contender)) return "not rejected";
  return rejected(contender) ? "rejected" : "undecided";
}

Markup paragraph(const std::string& words) { return tag("p", text(words)); }

}  // namespace gainsay::cli
