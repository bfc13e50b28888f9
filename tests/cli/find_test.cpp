#include "gainsay/cli/find.h"

#include <gtest/gtest.h>

namespace gainsay::cli {
namespace {

Study two_rivals() {
  Study study;
  study.hypotheses.resize(2);
  study.hypotheses[0].letter = "A";
  study.hypotheses[0].mechanism.title = "Plain";
  study.hypotheses[1].letter = "B";
  study.hypotheses[1].mechanism.title = "Inhibited";
  study.experiments.resize(1);
  study.experiments[0].name = "run-1";
  return study;
}

TEST(Find, ALetterOrATitleNamesAHypothesis) {
  const Study study = two_rivals();
  EXPECT_EQ(*find_hypothesis(study, "B"), 1U);
  EXPECT_EQ(*find_hypothesis(study, "Plain"), 0U);
}

TEST(Find, ASlipIsAnsweredWithTheNearest) {
  const auto found = find_hypothesis(two_rivals(), "Inhibted");
  ASSERT_FALSE(found);
  EXPECT_EQ(found.failure().what, "no hypothesis 'Inhibted' in this study");
  EXPECT_EQ(found.failure().expected, "perhaps 'Inhibited'");
}

TEST(Find, AnExperimentIsFoundByItsName) {
  EXPECT_EQ(*find_experiment(two_rivals(), "run-1"), 0U);
  EXPECT_FALSE(find_experiment(two_rivals(), "run-9"));
}

}  // namespace
}  // namespace gainsay::cli
