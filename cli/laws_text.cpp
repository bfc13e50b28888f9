#include "gainsay/cli/laws_text.h"

#include "gainsay/cli/table_text.h"
#include "gainsay/core/parse.h"
#include "gainsay/core/print.h"

#include <fmt/format.h>
#include <fmt/ranges.h>
#include <nlohmann/json.hpp>

#include <algorithm>

namespace gainsay::cli {
namespace {

using core::RateLaw;
using Json = nlohmann::ordered_json;

constexpr std::size_t kWidth = 80;

/// As it is called: "michaelis_menten(S, Vmax, Km)".
std::string call(const RateLaw& law) {
  return fmt::format("{}({})", law.name, fmt::join(law.arguments, ", "));
}

/// A paragraph whose first line begins with a heading, and the others below its text.
std::string headed(const std::string& heading, const std::string& words, std::size_t indent) {
  return wrap(words, kWidth, indent).replace(0, heading.size(), heading);
}

std::string capitalised(std::string text) {
  text.front() = static_cast<char>(std::toupper(static_cast<unsigned char>(text.front())));
  return text;
}

Json as_json(const RateLaw& law) {
  Json arguments = Json::array();
  for (std::size_t i = 0; i < law.arguments.size(); ++i) {
    arguments.push_back(Json{{"name", law.arguments[i]}, {"meaning", law.meanings[i]}});
  }
  return Json{{"name", law.name},
              {"title", law.title},
              {"call", call(law)},
              {"formula", law.formula},
              {"latex", core::print_latex(core::parse(law.formula)->expression)},
              {"arguments", arguments},
              {"limits", law.limits},
              {"source", law.source}};
}

constexpr std::string_view kHeadOfPage = R"(# Rate laws

Any expression may call a rate law by its name, with arguments in the order substrates, products,
effectors, constants (symbols after IUBMB, Recommendations 1981, and Cleland 1963). The call stands
for the formula and nothing else: each argument may be an expression, and pages show the formula
written out. Dimensions stand in brackets; any consistent units will do. `gainsay laws NAME` says
the same on a terminal.

| name | arguments | |
|---|---|---|
)";

}  // namespace

std::string list_of_laws() {
  std::string text;
  for (const RateLaw& law : core::all_rate_laws()) {
    text += fmt::format("{:<28} {}\n", law.name, law.title);
  }
  return text;
}

std::string explanation(const RateLaw& law) {
  std::size_t widest = 0;
  for (const std::string& argument : law.arguments) widest = std::max(widest, argument.size());
  std::string text = fmt::format("{}\n{}\n\n", call(law), law.title);
  text += wrap(law.formula, kWidth, 4) + "\n";
  for (std::size_t i = 0; i < law.arguments.size(); ++i) {
    text += headed("    " + law.arguments[i], law.meanings[i], widest + 6);
  }
  return text + "\n" + headed("holds:", law.limits, 9) + headed("source:", law.source, 9);
}

std::string law_as_json(const RateLaw& law) { return as_json(law).dump(2) + "\n"; }

std::string laws_as_json() {
  Json laws = Json::array();
  for (const RateLaw& law : core::all_rate_laws()) laws.push_back(as_json(law));
  return laws.dump(2) + "\n";
}

std::string law_as_markdown(const RateLaw& law) {
  constexpr std::size_t kPageWidth = 100;
  std::string text = fmt::format("## {}\n\n{}.\n\n", law.name, capitalised(law.title));
  text += fmt::format("```\n{} =\n{}```\n\n", call(law), wrap(law.formula, kPageWidth, 4));
  for (std::size_t i = 0; i < law.arguments.size(); ++i) {
    text += fmt::format("- `{}`: {}\n", law.arguments[i], law.meanings[i]);
  }
  text += "\n" + wrap("Holds: " + law.limits + ".", kPageWidth, 0);
  return text + "\n" + wrap("Source: " + law.source + ".", kPageWidth, 0);
}

std::string rate_laws_page() {
  std::string text(kHeadOfPage);
  for (const RateLaw& law : core::all_rate_laws()) {
    text += fmt::format("| [{0}](#{0}) | {1} | {2} |\n", law.name, fmt::join(law.arguments, ", "),
                        law.title);
  }
  for (const RateLaw& law : core::all_rate_laws()) text += "\n" + law_as_markdown(law);
  return text;
}

}  // namespace gainsay::cli
