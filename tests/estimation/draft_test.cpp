#include "gainsay/estimation/draft.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

#include <cmath>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using testing::between;
using ::testing::ElementsAre;
using ::testing::HasSubstr;
using ::testing::IsEmpty;
using ::testing::IsNan;
using testing::Mechanism;
using ::testing::Pair;
using testing::shows;

/// One compartment with a depot, as a pharmacologist would write it.
core::Hypothesis one_compartment() {
  return Mechanism("one compartment")
      .compartment("plasma", "V1")
      .amount("depot")
      .species("drug", "c0")
      .held("salt", "150")
      .flow("absorption", {{"depot", 1}}, {{"drug", 1}}, "ka * depot")
      .flow("elimination", {{"drug", 1}}, {}, "CL * drug")
      .known("c0", 0.25)
      .unknowns({"ka", "CL", "V1", "size"})
      .inputs({"T", "feed"});
}

class DraftTest : public ::testing::Test {
 protected:
  core::Result<Draft> draft_of(const Experiment& experiment, bool all_readouts = false) const {
    const std::vector<Experiment> experiments{experiment};
    const Ground ground = make_ground(hypothesis_, declared_, readouts_, experiments);
    return draft(ground, experiment, all_readouts);
  }
  Draft good(const Experiment& experiment, bool all_readouts = false) const {
    auto made = draft_of(experiment, all_readouts);
    if (made) return *made;
    ADD_FAILURE() << made.failure().what;
    return {};
  }
  std::string bad(const Experiment& experiment) const {
    const auto made = draft_of(experiment);
    return made ? "no failure" : made.failure().what;
  }

  const core::Hypothesis hypothesis_ = one_compartment();
  std::vector<DeclaredUnknown> declared_{between("ka", 0.1, 10), between("CL", 0.1, 10),
                                         between("V1", 1, 100), between("size", 1, 100)};
  std::vector<Readout> readouts_{shows("plasma", "drug", 0.1), shows("total", "depot + drug * V1")};
};

TEST_F(DraftTest, EquationsAreInStatesAndUnknownsAlone) {
  const Draft made = good(Bench("low").start("depot", "20"));
  EXPECT_THAT(made.system.states, ElementsAre("depot", "drug", "salt"));
  EXPECT_EQ(core::print_text(made.system.rates[1]), "(ka * depot - CL * drug) / V1");
  EXPECT_THAT(made.system.starts, ElementsAre(20.0, 0.25, 150.0))
      << "the experiment's start before the hypothesis' before 0";
}

TEST_F(DraftTest, AStartOfItsOwnIsAnUnknownByItsName) {
  const Draft made = good(Bench("low").start("depot", between("", 1, 9).unknown));
  EXPECT_EQ(made.system.starts[0], core::Expression::symbol("start.depot[low]"));
}

TEST_F(DraftTest, DosesComeInTheUnitOfTheState) {
  const Draft made = good(Bench("doses")
                              .add(1, "depot", "20")
                              .add(2, "drug", "size")
                              .raise(3, "drug", "0.5")
                              .raise(4, "depot", "2")
                              .add(5, "depot", "0"));
  std::vector<std::string> rises;
  for (const auto& jump : made.system.jumps) rises.push_back(core::print_text(jump.rise));
  EXPECT_THAT(rises, ElementsAre("20", "size / V1", "0.5", "2 * V1"));
  EXPECT_THAT(made.jumps, ElementsAre(Pair(1, 0), Pair(2, 1), Pair(3, 2), Pair(4, 3)));
}

TEST_F(DraftTest, ReadoutsWithoutDataAreLeftOutUnlessAllAreAskedFor) {
  const Bench bench = Bench("low").data("total", {{1, 5}});
  EXPECT_THAT(good(bench).shown, ElementsAre(1));
  EXPECT_THAT(good(bench, true).shown, ElementsAre(0, 1));
  EXPECT_EQ(good(bench, true).series[0].data[0].readout, 1U);
}

