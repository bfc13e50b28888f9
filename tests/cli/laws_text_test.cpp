#include "gainsay/cli/laws_text.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

#include <fstream>
#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

using ::testing::AllOf;
using ::testing::HasSubstr;
using ::testing::StartsWith;

const core::RateLaw& law(std::string_view name) { return *core::find_rate_law(name); }

void expect_lines_fit(const std::string& text) {
  constexpr std::size_t kWidth = 80;
  std::istringstream lines(text);
  for (std::string line; std::getline(lines, line);) EXPECT_LE(line.size(), kWidth) << line;
}

TEST(LawsText, ListsEveryLawInOneLine) {
  const std::string text = list_of_laws();
  for (const core::RateLaw& each : core::all_rate_laws()) {
    EXPECT_THAT(text, HasSubstr(each.name + " "));
  }
  EXPECT_EQ(std::count(text.begin(), text.end(), '\n'),
            static_cast<long>(core::all_rate_laws().size()));
  expect_lines_fit(text);
}

TEST(LawsText, ExplainsALaw) {
  EXPECT_EQ(explanation(law("michaelis_menten")),
            "michaelis_menten(S, Vmax, Km)\n"
            "saturation of an enzyme\n"
            "\n"
            "    Vmax * S / (Km + S)\n"
            "\n"
            "    S     the substrate [concentration]\n"
            "    Vmax  limiting rate at saturation [concentration/time]\n"
            "    Km    Michaelis constant, S at half the limiting rate [concentration]\n"
            "\n"
            "holds:   one substrate, no product yet, total enzyme far below S + Km\n"
            "source:  Michaelis and Menten (1913), Biochem. Z. 49, 333; at steady state:\n"
            "         Briggs and Haldane (1925), Biochem. J. 19, 338\n");
}

TEST(LawsText, ExplanationsFitATerminal) {
  for (const core::RateLaw& each : core::all_rate_laws()) expect_lines_fit(explanation(each));
}

TEST(LawsText, JsonHoldsTheSameFacts) {
  const auto one = nlohmann::json::parse(law_as_json(law("hill")));
  EXPECT_EQ(one.at("name"), "hill");
  EXPECT_EQ(one.at("call"), "hill(S, Vmax, K_half, n)");
  EXPECT_EQ(one.at("formula"), "Vmax * S^n / (K_half^n + S^n)");
  EXPECT_EQ(one.at("arguments").size(), 4U);
  EXPECT_EQ(one.at("arguments")[2].at("name"), "K_half");
  EXPECT_THAT(one.at("latex").get<std::string>(), StartsWith("\\frac{"));
  const auto all = nlohmann::json::parse(laws_as_json());
  ASSERT_EQ(all.size(), core::all_rate_laws().size());
  EXPECT_EQ(all[0].at("name"), "mass_action");
}

TEST(LawsText, MarkdownOfALaw) {
  EXPECT_THAT(law_as_markdown(law("monod")),
              AllOf(StartsWith("## monod\n"),
                    HasSubstr("monod(S, mu_max, Ks) =\n    mu_max * S / (Ks + S)\n"),
                    HasSubstr("- `Ks`: "), HasSubstr("Source: Monod (1949)")));
}

TEST(RateLawsPage, IsTheOneInDocs) {
  std::ifstream file(GAINSAY_SOURCE_DIR "/docs/rate-laws.md");
  ASSERT_TRUE(file);
  std::ostringstream page;
  page << file.rdbuf();
  EXPECT_EQ(page.str(), rate_laws_page()) << "to do: gainsay laws --markdown > docs/rate-laws.md";
}

}  // namespace
}  // namespace gainsay::cli
