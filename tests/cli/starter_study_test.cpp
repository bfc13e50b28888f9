#include "gainsay/cli/starter_study.h"

#include "gainsay/cli/mechanism_warnings.h"
#include "gainsay/cli/study_reader.h"
#include "gainsay/testing/scratch_folder.h"

#include <gtest/gtest.h>

#include <string>

namespace gainsay::cli {
namespace {

TEST(StarterStudy, ReadsWithoutAWord) {
  const testing::ScratchFolder folder;
  for (const auto& [below, texts] : starter_study()) {
    for (const auto& [name, text] : texts)
      folder.write(below.empty() ? name : below + "/" + name, text);
  }
  const StudyReading reading = read_study(folder.path());
  ASSERT_TRUE(reading.study.has_value());
  EXPECT_TRUE(reading.diagnostics.empty());
  EXPECT_TRUE(mechanism_warnings(reading).empty());
  EXPECT_EQ(reading.study->hypotheses.size(), 3U);
  EXPECT_EQ(reading.study->experiments.size(), 2U);
}

TEST(StarterStudy, SaysThatItIsInvented) {
  EXPECT_NE(starter_study().at("").at("study.toml").find("invented"), std::string::npos);
}

}  // namespace
}  // namespace gainsay::cli
