#include "gainsay/core/conserved.h"

#include "gainsay/core/sample.h"

#include <Eigen/LU>
#include <gmock/gmock.h>

#include <cmath>

namespace gainsay::core {
namespace {

using ::testing::ElementsAre;
using ::testing::IsEmpty;
using ::testing::SizeIs;

Eigen::MatrixXd matrix(std::initializer_list<std::initializer_list<double>> rows) {
  return Eigen::MatrixXd(rows);
}

// E + S <-> C -> E + P: the two sums of every text on enzyme kinetics, e + c and s + c + p
// (Michaelis & Menten 1913).
TEST(ConservedWeights, EnzymeAndSubstrateOfTheClassicMechanism) {
  const auto S = matrix({{-1, 1}, {-1, 0}, {1, -1}, {0, 1}});  // E, S, C, P
  EXPECT_THAT(conserved_weights(S), ElementsAre(ElementsAre(1, 0, 1, 0), ElementsAre(0, 1, 1, 1)));
}

// Water formation, 2 H2 + O2 -> 2 H2O: atoms of hydrogen and of oxygen. A sum over H2 and O2 with a
// negative weight is conserved too, but two without are there.
TEST(ConservedWeights, AtomsOfWater) {
  const auto S = matrix({{-2}, {-1}, {2}});
  EXPECT_THAT(conserved_weights(S), ElementsAre(ElementsAre(1, 0, 1), ElementsAre(0, 2, 1)));
}

TEST(ConservedWeights, FractionsBecomeSmallestWholeNumbers) {
  // A -> 2/3 B, typed with four digits and as a double of full length.
  EXPECT_THAT(conserved_weights(matrix({{-1}, {0.6667}})), ElementsAre(ElementsAre(6667, 10000)));
  EXPECT_THAT(conserved_weights(matrix({{-1}, {2.0 / 3.0}})), ElementsAre(ElementsAre(2, 3)));
  EXPECT_THAT(conserved_weights(matrix({{-0.1}, {0.3}})), ElementsAre(ElementsAre(3, 1)));
}

TEST(ConservedWeights, ADifferenceIsFoundWhereNoSumIs) {
  // -> A + B: only A - B stays.
  EXPECT_THAT(conserved_weights(matrix({{1}, {1}})), ElementsAre(ElementsAre(1, -1)));
}

TEST(ConservedWeights, NoneOfAnOpenSystemAllWithoutReactions) {
  EXPECT_THAT(conserved_weights(matrix({{-1, 1}})), IsEmpty());
  EXPECT_THAT(conserved_weights(Eigen::MatrixXd::Zero(2, 0)),
              ElementsAre(ElementsAre(1, 0), ElementsAre(0, 1)));
  EXPECT_THAT(conserved_weights(Eigen::MatrixXd::Zero(0, 0)), IsEmpty());
}

// Twelve pairs that exchange a group each: 2^12 extreme sums, more than the tableau may hold, so
// that the basis comes from elimination; it must still be one.
TEST(ConservedWeights, AnOvergrownTableauLeavesABasisAllTheSame) {
  constexpr int kPairs = 12;
  Eigen::MatrixXd S = Eigen::MatrixXd::Zero(2 * kPairs, 2);
  for (int i = 0; i < kPairs; ++i) {
    S(2 * i, 0) = 1 + i;
    S(2 * i + 1, 0) = -1 - 2 * i;
    S(2 * i, 1) = 3 + i;
    S(2 * i + 1, 1) = 2;
  }
  const auto basis = conserved_weights(S);
  ASSERT_THAT(basis, SizeIs(2 * kPairs - 2));
  for (const auto& weights : basis)
    for (int j = 0; j < 2; ++j) {
      double effect = 0.0;
      for (int i = 0; i < 2 * kPairs; ++i) effect += weights[static_cast<std::size_t>(i)] * S(i, j);
      EXPECT_EQ(effect, 0.0) << "whole numbers: exact in doubles";
    }
}

TEST(ConservedWeights, HoldForRandomNetworks) {
  for (std::uint64_t network = 0; network < 50; ++network) {
    Eigen::MatrixXd S(7, 4);
    for (Eigen::Index i = 0; i < S.size(); ++i)
      S(i) = std::trunc(2.0 * std::log10(sample("cell" + std::to_string(i), 2 * network)));
    const auto basis = conserved_weights(S);
    EXPECT_EQ(static_cast<Eigen::Index>(basis.size()),
              S.rows() - Eigen::FullPivLU<Eigen::MatrixXd>(S).rank());
    for (const auto& weights : basis)
      EXPECT_TRUE((Eigen::Map<const Eigen::VectorXd>(weights.data(), 7).transpose() * S).isZero(0))
          << "network " << network;
  }
}

}  // namespace
}  // namespace gainsay::core
