#include "gainsay/estimation/measurement.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using ::testing::ElementsAre;
using testing::shows;
using testing::written;

using Kind = Coefficient::Kind;

Readout glow(Kind scale, Kind offset) {
  Readout readout = shows("glow", "A");
  readout.scale.kind = scale;
  readout.offset.kind = offset;
  return readout;
}

TEST(Measurement, ScaleTimesShownPlusOffset) {
  Readout fixed = shows("glow", "A");
  EXPECT_EQ(core::print_text(measurement(fixed, written("A"), "r")), "A");
  fixed.scale.value = 3;
  fixed.offset.value = -1;
  EXPECT_EQ(measurement(fixed, written("A"), "r"),
            core::Expression(3) * written("A") + core::Expression(-1));
  EXPECT_EQ(measurement(glow(Kind::Unknown, Kind::PerExperiment), written("A"), "r"),
            core::Expression::symbol("scale.glow") * written("A") +
                core::Expression::symbol("offset.glow[r]"));
}

// Ranges of the study-file reference, m = 50 the largest |reading|.
TEST(Measurement, DefaultRangesFollowTheLargestReading) {
  Bench bench("r1");
  bench.data("glow", {{0, 3}, {1, -50}, {2, 1e9}});
  bench.last_point().left_out = "bubble";
  const std::vector<Experiment> experiments{bench, Bench("r2").data("other", {{0, 1e6}})};
  const std::vector<Readout> readouts{glow(Kind::Unknown, Kind::Unknown)};
  EXPECT_EQ(largest_reading(readouts[0], experiments), 50);

  const auto unknowns = measurement_unknowns(readouts, experiments);
  ASSERT_EQ(unknowns.size(), 2U);
  EXPECT_EQ(unknowns[0].name, "scale.glow");
  EXPECT_DOUBLE_EQ(unknowns[0].low, 50e-6);
  EXPECT_DOUBLE_EQ(unknowns[0].high, 50e6);
  EXPECT_FALSE(unknowns[0].linear);
  EXPECT_EQ(unknowns[1].name, "offset.glow");
  EXPECT_DOUBLE_EQ(unknowns[1].low, -500);
  EXPECT_DOUBLE_EQ(unknowns[1].high, 500);
  EXPECT_TRUE(unknowns[1].linear);
  for (const auto& unknown : unknowns) EXPECT_EQ(unknown.kind, UnknownKind::Measurement);
}

TEST(Measurement, ASignedScaleIsLinear) {
  std::vector<Readout> readouts{glow(Kind::Unknown, Kind::Fixed)};
  readouts[0].is_signed = true;
  const std::vector<Experiment> none{Bench("r")};
  const auto unknowns = measurement_unknowns(readouts, none);
  ASSERT_EQ(unknowns.size(), 1U);
  EXPECT_EQ(unknowns[0].low, -1e6) << "m is 1 where nothing was read";
  EXPECT_EQ(unknowns[0].high, 1e6);
  EXPECT_TRUE(unknowns[0].linear);
}

TEST(Measurement, OneUnknownForEachExperimentWhereSaid) {
  const std::vector<Readout> readouts{glow(Kind::PerExperiment, Kind::Unknown)};
  const std::vector<Experiment> experiments{Bench("a"), Bench("b")};
  std::vector<std::string> names;
  for (const auto& unknown : measurement_unknowns(readouts, experiments))
    names.push_back(unknown.name);
  EXPECT_THAT(names, ElementsAre("scale.glow[a]", "scale.glow[b]", "offset.glow"));
}

}  // namespace
}  // namespace gainsay::estimation
