#include "gainsay/core/rate_laws.h"

#include "gainsay/core/parse.h"
#include "gainsay/core/require.h"
#include "gainsay/testing/derivatives.h"
#include "gainsay/testing/random_expressions.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <regex>
#include <set>
#include <string>
#include <vector>

namespace gainsay::core {
namespace {

using ::gainsay::testing::check_derivatives;
using ::gainsay::testing::derivative_entries;
using ::gainsay::testing::DerivativeCheck;
using ::gainsay::testing::DerivativeEntry;
using ::gainsay::testing::Dice;
using ::gainsay::testing::FiftyValues;
using ::testing::ElementsAre;
using ::testing::IsEmpty;

// A formula of at most 12 operations, each rounded by at most 2^-53 of numbers of like size.
constexpr double kRounding = 12 * 0x1p-53;

/// The law at these arguments.
double value_of(std::string_view law, const std::vector<double>& arguments) {
  const std::vector<Expression> numbers(arguments.begin(), arguments.end());
  return evaluate(write_out(*find_rate_law(law), numbers), {});
}

void expect_close(double value, double expected) {
  EXPECT_NEAR(value, expected, kRounding * std::abs(expected));
}

TEST(RateLaws, TheTableIsConsistent) {
  std::set<std::string> names;
  for (const RateLaw& law : all_rate_laws()) {
    EXPECT_TRUE(is_name(law.name)) << law.name;
    EXPECT_TRUE(names.insert(law.name).second) << law.name << " stands twice";
    EXPECT_GT(law.name.size(), 3U) << "names are written out";
    EXPECT_FALSE(law.title.empty()) << law.name;
    EXPECT_FALSE(law.limits.empty()) << law.name;
    EXPECT_EQ(law.meanings.size(), law.arguments.size()) << law.name;
    EXPECT_EQ(find_rate_law(law.name), &law);
    for (const std::string& argument : law.arguments) {
      EXPECT_TRUE(is_name(argument)) << law.name << ": " << argument;
      EXPECT_FALSE(is_reserved(argument)) << law.name << ": " << argument;
    }
    for (const std::string& meaning : law.meanings) {
      EXPECT_TRUE(std::regex_search(meaning, std::regex(R"( \[[^\]]+\]$)")))
          << law.name << ": '" << meaning << "' lacks its dimension";
    }
  }
}

TEST(RateLaws, EveryFormulaUsesItsArgumentsAndNothingElse) {
  for (const RateLaw& law : all_rate_laws()) {
    const Result<Parsed> formula = parse(law.formula);
    ASSERT_TRUE(formula) << law.name << ": " << formula.failure().what;
    if (law.takes_side) continue;
    const std::set<std::string, std::less<>> arguments(law.arguments.begin(), law.arguments.end());
    EXPECT_EQ(symbols(formula->expression), arguments) << law.name;
  }
}

TEST(RateLaws, EverySourceHasAnAuthorAndAYear) {
  for (const RateLaw& law : all_rate_laws()) {
    EXPECT_TRUE(std::regex_search(law.source, std::regex(R"([A-Z][a-z]+ \(1[89]\d\d\))")))
        << law.name << ": " << law.source;
  }
}

TEST(RateLaws, AreWrittenOutWithTheirArguments) {
  const RateLaw& law = *find_rate_law("michaelis_menten");
  const Expression S = Expression::symbol("S");
  const Expression Km = Expression::symbol("Km");
  // Arguments whose names are those of other arguments stay apart.
  EXPECT_EQ(write_out(law, {Km, 2.0, S}), 2.0 * Km / (S + Km));
  EXPECT_THROW(write_out(law, {S}), BrokenPromise);
  EXPECT_THROW(write_out(*find_rate_law("mass_action"), {S}), BrokenPromise);
  EXPECT_EQ(find_rate_law("mm"), nullptr);
}

TEST(RateLawDerivatives, AgreeWithFiftyDigitDifferences) {
  constexpr std::uint64_t kSeed = 42;
  Dice dice(kSeed);
  for (const RateLaw& law : all_rate_laws()) {
    std::vector<FiftyValues> points(10);
    for (FiftyValues& point : points) {
      for (const std::string& argument : law.arguments) point[argument] = dice.between(0.1, 5.0);
      for (const char* side : {"A", "B", "a", "b"}) point.emplace(side, dice.between(0.1, 5.0));
    }
    const DerivativeCheck check =
        check_derivatives(derivative_entries(law.name, parse(law.formula)->expression), points);
    EXPECT_THAT(check.mismatches, IsEmpty());
    EXPECT_EQ(check.not_comparable, 0U) << law.name;
    EXPECT_GE(check.compared, points.size()) << law.name;
  }
}

TEST(RateLawDerivatives, ASpoiltEntryIsNamed) {
  std::vector<DerivativeEntry> entries =
      derivative_entries("rate", parse(find_rate_law("haldane_reversible")->formula)->expression);
  const std::vector<FiftyValues> points{
      {{"S", 2}, {"P", 1}, {"Vf", 3}, {"KmS", 0.5}, {"KmP", 4}, {"Keq", 7}}};
  for (DerivativeEntry& entry : entries) {
    if (entry.symbol == "KmS") entry.derivative = entry.derivative * (1.0 + 1e-15);
  }
  EXPECT_THAT(check_derivatives(entries, points).mismatches, ElementsAre("d rate / d KmS"));
}

// Properties below are stated by the sources of the laws, or follow from them in closed form.

TEST(RateLaws, HalfTheLimitingRateAtTheMichaelisConstant) {
  expect_close(value_of("michaelis_menten", {3.0, 8.0, 3.0}), 4.0);
  expect_close(value_of("hill", {3.0, 8.0, 3.0, 2.7}), 4.0);
  expect_close(value_of("hill_repression", {3.0, 8.0, 3.0, 2.7}), 4.0);
  expect_close(value_of("monod", {3.0, 8.0, 3.0}), 4.0);
  expect_close(value_of("contois", {6.0, 2.0, 8.0, 3.0}), 4.0);
  expect_close(value_of("langmuir_unimolecular", {0.5, 8.0, 2.0}), 4.0);
}

TEST(RateLaws, ReversibleOnesRestAtTheirEquilibrium) {
  const double S = 2.0, Vf = 3.0, Vr = 0.7, KmS = 0.4, KmP = 1.9;
  const double Keq = Vf * KmP / (Vr * KmS);  // Haldane (1930)
  EXPECT_NEAR(value_of("reversible_michaelis_menten", {S, Keq * S, Vf, Vr, KmS, KmP}), 0.0,
              kRounding * Vf);
  EXPECT_EQ(value_of("haldane_reversible", {S, Keq * S, Vf, KmS, KmP, Keq}), 0.0);
  expect_close(value_of("haldane_reversible", {S, 0.3, Vf, KmS, KmP, Keq}),
               value_of("reversible_michaelis_menten", {S, 0.3, Vf, Vr, KmS, KmP}));
  EXPECT_EQ(value_of("reversible_first_order", {2.0, 6.0, 3.0, 1.0}), 0.0);
}

TEST(RateLaws, KindsOfInhibitionAreLimitsOfTheMixedOne) {
  const double never = std::numeric_limits<double>::infinity();
  const double S = 2.0, I = 1.5, Vmax = 3.0, Km = 0.8, Ki = 0.6;
  expect_close(value_of("mixed_inhibition", {S, I, Vmax, Km, Ki, never}),
               value_of("competitive_inhibition", {S, I, Vmax, Km, Ki}));
  expect_close(value_of("mixed_inhibition", {S, I, Vmax, Km, never, Ki}),
               value_of("uncompetitive_inhibition", {S, I, Vmax, Km, Ki}));
  expect_close(value_of("mixed_inhibition", {S, I, Vmax, Km, Ki, Ki}),
               value_of("noncompetitive_inhibition", {S, I, Vmax, Km, Ki}));
  expect_close(value_of("mixed_inhibition", {S, 0.0, Vmax, Km, Ki, Ki}),
               value_of("michaelis_menten", {S, Vmax, Km}));
}

TEST(RateLaws, SubstrateInhibitionPeaksAtTheGeometricMean) {
  const double Km = 0.5, Ki = 8.0, top = 2.0;  // sqrt(Km Ki)
  const double peak = value_of("substrate_inhibition", {top, 1.0, Km, Ki});
  expect_close(peak, 1.0 / (1.0 + 2.0 * std::sqrt(Km / Ki)));
  EXPECT_LT(value_of("substrate_inhibition", {top * 1.01, 1.0, Km, Ki}), peak);
  EXPECT_LT(value_of("substrate_inhibition", {top / 1.01, 1.0, Km, Ki}), peak);
  EXPECT_EQ(value_of("andrews", {top, 1.0, Km, Ki}), peak);
}

TEST(RateLaws, TightBindingLeavesTheShareOfFreeEnzyme) {
  // Binding at equilibrium: free enzyme f satisfies f (I - E + f) = Ki (E - f). Choose f.
  const double E = 2.0, f = 0.5, Ki = 0.25;
  const double I = Ki * (E - f) / f + E - f;
  expect_close(value_of("tight_binding_inhibition", {E, I, 8.0, Ki}), 8.0 * f / E);
}

TEST(RateLaws, CooperativeOnesWithOneSiteAreMichaelisMenten) {
  expect_close(value_of("hill", {2.0, 3.0, 0.7, 1.0}),
               value_of("michaelis_menten", {2.0, 3.0, 0.7}));
  // One site: the other state only raises the apparent constant to K (1 + L).
  expect_close(value_of("monod_wyman_changeux", {2.0, 3.0, 0.7, 5.0, 1.0}),
               value_of("michaelis_menten", {2.0, 3.0, 0.7 * 6.0}));
}

TEST(RateLaws, TwoSubstratesSaturateOneByOne) {
  const double much = 1e300;
  expect_close(value_of("ping_pong", {2.0, much, 3.0, 0.7, 0.9}),
               value_of("michaelis_menten", {2.0, 3.0, 0.7}));
  expect_close(value_of("ternary_complex", {2.0, much, 3.0, 0.2, 0.7, 0.9}),
               value_of("michaelis_menten", {2.0, 3.0, 0.7}));
  expect_close(value_of("essential_activation", {2.0, much, 3.0, 0.7, 0.9}),
               value_of("michaelis_menten", {2.0, 3.0, 0.7}));
}

TEST(RateLaws, SurfacesArePartlyCovered) {
  // Langmuir's isotherms: coverages KA A / (1 + KA A + KB B) and likewise; their product times k.
  const double A = 2.0, B = 3.0, k = 5.0, KA = 0.5, KB = 2.0, sum = 1.0 + KA * A + KB * B;
  expect_close(value_of("langmuir_hinshelwood", {A, B, k, KA, KB}),
               k * (KA * A / sum) * (KB * B / sum));
  expect_close(value_of("eley_rideal", {A, B, k, KA}), k * B * (KA * A / (1.0 + KA * A)));
}

TEST(RateLaws, TemperatureByArrheniusAndEyring) {
  const double R = 8.31446261815324;
  expect_close(value_of("arrhenius", {300.0, 2.0, 300.0 * R}), 2.0 * std::exp(-1.0));
  expect_close(value_of("arrhenius_from", {300.0, 2.0, 5e4, 300.0}), 2.0);
  // k(T2) / k(T1) = exp(Ea / R (1 / T1 - 1 / T2)) whichever form is taken.
  const double ratio =
      value_of("arrhenius", {310.0, 1.0, 5e4}) / value_of("arrhenius", {300.0, 1.0, 5e4});
  // Arguments of exp near 20 pass their rounding on twentyfold.
  EXPECT_NEAR(value_of("arrhenius_from", {310.0, 1.0, 5e4, 300.0}), ratio, 40 * kRounding * ratio);
  // Boltzmann's constant times 298.15 K over Planck's: 6.2124e12 1/s, from memory.
  constexpr double kHalfOfTheFifthDigit = 0.5e8;
  EXPECT_NEAR(value_of("eyring", {298.15, 0.0, 0.0}), 6.2124e12, kHalfOfTheFifthDigit);
}

TEST(RateLaws, SimpleOrders) {
  EXPECT_EQ(value_of("first_order", {2.0, 3.0}), 6.0);
  EXPECT_EQ(value_of("second_order", {2.0, 3.0, 5.0}), 30.0);
  EXPECT_EQ(value_of("power_law", {2.0, 3.0, 2.0}), 12.0);
  EXPECT_EQ(value_of("logistic", {10.0, 3.0, 10.0}), 0.0);
  EXPECT_EQ(value_of("film_transfer", {2.0, 3.0, 4.0}), 6.0);
  // Lindemann (1922): first order where collisions are many, second where they are few.
  expect_close(value_of("lindemann", {2.0, 1e300, 1.0, 3.0}), 6.0);
  expect_close(value_of("lindemann", {2.0, 1e-300, 5.0, 3.0}), 1e-299);
}

}  // namespace
}  // namespace gainsay::core
