#include "gainsay/cli/study_keys_page.h"

#include <algorithm>

namespace gainsay::cli {

namespace {

constexpr std::string_view kBegin = "<!-- keys: ";
constexpr std::string_view kEndOfBegin = " -->\n";
constexpr std::string_view kEnd = "<!-- end of keys -->";

// A cell of a Markdown table: '|' would end it.
std::string cell(std::string_view text) {
  std::string shown;
  for (const char c : text) {
    if (c == '|') shown += '\\';
    shown += c;
  }
  return shown.empty() ? " " : " " + shown + " ";
}

std::string row(const StudyKey& key) {
  const std::string name = key.name == "*" ? "NAME" : std::string(key.name);
  std::string line = "|" + cell("`" + name + "`") + "|" + cell(words_for_takes(key.takes)) + "|" +
                     cell(key.unit) + "|";
  line += cell(key.accepted ? key.otherwise : "**not yet**") + "|";
  line += cell("`" + std::string(key.example) + "`") + "|";
  std::string meaning(key.meaning);
  if (!key.accepted) meaning += "; for now: " + std::string(key.instead);
  return line + cell(meaning) + "|\n";
}

}  // namespace

std::string keys_as_markdown(Section section) {
  std::string table =
      "| key | takes | unit | default | example | meaning |\n|---|---|---|---|---|---|\n";
  for (const bool accepted : {true, false}) {
    for (const StudyKey& key : all_study_keys()) {
      if (key.section == section && key.accepted == accepted) table += row(key);
    }
  }
  return table;
}

std::string with_key_tables(std::string_view page) {
  std::string result;
  while (true) {
    const std::size_t begin = page.find(kBegin);
    const std::size_t head = page.find(kEndOfBegin, begin);
    const std::size_t end = page.find(kEnd, head);
    if (begin == std::string_view::npos || end == std::string_view::npos) break;
    const std::string_view named = page.substr(begin + kBegin.size(), head - begin - kBegin.size());
    result += page.substr(0, head + kEndOfBegin.size());
    for (const SectionWords& words : all_sections()) {
      if (std::string(words.file) + ": " + std::string(words.header) == named) {
        result += keys_as_markdown(words.section);
      }
    }
    result += kEnd;
    page = page.substr(end + kEnd.size());
  }
  return result += page;
}

}  // namespace gainsay::cli
