#include "gainsay/core/notation.h"

#include "gainsay/core/tokens.h"

#include <gtest/gtest.h>

#include <set>
#include <string_view>

namespace gainsay::core {
namespace {

TEST(Notation, EveryFunctionIsFoundByNameAndByOperation) {
  std::set<std::string_view> names;
  for (const Function& function : all_functions()) {
    EXPECT_TRUE(is_name(function.name)) << function.name;
    EXPECT_TRUE(names.insert(function.name).second) << function.name;
    EXPECT_EQ(find_function(function.name), &function);
    EXPECT_EQ(find_function(function.operation), &function);
    EXPECT_GE(operand_count(function.operation), 1U);
  }
  EXPECT_EQ(find_function("sine"), nullptr);
  EXPECT_EQ(find_function(Operation::Add), nullptr);
}

TEST(Notation, SignsBindInTheOrderOfTheGrammar) {
  const auto binding = [](std::string_view sign) { return find_infix_sign(sign)->binding; };
  EXPECT_LT(binding("or"), binding("and"));
  EXPECT_LT(binding("and"), Binding::Not);
  EXPECT_LT(Binding::Not, binding("<"));
  EXPECT_LT(binding("<"), binding("+"));
  EXPECT_LT(binding("+"), binding("*"));
  EXPECT_LT(binding("*"), Binding::Minus);
  EXPECT_LT(Binding::Minus, binding("^"));
  EXPECT_EQ(find_infix_sign(Operation::Power)->text, "^");
  EXPECT_EQ(find_infix_sign("**"), nullptr);
  EXPECT_EQ(find_infix_sign(Operation::Exp), nullptr);
}

// The molar gas constant is the product of two constants that the SI of 2019 fixes: Boltzmann's,
// 1.380649e-23 J/K, and Avogadro's, 6.02214076e23 1/mol; 8.314 462 618 153 24 J/(mol K) (CODATA
// 2018, table XXXI of Tiesinga et al. 2021).
TEST(Notation, ConstantsAreThoseOfTheirSources) {
  // Two decimal factors and their product are rounded once each, at most half a unit of 2^-53.
  constexpr double kRounding = 3 * 0x1p-53 * 8.4;
  EXPECT_NEAR(find_constant("gas_constant")->value, 1.380649 * 6.02214076, kRounding);
  EXPECT_EQ(find_constant("pi")->value, 3.14159265358979323846);  // Abramowitz & Stegun (1964), 1.1
  EXPECT_EQ(find_constant("e"), nullptr);
  EXPECT_EQ(find_constant(2.0), nullptr);
}

}  // namespace
}  // namespace gainsay::core
