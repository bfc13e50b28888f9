// Prints how many of the common starts of the fits under tests/fits one descent each brings home,
// on plain and on shifted ranges, and what that costs. Success: V within 0.5 of the best known.
// Usage: fits_benchmark [name of a fit ...]

#include "gainsay/estimation/fit.h"
#include "gainsay/testing/kinetic_fits.h"

#include <fmt/format.h>

#include <chrono>
#include <string>
#include <vector>

namespace {

using namespace gainsay;

constexpr double kSuccess = 0.5;

struct Tally {
  int starts = 0, successes = 0, converged = 0;
  long evaluations = 0, jacobians = 0, integrations = 0;
  double milliseconds = 0.0;

  Tally& operator+=(const Tally& other) {
    starts += other.starts;
    successes += other.successes;
    converged += other.converged;
    evaluations += other.evaluations;
    jacobians += other.jacobians;
    integrations += other.integrations;
    milliseconds += other.milliseconds;
    return *this;
  }
};

Tally run(const testing::KineticFit& fit) {
  using Clock = std::chrono::steady_clock;
  Tally tally;
  estimation::Evaluator evaluator(fit.problem);
  const auto began = Clock::now();
  for (const Eigen::VectorXd& start : fit.starts) {
    const estimation::Fit end = estimation::descend(evaluator, start);
    ++tally.starts;
    tally.successes += end.V <= fit.best_known_V + kSuccess;
    tally.converged += end.stopped == estimation::Stopped::Converged;
    tally.evaluations += end.evaluations;
    tally.jacobians += end.jacobians;
    tally.integrations += end.integrations;
  }
  tally.milliseconds = std::chrono::duration<double, std::milli>(Clock::now() - began).count();
  return tally;
}

void print(const std::string& name, const std::string& ranges, const Tally& tally) {
  const double starts = tally.starts;
  fmt::print("{:<8} {:<8} {:>4} of {:>3} {:>9} {:>12.1f} {:>10.1f} {:>13.1f} {:>9.1f}\n", name,
             ranges, tally.successes, tally.starts, tally.converged, tally.evaluations / starts,
             tally.jacobians / starts, tally.integrations / starts, tally.milliseconds / starts);
}

}  // namespace

int main(int count, char** arguments) {
  std::vector<std::string> names(arguments + 1, arguments + count);
  if (names.empty()) names.assign(testing::kKineticFits.begin(), testing::kKineticFits.end());
  fmt::print("{:<8} {:<8} {:>11} {:>9} {:>12} {:>10} {:>13} {:>9}\n", "fit", "ranges", "success",
             "converged", "states only", "Jacobians", "integrations", "ms");
  for (const testing::Ranges ranges : {testing::Ranges::Plain, testing::Ranges::Shifted}) {
    const std::string words = ranges == testing::Ranges::Plain ? "plain" : "shifted";
    Tally all;
    for (const std::string& name : names) {
      const Tally tally = run(testing::kinetic_fit(name, ranges));
      print(name, words, tally);
      all += tally;
    }
    print("all", words, all);
  }
  return 0;
}
