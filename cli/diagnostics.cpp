#include "gainsay/cli/diagnostics.h"

#include "gainsay/cli/table_text.h"

#include <algorithm>
#include <string_view>
#include <tuple>
#include <utility>

namespace gainsay::cli {

namespace {

constexpr std::string_view kBold = "\x1b[1m";
constexpr std::string_view kRed = "\x1b[31m";
constexpr std::string_view kPlain = "\x1b[0m";

std::string place(const Diagnostic& diagnostic) {
  std::string text = harmless(diagnostic.file);
  if (diagnostic.line > 0) {
    text += ":" + std::to_string(diagnostic.line) + ":" + std::to_string(diagnostic.column);
  }
  return text;
}

auto sorted_by(const Diagnostic& d) {
  return std::tie(d.file, d.line, d.column, d.severity, d.what, d.expected, d.to_do);
}

}  // namespace

bool has_errors(const std::vector<Diagnostic>& diagnostics) {
  return std::any_of(diagnostics.begin(), diagnostics.end(),
                     [](const Diagnostic& d) { return d.severity == Severity::Error; });
}

void put_in_order(std::vector<Diagnostic>& diagnostics) {
  std::stable_sort(
      diagnostics.begin(), diagnostics.end(),
      [](const Diagnostic& a, const Diagnostic& b) { return sorted_by(a) < sorted_by(b); });
  diagnostics.erase(std::unique(diagnostics.begin(), diagnostics.end()), diagnostics.end());
}

void print(std::ostream& out, const std::vector<Diagnostic>& diagnostics, bool colour) {
  for (const Diagnostic& diagnostic : diagnostics) {
    const bool is_error = diagnostic.severity == Severity::Error;
    if (colour) out << kBold;
    const std::string where = place(diagnostic);
    if (!where.empty()) out << where << ": ";
    if (colour && is_error) out << kRed;
    out << (is_error ? "error: " : "warning: ");
    if (colour) out << kPlain;
    out << harmless(diagnostic.what) << '\n';
    if (!diagnostic.expected.empty())
      out << "    expected " << harmless(diagnostic.expected) << '\n';
    if (!diagnostic.to_do.empty()) out << "    to do: " << harmless(diagnostic.to_do) << '\n';
  }
}

void print_failure(const Console& console, const core::Failure& failure) {
  print(console.messages,
        {{Severity::Error, "", 0, 0, failure.what, failure.expected, failure.to_do}},
        console.colour);
}

void Diagnostics::error(const Location& at, Message message) {
  ++errors_;
  if (++errors_of_file_[at.file()] > kMostOfOneFile) return;
  diagnostics_.push_back({Severity::Error, at.file(), at.line, at.column, std::move(message.what),
                          std::move(message.expected), std::move(message.to_do)});
}

void Diagnostics::warning(const Location& at, Message message) {
  diagnostics_.push_back({Severity::Warning, at.file(), at.line, at.column, std::move(message.what),
                          std::move(message.expected), std::move(message.to_do)});
}

std::vector<Diagnostic> Diagnostics::collected() const {
  std::vector<Diagnostic> all = diagnostics_;
  for (const auto& [file, count] : errors_of_file_) {
    if (count <= kMostOfOneFile) continue;
    all.push_back(
        {Severity::Error, file, 0, 0,
         std::to_string(count - kMostOfOneFile) + " more errors in this file are not shown", "",
         "correct those shown and run again"});
  }
  put_in_order(all);
  return all;
}

}  // namespace gainsay::cli
