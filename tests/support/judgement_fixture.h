#pragma once

#include "gainsay/cli/judgement.h"
#include "gainsay/testing/mechanism.h"

#include <cmath>
#include <memory>
#include <string>
#include <vector>

namespace gainsay::testing {

/// A judgement put together by hand for tests of what is written from one. All its numbers are
/// invented; curves are those of two steps in a row (A -> B -> C), bent a little for each
/// hypothesis, so that pictures look like pictures. Programs are null.
class JudgementFixture {
 public:
  JudgementFixture() {
    judgement_.study.title = "Why does the acid stop forming?";
    judgement_.study.time_unit = "min";
    judgement_.version = "0.1.0";
    judgement_.libraries = {"SUNDIALS 6.4.1", "Ceres 2.1.0"};
    judgement_.fingerprints = {{"experiments/one.csv", std::string(64, 'a')},
                               {"study.toml", std::string(64, 'b')}};
    add_readout("amide", "mmol/L", false);
    add_readout("glow", "", true);
    add_experiment("low load", 12.0);
    add_experiment("high load", 40.0);
  }

  /// Three hypotheses: A rejected, B (amends A) not rejected, C undecided.
  cli::Judgement three() {
    add("plain", stats::Decision::Rejected, 96.4, 0.35);
    add("enzyme lost", stats::Decision::NotRejected, 19.8, 0.02);
    add("loss and inhibition", stats::Decision::Undecided, 28.0, 0.06);
    judgement_.study.hypotheses[1].base = 0;
    judgement_.study.hypotheses[2].base = 0;
    judgement_.study.experiments[0].series[0].points[2].left_out = "bubble";
    return judgement_;
  }

  /// One hypothesis more, called so, decided so. `bend` is how far its curves miss the readings.
  JudgementFixture& add(const std::string& title, stats::Decision decision, double V, double bend) {
    const std::size_t number = judgement_.study.hypotheses.size();
    cli::StudyHypothesis hypothesis;
    hypothesis.letter = std::string(1, static_cast<char>('A' + number));
    hypothesis.file = "hypotheses/" + std::to_string(number + 1) + ".toml";
    hypothesis.mechanism = mechanism(title, number);
    judgement_.study.hypotheses.push_back(hypothesis);
    cli::Outcome outcome;
    outcome.hypothesis = number;
    outcome.problem = problem(title);
    outcome.network = core::derive_network(hypothesis.mechanism);
    outcome.judged.verdict = verdict(decision, V, bend, *outcome.problem);
    outcome.judged.search = search(V, *outcome.problem);
    outcome.curves = curves(bend);
    outcome.weight = decision == stats::Decision::NotRejected ? 1.0 : stats::kNotComputed;
    judgement_.outcomes.push_back(std::move(outcome));
    return *this;
  }

  const cli::Judgement& judgement() const { return judgement_; }
  cli::Judgement& judgement() { return judgement_; }

  /// A judgement that has `words` in every place where a study can name something.
  static cli::Judgement named_throughout(const std::string& words) {
    JudgementFixture fixture;
    cli::Judgement judgement = fixture.three();
    judgement.study.title = words;
    judgement.study.time_unit = words;
    for (auto& readout : judgement.study.readouts) readout.title = readout.unit = words;
    for (auto& experiment : judgement.study.experiments) {
      experiment.title = words;
      experiment.series[0].points[0].left_out = words;
    }
    for (auto& hypothesis : judgement.study.hypotheses) {
      hypothesis.mechanism.title = words;
      for (auto& species : hypothesis.mechanism.species) species.shown_as = words;
    }
    for (auto& outcome : judgement.outcomes) {
      outcome.judged.verdict.reason = words;
      outcome.judged.verdict.sentences = {words};
      outcome.judged.verdict.intervals[0].words = words;
    }
    judgement.fingerprints[0].file = words;
    return judgement;
  }

 private:
  static constexpr std::size_t kPoints = 8;
  static constexpr double kEvery = 10.0;
  static constexpr double kSd = 0.6;

