// The script that installs Debian's packages, among commands that stand in for the system's:
// nothing is installed here.

#include "gainsay/testing/program_run.h"
#include "gainsay/testing/scratch_folder.h"

#include <gmock/gmock.h>

#include <string>

namespace gainsay {
namespace {

using ::testing::HasSubstr;
using ::testing::IsEmpty;
using ::testing::Not;
using testing::quoted;

constexpr const char* kDebian12 = "ID=debian\nVERSION_ID=\"12\"\n";
constexpr const char* kNothingInstalled = "exit 1";
constexpr const char* kAllInstalled = "shift 2; printf '%s=installed ' \"$@\"";

class Setup : public ::testing::Test {
 protected:
  Setup() {
    system(kDebian12);
    command("dpkg-query", kNothingInstalled);
    command("env", "while [[ $1 == *=* ]]; do shift; done; exec \"$@\"");
    command("apt-get", "echo apt-get \"$@\" >&2");
    user("0");
  }

  void system(const std::string& release) { folder_.write("os-release", release); }
  void user(const std::string& id) { command("id", "echo " + id); }

  void command(const std::string& name, const std::string& does) {
    folder_.write("bin/" + name, "#!/bin/bash\n" + does + "\n");
    std::filesystem::permissions(folder_.path() / "bin" / name, std::filesystem::perms::owner_all);
  }

  /// Status, output and messages of cli/setup, which finds no other commands than the ones above.
  testing::ProgramRun run(const std::string& groups, const std::string& environment = {}) const {
    const std::string path = folder_.path().string();
    const std::string line =
        "PATH=" + quoted(path + "/bin") + " GAINSAY_OS_RELEASE=" + quoted(path + "/os-release") +
        " " + environment + " /bin/bash " + quoted(GAINSAY_SOURCE_DIR "/cli/setup") + " " + groups +
        " >" + quoted(path + "/out") + " 2>" + quoted(path + "/messages");
    const int ended = std::system(line.c_str());
    return {.status = WIFEXITED(ended) ? WEXITSTATUS(ended) : -1,
            .out = folder_.read("out"),
            .messages = folder_.read("messages")};
  }

  testing::ScratchFolder folder_;
};

TEST_F(Setup, IsSilentWhereNothingIsMissing) {
  command("dpkg-query", kAllInstalled);
  const testing::ProgramRun run = this->run("build tests checks");
  EXPECT_EQ(run.status, 0);
  EXPECT_THAT(run.out + run.messages, IsEmpty());
}

TEST_F(Setup, InstallsWhatIsMissingAsRoot) {
  command("dpkg-query", "printf 'cmake=installed ninja-build=config-files '");
  const testing::ProgramRun run = this->run("build");
  EXPECT_EQ(run.status, 0) << run.messages;
  EXPECT_THAT(
      run.messages,
      HasSubstr("Installing from Debian's packages, which can take some minutes: g++ ninja-build"));
  EXPECT_THAT(run.messages, HasSubstr("apt-get -qq update\napt-get -qq install --yes"));
  EXPECT_THAT(run.messages, Not(HasSubstr("cmake"))) << "it is there already";
}

TEST_F(Setup, InstallsThroughSudoOtherwise) {
  user("1000");
  command("sudo", "echo through sudo >&2; exec \"$@\"");
  const testing::ProgramRun run = this->run("build");
  EXPECT_EQ(run.status, 0) << run.messages;
  EXPECT_THAT(run.messages, HasSubstr("through sudo\napt-get -qq update"));
}

TEST_F(Setup, StopsWithTheListWhereNeitherRootNorSudo) {
  user("1000");
  const testing::ProgramRun run = this->run("build");
  EXPECT_EQ(run.status, 1);
  EXPECT_THAT(run.messages, HasSubstr("neither root nor sudo, so nothing is installed"));
  EXPECT_THAT(run.messages, HasSubstr("        libceres-dev\n"));
  EXPECT_THAT(run.messages, HasSubstr("to do: install them"));
  EXPECT_THAT(run.messages, Not(HasSubstr("apt-get")));
}

TEST_F(Setup, StopsWithTheListOnAnotherSystem) {
  system("ID=fedora\nVERSION_ID=40\n");
  const testing::ProgramRun run = this->run("build tests");
  EXPECT_EQ(run.status, 1);
  EXPECT_THAT(run.messages, HasSubstr("this is not Debian 12, so nothing is installed"));
  EXPECT_THAT(run.messages, HasSubstr("        libgtest-dev\n"));
  EXPECT_THAT(run.messages, Not(HasSubstr("apt-get")));
}

TEST_F(Setup, GoesOnWithoutLookingIfToldSo) {
  system("ID=fedora\nVERSION_ID=40\n");
  EXPECT_EQ(run("build", "GAINSAY_SKIP_SETUP=1").status, 0);
}

TEST_F(Setup, NamesAnUnknownGroup) {
  const testing::ProgramRun run = this->run("bulid");
  EXPECT_EQ(run.status, 2);
  EXPECT_THAT(run.messages, HasSubstr("unknown group 'bulid'; there are build, tests, checks"));
}

}  // namespace
}  // namespace gainsay
