#include "gainsay/testing/study_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

using testing::StudyFolder;

/// A study whose readouts are these lines of [readouts].
void write_readouts(StudyFolder& folder, const std::string& lines) {
  folder.write("study.toml",
               "title = \"Does A decay?\"\n[readouts]\n" + lines + "[unknowns]\nk = [0.01, 10]\n");
  folder.write("experiments/run.csv", "time,glow,heat\n1,7.2,3\n2,4.9,5\n");
}

TEST(SharedNoise, NamesTheReadoutWhoseUnknownSdItIs) {
  StudyFolder folder;
  write_readouts(folder,
                 "glow = { shows = \"A\", noise = { sd = \"same as heat\" } }\n"
                 "heat = { shows = \"B\", noise = { sd = \"unknown\" } }\n");
  const StudyReading reading = folder.read();
  ASSERT_TRUE(reading.study.has_value()) << folder.messages();
  const estimation::Noise& noise = reading.study->readouts[0].noise;
  EXPECT_TRUE(noise.sd_unknown);
  EXPECT_EQ(noise.same_as, "heat");
}

TEST(SharedNoise, MustBeUnknownThere) {
  for (const std::string other : {"heat", "warmth", "glow"}) {
    StudyFolder folder;
    write_readouts(folder, "glow = { shows = \"A\", noise = { sd = \"same as " + other +
                               "\" } }\nheat = { shows = \"B\", noise = { sd = 0.1 } }\n");
    EXPECT_EQ(folder.messages(),
              "study.toml:3:1: error: the noise of 'glow' is the same as that of '" + other +
                  "', which has no unknown sd of its own\n" +
                  "    expected a readout with noise = { sd = \"unknown\" }\n" +
                  "    to do: correct the name, or give '" + other + "' that noise\n");
  }
}

}  // namespace
}  // namespace gainsay::cli
