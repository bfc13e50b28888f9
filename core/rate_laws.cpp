#include "gainsay/core/rate_laws.h"

#include "gainsay/core/parse.h"
#include "gainsay/core/require.h"

#include <algorithm>
#include <cstddef>
#include <map>

namespace gainsay::core {
namespace {

// Meanings that recur.
const char* const kSubstrate = "concentration of the substrate [concentration]";
const char* const kProduct = "concentration of the product [concentration]";
const char* const kInhibitor = "concentration of the inhibitor [concentration]";
const char* const kLimitingRate = "limiting rate at saturation [concentration/time]";
const char* const kMichaelis =
    "Michaelis constant: the concentration of half the limiting rate [concentration]";
const char* const kCompetitive = "competitive inhibition constant [concentration]";
const char* const kUncompetitive = "uncompetitive inhibition constant [concentration]";
const char* const kReactantA = "concentration of the first reactant [concentration]";
const char* const kReactantB = "concentration of the second reactant [concentration]";
const char* const kTemperature = "absolute temperature [K]";
const char* const kEnergy = "energy of activation [J/mol]";
const char* const kHalf = "concentration of half the limiting rate [concentration]";

// Sources that recur.
const char* const kInhibitionSource =
    "Cleland (1963), Biochim. Biophys. Acta 67, 173; symbols: IUBMB, Recommendations 1981, Eur. J. "
    "Biochem. 128, 281 (1982)";
const char* const kInhibitionLimits =
    "inhibitor in excess over the enzyme, binding at equilibrium, inhibited complexes idle";

std::vector<RateLaw> chemical_laws() {
  return {
      {.name = "mass_action",
       .title = "Mass action",
       .arguments = {"k"},
       .meanings = {"rate constant [concentration^(1 - order)/time]"},
       .formula = "k * A^a * B^b",
       .source = "Guldberg and Waage (1879), J. prakt. Chem. 127, 69",
       .limits = "elementary steps in a well-mixed, dilute solution; A, B are the species on the "
                 "equation's own side, a, b their coefficients",
       .takes_side = true},
      {.name = "first_order",
       .title = "First order",
       .arguments = {"A", "k"},
       .meanings = {kReactantA, "rate constant [1/time]"},
       .formula = "k * A",
       .source = "Wilhelmy (1850), Ann. Phys. 157, 413",
       .limits = "each molecule reacts by itself, or all partners are in large excess"},
  };
}

std::vector<RateLaw> enzyme_laws() {
  return {
      {.name = "michaelis_menten",
       .title = "Michaelis-Menten",
       .arguments = {"S", "Vmax", "Km"},
       .meanings = {kSubstrate, kLimitingRate, kMichaelis},
       .formula = "Vmax * S / (Km + S)",
       .source = "Michaelis and Menten (1913), Biochem. Z. 49, 333; steady state: Briggs and "
                 "Haldane (1925), Biochem. J. 19, 338",
       .limits = "one substrate, no product yet, enzyme far below S + Km"},
  };
}

}  // namespace

std::span<const RateLaw> all_rate_laws() {
  static const std::vector<RateLaw> kLaws = [] {
    std::vector<RateLaw> laws = chemical_laws();
    for (auto group : {enzyme_laws()}) {
      std::move(group.begin(), group.end(), std::back_inserter(laws));
    }
    return laws;
  }();
  return kLaws;
}

const RateLaw* find_rate_law(std::string_view name) {
  const std::span<const RateLaw> all = all_rate_laws();
  const auto found =
      std::find_if(all.begin(), all.end(), [&](const RateLaw& law) { return law.name == name; });
  return found == all.end() ? nullptr : &*found;
}

Expression write_out(const RateLaw& law, const std::vector<Expression>& arguments) {
  GAINSAY_REQUIRE(arguments.size() == law.arguments.size(),
                  "'" + law.name + "' is written out with all its arguments");
  GAINSAY_REQUIRE(!law.takes_side, "'" + law.name + "' is written out by its reaction");
  const Result<Parsed> formula = parse(law.formula);
  GAINSAY_REQUIRE(formula, "the formula of '" + law.name + "' reads as an expression");
  std::map<std::string, Expression, std::less<>> in_place;
  for (std::size_t i = 0; i < arguments.size(); ++i) in_place[law.arguments[i]] = arguments[i];
  return substitute(formula->expression, in_place);
}

}  // namespace gainsay::core
