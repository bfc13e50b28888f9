#include "gainsay/stats/tails.h"

#include <gtest/gtest.h>

#include <cmath>
#include <vector>

namespace gainsay::stats {
namespace {

// Half a unit of the last of `digits` digits.
double half_unit(double value, int digits) {
  return 0.5 * std::pow(10.0, std::floor(std::log10(std::abs(value))) + 1.0 - digits);
}

constexpr int kOwnDigits = 12;
constexpr double kPrinted = 0.5e-3;  // the tables print three decimals

struct Quantile {
  double freedom;
  double printed;
  double own;
};

void expect_quantiles(double tail, const std::vector<Quantile>& table) {
  for (const Quantile& row : table) {
    const double x = chi_square_quantile(tail, row.freedom);
    EXPECT_NEAR(x, row.printed, kPrinted) << row.freedom << " degrees, tail " << tail;
    EXPECT_NEAR(x, row.own, half_unit(row.own, kOwnDigits)) << row.freedom << " degrees";
  }
}

// Printed: NIST/SEMATECH e-Handbook of Statistical Methods, section 1.3.6.7.4 (from memory). Own:
// regularized incomplete gamma function in 30 digits (mpmath).
TEST(ChiSquareQuantile, AgreesWithPrintedTables) {
  expect_quantiles(0.95, {{1, 0.004, 0.00393214000002},
                          {2, 0.103, 0.102586588775},
                          {3, 0.352, 0.351846317749},
                          {4, 0.711, 0.710723021397},
                          {5, 1.145, 1.14547622606},
                          {6, 1.635, 1.63538289433},
                          {7, 2.167, 2.1673499093},
                          {8, 2.733, 2.7326367935},
                          {9, 3.325, 3.32511284307},
                          {10, 3.940, 3.94029913612},
                          {20, 10.851, 10.8508113942},
                          {30, 18.493, 18.492660982},
                          {50, 34.764, 34.7642516835},
                          {100, 77.929, 77.929465165}});
  expect_quantiles(0.05, {{1, 3.841, 3.84145882069},
                          {2, 5.991, 5.99146454711},
                          {3, 7.815, 7.81472790325},
                          {4, 9.488, 9.48772903678},
                          {5, 11.070, 11.0704976935},
                          {6, 12.592, 12.5915872437},
                          {7, 14.067, 14.0671404493},
                          {8, 15.507, 15.5073130559},
                          {9, 16.919, 16.9189776046},
                          {10, 18.307, 18.3070380533},
                          {20, 31.410, 31.4104328442},
                          {30, 43.773, 43.7729718257},
                          {50, 67.505, 67.5048065495},
                          {100, 124.342, 124.342113404}});
  expect_quantiles(0.01, {{1, 6.635, 6.63489660102},
                          {2, 9.210, 9.21034037198},
                          {3, 11.345, 11.3448667301},
                          {4, 13.277, 13.276704136},
                          {5, 15.086, 15.0862724694},
                          {6, 16.812, 16.8118938298},
                          {7, 18.475, 18.4753069066},
                          {8, 20.090, 20.0902350297},
                          {9, 21.666, 21.6659943335},
                          {10, 23.209, 23.209251159},
                          {20, 37.566, 37.5662347866},
                          {30, 50.892, 50.8921813115},
                          {50, 76.154, 76.153891249},
                          {100, 135.807, 135.806723171}});
}

// Regularized incomplete gamma function in 30 digits (mpmath).
TEST(ChiSquareUpperTail, AgreesWithThirtyDigitValues) {
  struct Tail {
    double freedom, x, P;
  };
  for (const Tail& row : {Tail{1, 3.84, 0.0500435212487},
                          {2, 10, 0.00673794699909},
                          {4, 9.49, 0.0499531312233},
                          {10, 5, 0.891178018914},
                          {54, 66.0785, 0.125383078536},
                          {56, 235.0917, 8.33777444081e-24},
                          {18, 0.5, 0.999999999992},
                          {100, 300, 7.41210085732e-22},
                          {1000, 1100, 0.0146144081263},
                          {3, 1e-6, 0.999999999734}}) {
    EXPECT_NEAR(chi_square_upper_tail(row.x, row.freedom), row.P, half_unit(row.P, kOwnDigits))
        << row.x << " on " << row.freedom;
  }
}

TEST(ChiSquareUpperTail, KeepsItsDigitsWhereOneMinusTheRestIsZero) {
  // Two degrees: exp(-x / 2) exactly. exp magnifies the rounding of its argument 350-fold.
  constexpr double kRounding = 1e-12;
  EXPECT_NEAR(chi_square_upper_tail(700.0, 2.0) / std::exp(-350.0), 1.0, kRounding);
  EXPECT_EQ(chi_square_upper_tail(-1.0, 3.0), 1.0);
}

TEST(NoncentralUpperTail, IsTheCentralOneWithoutDeparture) {
  constexpr double kSeries = 1e-12;  // the sum over Poisson weights stops at double precision
  EXPECT_NEAR(noncentral_chi_square_upper_tail(12.0, 5.0, 0.0), chi_square_upper_tail(12.0, 5.0),
              kSeries);
  EXPECT_EQ(noncentral_chi_square_upper_tail(0.0, 5.0, 2.0), 1.0);
}

TEST(NoncentralUpperTail, AgreesWithTheNormalLawOnOneDegree) {
  // X = (z + sqrt(L))^2: P(X > x) = Phi(sqrt(L) - sqrt(x)) + Phi(-sqrt(L) - sqrt(x)).
  constexpr double kSeries = 1e-12;
  const auto phi = [](double z) { return 0.5 * std::erfc(-z / std::sqrt(2.0)); };
  for (const double L : {0.5, 4.0, 20.0}) {
    const double exact = phi(std::sqrt(L) - 2.0) + phi(-std::sqrt(L) - 2.0);
    EXPECT_NEAR(noncentral_chi_square_upper_tail(4.0, 1.0, L), exact, kSeries);
  }
}

// NIST/SEMATECH e-Handbook, sections 1.3.6.7.1 and 1.3.6.7.2 (from memory), three decimals.
TEST(Quantiles, OfTheNormalAndOfStudentsLawAgreeWithPrintedTables) {
  EXPECT_NEAR(normal_quantile(0.025), 1.960, kPrinted);
  EXPECT_NEAR(normal_quantile(0.001), 3.090, kPrinted);
  EXPECT_NEAR(student_t_quantile(0.025, 1), 12.706, kPrinted);
  EXPECT_NEAR(student_t_quantile(0.025, 10), 2.228, kPrinted);
  EXPECT_NEAR(student_t_quantile(0.025, 35), 2.030, kPrinted);
  EXPECT_NEAR(student_t_quantile(0.05, 60), 1.671, kPrinted);
}

}  // namespace
}  // namespace gainsay::stats
