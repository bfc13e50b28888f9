#pragma once

#include "gainsay/cli/key_check.h"
#include "gainsay/cli/written_expression.h"
#include "gainsay/estimation/readout.h"

#include <string>
#include <vector>

namespace gainsay::cli {

/// A readout as study.toml gives it.
struct ReadReadout {
  estimation::Readout readout;
  WrittenExpression shows;
  bool says_noise = false;
  std::string sd_of;  ///< "reading", "mean", or empty where it is not said
  Location place;     ///< of its name
};

/// [readouts] of study.toml.
std::vector<ReadReadout> read_readouts(const CheckedTable& top, Diagnostics& diagnostics);

}  // namespace gainsay::cli
