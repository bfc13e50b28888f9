#include "gainsay/cli/readout_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

using estimation::Coefficient;

ReadReadout read(const std::string& table) {
  const TomlValue document = testing::toml("[readouts]\nglow = " + table + "\n");
  Diagnostics diagnostics;
  const CheckedTable top(document, Section::Study, Section::Study, diagnostics);
  const auto readouts = read_readouts(top, diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return readouts.empty() ? ReadReadout{} : readouts.front();
}

TEST(ReadoutReader, WithoutMoreTheScaleIsOneAndTheOffsetNothing) {
  const ReadReadout read_one = read("{ shows = 'A', noise = { sd = 0.1 } }");
  const estimation::Readout& readout = read_one.readout;
  EXPECT_EQ(readout.name, "glow");
  EXPECT_EQ(readout.title, "glow");
  EXPECT_EQ(readout.scale, (Coefficient{Coefficient::Kind::Fixed, 1.0}));
  EXPECT_EQ(readout.offset, (Coefficient{Coefficient::Kind::Fixed, 0.0}));
  EXPECT_FALSE(readout.is_signed);
  EXPECT_FALSE(readout.logarithmic_axis);
  EXPECT_EQ(read_one.sd_of, "");
}

TEST(ReadoutReader, AllKeys) {
  const ReadReadout read_one = read(
      "{ shows = '2 * A', title = 'Glow', unit = 'a.u.', scale = 'unknown per experiment', "
      "offset = 'unknown', signed = true, axis = 'log', sd_of = 'mean', "
      "noise = { sd = 0.1, relative = 0.03 } }");
  const estimation::Readout& readout = read_one.readout;
  EXPECT_EQ(readout.title, "Glow");
  EXPECT_EQ(readout.unit, "a.u.");
  EXPECT_EQ(readout.scale.kind, Coefficient::Kind::PerExperiment);
  EXPECT_EQ(readout.offset.kind, Coefficient::Kind::Unknown);
  EXPECT_TRUE(readout.is_signed);
  EXPECT_TRUE(readout.logarithmic_axis);
  EXPECT_EQ(read_one.sd_of, "mean");
  EXPECT_EQ(readout.noise.sd, 0.1);
  EXPECT_EQ(readout.noise.relative, 0.03);
  EXPECT_EQ(readout.shows, core::Expression(2.0) * core::Expression::symbol("A"));
}

TEST(ReadoutReader, AScaleMayBeANumber) {
  EXPECT_EQ(read("{ shows = 'A', scale = -2, offset = 3, noise = { sd = 1 } }").readout.scale.value,
            -2.0);
}

TEST(ReadoutReader, ThreeKindsOfNoise) {
  EXPECT_TRUE(read("{ shows = 'A', noise = { sd = 'unknown' } }").readout.noise.sd_unknown);
  EXPECT_TRUE(read("{ shows = 'A', noise = { relative = 0.1 } }").readout.noise.depends_on_model());
  EXPECT_FALSE(read("{ shows = 'A' }").readout.noise.said());
}

}  // namespace
}  // namespace gainsay::cli
