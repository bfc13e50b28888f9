#pragma once

#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// What the value of an option must be.
enum class ValueKind { None, Text, WholeNumber, Number };

/// One option or positional argument of a command.
struct Option {
  std::string name;   ///< "--threads", or "STUDY" for a positional one
  std::string value;  ///< what stands for its value in help: "N"; empty for a flag or a positional
  ValueKind kind = ValueKind::Text;
  std::string brief;  ///< one line
  bool required = false;
  bool repeated = false;                  ///< may be given several times
  std::vector<std::string> choices = {};  ///< the only values allowed, if any

  bool positional() const { return !name.starts_with("--"); }
};

struct Example {
  std::string command;
  std::string does;
};

struct Command {
  std::string name;
  std::string brief;        ///< one line
  std::string description;  ///< a paragraph
  std::vector<Option> options;
  std::vector<Example> examples;
};

/// The one table that feeds the command line, `--help`, the manual page and the completions.
std::span<const Command> all_commands();
const Command* find_command(std::string_view name);

}  // namespace gainsay::cli
