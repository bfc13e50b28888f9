#include "gainsay/cli/study_keys_page.h"

#include <gtest/gtest.h>

#include <filesystem>
#include <fstream>
#include <sstream>
#include <string>

namespace gainsay::cli {
namespace {

std::string contents(const std::filesystem::path& path) {
  std::ostringstream text;
  text << std::ifstream(path, std::ios::binary).rdbuf();
  return text.str();
}

TEST(StudyKeysPage, ATableHasARowForEachKey) {
  const std::string table = keys_as_markdown(Section::Dose);
  EXPECT_NE(table.find("| `at` | a number | time | needed | `at = 60` |"), std::string::npos)
      << table;
  EXPECT_NE(table.find("| `over` | a number | time | **not yet** |"), std::string::npos) << table;
  EXPECT_LT(table.find("`raise`"), table.find("`over`"));
}

TEST(StudyKeysPage, OnlyWhatStandsBetweenTheMarksIsReplaced) {
  const std::string page =
      "before\n<!-- keys: study.toml: [search] -->\nold\n<!-- end of keys -->\nafter\n";
  EXPECT_EQ(with_key_tables(page), "before\n<!-- keys: study.toml: [search] -->\n" +
                                       keys_as_markdown(Section::Search) +
                                       "<!-- end of keys -->\nafter\n");
  EXPECT_EQ(with_key_tables("no marks\n"), "no marks\n");
}

TEST(StudyKeysPage, DocsHoldTheTablesAsTheyAre) {
  const std::filesystem::path page =
      std::filesystem::path(GAINSAY_SOURCE_DIR) / "docs/study-files.md";
  const std::string text = contents(page);
  const std::string wanted = with_key_tables(text);
  if (text == wanted) return;
  const auto remade = std::filesystem::temp_directory_path() / "study-files.md";
  std::ofstream(remade, std::ios::binary) << wanted;
  FAIL() << "docs/study-files.md is behind the table of keys; copy " << remade << " over it";
}

TEST(StudyKeysPage, DocsShowEverySection) {
  const std::string text = contents(GAINSAY_SOURCE_DIR "/docs/study-files.md");
  for (const SectionWords& words : all_sections()) {
    const std::string mark =
        "<!-- keys: " + std::string(words.file) + ": " + std::string(words.header) + " -->";
    EXPECT_NE(text.find(mark), std::string::npos) << mark;
  }
}

}  // namespace
}  // namespace gainsay::cli
