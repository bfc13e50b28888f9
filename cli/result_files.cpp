#include "gainsay/cli/result_files.h"

#include <fcntl.h>
#include <fmt/format.h>
#include <unistd.h>

#include <cerrno>
#include <cstring>
#include <system_error>
#include <vector>

namespace gainsay::cli {
namespace fs = std::filesystem;
namespace {

core::Failure cannot_write(const fs::path& path, const std::string& reason) {
  return {.what = fmt::format("cannot write '{}': {}", path.generic_string(), reason),
          .expected = "a folder that may be written to, and room on the disk",
          .to_do = "check the folder's rights and the free space, then run again",
          .place = {}};
}

bool write_all(int file, const std::string& text) {
  std::size_t done = 0;
  while (done < text.size()) {
    const ssize_t count = ::write(file, text.data() + done, text.size() - done);
    if (count < 0 && errno == EINTR) continue;
    if (count < 0) return false;
    done += static_cast<std::size_t>(count);
  }
  return ::fsync(file) == 0;
}

/// Empty if the text stands whole on disk under `path`; else the reason.
std::string write_whole(const fs::path& path, const std::string& text) {
  const int file = ::open(path.c_str(), O_WRONLY | O_CREAT | O_TRUNC | O_CLOEXEC, 0644);
  if (file < 0) return std::strerror(errno);
  const bool written = write_all(file, text);
  const int why = errno;
  if (::close(file) != 0 || !written) return std::strerror(written ? errno : why);
  return {};
}

}  // namespace

core::Result<bool> write_files(const fs::path& folder,
                               const std::map<std::string, std::string>& texts) {
  std::error_code error;
  fs::create_directories(folder, error);
  if (error) return cannot_write(folder, error.message());

  std::vector<std::pair<fs::path, fs::path>> ready;
  const auto withdraw = [&ready] {
    std::error_code ignored;
    for (const auto& [beside, place] : ready) fs::remove(beside, ignored);
  };
  for (const auto& [name, text] : texts) {
    const fs::path place = folder / name;
    const fs::path beside = folder / ("." + name + ".part");
    ready.emplace_back(beside, place);
    const std::string reason = write_whole(beside, text);
    if (!reason.empty()) {
      withdraw();
      return cannot_write(place, reason);
    }
  }
  for (const auto& [beside, place] : ready) {
    fs::rename(beside, place, error);
    if (error) {
      withdraw();
      return cannot_write(place, error.message());
    }
  }
  return true;
}

}  // namespace gainsay::cli
