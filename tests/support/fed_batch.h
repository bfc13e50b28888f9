#pragma once

#include "gainsay/cli/equations.h"
#include "gainsay/cli/study.h"
#include "gainsay/estimation/problem.h"
#include "gainsay/testing/bench.h"

#include <string>
#include <utility>

namespace gainsay::testing {

/// A study with every sort of equation, as plain values: a fed tank, one reaction inhibited by its
/// product, another reversible; made up.
inline cli::Study fed_batch() {
  cli::Study study;
  study.title = "Why <slow> & \"bitter\"?";
  study.inputs = {"feed"};
  study.unknowns = {between("kcat", 0.01, 100), between("c0", 1, 10)};
  study.unknowns[0].unknown.unit = "1/min";

  core::Hypothesis mechanism = Mechanism("Inhibited by R*")
                                   .compartment("tank", "fill")
                                   .species("S", "c0")
                                   .species("R")
                                   .held("H", "1e-7")
                                   .rate("turnover", {{"S", 2}}, {{"R", 1}}, "kcat * S / brake")
                                   .rate("relaxing", {{"R", 1}}, {{"S", 2}}, "kf * R", "kb * S^2")
                                   .flow("feeding", {}, {{"S", 1}}, "feed * 200")
                                   .where("brake", "1 + R / Ki")
                                   .known("fill", 0.8)
                                   .known("Ki", 5)
                                   .unknowns({"kcat", "c0", "kf", "kb"})
                                   .inputs({"feed"});
  mechanism.species[1].shown_as = "R*";
  cli::StudyHypothesis hypothesis;
  hypothesis.letter = "A";
  hypothesis.mechanism = mechanism;
  hypothesis.unknowns = {between("kf", 0.1, 1), between("kb", 0.1, 1)};
  hypothesis.unknowns[0].unknown.prior = estimation::Prior{0.5, 0.1, {}};
  study.hypotheses.push_back(hypothesis);

  estimation::Readout glow = shows("glow", "R", 0.05);
  glow.noise.relative = 0.03;
  glow.scale.kind = estimation::Coefficient::Kind::PerExperiment;
  glow.offset.kind = estimation::Coefficient::Kind::Unknown;
  study.readouts = {glow, shows("substrate", "S", 2)};
  study.experiments = {Bench("low").input("feed", {{0, 0}}).start("S", "4").data("glow", {{1, 2}}),
                       Bench("high")
                           .input("feed", {{0, 0}, {30, 0.5}})
                           .known("fill", 1)
                           .add(60, "S", "10")
                           .raise(70, "S", "2")
                           .data("substrate", {{1, 2}})};
  return study;
}

inline cli::StateSpace fed_batch_form(const cli::Study& study = fed_batch()) {
  const cli::StudyHypothesis& hypothesis = study.hypotheses[0];
  std::vector<estimation::DeclaredUnknown> declared = hypothesis.unknowns;
  declared.insert(declared.end(), study.unknowns.begin(), study.unknowns.end());
  auto problem =
      estimation::assemble(hypothesis.mechanism, declared, study.readouts, study.experiments, {});
  if (problem) return cli::state_space(study, 0, *problem);
  ADD_FAILURE() << problem.failure().what;
  return {};
}

}  // namespace gainsay::testing
