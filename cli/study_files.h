#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/source_text.h"

#include <filesystem>
#include <map>
#include <memory>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// The files of a study folder, each read once.
class StudyFiles {
 public:
  explicit StudyFiles(std::filesystem::path folder) : folder_(std::move(folder)) {}

  /// Names, relative to the study and sorted, of the files of a folder below it that end so.
  std::vector<std::string> list(std::string_view folder, std::string_view ending) const;

  /// A file by its name relative to the study; null where it cannot be read, `why` then says so.
  std::shared_ptr<const SourceText> read(const std::string& name, std::string& why);

  bool exists(const std::string& name) const;

  /// `path` as written in the file `from`, as a name relative to the study.
  static std::string beside(const std::string& from, const std::string& path);

  const std::filesystem::path& folder() const { return folder_; }
  /// Bytes of all files read.
  std::map<std::string, std::string> texts() const;

 private:
  std::filesystem::path folder_;
  std::map<std::string, std::shared_ptr<const SourceText>> read_;
};

}  // namespace gainsay::cli
