#pragma once

#include "gainsay/testing/study_folder.h"

#include <algorithm>
#include <filesystem>
#include <fstream>
#include <optional>
#include <ostream>
#include <string>
#include <utility>
#include <vector>

namespace gainsay::testing {

/// One case of tests/programs/broken: the files that differ from those of StudyFolder (none: taken
/// away), and what reading the study says.
struct BrokenStudy {
  std::string name;
  std::vector<std::pair<std::string, std::optional<std::string>>> files;
  std::string says;

  friend std::ostream& operator<<(std::ostream& out, const BrokenStudy& study) {
    return out << study.name;
  }
};

/// All cases, file by file.
inline std::vector<BrokenStudy> broken_studies() {
  namespace fs = std::filesystem;
  constexpr std::string_view kAbsent = " (absent)";
  std::vector<fs::path> corpus;
  for (const auto& entry : fs::directory_iterator(GAINSAY_SOURCE_DIR "/tests/programs/broken")) {
    if (entry.path().extension() == ".txt") corpus.push_back(entry.path());
  }
  std::sort(corpus.begin(), corpus.end());
  std::vector<BrokenStudy> studies;
  for (const fs::path& path : corpus) {
    std::ifstream file(path);
    std::string* text = nullptr;
    for (std::string line; std::getline(file, line);) {
      if (line.starts_with("=== ")) {
        studies.push_back({line.substr(4), {}, ""});
      } else if (line == "--- says") {
        text = &studies.back().says;
      } else if (line.starts_with("--- ") && line.ends_with(kAbsent)) {
        studies.back().files.emplace_back(line.substr(4, line.size() - 4 - kAbsent.size()),
                                          std::nullopt);
      } else if (line.starts_with("--- ")) {
        studies.back().files.emplace_back(line.substr(4), "");
        text = &*studies.back().files.back().second;
      } else if (text != nullptr && !(text == &studies.back().says && line.empty())) {
        *text += line + "\n";
      }
    }
  }
  return studies;
}

/// The study of a case, written to a folder.
inline void write(const BrokenStudy& study, StudyFolder& folder) {
  for (const auto& [name, text] : study.files) {
    if (text) {
      folder.write(name, *text);
    } else {
      std::filesystem::remove(folder.path() / name);
    }
  }
}

}  // namespace gainsay::testing
