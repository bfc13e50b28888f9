#include "gainsay/cli/find.h"

#include "gainsay/core/nearest_name.h"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

core::Failure unknown_name(std::string_view kind, std::string_view name,
                           const std::vector<std::string>& names) {
  const auto nearest = core::nearest_name(name, names);
  return {.what = fmt::format("no {} '{}' in this study", kind, name),
          .expected = nearest ? fmt::format("perhaps '{}'", *nearest)
                              : fmt::format("one of: {}", fmt::join(names, "; ")),
          .to_do = "correct the name; 'gainsay check' lists them",
          .place = {}};
}

}  // namespace

core::Result<std::size_t> find_hypothesis(const Study& study, std::string_view letter_or_title) {
  std::vector<std::string> names;
  for (std::size_t i = 0; i < study.hypotheses.size(); ++i) {
    const StudyHypothesis& hypothesis = study.hypotheses[i];
    if (hypothesis.letter == letter_or_title || hypothesis.mechanism.title == letter_or_title)
      return i;
    names.push_back(hypothesis.mechanism.title);
  }
  return unknown_name("hypothesis", letter_or_title, names);
}

core::Result<std::size_t> find_experiment(const Study& study, std::string_view name) {
  std::vector<std::string> names;
  for (std::size_t i = 0; i < study.experiments.size(); ++i) {
    if (study.experiments[i].name == name) return i;
    names.push_back(study.experiments[i].name);
  }
  return unknown_name("experiment", name, names);
}

}  // namespace gainsay::cli
