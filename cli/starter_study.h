#pragma once

#include <map>
#include <string>

namespace gainsay::cli {

/// The files of the starter study by name, each below its folder: "" (the study's own),
/// "hypotheses", "experiments". Its readings are invented, and say so.
std::map<std::string, std::map<std::string, std::string>> starter_study();

}  // namespace gainsay::cli
