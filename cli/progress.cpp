#include "gainsay/cli/progress.h"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <ostream>

namespace gainsay::cli {
namespace {

constexpr std::chrono::milliseconds kBetweenLines{200};
constexpr std::size_t kWidth = 79;

}  // namespace

std::string time_left(double seconds) {
  if (seconds < 60.0) return fmt::format("{:.0f} s", std::max(1.0, std::ceil(seconds)));
  if (seconds < 3600.0) return fmt::format("{:.0f} min", std::ceil(seconds / 60.0));
  return fmt::format("{:.0f} h", std::ceil(seconds / 3600.0));
}

Progress::Progress(const Console& console)
    : console_(console), begun_(std::chrono::steady_clock::now()), shown_(begun_) {}

Progress::~Progress() { clear(); }

void Progress::begin(const std::string& what, std::size_t number, std::size_t of) {
  what_ = what;
  number_ = number;
  of_ = std::max<std::size_t>(of, 1);
  update(0, 0, std::nan(""));
}

void Progress::update(std::size_t done, std::size_t expected, double best_misfit) {
  if (!console_.messages_are_terminal) return;
  const auto now = std::chrono::steady_clock::now();
  if (done != 0 && now - shown_ < kBetweenLines) return;
  shown_ = now;
  const double share =
      expected == 0 ? 0.0
                    : std::min(1.0, static_cast<double>(done) / static_cast<double>(expected));
  const double all = (static_cast<double>(number_) + share) / static_cast<double>(of_);
  const double spent = std::chrono::duration<double>(now - begun_).count();
  std::string line = fmt::format("{} of {}: {}", number_ + 1, of_, what_);
  if (expected != 0) line += fmt::format(", start {} of {}", done, expected);
  if (std::isfinite(best_misfit)) line += fmt::format(", least misfit {:.4g}", best_misfit);
  if (all > 0.0 && spent > 1.0)
    line += fmt::format(", about {} left", time_left(spent * (1.0 - all) / all));
  console_.messages << "\r\033[K" << line.substr(0, kWidth) << std::flush;
}

void Progress::clear() {
  if (console_.messages_are_terminal) console_.messages << "\r\033[K" << std::flush;
}

}  // namespace gainsay::cli
