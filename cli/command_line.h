#pragma once

#include "gainsay/core/result.h"

#include <map>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// A command line as understood: the command and what was given for each of its options, checked
/// against the table.
struct Invocation {
  std::string command;
  std::map<std::string, std::vector<std::string>, std::less<>> given;

  bool has(std::string_view option) const { return given.find(option) != given.end(); }
  std::optional<std::string> text(std::string_view option) const;
  std::vector<std::string> texts(std::string_view option) const;
  std::optional<long> whole_number(std::string_view option) const;
  std::optional<double> number(std::string_view option) const;
};

/// What a command line asks for: a command to run, or a text to print (help, version) with status
/// 0.
struct CommandLine {
  std::optional<Invocation> invocation;
  std::string text;
};

/// `arguments` without the program's name. Fails with a message that names the nearest command or
/// option.
core::Result<CommandLine> read_command_line(const std::vector<std::string>& arguments);

}  // namespace gainsay::cli
