#include "gainsay/estimation/names.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using testing::between;
using ::testing::HasSubstr;
using testing::Mechanism;
using testing::per_experiment;
using testing::written;

class NamesTest : public ::testing::Test {
 protected:
  core::Result<core::Expression> over_time(const char* text) const {
    return names().over_time(written(text), "the rate of 'loss'");
  }
  std::string resolved(const char* text) const {
    const auto result = over_time(text);
    return result ? core::print_text(*result) : result.failure().what;
  }
  std::string at(double time, const char* text) const {
    const auto result = names().at_time(written(text), time, "the start value of 'A'");
    return result ? core::print_text(*result) : result.failure().what;
  }
  Names names() const { return {hypothesis_, declared_, experiments_, experiments_.front()}; }

  const core::Hypothesis hypothesis_ = Mechanism("decay")
                                           .species("A")
                                           .known("c", 2)
                                           .known("fill", 3)
                                           .unknowns({"k", "kd", "lost"})
                                           .inputs({"T", "feed", "stir"});
  const std::vector<DeclaredUnknown> declared_{between("k", 1, 2),
                                               per_experiment(between("kd", 1, 2))};
  const std::vector<Experiment> experiments_{
      Bench("run-03").known("fill", 5).input("T", {{0, 25}}).input("feed", {{0, 1}, {30, 4}}),
      Bench("run-04").known("load", 7)};
};

TEST_F(NamesTest, KnownsAreNumbersTheExperimentsBeforeTheHypothesis) {
  EXPECT_EQ(resolved("c * A + fill"), "2 * A + 5");
}

TEST_F(NamesTest, UnknownsOfOneExperimentCarryItsName) {
  EXPECT_EQ(resolved("k * A"), "k * A");
  EXPECT_EQ(core::symbols(*over_time("kd * A")),
            (std::set<std::string, std::less<>>{"A", "kd[run-03]"}));
}

TEST(Particular, ConditionsWithoutANameAddNothing) {
  EXPECT_EQ(particular("kd", "run-03"), "kd[run-03]");
  EXPECT_EQ(particular("kd", ""), "kd");
}

TEST_F(NamesTest, InputsThatNeverChangeAreNumbers) {
  EXPECT_EQ(resolved("T * A"), "25 * A");
  EXPECT_EQ(resolved("feed * A + t"), "feed * A + t");
}

TEST_F(NamesTest, AtATimeInputsHaveValues) {
  EXPECT_EQ(at(0, "k * feed"), "k");
  EXPECT_EQ(at(30, "k * feed * T"), "100 * k");
  EXPECT_EQ(at(30, "k + t"), "k + 30");
}

TEST_F(NamesTest, FailuresSayWhereAndWhatToDo) {
  EXPECT_EQ(at(0, "2 * A"),
            "hypothesis 'decay' with experiment 'run-03': the start value of 'A' uses the species "
            "'A'");
  const auto nothing = over_time("fil * A").failure();
  EXPECT_EQ(nothing.what,
            "hypothesis 'decay' with experiment 'run-03': 'fil', used in the rate of 'loss', means "
            "nothing in this hypothesis");
  EXPECT_THAT(nothing.expected, HasSubstr("nearest known name: 'fill'"));

  EXPECT_THAT(resolved("load"), HasSubstr("the known 'load', used in the rate of 'loss', is not"));
  EXPECT_THAT(over_time("load").failure().expected, HasSubstr("as 'run-04' gives one"));
  EXPECT_THAT(resolved("stir"), HasSubstr("the input 'stir', used in the rate of 'loss', is not"));
  EXPECT_THAT(resolved("lost"), HasSubstr("the unknown 'lost' has no range"));
}

TEST_F(NamesTest, AnExperimentMayNotFixAnUnknown) {
  const std::vector<Experiment> fixing{Bench("run-05").known("k", 1)};
  const Names names(hypothesis_, declared_, fixing, fixing.front());
  EXPECT_THAT(names.over_time(written("k"), "a rate").failure().what,
              HasSubstr("gives a value to 'k', which is an unknown"));
}

}  // namespace
}  // namespace gainsay::estimation
