#include "gainsay/estimation/ceres_solve.h"

#include "gainsay/core/require.h"
#include "gainsay/estimation/data_rows.h"

#include <ceres/ceres.h>
#include <glog/logging.h>

#include <algorithm>
#include <mutex>
#include <utility>

namespace gainsay::estimation {
namespace {

using Rows = std::vector<Eigen::Index>;

/// Ceres logs through glog, which complains where nobody has set it up; a library prints nothing.
void silence_log() {
  static std::once_flag once;
  std::call_once(once, [] {
    if (google::IsGoogleLoggingInitialized()) return;  // the program around us decides
    FLAGS_logtostderr = true;                          // no files
    FLAGS_minloglevel = google::GLOG_FATAL;
    google::InitGoogleLogging("gainsay");
  });
}

/// Some rows of r and J, over the free unknowns.
class Block : public ceres::CostFunction {
 public:
  Block(Workbench& bench, Rows rows) : bench_(bench), rows_(std::move(rows)) {
    set_num_residuals(static_cast<int>(rows_.size()));
    mutable_parameter_block_sizes()->push_back(static_cast<int>(bench_.free().size()));
  }

  bool Evaluate(double const* const* parameters, double* residuals,
                double** jacobians) const override {
    const Evaluation* evaluation = bench_.evaluate(bench_.with_free(parameters[0]));
    if (evaluation == nullptr) return false;
    const Rows& free = bench_.free();
    double* entry = jacobians == nullptr ? nullptr : jacobians[0];
    for (const Eigen::Index row : rows_) {
      *residuals++ = evaluation->r[row];
      for (std::size_t k = 0; entry != nullptr && k < free.size(); ++k)
        *entry++ = evaluation->J(row, free[k]);
    }
    return true;
  }

 private:
  Workbench& bench_;
  Rows rows_;
};

/// N_g ln(1 + s / (N_g f^2)) of a block's sum of squares s. Methods (14).
class UnknownNoise : public ceres::LossFunction {
 public:
  explicit UnknownNoise(const NoiseGroup& group) : group_(group) {}
  void Evaluate(double sum_squares, double rho[3]) const override {
    NoiseGroup group = group_;
    group.sum_squares = sum_squares;
    rho[0] = group.objective();
    rho[1] = 1.0 / group.variance();
    rho[2] = -rho[1] * rho[1] / static_cast<double>(group.count);
  }

 private:
  NoiseGroup group_;
};

/// Numbers of the residuals by group of unknown noise; those of known noise, and priors, first.
std::vector<Rows> blocks_of(const Problem& problem) {
  std::vector<Rows> blocks(1 + problem.noise_groups.size());
  std::size_t number = 0;
  for (const ExperimentRows& table : data_rows(problem)) {
    for (const DataRow& row : table.rows) {
      blocks[row.group ? 1 + *row.group : 0].push_back(static_cast<Eigen::Index>(row.number));
      ++number;
    }
  }
  for (; number < problem.residuals(); ++number)
    blocks[0].push_back(static_cast<Eigen::Index>(number));
  for (Rows& rows : blocks) std::sort(rows.begin(), rows.end());
  return blocks;
}

/// True where nothing is integrated: a plain regression, exact but for rounding.
bool is_algebraic(const Problem& problem) {
  return std::all_of(problem.experiments.begin(), problem.experiments.end(),
                     [](const FittedExperiment& fitted) { return fitted.program->states() == 0; });
}

ceres::Solver::Options options_for(const Problem& problem) {
  // What the integration cannot tell apart is one; below that only rejected steps would follow.
  const double accuracy = is_algebraic(problem) ? 1e-14 : problem.relative_accuracy;
  ceres::Solver::Options options;
  options.linear_solver_type = ceres::DENSE_QR;
  options.dense_linear_algebra_library_type = ceres::EIGEN;
  options.num_threads = 1;
  options.logging_type = ceres::SILENT;
  options.max_num_iterations = 100;
  options.max_num_consecutive_invalid_steps = 50;
  options.function_tolerance = 1e-2 * accuracy;
  options.parameter_tolerance = accuracy;
  options.gradient_tolerance = 1e-10;
  return options;
}

}  // namespace

Workbench::Workbench(Allowance& allowance, const Box& box, Eigen::VectorXd x)
    : allowance_(allowance), box_(box), x_(std::move(x)) {}

const Evaluation* Workbench::evaluate(const Eigen::VectorXd& x) {
  if (kept_ && kept_x_ == x) return &*kept_;
  if ((x.array() < box_.low.array()).any() || (x.array() > box_.high.array()).any()) {
    return nullptr;
  }
  kept_ = allowance_.evaluate(x, Evaluator::Want::ResidualsAndJacobian, Stage{});
  kept_x_ = x;
  return kept_ ? &*kept_ : nullptr;
}

Eigen::VectorXd Workbench::with_free(const double* values) const {
  Eigen::VectorXd x = x_;
  for (const Eigen::Index i : free_) x[i] = *values++;
  return x;
}

CeresEnd solve_with_ceres(Workbench& bench) {
  GAINSAY_REQUIRE(!bench.free().empty(), "there is an unknown to move");
  silence_log();
  const std::vector<Rows> blocks = blocks_of(bench.problem());
  const std::vector<NoiseGroup> groups = noise_groups(bench.problem());
  std::vector<double> free;
  for (const Eigen::Index i : bench.free()) free.push_back(bench.x()[i]);
  ceres::Problem sum;
  for (std::size_t b = 0; b < blocks.size(); ++b) {
    if (blocks[b].empty()) continue;
    sum.AddResidualBlock(new Block(bench, blocks[b]),
                         b == 0 ? nullptr : new UnknownNoise(groups[b - 1]), free.data());
  }
  ceres::Solver::Summary summary;
  ceres::Solve(options_for(bench.problem()), &sum, &summary);
  bench.move_to(bench.with_free(free.data()));
  return {summary.termination_type == ceres::CONVERGENCE, summary.message};
}

}  // namespace gainsay::estimation
