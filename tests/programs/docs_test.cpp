// What README.md, DEVELOPERS.md and the pages of docs show is run as shown, each page in an empty
// folder of its own beside a copy of the project's studies:
// - a line that is a path in backticks alone, before a fenced block: the block is that file;
// - `gainsay ...` in backticks, indented by four, or on a line of a fenced block: it is run, and
//   ends with status 0 (commands with words in capitals are patterns, and are not run);
// - a fenced block without a language after an indented command: the command's output, exactly.

#include "gainsay/testing/program_run.h"
#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <filesystem>
#include <optional>
#include <regex>
#include <sstream>
#include <string>
#include <vector>

namespace gainsay {
namespace {

namespace fs = std::filesystem;

const fs::path kRoot = GAINSAY_SOURCE_DIR;

std::vector<std::string> pages() {
  std::vector<std::string> names = {"README.md", "DEVELOPERS.md"};
  std::error_code none_yet;
  for (const auto& entry : fs::directory_iterator(kRoot / "docs", none_yet)) {
    if (entry.path().extension() == ".md")
      names.push_back("docs/" + entry.path().filename().string());
  }
  std::ranges::sort(names);
  return names;
}

/// What a page asks for, in its order.
struct Step {
  enum class Kind { Write, Run } kind = Kind::Run;
  std::string words;                ///< file to write, or command line without `gainsay `
  std::optional<std::string> text;  ///< contents of the file, or output of the command
};

class PageReader {
 public:
  explicit PageReader(const std::string& text) : stream_(text) {}

  std::vector<Step> steps() {
    for (std::string line; std::getline(stream_, line);) take(line);
    return std::move(steps_);
  }

 private:
  void take(const std::string& line) {
    static const std::regex lone_path("`([A-Za-z0-9_./-]+\\.[a-z]+)`");
    std::smatch found;
    if (line.starts_with("```")) {
      take_block(line.substr(3));
    } else if (line.starts_with("    gainsay ")) {
      take_command(line.substr(4), true);
    } else if (std::regex_match(line, found, lone_path)) {
      file_ = found[1];
    } else if (!line.empty()) {
      awaits_output_ = false;
      file_.clear();
      take_inline(line);
    }
  }

  void take_block(const std::string& language) {
    std::string block;
    std::vector<std::string> commands;
    for (std::string line; std::getline(stream_, line) && !line.starts_with("```");) {
      block += line + "\n";
      if (line.starts_with("gainsay ")) commands.push_back(line);
    }
    if (!file_.empty()) {
      steps_.push_back({Step::Kind::Write, file_, block});
    } else if (language.empty() && awaits_output_) {
      steps_.back().text = block;
    } else {
      for (const std::string& command : commands) take_command(command, false);
    }
    file_.clear();
    awaits_output_ = false;
  }

  void take_inline(const std::string& line) {
    static const std::regex quoted("`(gainsay [^`]+)`");
    for (std::sregex_iterator i(line.begin(), line.end(), quoted), end; i != end; ++i)
      take_command((*i)[1], false);
  }

  void take_command(const std::string& command, bool awaits_output) {
    static const std::regex pattern("(^|[ =])[A-Z]{2,}|\\.\\.\\.");
    awaits_output_ = awaits_output;
    if (std::regex_search(command, pattern)) {
      awaits_output_ = false;
      return;
    }
    steps_.push_back({Step::Kind::Run, command.substr(std::string("gainsay ").size()), {}});
  }

  std::istringstream stream_;
  std::vector<Step> steps_;
  std::string file_;
  bool awaits_output_ = false;
};

void copy_studies(const fs::path& folder) {
  fs::create_directories(folder / "docs");
  fs::copy(kRoot / "data", folder / "data", fs::copy_options::recursive);
  for (const auto& study : fs::directory_iterator(folder / "data"))
    fs::remove_all(study.path() / "results");
}

class Page : public ::testing::TestWithParam<std::string> {};

TEST_P(Page, IsTrue) {
  const testing::ScratchFolder folder;
  copy_studies(folder.path());
  std::ostringstream text;
  text << std::ifstream(kRoot / GetParam()).rdbuf();
  for (const Step& step : PageReader(text.str()).steps()) {
    if (step.kind == Step::Kind::Write) {
      folder.write(step.words, *step.text);
      continue;
    }
    const testing::ProgramRun run = testing::run_gainsay_line(
        step.words, "cd " + testing::quoted(folder.path().string()) + " &&");
    EXPECT_EQ(run.status, 0) << "gainsay " << step.words << "\n" << run.messages;
    if (step.text) {
      EXPECT_EQ(run.out, *step.text) << "gainsay " << step.words;
    }
  }
}

INSTANTIATE_TEST_SUITE_P(Docs, Page, ::testing::ValuesIn(pages()), [](const auto& info) {
  std::string name = fs::path(info.param).stem().string();
  std::ranges::replace(name, '-', '_');
  return name;
});

TEST(PageReader, FindsFilesCommandsAndOutputs) {
  const std::string text =
      "Say `gainsay laws` or `gainsay check STUDY`.\n\n`a/study.toml`\n\n```toml\nx = 1\n```\n\n"
      "    gainsay judge a\n\n```\nverdict\n```\n\n```sh\ngainsay new b\n```\n";
  const std::vector<Step> steps = PageReader(text).steps();
  ASSERT_EQ(steps.size(), 4U);
  EXPECT_EQ(steps[0].words, "laws");
  EXPECT_EQ(steps[1].words, "a/study.toml");
  EXPECT_EQ(steps[1].text, "x = 1\n");
  EXPECT_EQ(steps[2].words, "judge a");
  EXPECT_EQ(steps[2].text, "verdict\n");
  EXPECT_EQ(steps[3].words, "new b");
}

}  // namespace
}  // namespace gainsay
