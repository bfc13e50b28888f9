#include "gainsay/cli/study_files.h"

#include <algorithm>
#include <fstream>
#include <iterator>
#include <system_error>

namespace gainsay::cli {

namespace fs = std::filesystem;

std::vector<std::string> StudyFiles::list(std::string_view folder, std::string_view ending) const {
  std::vector<std::string> names;
  std::error_code error;
  for (fs::directory_iterator item(folder_ / folder, error), end; !error && item != end;
       item.increment(error)) {
    const std::string name = item->path().filename().string();
    if (name.ends_with(ending) && !name.starts_with(".") && !item->is_directory()) {
      names.push_back(std::string(folder) + "/" + name);
    }
  }
  std::sort(names.begin(), names.end());
  return names;
}

std::shared_ptr<const SourceText> StudyFiles::read(const std::string& name, std::string& why) {
  const auto known = read_.find(name);
  if (known != read_.end()) return known->second;
  const fs::path path = folder_ / name;
  std::error_code error;
  if (!fs::exists(path, error)) {
    why = "there is no such file";
    return nullptr;
  }
  if (!fs::is_regular_file(path, error)) {
    why = "it is not a file";
    return nullptr;
  }
  std::ifstream file(path, std::ios::binary);
  std::string bytes{std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>()};
  if (!file.is_open() || file.bad()) {
    why = "it cannot be read";
    return nullptr;
  }
  auto source = std::make_shared<const SourceText>(SourceText{name, std::move(bytes)});
  read_[name] = source;
  return source;
}

bool StudyFiles::exists(const std::string& name) const {
  std::error_code error;
  return fs::exists(folder_ / name, error);
}

std::string StudyFiles::beside(const std::string& from, const std::string& path) {
  return (fs::path(from).parent_path() / path).lexically_normal().generic_string();
}

std::map<std::string, std::string> StudyFiles::texts() const {
  std::map<std::string, std::string> texts;
  for (const auto& [name, source] : read_) texts[name] = source->bytes;
  return texts;
}

}  // namespace gainsay::cli
