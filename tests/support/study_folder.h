#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/testing/scratch_folder.h"

#include <initializer_list>
#include <map>
#include <sstream>
#include <string>
#include <utility>

namespace gainsay::testing {

/// A small study of A -> B that reads without a word, to be changed file by file.
class StudyFolder {
 public:
  StudyFolder() {
    write("study.toml", kStudy);
    write("hypotheses/loss.toml", kLoss);
    write("experiments/run.toml", kRun);
    write("experiments/run.csv", kTable);
  }
  StudyFolder(std::initializer_list<std::pair<const char*, const char*>> changed) : StudyFolder() {
    for (const auto& [name, text] : changed) write(name, text);
  }

  void write(const std::string& name, const std::string& text) { folder_.write(name, text); }
  const std::filesystem::path& path() const { return folder_.path(); }

  cli::StudyReading read(cli::ReadFor what_for = cli::ReadFor::Judging) const {
    return cli::read_study(folder_.path(), what_for);
  }
  /// What reading it says, as it is printed.
  std::string messages(cli::ReadFor what_for = cli::ReadFor::Judging) const {
    std::ostringstream out;
    cli::print(out, read(what_for).diagnostics, false);
    return out.str();
  }

  static constexpr const char* kStudy =
      "title = \"Does A decay?\"\n"
      "[readouts]\n"
      "glow = { shows = \"A\", noise = { sd = 0.1 } }\n"
      "[unknowns]\n"
      "k = [0.01, 10]\n";
  static constexpr const char* kLoss =
      "title = \"Loss\"\n"
      "[species]\n"
      "A = { start = 5 }\n"
      "B = {}\n"
      "[reactions]\n"
      "loss = { equation = \"A -> B\", rate = \"k * A\" }\n";
  static constexpr const char* kRun = "start = { A = 10 }\n";
  static constexpr const char* kTable =
      "time,glow\n"
      "1,7.2\n"
      "2,4.9\n";

 private:
  ScratchFolder folder_;
};

}  // namespace gainsay::testing