  /// What readout number `readout` shows of `load` at t: A -> B -> C with rate constants 0.08 and
  /// 0.02 (B in closed form), the second one stretched a hundred times.
  static double shown(std::size_t readout, double load, double t, double bend) {
    const double fast = 0.08;
    const double slow = 0.02 * (1.0 + bend);
    const double b = load * fast / (fast - slow) * (std::exp(-slow * t) - std::exp(-fast * t));
    return readout == 0 ? b : 100.0 * (load - b) * (1.0 - std::exp(-slow * t)) + 1.0;
  }
  static double sd_of(std::size_t readout) { return readout == 0 ? kSd : 20.0; }
  /// Scatter without order, by number.
  static double scatter(std::size_t i) {
    return std::sin(12.9898 * (static_cast<double>(i) + 1.0));
  }
  double load(std::size_t experiment) const { return experiment == 0 ? 12.0 : 40.0; }

  void add_readout(const std::string& name, const std::string& unit, bool logarithmic) {
    estimation::Readout readout;
    readout.name = readout.title = name;
    readout.unit = unit;
    readout.noise.sd = sd_of(judgement_.study.readouts.size());
    readout.logarithmic_axis = logarithmic;
    judgement_.study.readouts.push_back(readout);
  }

  void add_experiment(const std::string& title, double with_load) {
    estimation::Experiment experiment;
    experiment.name = "run-" + std::to_string(judgement_.study.experiments.size() + 1);
    experiment.title = title;
    for (std::size_t r = 0; r < judgement_.study.readouts.size(); ++r) {
      estimation::Series series;
      series.readout = judgement_.study.readouts[r].name;
      for (std::size_t i = 0; i < kPoints; ++i) {
        const double t = kEvery * static_cast<double>(i);
        series.points.push_back({t, shown(r, with_load, t, 0.0) + sd_of(r) * scatter(i + 3 * r),
                                 estimation::kNotGiven, "", 0});
      }
      experiment.series.push_back(series);
    }
    judgement_.study.experiments.push_back(experiment);
  }

  static core::Hypothesis mechanism(const std::string& title, std::size_t number) {
    Mechanism written(title);
    written.species("nitrile").species("amide").species("acid").species("enzyme", "1");
    written.rate("hydration", {{"nitrile", 1}}, {{"amide", 1}}, "k1 * enzyme * nitrile");
    written.rate("hydrolysis", {{"amide", 1}}, {{"acid", 1}},
                 number == 2 ? "k2 * amide / (1 + acid / Ki)" : "k2 * amide");
    if (number > 0) written.rate("inactivation", {{"enzyme", 1}}, {}, "kd * enzyme * nitrile");
    return written.unknowns({"k1", "k2", "kd", "Ki"});
  }

  std::shared_ptr<const estimation::Problem> problem(const std::string& title) const {
    auto problem = std::make_shared<estimation::Problem>();
    problem->hypothesis = title;
    problem->unknowns.resize(2);
    problem->unknowns[0].name = "k1";
    problem->unknowns[0].unit = "1/min";
    problem->unknowns[1].name = "kd[run-1]";
    for (estimation::Unknown& unknown : problem->unknowns) {
      unknown.low = 1e-4;
      unknown.high = 10.0;
    }
    for (const estimation::Experiment& run : judgement_.study.experiments) {
      estimation::FittedExperiment fitted;
      fitted.name = run.name;
      for (std::size_t i = 0; i < kPoints; ++i) {
        fitted.schedule.outputs.push_back(kEvery * static_cast<double>(i));
      }
      for (std::size_t r = 0; r < run.series.size(); ++r) {
        estimation::FittedSeries series;
        series.readout = run.series[r].readout;
        series.readout_number = r;
        for (std::size_t i = 0; i < run.series[r].points.size(); ++i) {
          estimation::Datum datum;
          datum.value = run.series[r].points[i].value;
          datum.output = i;
          datum.point = i;
          series.data.push_back(datum);
        }
        fitted.series.push_back(std::move(series));
      }
      problem->experiments.push_back(std::move(fitted));
    }
    return problem;
  }

