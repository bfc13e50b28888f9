#include "gainsay/cli/equations.h"

#include <gmock/gmock.h>

namespace gainsay::cli {
namespace {

using core::Expression;
using ::testing::HasSubstr;
using Left = Equation::Left;

StateSpace decay() {
  const Expression A = Expression::symbol("A");
  const Expression loss = Expression::symbol("loss");
  StateSpace form{"B", "Decay", {}, true, {{"A", "A*"}}};
  form.sections.push_back({"Derivatives", {{Left::Derivative, "A", -loss, {}, ""}}, {}});
  form.sections.push_back({"Reactions",
                           {{Left::Name, "loss", Expression::symbol("k") * A,
                             ReactionEquation{{{1.0, "A", {}}}, {}, false}, "a flow"}},
                           {}});
  form.sections.push_back({"Start values", {{Left::AtBeginning, "A", 2.0, {}, "in low"}}, {}});
  form.sections.push_back({"Measurement equations", {{Left::OverTime, "glow", A, {}, ""}}, {}});
  form.sections.push_back({"Additions", {{Left::Rise, "A", 1.0, {}, "at t = 3"}}, {}});
  form.sections.push_back({"Kinetic unknowns", {}, {{"k", "0.1 to 10"}, {"kd[run-03]", "1 to 2"}}});
  return form;
}

TEST(EquationsText, IsSetInColumns) {
  EXPECT_EQ(equations_text(decay()),
            "B  Decay\n"
            "========\n"
            "\n"
            "Derivatives\n"
            "  d A / dt = -loss\n"
            "\n"
            "Reactions\n"
            "  loss = k * A   (A ->; a flow)\n"
            "\n"
            "Start values\n"
            "  A(0) = 2   (in low)\n"
            "\n"
            "Measurement equations\n"
            "  glow(t) = A\n"
            "\n"
            "Additions\n"
            "  rise of A = 1   (at t = 3)\n"
            "\n"
            "Kinetic unknowns\n"
            "  k          0.1 to 10\n"
            "  kd[run-03] 1 to 2\n");
}

TEST(EquationsText, ALateBeginningIsNotZero) {
  StateSpace form = decay();
  form.begins_at_zero = false;
  EXPECT_THAT(equations_text(form), HasSubstr("A(t0) = 2"));
}

TEST(EquationsText, WordsWithoutRoomStandBelow) {
  StateSpace form = decay();
  form.sections[0].equations[0].right = Expression::symbol(std::string(85, 'x'));
  form.sections[0].equations[0].words = "held by the experimenter";
  EXPECT_THAT(equations_text(form), HasSubstr("x\n             (held by the experimenter)\n"));
}

}  // namespace
}  // namespace gainsay::cli
