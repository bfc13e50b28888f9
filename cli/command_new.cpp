#include "gainsay/cli/command_new.h"

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/result_files.h"
#include "gainsay/cli/starter_study.h"

#include <string>
#include <system_error>

namespace gainsay::cli {

namespace fs = std::filesystem;

namespace {

// Why the folder cannot be used; empty if it can.
std::string why_not(const fs::path& folder) {
  std::error_code error;
  if (!fs::exists(folder, error)) return {};
  if (!fs::is_directory(folder, error)) return "it is there and is no folder";
  if (!fs::is_empty(folder, error)) return error ? "it cannot be looked into" : "it is not empty";
  return {};
}

}  // namespace

int run_new(const NewOptions& options, const Console& console) {
  const std::string shown = options.folder.generic_string();
  if (const std::string why = why_not(options.folder); !why.empty()) {
    print_failure(console, {.what = "'" + shown + "' cannot take a new study: " + why,
                            .expected = "a folder that does not exist or is empty",
                            .to_do = "choose another name",
                            .place = {}});
    return kWrongInput;
  }
  for (const auto& [below, texts] : starter_study()) {
    const auto written =
        write_files(below.empty() ? options.folder : options.folder / below, texts);
    if (written) continue;
    print_failure(console, written.failure());
    return kWrongInput;
  }
  console.out << "wrote a starter study to " << shown << "\n"
              << "  study.toml         the question, the readouts, the unknowns\n"
              << "  hypotheses/*.toml  one mechanism each\n"
              << "  experiments/*      one run each, with its table\n"
              << "next: gainsay judge " << shown << "\n";
  return kDone;
}

}  // namespace gainsay::cli
