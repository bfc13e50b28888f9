#include "gainsay/cli/command_simulate.h"

#include "gainsay/testing/scratch_folder.h"

#include <gmock/gmock.h>

#include <cmath>
#include <sstream>

namespace gainsay::cli {
namespace {

using ::testing::HasSubstr;
using ::testing::StartsWith;

struct Ran {
  int status;
  std::string out, messages;
};

Ran run(const SimulateOptions& options) {
  std::ostringstream out, messages;
  const Console console{.out = out, .messages = messages};
  const int status = run_simulate(options, console);
  return {status, out.str(), messages.str()};
}

class Simulate : public ::testing::Test {
 protected:
  Simulate() {
    folder.write(
        "study.toml",
        "title = \"Decay\"\n[readouts]\ndouble_A = { shows = \"2 * A\", noise = { sd = 1 } }\n");
    folder.write(
        "hypotheses/decay.toml",
        "species.A = { start = 1 }\nreactions.decay = { equation = \"A ->\", rate = \"k * A\" }\n"
        "unknowns.k = [0.01, 10]\n");
    folder.write("experiments/run.toml", "start = { A = 3 }\n");
    folder.write("experiments/run.csv", "time,double_A\n0.5,5\n2,3\n");
    options.study = folder.path();
    options.hypothesis = "A";
  }
  gainsay::testing::ScratchFolder folder;
  SimulateOptions options;
};

// dA/dt = -k A: closed form; 1e-5 is ten times the relative control of 1e-6.
TEST_F(Simulate, WritesStatesReadoutsAndSensitivities) {
  options.values = {{"k", 0.5}};
  options.until = 2.0;
  options.every = 1.0;
  options.sensitivities = true;
  const Ran ran = run(options);
  ASSERT_EQ(ran.status, 0) << ran.messages;
  EXPECT_THAT(ran.out, StartsWith("time,A,double_A,d A / d k\n0,1,2,0\n"));
  std::istringstream last(ran.out.substr(ran.out.rfind("\n2,") + 1));
  double time = 0, a = 0, shown = 0, derivative = 0;
  char comma = 0;
  last >> time >> comma >> a >> comma >> shown >> comma >> derivative;
  EXPECT_NEAR(a, std::exp(-1.0), 1e-5);
  EXPECT_NEAR(shown, 2.0 * std::exp(-1.0), 2e-5);
  EXPECT_NEAR(derivative, -2.0 * std::exp(-1.0), 2e-5);
}

TEST_F(Simulate, AnExperimentGivesItsStartsAndTimes) {
  options.values = {{"k", 0.5}};
  options.experiment = "run";
  const Ran ran = run(options);
  ASSERT_EQ(ran.status, 0) << ran.messages;
  EXPECT_THAT(ran.out, HasSubstr("\n0.5,2.33"));  // 3 exp(-0.25) = 2.3364
}

TEST_F(Simulate, AMissingValueIsAskedForWithTheOptionToAdd) {
  options.until = 1.0;
  const Ran ran = run(options);
  EXPECT_EQ(ran.status, 2);
  EXPECT_EQ(ran.out, "");
  EXPECT_THAT(ran.messages, HasSubstr("no value for k"));
  EXPECT_THAT(ran.messages, HasSubstr("add --set k=VALUE"));
}

TEST_F(Simulate, ASlipInSetNamesTheNearest) {
  options.values = {{"kk", 0.5}};
  options.until = 1.0;
  const Ran ran = run(options);
  EXPECT_EQ(ran.status, 2);
  EXPECT_THAT(ran.messages, HasSubstr("'kk', which is no unknown here"));
}

TEST_F(Simulate, TimesMustMakeSense) {
  options.values = {{"k", 0.5}};
  options.every = 1.0;
  EXPECT_THAT(run(options).messages, HasSubstr("--every is given without --until"));
  options.until = -1.0;
  EXPECT_THAT(run(options).messages, HasSubstr("an end after the beginning"));
  options.until = 1e300;
  EXPECT_THAT(run(options).messages, HasSubstr("at most a million steps"));
}

TEST(Settings, AreNamesAndFiniteNumbers) {
  EXPECT_EQ(read_settings({"k=0.2", "Km=1e-3"})->at("Km"), 1e-3);
  for (const char* wrong : {"k", "k=", "=2", "k=2x", "k=inf", "k=nan"})
    EXPECT_FALSE(read_settings({wrong})) << wrong;
  EXPECT_FALSE(read_settings({"k=1", "k=2"}));
}

}  // namespace
}  // namespace gainsay::cli
