#pragma once

#include "gainsay/cli/key_check.h"
#include "gainsay/cli/study_top.h"
#include "gainsay/estimation/experiment.h"

#include <vector>

namespace gainsay::cli {

/// The course of every declared input in one experiment: what its [inputs] say, else the study's
/// `otherwise`. Says which inputs are not declared, or given by neither.
std::vector<estimation::InputCourse> read_courses(const CheckedTable& experiment,
                                                  const std::vector<DeclaredInput>& inputs,
                                                  double begins, const Location& file,
                                                  Diagnostics& diagnostics);

}  // namespace gainsay::cli
