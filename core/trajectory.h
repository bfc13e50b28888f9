#pragma once

#include <Eigen/Core>

#include <cstddef>
#include <string>
#include <vector>

namespace gainsay::core {

/// States and readouts of one experiment at its T output times, and their derivatives by the p
/// unknowns of the Program. Derivatives are empty where they were not asked for. T may be short of
/// the schedule's if an observer ended the run.
struct Trajectory {
  std::vector<double> times;                ///< T
  Eigen::MatrixXd states;                   ///< n x T
  Eigen::MatrixXd shown;                    ///< m x T
  std::vector<Eigen::MatrixXd> dstates_dp;  ///< T of n x p
  std::vector<Eigen::MatrixXd> dshown_dp;   ///< T of m x p
  bool ended_early = false;                 ///< by the observer
};

/// Why an integration did not reach the last output time.
struct IntegrationFailure {
  enum class Kind { StepLimit, BlowUp, OutsideDomain, BadStart, Solver };
  Kind kind = Kind::Solver;
  double time = 0.0;
  std::string species;  ///< the state in trouble; empty if none can be told
  std::string words;    ///< one sentence for people
};

}  // namespace gainsay::core
