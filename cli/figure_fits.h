#pragma once

#include "gainsay/cli/page.h"

#include <string>

namespace gainsay::cli {

/// Data and fits: a row of panels a readout, a column an experiment; curves of every hypothesis
/// judged, of which those that are ticked show.
Markup figure_fits(const Page& page);

/// The boxes that are ticked to show a hypothesis in all pictures: in order of the line-up, six
/// open, the rest folded.
Markup tick_boxes(const Page& page);

/// The numbers of the panels as JSON, for the script: by id of the panel, times, readings, sd and
/// what each hypothesis shows there.
std::string panel_numbers(const Page& page);

}  // namespace gainsay::cli
