#pragma once

#include "gainsay/core/expression.h"
#include "gainsay/core/hypothesis.h"
#include "gainsay/core/result.h"
#include "gainsay/estimation/experiment.h"
#include "gainsay/estimation/unknown.h"

#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::estimation {

/// `name[experiment]`: how an unknown of one experiment is shown; `name` where the experiment has
/// no name (conditions made up to simulate).
std::string particular(std::string_view name, std::string_view experiment);

/// What the names of a hypothesis mean in one experiment: knowns become numbers, unknowns of one
/// experiment carry its name, inputs that never change become numbers. The referents must outlive
/// this.
class Names {
 public:
  Names(const core::Hypothesis& hypothesis, std::span<const DeclaredUnknown> declared,
        std::span<const Experiment> experiments, const Experiment& experiment);

  /// `written` in species, unknowns, inputs that change and t alone, simplified. `where` says in a
  /// failure what it is part of: "the rate of 'hydration'".
  core::Result<core::Expression> over_time(const core::Expression& written,
                                           const std::string& where) const;

  /// `written` in unknowns alone: inputs and t as they are at `time`. A species fails.
  core::Result<core::Expression> at_time(const core::Expression& written, double time,
                                         const std::string& where) const;

  /// The failure with hypothesis and experiment said in front.
  core::Failure failure(std::string what, std::string expected, std::string to_do) const;

 private:
  core::Result<core::Expression> meaning(const std::string& name, const std::string& where) const;
  core::Result<core::Expression> meaning_of_input(const std::string& name,
                                                  const std::string& where) const;
  core::Failure without_meaning(const std::string& name, const std::string& where) const;
  std::vector<std::string> all_names() const;

  const core::Hypothesis& hypothesis_;
  std::span<const DeclaredUnknown> declared_;
  std::span<const Experiment> experiments_;
  const Experiment& experiment_;
};

}  // namespace gainsay::estimation
