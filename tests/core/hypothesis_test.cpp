#include "gainsay/core/hypothesis.h"

#include "gainsay/core/print.h"
#include "gainsay/testing/mechanism.h"

#include <gmock/gmock.h>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using ::testing::IsEmpty;
using testing::Mechanism;
using testing::written;

Hypothesis titration() {
  return Mechanism("titration")
      .compartment("tank", "fill")
      .species("amide")
      .species("acid")
      .rate("hydrolysis", {{"amide", 1}}, {{"acid", 1}}, "vmax * amide / brake", "kb * acid")
      .where("base_added", "hydrolysis * tank / c_base")
      .where("brake", "1 + acid / ki");
}

TEST(WrittenOut, ReplacesCompartmentsReactionsAndDefinitionsThroughEachOther) {
  EXPECT_EQ(print_text(written_out(written("base_added + amide"), titration())),
            "(vmax * amide / (1 + acid / ki) - kb * acid) * fill / c_base + amide");
}

TEST(WrittenOut, LeavesElementaryNamesAlone) {
  const Expression elementary = written("amide * vmax + t");
  EXPECT_EQ(written_out(elementary, titration()), elementary);
}

TEST(WrittenOut, SeveralExpressionsShareWhatTheyHaveInCommon) {
  const auto both = written_out({written("brake"), written("brake")}, titration());
  EXPECT_EQ(both[0].identity(), both[1].identity());
}

TEST(WrittenOut, ACircleIsABrokenPromise) {
  const Hypothesis turning = Mechanism("turning").where("a", "b + 1").where("b", "2 * a");
  EXPECT_THROW(written_out(written("a"), turning), BrokenPromise);
}

TEST(Net, IsForwardMinusBack) {
  EXPECT_EQ(print_text(net(titration().reactions[0])), "vmax * amide / brake - kb * acid");
}

TEST(Circle, NamesTheDefinitionsOnItInOrder) {
  EXPECT_THAT(circle({{"start", written("a")},
                      {"a", written("b * 2")},
                      {"b", written("k + c")},
                      {"c", written("a + 1")}}),
              ElementsAre("a", "b", "c"));
  EXPECT_THAT(circle({{"self", written("self + 1")}}), ElementsAre("self"));
}

TEST(Circle, SharedDefinitionsAreNone) {
  EXPECT_THAT(circle({{"a", written("b + c")}, {"b", written("c")}, {"c", written("k")}}),
              IsEmpty());
}

TEST(FindSpecies, ByExactName) {
  EXPECT_EQ(find_species(titration(), "acid"), 1U);
  EXPECT_EQ(find_species(titration(), "Acid"), std::nullopt);
}

}  // namespace
}  // namespace gainsay::core