TEST_F(DraftTest, LeftOutPointsAreNoData) {
  Bench bench("low");
  bench.data("plasma", {{0, 1}, {1, 5}, {2, 99}});
  bench.last_point().left_out = "clotted";
  const Draft made = good(bench);
  ASSERT_EQ(made.series.size(), 1U);
  EXPECT_EQ(made.series[0].data.size(), 2U);
  EXPECT_EQ(made.series[0].data[1].point, 1U);
  EXPECT_THAT(made.times, ElementsAre(0, 1));

  Bench all_out("low");
  all_out.data("plasma", {{2, 99}});
  all_out.last_point().left_out = "clotted";
  EXPECT_FALSE(has_data(all_out));
  EXPECT_THAT(good(all_out).series, IsEmpty());
}

TEST_F(DraftTest, APointsOwnSdStandsAlone) {
  Bench bench("low");
  bench.data("plasma", {{1, 5}, {2, 6}});
  bench.last_point().sd = 0.7;
  EXPECT_EQ(good(bench).series[0].data[0].sd, 0.1);
  EXPECT_EQ(good(bench).series[0].data[1].sd, 0.7);

  readouts_[0].noise.relative = 0.12;
  EXPECT_THAT(good(bench).series[0].data[0].sd, IsNan()) << "it depends on the modelled value";
  EXPECT_EQ(good(bench).series[0].data[1].sd, 0.7);

  readouts_[0].noise = Noise{.sd = {}, .relative = {}, .sd_unknown = true};
  EXPECT_THAT(good(bench).series[0].data[0].sd, IsNan());
}

TEST_F(DraftTest, ReadingsOfSpeciesTellSizes) {
  readouts_[0].scale.value = 4;
  readouts_[0].offset.value = 1;
  const Draft made = good(Bench("low").data("plasma", {{1, 9}}).data("total", {{1, 7}}));
  ASSERT_EQ(made.readings.size(), 1U) << "V1 is unknown: 'total' tells nothing";
  EXPECT_EQ(made.readings[0].kind, Kind::Concentration);
  EXPECT_EQ(made.readings[0].size, 2);
}

TEST_F(DraftTest, FailuresNameHypothesisExperimentAndMatter) {
  const std::string where = "hypothesis 'one compartment' with experiment 'low': ";
  EXPECT_EQ(bad(Bench("low").start("dpot", "1")),
            where + "a start value is given for 'dpot', which the hypothesis lacks");
  EXPECT_EQ(bad(Bench("low").add(0, "dpot", "1")),
            where + "a dose is given for 'dpot', which the hypothesis lacks");
  EXPECT_EQ(bad(Bench("low").add(1, "salt", "1")),
            where + "a dose goes to 'salt', which this hypothesis holds at its start");
  EXPECT_EQ(bad(Bench("low").begins(5).add(4, "depot", "1")),
            where + "a dose comes before the beginning");
  EXPECT_EQ(bad(Bench("low").begins(5).data("plasma", {{4, 1}})),
            where + "a reading of 'plasma' comes before the beginning");
  EXPECT_EQ(bad(Bench("low").data("plasm", {{4, 1}})),
            where + "there are data of 'plasm', which is no readout");
  EXPECT_EQ(bad(Bench("low").start("depot", "2 * drug")),
            where + "the start value of 'depot' uses the species 'drug'");
  EXPECT_THAT(bad(Bench("low").start("depot", "feed")), HasSubstr("the input 'feed'"));
}

TEST_F(DraftTest, AbsentSpeciesMayBeLacking) {
  const Draft made = good(
      Bench("low").absent("deep").start("deep", "1").add(1, "deep", "2").raise(2, "deep", "3"));
  EXPECT_THAT(made.system.jumps, IsEmpty());
  EXPECT_EQ(made.system.states.size(), 3U);
}

TEST_F(DraftTest, AReadingWithoutAnySdIsAskedAbout) {
  readouts_[0].noise = {};
  EXPECT_THAT(bad(Bench("low").data("plasma", {{1, 2}})),
              HasSubstr("a reading of 'plasma' has no sd"));
  readouts_[0].noise.sd = 0.0;
  EXPECT_THAT(bad(Bench("low").data("plasma", {{1, 2}})), HasSubstr("has no sd"));
  EXPECT_EQ(good(Bench("low").data("plasma", {{1, 2}}), true).series.size(), 1U)
      << "to simulate none is needed";
}

}  // namespace
}  // namespace gainsay::estimation