  stats::Verdict verdict(stats::Decision decision, double V, double bend,
                         const estimation::Problem& problem) const {
    stats::Verdict verdict;
    verdict.decision = decision;
    verdict.reason = "misfit " + std::to_string(static_cast<int>(V)) + " against 41.3";
    verdict.sentences = {"Even the best fit that was found leaves more than noise explains."};
    verdict.V = verdict.V_tighter = V;
    verdict.N = 32;
    verdict.k = 2;
    verdict.full = {V, 43.7, 32.0, 0.2, ""};
    verdict.reduced = {V, 41.3, 30.0, 0.15, ""};
    verdict.order.T = 1.9;
    verdict.order.p_value = 0.4;
    verdict.p_value = decision == stats::Decision::Rejected ? 1.3e-7 : 0.19;
    verdict.departure_sd = 0.83;
    for (std::size_t e = 0; e < problem.experiments.size(); ++e) {
      for (std::size_t s = 0; s < problem.experiments[e].series.size(); ++s) {
        add_residuals(e, s, bend, problem, verdict);
      }
    }
    verdict.intervals = {{"k1", 0.08, 0.07, 0.092, 0.005, true, false, ""},
                         {"kd[run-1]", 0.4, stats::kNotComputed, stats::kNotComputed,
                          stats::kNotComputed, false, false, "not determined by these data"}};
    verdict.minus_two_ln_L = V;
    verdict.K = 2.0;
    verdict.AIC = V + 4.0;
    verdict.BIC = V + 6.9;
    return verdict;
  }

  void add_residuals(std::size_t e, std::size_t s, double bend, const estimation::Problem& problem,
                     stats::Verdict& verdict) const {
    const estimation::FittedSeries& series = problem.experiments[e].series[s];
    stats::Share share{problem.experiments[e].name, series.readout, series.data.size(), 0.0};
    for (std::size_t d = 0; d < series.data.size(); ++d) {
      const double modelled = shown(s, load(e), kEvery * static_cast<double>(d), bend);
      const double r = (series.data[d].value - modelled) / sd_of(s);
      verdict.residuals.push_back({e, s, d, modelled, sd_of(s), r});
      share.V += r * r;
    }
    verdict.shares.push_back(share);
  }

  std::vector<estimation::Curve> curves(double bend) const {
    std::vector<estimation::Curve> all;
    for (std::size_t e = 0; e < judgement_.study.experiments.size(); ++e) {
      for (std::size_t r = 0; r < judgement_.study.readouts.size(); ++r) {
        estimation::Curve curve;
        curve.experiment = judgement_.study.experiments[e].name;
        curve.readout = judgement_.study.readouts[r].name;
        for (int i = 0; i <= 70; ++i) {
          curve.times.push_back(i);
          curve.shown.push_back(shown(r, load(e), i, bend));
        }
        all.push_back(std::move(curve));
      }
    }
    return all;
  }

  /// Twenty starts, of which three quarters end in the best optimum.
  static estimation::SearchResult search(double V, const estimation::Problem& problem) {
    estimation::SearchResult result;
    for (std::size_t i = 0; i < 20; ++i) {
      estimation::Descent descent;
      descent.fit.V = descent.fit.objective = i % 4 == 3 ? 2.0 * V + static_cast<double>(i) : V;
      descent.fit.values.assign(problem.unknowns.size(), 0.1);
      descent.fit.stopped = estimation::Stopped::Converged;
      descent.fit.why = "converged";
      descent.start_number = i;
      result.descents.push_back(descent);
    }
    result.optima = {{0, 15}, {3, 5}};
    result.best = result.descents[0].fit;
    result.random_starts = 20;
    return result;
  }

  cli::Judgement judgement_;
};

}  // namespace gainsay::testing
