#include "gainsay/cli/command_equations.h"

#include "gainsay/testing/study_folder.h"

#include <gmock/gmock.h>

#include <filesystem>
#include <sstream>

namespace gainsay::cli {
namespace {

using ::testing::AllOf;
using ::testing::HasSubstr;
using ::testing::IsEmpty;
using ::testing::Not;
using ::testing::StartsWith;
using testing::StudyFolder;

struct Ran {
  int status;
  std::string out, messages;
};

class EquationsCommand : public ::testing::Test {
 protected:
  EquationsCommand() {
    folder_.write("hypotheses/second.toml",
                  "base = \"loss.toml\"\ntitle = \"Second order\"\n"
                  "reactions.loss.rate = \"k * A^2\"\n");
    options_.study = folder_.path();
  }
  Ran run() const {
    std::ostringstream out;
    std::ostringstream messages;
    const int status = run_equations(options_, Console{.out = out, .messages = messages});
    return {status, out.str(), messages.str()};
  }
  StudyFolder folder_;
  EquationsOptions options_;
};

TEST_F(EquationsCommand, WritesAllHypothesesOrOne) {
  const Ran all = run();
  EXPECT_EQ(all.status, 0) << all.messages;
  EXPECT_THAT(all.out, AllOf(HasSubstr("A  Loss"), HasSubstr("B  Second order"),
                             HasSubstr("d A / dt = -loss"), HasSubstr("loss = k * A^2   (A -> B)"),
                             HasSubstr("A(0) = 10"), HasSubstr("glow(t) = A   (sd 0.1)"),
                             HasSubstr("Kinetic unknowns\n  k 0.01 to 10")));
  options_.hypothesis = "Second order";
  EXPECT_THAT(run().out, AllOf(StartsWith("B  Second order"), Not(HasSubstr("Loss"))));
  options_.hypothesis = "A";
  EXPECT_THAT(run().out, StartsWith("A  Loss"));
}

TEST_F(EquationsCommand, WritesWholeDocumentsInOtherForms) {
  options_.form = EquationsForm::Latex;
  EXPECT_THAT(run().out, StartsWith("\\documentclass"));
  options_.form = EquationsForm::Html;
  EXPECT_THAT(run().out, StartsWith("<!doctype html>"));
}

TEST_F(EquationsCommand, NeedsNoExperiments) {
  std::filesystem::remove_all(folder_.path() / "experiments");
  const Ran ran = run();
  EXPECT_EQ(ran.status, 0) << ran.messages;
  EXPECT_THAT(ran.out, AllOf(HasSubstr("A(0) = 5"), HasSubstr("Kinetic unknowns\n  k 0.01 to 10")));
}

TEST_F(EquationsCommand, AnUnknownHypothesisIsAnError) {
  options_.hypothesis = "Second ordr";
  const Ran ran = run();
  EXPECT_EQ(ran.status, 2);
  EXPECT_THAT(ran.out, IsEmpty());
  EXPECT_THAT(ran.messages, HasSubstr("Second order"));
}

TEST_F(EquationsCommand, AWrongStudyIsAnError) {
  folder_.write("hypotheses/loss.toml", "title = \n");
  const Ran ran = run();
  EXPECT_EQ(ran.status, 2);
  EXPECT_THAT(ran.out, IsEmpty());
  EXPECT_THAT(ran.messages, HasSubstr("hypotheses/loss.toml:1:"));
}

}  // namespace
}  // namespace gainsay::cli
