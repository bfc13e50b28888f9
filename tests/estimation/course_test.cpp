#include "gainsay/estimation/course.h"

#include "gainsay/core/require.h"
#include "gainsay/testing/bench.h"

#include <gmock/gmock.h>

namespace gainsay::estimation {
namespace {

using testing::Bench;
using ::testing::ElementsAre;
using ::testing::IsEmpty;
using ::testing::Pair;

TEST(Course, AnInputHasTheValueOfItsLastStep) {
  const InputCourse feed{"feed", {{0, 0}, {30, 5}, {90, 1}}};
  EXPECT_EQ(value_at(feed, 0), 0);
  EXPECT_EQ(value_at(feed, 29.9), 0);
  EXPECT_EQ(value_at(feed, 30), 5);
  EXPECT_EQ(value_at(feed, 1e9), 1);
  EXPECT_THROW(value_at(feed, -1), core::BrokenPromise);
}

TEST(Course, IsConstantIfNothingChangesFromTheBeginningOn) {
  EXPECT_TRUE(is_constant({"T", {{0, 25}}}, 0));
  EXPECT_TRUE(is_constant({"T", {{0, 25}, {5, 25}}}, 0));
  EXPECT_TRUE(is_constant({"T", {{0, 20}, {5, 25}}}, 5));
  EXPECT_FALSE(is_constant({"T", {{0, 20}, {5, 25}}}, 4));
}

TEST(Schedule, MergesWhatHappensAtOneTime) {
  const Experiment experiment =
      Bench("run").input("feed", {{0, 0}, {30, 5}, {40, 5}}).input("T", {{-1, 20}, {30, 25}});
  const core::Schedule made =
      schedule(experiment, {"T", "feed"}, {{30, 0}, {10, 1}, {30, 2}}, {20, 5, 20});
  EXPECT_EQ(made.begins, 0);
  EXPECT_THAT(made.inputs, ElementsAre(20, 0));
  EXPECT_THAT(made.outputs, ElementsAre(5, 20));
  ASSERT_EQ(made.events.size(), 2U) << "the step from 5 to 5 is none";
  EXPECT_EQ(made.events[0].time, 10);
  EXPECT_THAT(made.events[0].jumps, ElementsAre(1));
  EXPECT_THAT(made.events[0].settings, IsEmpty());
  EXPECT_EQ(made.events[1].time, 30);
  EXPECT_THAT(made.events[1].jumps, ElementsAre(0, 2));
  EXPECT_THAT(made.events[1].settings, ElementsAre(Pair(0, 25), Pair(1, 5)));
}

TEST(Schedule, StepsBeforeTheBeginningAreNoEvents) {
  const Experiment experiment = Bench("late").begins(10).input("feed", {{0, 1}, {10, 2}, {11, 3}});
  const core::Schedule made = schedule(experiment, {"feed"}, {}, {});
  EXPECT_EQ(made.begins, 10);
  EXPECT_THAT(made.inputs, ElementsAre(2));
  ASSERT_EQ(made.events.size(), 1U);
  EXPECT_EQ(made.events[0].time, 11);
}

}  // namespace
}  // namespace gainsay::estimation
