#pragma once

#include "gainsay/testing/program_run.h"
#include "gainsay/testing/scratch_folder.h"

#include <nlohmann/json.hpp>

#include <filesystem>
#include <stdexcept>
#include <string>
#include <vector>

namespace gainsay::testing {

/// A study of `data`, judged by the program in a copy: what `--json` says.
inline nlohmann::json judged(const std::string& study, std::vector<std::string> options = {}) {
  const ScratchFolder folder;
  const std::filesystem::path copy = folder.path() / study;
  std::filesystem::copy(std::filesystem::path(GAINSAY_SOURCE_DIR) / "data" / study, copy,
                        std::filesystem::copy_options::recursive);
  std::filesystem::remove_all(copy / "results");
  options.insert(options.begin(), {"judge", copy.string(), "--json"});
  const ProgramRun run = run_gainsay(options);
  if (run.status != 0) throw std::runtime_error("gainsay judge " + study + ": " + run.messages);
  return nlohmann::json::parse(run.out);
}

/// The hypothesis of this letter.
inline nlohmann::json hypothesis(const nlohmann::json& report, const std::string& letter) {
  for (const nlohmann::json& one : report.at("hypotheses")) {
    if (one.at("letter") == letter) return one;
  }
  throw std::runtime_error("no hypothesis " + letter);
}

/// The estimate of an unknown.
inline double estimate(const nlohmann::json& hypothesis, const std::string& name) {
  for (const nlohmann::json& unknown : hypothesis.at("unknowns")) {
    if (unknown.at("name") == name) return unknown.at("estimate").get<double>();
  }
  throw std::runtime_error("no unknown " + name);
}

/// Sum of (reading - shown)^2, without weights.
inline double sum_of_squares(const nlohmann::json& hypothesis) {
  double sum = 0.0;
  for (const nlohmann::json& residual : hypothesis.at("residuals")) {
    const double apart = residual.at("reading").get<double>() - residual.at("shown").get<double>();
    sum += apart * apart;
  }
  return sum;
}

}  // namespace gainsay::testing
