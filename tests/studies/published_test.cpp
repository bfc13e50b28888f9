// The published studies of `data` end to end through the program, against the figures printed in
// their sources; each source stands in full at the head of the study's own file.

#include "gainsay/testing/judged.h"
#include "gainsay/testing/printed.h"

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <string>

namespace gainsay {
namespace {

using nlohmann::json;
using testing::estimate;
using testing::hypothesis;
using testing::judged;
using testing::rounds_to;
using testing::sum_of_squares;

double misfit(const json& hypothesis) { return hypothesis.at("tests").at("misfit"); }

void expect_estimates(const json& hypothesis, const std::map<std::string, std::string>& printed) {
  for (const auto& [name, value] : printed)
    EXPECT_TRUE(rounds_to(value, estimate(hypothesis, name)))
        << name << ": found " << estimate(hypothesis, name) << ", printed " << value;
}

void expect_sum_of_squares(const json& hypothesis, const std::string& printed) {
  EXPECT_TRUE(rounds_to(printed, sum_of_squares(hypothesis)))
      << "found " << sum_of_squares(hypothesis) << ", printed " << printed;
}

// Bevington & Robinson (2003), chapter 8: chi-square 66.1 on 54 degrees of freedom.
TEST(Published, SilverDecaysAsTwoIsotopes) {
  const json report = judged("silver-decay");
  const json one = hypothesis(report, "A");
  EXPECT_EQ(one.at("verdict"), "rejected");
  EXPECT_EQ(one.at("tests").at("decides"), "reduced");
  EXPECT_GT(misfit(one), one.at("tests").at("reduced_limit").at("value").get<double>());

  const json two = hypothesis(report, "B");
  EXPECT_EQ(two.at("verdict"), "not rejected");
  EXPECT_EQ(two.at("tests").at("reduced_limit").at("degrees_of_freedom"), 54);
  EXPECT_TRUE(rounds_to("66.1", misfit(two))) << misfit(two);
  expect_estimates(two, {{"offset.counts", "10.1"},
                         {"activity_short", "957.8"},
                         {"activity_long", "128.3"},
                         {"life_short", "34.2"},
                         {"life_long", "209.7"}});
}

// COPS 3.0 (Dolan, More & Munson 2004).
TEST(Published, GasOilIsJudgedByOrderAlone) {
  const json cracking = hypothesis(judged("gas-oil-cracking"), "A");
  expect_sum_of_squares(cracking, "5.2366e-3");
  EXPECT_EQ(cracking.at("tests").at("decides"), "order");
  EXPECT_TRUE(cracking.at("tests").at("noise_unknown").get<bool>());
}

// Sum of squares 19.872 (COPS 3.0); rate constants of Box et al. (1973). Along k4 the sum is flat
// (standard error 2.3e-5): the printed 27.5e-5 is met to one unit of its last digit.
TEST(Published, AlphaPineneIsUndecided) {
  const json scheme = hypothesis(judged("alpha-pinene"), "A");
  expect_sum_of_squares(scheme, "19.872");
  expect_estimates(scheme,
                   {{"k1", "5.93e-5"}, {"k2", "2.96e-5"}, {"k3", "2.05e-5"}, {"k5", "4.00e-5"}});
  constexpr double kUnitOfLastDigit = 0.1e-5;
  EXPECT_NEAR(estimate(scheme, "k4"), 27.5e-5, kUnitOfLastDigit);
  EXPECT_EQ(scheme.at("verdict"), "undecided");
}

// Esposito & Floudas (2000).
TEST(Published, FirstOrderChain) {
  const json chain = hypothesis(judged("first-order-chain"), "A");
  expect_sum_of_squares(chain, "1.18584e-6");
  expect_estimates(chain, {{"k1", "5.0035"}, {"k2", "1.0000"}});
  EXPECT_EQ(chain.at("verdict"), "not rejected");
}

// The optimum of this table by least squares over LSODA and by Gauss-Newton over the closed form;
// Esposito & Floudas (2000) print 4.000, 2.000, 40.013, 20.007 for a table rounded likewise.
TEST(Published, ReversibleChain) {
  const json chain = hypothesis(judged("reversible-chain"), "A");
  expect_sum_of_squares(chain, "3.7418e-8");
  expect_estimates(chain,
                   {{"k1", "3.99992"}, {"k2", "1.99968"}, {"k3", "40.0050"}, {"k4", "20.0035"}});
  EXPECT_EQ(chain.at("verdict"), "not rejected");
}

// Varah (1982): the published optimum, whose residuals run in order (Durbin-Watson 0.235).
TEST(Published, NitricOxideIsFittedAndRejected) {
  const json oxidation = hypothesis(judged("nitric-oxide"), "A");
  expect_sum_of_squares(oxidation, "21.87");
  expect_estimates(oxidation, {{"k1", "4.577e-6"}, {"k2", "2.796e-4"}});
  EXPECT_TRUE(rounds_to("0.235", oxidation.at("tests").at("order").at("T")));
  EXPECT_EQ(oxidation.at("verdict"), "rejected");
}

// Pinheiro & Bates (2000), in logarithms: -2.9196, 0.5752, -3.9159.
TEST(Published, Theophylline) {
  const json one = hypothesis(judged("theophylline"), "A");
  EXPECT_TRUE(rounds_to("-2.9196", std::log(estimate(one, "ke"))));
  EXPECT_TRUE(rounds_to("0.5752", std::log(estimate(one, "ka"))));
  EXPECT_TRUE(rounds_to("-3.9159", std::log(estimate(one, "Cl"))));
  expect_sum_of_squares(one, "4.286009");
  EXPECT_EQ(one.at("verdict"), "not rejected");
}

// Sums of squares and rate constants by least squares on the closed forms; the textbook's second
// order (Zumdahl).
TEST(Published, ButadieneIsOfSecondOrder) {
  const json report = judged("butadiene");
  const json zeroth = hypothesis(report, "A"), first = hypothesis(report, "B"),
             second = hypothesis(report, "C");
  expect_sum_of_squares(zeroth, "9.0756e-6");
  expect_sum_of_squares(first, "2.0810e-6");
  expect_sum_of_squares(second, "1.8775e-9");
  expect_estimates(second, {{"k", "0.06090"}, {"begin", "0.010008"}});
  EXPECT_EQ(zeroth.at("verdict"), "rejected");
  EXPECT_EQ(first.at("verdict"), "rejected");
  EXPECT_EQ(second.at("verdict"), "not rejected");
}

// Moles, Mendes & Banga (2003): the values that the data were computed from.
TEST(Published, ThreeStepPathwayIsFoundAgain) {
  const json pathway = hypothesis(judged("three-step-pathway"), "A");
  for (const json& unknown : pathway.at("unknowns")) {
    const std::string name = unknown.at("name");
    const bool exponent = name.starts_with("ni") || name.starts_with("na");
    const bool slow = name == "V4" || name == "V5" || name == "V6" || name == "k4" ||
                      name == "k5" || name == "k6";
    const std::string truth = exponent ? "2.0000" : slow ? "0.10000" : "1.0000";
    EXPECT_TRUE(rounds_to(truth, unknown.at("estimate"))) << name << " " << unknown.at("estimate");
  }
}

}  // namespace
}  // namespace gainsay
