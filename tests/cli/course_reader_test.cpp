#include "gainsay/cli/course_reader.h"

#include "gainsay/testing/reading.h"

#include <gtest/gtest.h>

#include <string>
#include <utility>
#include <vector>

namespace gainsay::cli {
namespace {

using Steps = std::vector<std::pair<double, double>>;

std::vector<estimation::InputCourse> read(const std::string& text,
                                          const std::vector<DeclaredInput>& inputs,
                                          double begins = 0.0) {
  const TomlValue document = testing::toml(text);
  Diagnostics diagnostics;
  const CheckedTable top(document, Section::Experiment, Section::Experiment, diagnostics);
  auto courses = read_courses(top, inputs, begins, {}, diagnostics);
  EXPECT_EQ(testing::said(diagnostics), "");
  return courses;
}

const std::vector<DeclaredInput> kLight = {{"light", std::nullopt, {}}};
const std::vector<DeclaredInput> kLightOrDark = {{"light", 0.5, {}}};

TEST(CourseReader, ANumberHoldsThroughout) {
  EXPECT_EQ(read("inputs.light = 3\n", kLight, -2.0)[0].steps, (Steps{{-2, 3}}));
}

TEST(CourseReader, StepsAreKept) {
  EXPECT_EQ(read("inputs.light = { steps = [[-1, 3], [5, 4.5]] }\n", kLight)[0].steps,
            (Steps{{-1, 3}, {5, 4.5}}));
}

TEST(CourseReader, WithoutAFirstStepTheStudysValueHoldsAtTheBeginning) {
  EXPECT_EQ(read("inputs.light.steps = [[5, 4]]\n", kLightOrDark)[0].steps,
            (Steps{{0, 0.5}, {5, 4}}));
}

TEST(CourseReader, AnInputThatIsNotGivenIsAsOtherwise) {
  const auto courses = read("", kLightOrDark);
  ASSERT_EQ(courses.size(), 1U);
  EXPECT_EQ(courses[0].input, "light");
  EXPECT_EQ(courses[0].steps, (Steps{{0, 0.5}}));
}

}  // namespace
}  // namespace gainsay::cli
