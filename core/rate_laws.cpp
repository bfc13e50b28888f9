#include "gainsay/core/rate_laws.h"

#include "gainsay/core/parse.h"
#include "gainsay/core/require.h"

#include <algorithm>
#include <cstddef>
#include <iterator>
#include <map>

namespace gainsay::core {
namespace {

// Meanings and sources that recur.
const char* const kSubstrate = "the substrate [concentration]";
const char* const kProduct = "the product [concentration]";
const char* const kInhibitor = "the inhibitor [concentration]";
const char* const kFirst = "the first reactant [concentration]";
const char* const kSecond = "the second reactant [concentration]";
const char* const kGrowing = "the growing population [concentration]";
const char* const kTemperature = "absolute temperature [K]";
const char* const kLimitingRate = "limiting rate at saturation [concentration/time]";
const char* const kMichaelis = "Michaelis constant, S at half the limiting rate [concentration]";
const char* const kHalf = "concentration of half the effect [concentration]";
const char* const kHillExponent = "Hill exponent [1]";
const char* const kCompetitive =
    "competitive inhibition constant, of the free enzyme [concentration]";
const char* const kUncompetitive =
    "uncompetitive inhibition constant, of the enzyme with its substrate [concentration]";
const char* const kPerTime = "rate constant [1/time]";
const char* const kSpecificGrowth = "largest specific growth rate [1/time]";
const char* const kHalfGrowth = "S at half the largest growth rate [concentration]";
const char* const kVantHoff = "van 't Hoff (1884), Etudes de dynamique chimique, Amsterdam";
const char* const kInhibitionSource =
    "Cleland (1963), Biochim. Biophys. Acta 67, 173; symbols of IUBMB (1981 recommendations), "
    "Eur. J. Biochem. 128, 281 (1982)";
const char* const kInhibitionLimits =
    "one substrate, no product yet; binding of the inhibitor is quick and takes up little of it";

std::vector<RateLaw> laws_of_solutions() {
  return {
      {.name = "mass_action",
       .title = "mass action",
       .arguments = {"k"},
       .meanings = {"rate constant [concentration^(1 - order)/time]"},
       .formula = "k * A^a * B^b",
       .source = "Guldberg and Waage (1879), J. prakt. Chem. 127, 69",
       .limits = "elementary steps in well-mixed, dilute solution; A, B stand for the species on "
                 "the equation's own side, a, b for their coefficients; only in the 'rate' or "
                 "'back' of a reaction",
       .takes_side = true},
      {.name = "first_order",
       .title = "first order",
       .arguments = {"A", "k"},
       .meanings = {"the reactant [concentration]", kPerTime},
       .formula = "k * A",
       .source = "Wilhelmy (1850), Annalen der Physik und Chemie 81, 413",
       .limits = "each molecule reacts by itself, or its partners stay in large excess"},
      {.name = "second_order",
       .title = "second order",
       .arguments = {"A", "B", "k"},
       .meanings = {kFirst, kSecond, "rate constant [1/(concentration time)]"},
       .formula = "k * A * B",
       .source = kVantHoff,
       .limits = "both meet in one step, well mixed; twice the same reactant: give it twice"},
      {.name = "power_law",
       .title = "power of a concentration",
       .arguments = {"A", "k", "order"},
       .meanings = {"the reactant [concentration]",
                    "rate constant [concentration^(1 - order)/time]", "order of the reaction [1]"},
       .formula = "k * A^order",
       .source = kVantHoff,
       .limits = "empirical; an order below 1 uses up the reactant in finite time"},
      {.name = "reversible_first_order",
       .title = "first order both ways",
       .arguments = {"A", "B", "k_forward", "k_back"},
       .meanings = {"the reactant [concentration]", kProduct,
                    "rate constant of the way there [1/time]",
                    "rate constant of the way back [1/time]"},
       .formula = "k_forward * A - k_back * B",
       .source = kVantHoff,
       .limits = "one reactant, one product; the equilibrium constant is k_forward / k_back"},
      {.name = "lindemann",
       .title = "unimolecular reaction activated by collisions",
       .arguments = {"A", "M", "k_low", "k_high"},
       .meanings = {"the reactant [concentration]", "all collision partners [concentration]",
                    "rate constant at low pressure [1/(concentration time)]",
                    "rate constant at high pressure [1/time]"},
       .formula = "k_low * M * k_high / (k_low * M + k_high) * A",
       .source = "Lindemann (1922), Trans. Faraday Soc. 17, 598",
       .limits = "gas phase; strong collisions; the fall-off is broader in truth"},
  };
}

std::vector<RateLaw> laws_of_temperature() {
  return {
      {.name = "arrhenius",
       .title = "rate constant by temperature",
       .arguments = {"T", "A", "Ea"},
       .meanings = {kTemperature, "frequency factor [unit of the rate constant]",
                    "energy of activation [J/mol]"},
       .formula = "A * exp(-Ea / (gas_constant * T))",
       .source = "Arrhenius (1889), Z. phys. Chem. 4, 226",
       .limits = "a rate constant, to be multiplied by concentrations; one step limits the rate "
                 "over the whole range of temperature"},
      {.name = "arrhenius_from",
       .title = "rate constant by temperature, from a reference",
       .arguments = {"T", "k_ref", "Ea", "T_ref"},
       .meanings = {kTemperature, "rate constant at T_ref [its unit]",
                    "energy of activation [J/mol]", "reference temperature [K]"},
       .formula = "k_ref * exp(-Ea / gas_constant * (1 / T - 1 / T_ref))",
       .source = "Arrhenius (1889), Z. phys. Chem. 4, 226, in the form of his eq. for two "
                 "temperatures",
       .limits = "as arrhenius; k_ref and Ea are far less correlated than A and Ea if T_ref lies "
                 "among the temperatures measured"},
      {.name = "eyring",
       .title = "rate constant by temperature, transition state",
       .arguments = {"T", "enthalpy", "entropy"},
       .meanings = {kTemperature, "enthalpy of activation [J/mol]",
                    "entropy of activation [J/(mol K)]"},
       .formula = "20836619123.32757 * T * exp(entropy / gas_constant) * exp(-enthalpy / "
                  "(gas_constant * T))",
       .source = "Eyring (1935), J. Chem. Phys. 3, 107; Boltzmann's over Planck's constant, "
                 "1.380649e-23 / 6.62607015e-34 per K and s, as the SI of 2019 fixes them",
       .limits = "a rate constant in 1/s, to be multiplied by concentrations; transmission "
                 "coefficient 1"},
  };
}

std::vector<RateLaw> laws_of_enzymes() {
  return {
      {.name = "michaelis_menten",
       .title = "saturation of an enzyme",
       .arguments = {"S", "Vmax", "Km"},
       .meanings = {kSubstrate, kLimitingRate, kMichaelis},
       .formula = "Vmax * S / (Km + S)",
       .source = "Michaelis and Menten (1913), Biochem. Z. 49, 333; at steady state: Briggs and "
                 "Haldane (1925), Biochem. J. 19, 338",
       .limits = "one substrate, no product yet, total enzyme far below S + Km"},
      {.name = "reversible_michaelis_menten",
       .title = "saturation of an enzyme, both ways",
       .arguments = {"S", "P", "Vf", "Vr", "KmS", "KmP"},
       .meanings = {kSubstrate, kProduct, "limiting rate of the way there [concentration/time]",
                    "limiting rate of the way back [concentration/time]",
                    "Michaelis constant of the substrate [concentration]",
                    "Michaelis constant of the product [concentration]"},
       .formula = "(Vf * S / KmS - Vr * P / KmP) / (1 + S / KmS + P / KmP)",
       .source = "Haldane (1930), Enzymes, Longmans, London; Cleland (1963), Biochim. Biophys. "
                 "Acta 67, 104",
       .limits = "one substrate, one product; the equilibrium constant is Vf * KmP / (Vr * KmS)"},
      {.name = "haldane_reversible",
       .title = "saturation both ways, tied to the equilibrium",
       .arguments = {"S", "P", "Vf", "KmS", "KmP", "Keq"},
       .meanings = {kSubstrate, kProduct, "limiting rate of the way there [concentration/time]",
                    "Michaelis constant of the substrate [concentration]",
                    "Michaelis constant of the product [concentration]",
                    "equilibrium constant, P over S at rest [1]"},
       .formula = "Vf / KmS * (S - P / Keq) / (1 + S / KmS + P / KmP)",
       .source = "Haldane (1930), Enzymes, Longmans, London",
       .limits = "as reversible_michaelis_menten, with Vr given by the equilibrium"},
      {.name = "hill",
       .title = "cooperative saturation",
       .arguments = {"S", "Vmax", "K_half", "n"},
       .meanings = {kSubstrate, kLimitingRate, kHalf, kHillExponent},
       .formula = "Vmax * S^n / (K_half^n + S^n)",
       .source = "Hill (1910), J. Physiol. 40, iv",
       .limits = "empirical; n is no count of binding sites, only at most that"},
      {.name = "hill_repression",
       .title = "cooperative repression",
       .arguments = {"I", "Vmax", "K_half", "n"},
       .meanings = {"the repressor [concentration]", "rate without repressor [concentration/time]",
                    kHalf, kHillExponent},
       .formula = "Vmax * K_half^n / (K_half^n + I^n)",
       .source = "Hill (1910), J. Physiol. 40, iv: the share of sites left free",
       .limits = "empirical, as hill"},
      {.name = "monod_wyman_changeux",
       .title = "cooperative saturation, enzyme of two states",
       .arguments = {"S", "Vmax", "K", "L", "n"},
       .meanings = {kSubstrate, kLimitingRate,
                    "dissociation constant of the binding state [concentration]",
                    "ratio of the two states without substrate [1]", "number of binding sites [1]"},
       .formula = "Vmax * S / K * (1 + S / K)^(n - 1) / (L + (1 + S / K)^n)",
       .source = "Monod, Wyman and Changeux (1965), J. Mol. Biol. 12, 88",
       .limits = "equal sites; the substrate binds to one of the two states alone"},
      {.name = "essential_activation",
       .title = "an activator without which nothing goes",
       .arguments = {"S", "A", "Vmax", "Km", "Ka"},
       .meanings = {kSubstrate, "the activator [concentration]", kLimitingRate, kMichaelis,
                    "dissociation constant of the activator [concentration]"},
       .formula = "Vmax * S * A / ((Km + S) * (Ka + A))",
       .source = "Segel (1975), Enzyme Kinetics, Wiley, New York, chapter 5",
       .limits = "substrate and activator bind independently, at equilibrium"},
      {.name = "ternary_complex",
       .title = "two substrates, bound together",
       .arguments = {"A", "B", "Vmax", "KiA", "KmA", "KmB"},
       .meanings = {"the substrate that binds first [concentration]",
                    "the substrate that binds second [concentration]", kLimitingRate,
                    "dissociation constant of A from the enzyme [concentration]",
                    "Michaelis constant of A [concentration]",
                    "Michaelis constant of B [concentration]"},
       .formula = "Vmax * A * B / (KiA * KmB + KmB * A + KmA * B + A * B)",
       .source = "Alberty (1953), J. Am. Chem. Soc. 75, 1928; Cleland (1963), Biochim. Biophys. "
                 "Acta 67, 104",
       .limits = "binding in order, or at random and at equilibrium; no products yet"},
      {.name = "ping_pong",
       .title = "two substrates, one after the other",
       .arguments = {"A", "B", "Vmax", "KmA", "KmB"},
       .meanings = {"the substrate that binds first [concentration]",
                    "the substrate that binds after the first product left [concentration]",
                    kLimitingRate, "Michaelis constant of A [concentration]",
                    "Michaelis constant of B [concentration]"},
       .formula = "Vmax * A * B / (KmB * A + KmA * B + A * B)",
       .source = "Alberty (1953), J. Am. Chem. Soc. 75, 1928; Cleland (1963), Biochim. Biophys. "
                 "Acta 67, 104",
       .limits = "the first product leaves before B binds; no products yet"},
  };
}

std::vector<RateLaw> laws_of_inhibition() {
  return {
      {.name = "competitive_inhibition",
       .title = "competitive inhibition",
       .arguments = {"S", "I", "Vmax", "Km", "Kic"},
       .meanings = {kSubstrate, kInhibitor, kLimitingRate, kMichaelis, kCompetitive},
       .formula = "Vmax * S / (Km * (1 + I / Kic) + S)",
       .source = kInhibitionSource,
       .limits = kInhibitionLimits},
      {.name = "uncompetitive_inhibition",
       .title = "uncompetitive inhibition",
       .arguments = {"S", "I", "Vmax", "Km", "Kiu"},
       .meanings = {kSubstrate, kInhibitor, kLimitingRate, kMichaelis, kUncompetitive},
       .formula = "Vmax * S / (Km + S * (1 + I / Kiu))",
       .source = kInhibitionSource,
       .limits = kInhibitionLimits},
      {.name = "noncompetitive_inhibition",
       .title = "pure non-competitive inhibition",
       .arguments = {"S", "I", "Vmax", "Km", "Ki"},
       .meanings = {kSubstrate, kInhibitor, kLimitingRate, kMichaelis,
                    "inhibition constant, with and without substrate alike [concentration]"},
       .formula = "Vmax * S / ((Km + S) * (1 + I / Ki))",
       .source = kInhibitionSource,
       .limits = kInhibitionLimits},
      {.name = "mixed_inhibition",
       .title = "mixed inhibition",
       .arguments = {"S", "I", "Vmax", "Km", "Kic", "Kiu"},
       .meanings = {kSubstrate, kInhibitor, kLimitingRate, kMichaelis, kCompetitive,
                    kUncompetitive},
       .formula = "Vmax * S / (Km * (1 + I / Kic) + S * (1 + I / Kiu))",
       .source = kInhibitionSource,
       .limits = kInhibitionLimits},
      {.name = "substrate_inhibition",
       .title = "inhibition by much substrate",
       .arguments = {"S", "Vmax", "Km", "Ki"},
       .meanings = {kSubstrate, "rate at saturation if nothing inhibited [concentration/time]",
                    "Michaelis constant if nothing inhibited [concentration]",
                    "dissociation constant of the second substrate molecule [concentration]"},
       .formula = "Vmax * S / (Km + S + S^2 / Ki)",
       .source = "Haldane (1930), Enzymes, Longmans, London",
       .limits = "the enzyme with two substrate molecules is idle; fastest at S = sqrt(Km * Ki)"},
      {.name = "tight_binding_inhibition",
       .title = "inhibition by tight binding",
       .arguments = {"E", "I", "v0", "Ki"},
       .meanings = {"total enzyme [concentration]", "total inhibitor [concentration]",
                    "rate without inhibitor [concentration/time]",
                    "apparent inhibition constant at this substrate [concentration]"},
       .formula = "v0 * (E - I - Ki + sqrt((E - I - Ki)^2 + 4 * E * Ki)) / (2 * E)",
       .source = "Morrison (1969), Biochim. Biophys. Acta 185, 269",
       .limits = "one site, binding at equilibrium; E above 0"},
  };
}

std::vector<RateLaw> laws_of_growth() {
  return {
      {.name = "monod",
       .title = "specific growth rate on one nutrient",
       .arguments = {"S", "mu_max", "Ks"},
       .meanings = {"the nutrient [concentration]", kSpecificGrowth, kHalfGrowth},
       .formula = "mu_max * S / (Ks + S)",
       .source = "Monod (1949), Annu. Rev. Microbiol. 3, 371",
       .limits = "balanced growth, one nutrient limits; multiplied by the population it is a rate"},
      {.name = "andrews",
       .title = "specific growth rate on a nutrient that inhibits",
       .arguments = {"S", "mu_max", "Ks", "Ki"},
       .meanings = {"the nutrient [concentration]", "growth rate if nothing inhibited [1/time]",
                    "S at half of mu_max if nothing inhibited [concentration]",
                    "inhibition constant of the nutrient [concentration]"},
       .formula = "mu_max * S / (Ks + S + S^2 / Ki)",
       .source = "Andrews (1968), Biotechnol. Bioeng. 10, 707",
       .limits = "as monod"},
      {.name = "contois",
       .title = "specific growth rate in dense populations",
       .arguments = {"S", "X", "mu_max", "Kx"},
       .meanings = {"the nutrient [concentration]", kGrowing, kSpecificGrowth,
                    "S over X at half the largest growth rate [1]"},
       .formula = "mu_max * S / (Kx * X + S)",
       .source = "Contois (1959), J. Gen. Microbiol. 21, 40",
       .limits = "dense populations; not defined without both nutrient and population"},
      {.name = "logistic",
       .title = "growth towards a capacity",
       .arguments = {"X", "growth", "capacity"},
       .meanings = {kGrowing, "growth rate of a small population [1/time]",
                    "population that no longer grows [concentration]"},
       .formula = "growth * X * (1 - X / capacity)",
       .source = "Verhulst (1838), Correspondance mathematique et physique 10, 113",
       .limits = "what limits growth is not followed by itself"},
  };
}

std::vector<RateLaw> laws_of_surfaces() {
  return {
      {.name = "langmuir_hinshelwood",
       .title = "two reactants on one kind of site",
       .arguments = {"A", "B", "k", "KA", "KB"},
       .meanings = {kFirst, kSecond, "rate at full coverage of matching sites [concentration/time]",
                    "adsorption constant of A [1/concentration]",
                    "adsorption constant of B [1/concentration]"},
       .formula = "k * KA * A * KB * B / (1 + KA * A + KB * B)^2",
       .source = "Langmuir (1922), Trans. Faraday Soc. 17, 621; Hinshelwood (1940), The Kinetics "
                 "of Chemical Change, Clarendon, Oxford",
       .limits = "adsorption at equilibrium on equal sites; the step on the surface limits"},
      {.name = "langmuir_unimolecular",
       .title = "one reactant on a surface",
       .arguments = {"A", "k", "KA"},
       .meanings = {"the reactant [concentration]", "rate at full coverage [concentration/time]",
                    "adsorption constant [1/concentration]"},
       .formula = "k * KA * A / (1 + KA * A)",
       .source = "Hinshelwood (1940), The Kinetics of Chemical Change, Clarendon, Oxford",
       .limits = "adsorption at equilibrium on equal sites; the step on the surface limits"},
      {.name = "eley_rideal",
       .title = "an adsorbed reactant meets one from the fluid",
       .arguments = {"A", "B", "k", "KA"},
       .meanings = {"the adsorbed reactant [concentration]",
                    "the reactant from the fluid [concentration]",
                    "rate constant at full coverage [1/time]",
                    "adsorption constant of A [1/concentration]"},
       .formula = "k * KA * A * B / (1 + KA * A)",
       .source = "Eley and Rideal (1940), Nature 146, 401",
       .limits = "only A adsorbs, at equilibrium, on equal sites"},
      {.name = "film_transfer",
       .title = "transfer through a film",
       .arguments = {"C", "k", "C_rest"},
       .meanings = {"what is taken up [concentration]",
                    "transfer coefficient times area per volume [1/time]",
                    "its concentration at rest with the other phase [concentration]"},
       .formula = "k * (C_rest - C)",
       .source = "Noyes and Whitney (1897), J. Am. Chem. Soc. 19, 930; between gas and liquid: "
                 "Lewis and Whitman (1924), Ind. Eng. Chem. 16, 1215",
       .limits = "the area and the other phase stay as they are"},
  };
}

}  // namespace

std::span<const RateLaw> all_rate_laws() {
  static const std::vector<RateLaw> kLaws = [] {
    std::vector<RateLaw> laws;
    for (const auto& group : {laws_of_solutions(), laws_of_temperature(), laws_of_enzymes(),
                              laws_of_inhibition(), laws_of_growth(), laws_of_surfaces()}) {
      laws.insert(laws.end(), group.begin(), group.end());
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
