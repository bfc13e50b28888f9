#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/toml_tree.h"

namespace gainsay::cli {

/// A base hypothesis' document with an amendment's applied: the base's `title` and `base` are not
/// inherited; the paths of the amendment's `remove` are taken out (one that is not there is an
/// error); then its keys are merged at any depth. Lists are replaced whole, a list replaces a table
/// and the reverse; `flow` drops an inherited `rate` and the reverse. Every key and value keeps its
/// place in the file it comes from.
TomlValue amended(const TomlValue& base, const TomlValue& amendment, Diagnostics& diagnostics);

}  // namespace gainsay::cli
