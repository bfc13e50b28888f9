// Whatever bytes a study's files hold, reading them ends, throws nothing, and says something with a
// place that exists. Texts are those of tests/programs/broken and of the starter study, spoilt by
// seeded changes; a case that fails prints its number and its text.

#include "gainsay/cli/csv_reader.h"
#include "gainsay/cli/starter_study.h"
#include "gainsay/cli/toml_tree.h"
#include "gainsay/testing/broken_studies.h"
#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cstdint>
#include <iterator>
#include <optional>
#include <random>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay {
namespace {

using testing::StudyFolder;

constexpr std::uint64_t kSeed = 20240229;
constexpr int kChangesOfOneText = 20;

// Pieces that mean something to one of the readers.
constexpr std::string_view kPieces[] = {
    "\"",    "'",    "\"\"\"",       "{", "}",  "[",  "]",   "=",   ",",
    ".",     "\n",   "\r",           "#", "\\", "->", "<->", "inf", "-0.0",
    "1e999", "\xFF", "\xEF\xBB\xBF", "(", "t",  "NA"};

// One change: bytes taken out, doubled or replaced, a piece put in, or the end cut off.
std::string changed(std::string text, std::mt19937_64& draws) {
  const std::size_t at = text.empty() ? 0 : draws() % text.size();
  const std::size_t length = std::min<std::size_t>(1 + draws() % 8, text.size() - at);
  switch (draws() % 5) {
    case 0:
      return text.erase(at, length);
    case 1:
      return text.insert(at, text.substr(at, length));
    case 2:
      if (!text.empty()) text[at] = static_cast<char>(draws() % 256);
      return text;
    case 3:
      return text.insert(at, kPieces[draws() % std::size(kPieces)]);
    default:
      text.resize(at);
      return text;
  }
}

// Every place lies within the text, or means the whole file.
void expect_places_within(const cli::Diagnostics& diagnostics, const std::string& text) {
  const auto lines = static_cast<std::size_t>(std::count(text.begin(), text.end(), '\n')) + 1;
  for (const cli::Diagnostic& one : diagnostics.collected()) {
    EXPECT_LE(one.line, lines) << one.what;
    EXPECT_FALSE(one.what.empty());
  }
}

// All texts of a kind, told by the end of their names.
std::vector<std::string> texts_of_kind(std::string_view ending) {
  std::vector<std::string> texts = {""};
  for (const testing::BrokenStudy& study : testing::broken_studies()) {
    for (const auto& [name, text] : study.files) {
      if (text && name.ends_with(ending)) texts.push_back(*text);
    }
  }
  for (const auto& [below, files] : cli::starter_study()) {
    for (const auto& [name, text] : files) {
      if (name.ends_with(ending)) texts.push_back(text);
    }
  }
  return texts;
}

TEST(StudyTexts, AnyTomlIsReadOrSaidToBeWrong) {
  std::mt19937_64 draws(kSeed);
  for (const std::string& original : texts_of_kind(".toml")) {
    std::string text = original;
    for (int change = 0; change < kChangesOfOneText; ++change) {
      text = changed(text, draws);
      cli::Diagnostics diagnostics;
      std::optional<cli::TomlValue> document;
      ASSERT_NO_THROW(document = cli::read_toml(testing::source(text), diagnostics)) << text;
      EXPECT_EQ(document.has_value(), !diagnostics.has_errors()) << text;
      expect_places_within(diagnostics, text);
    }
  }
}

TEST(StudyTexts, AnyTableIsReadOrSaidToBeWrong) {
  std::mt19937_64 draws(kSeed);
  for (const std::string& original : texts_of_kind(".csv")) {
    std::string text = original;
    for (int change = 0; change < kChangesOfOneText; ++change) {
      text = changed(text, draws);
      cli::Diagnostics diagnostics;
      std::optional<cli::CsvTable> table;
      ASSERT_NO_THROW(table = cli::read_csv(testing::source(text, "t.csv"), diagnostics)) << text;
      EXPECT_EQ(table.has_value(), !diagnostics.has_errors()) << text;
      expect_places_within(diagnostics, text);
      if (!table) continue;
      for (const cli::CsvRow& row : table->rows)
        EXPECT_EQ(row.size(), table->header.size()) << text;
    }
  }
}

TEST(StudyTexts, AnyStudyIsReadOrSaidToBeWrong) {
  std::mt19937_64 draws(kSeed);
  for (const testing::BrokenStudy& study : testing::broken_studies()) {
    StudyFolder folder;
    write(study, folder);
    for (const auto& [name, text] : study.files) {
      if (!text) continue;
      const std::string spoilt = changed(changed(*text, draws), draws);
      folder.write(name, spoilt);
      cli::StudyReading reading;
      ASSERT_NO_THROW(reading = folder.read()) << study.name << '\n' << spoilt;
      EXPECT_EQ(reading.study.has_value(), !cli::has_errors(reading.diagnostics)) << study.name;
    }
  }
}

}  // namespace
}  // namespace gainsay
