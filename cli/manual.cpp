#include "gainsay/cli/manual.h"

#include "gainsay/cli/options.h"
#include "gainsay/core/version.h"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <algorithm>

namespace gainsay::cli {
namespace {

/// Hyphens and backslashes as roff wants them; a line may not begin with a dot.
std::string roff(std::string_view text) {
  std::string escaped;
  for (const char c : text) {
    if (c == '-') {
      escaped += "\\-";
    } else if (c == '\\') {
      escaped += "\\e";
    } else {
      if (escaped.empty() && (c == '.' || c == '\'')) escaped += "\\&";
      escaped += c;
    }
  }
  return escaped;
}

std::string usage(const Command& command) {
  std::string words = "gainsay " + command.name;
  for (const Option& option : command.options) {
    const std::string shown = option.value.empty() ? option.name : option.name + " " + option.value;
    words += option.required ? " " + shown : " [" + shown + "]";
  }
  return words;
}

std::string manual_section(const Command& command) {
  std::string text = fmt::format(".SS {}\n.B {}\n.PP\n{}\n", roff(command.name),
                                 roff(usage(command)), roff(command.description));
  for (const Option& option : command.options) {
    text += fmt::format(".TP\n.B {} {}\n{}\n", roff(option.name), roff(option.value),
                        roff(option.brief));
  }
  for (const Example& example : command.examples) {
    text += fmt::format(".PP\n.nf\n.RS\n{}\n.RE\n.fi\n({})\n", roff(example.command),
                        roff(example.does));
  }
  return text;
}

std::vector<std::string> command_names() {
  std::vector<std::string> names;
  for (const Command& command : all_commands()) names.push_back(command.name);
  return names;
}

std::vector<std::string> option_names(const Command& command) {
  std::vector<std::string> names;
  for (const Option& option : command.options) {
    if (!option.positional()) names.push_back(option.name);
    names.insert(names.end(), option.choices.begin(), option.choices.end());
  }
  names.emplace_back("--help");
  return names;
}

std::string bash_script() {
  std::string cases;
  for (const Command& command : all_commands()) {
    cases += fmt::format("    {}) words=\"{}\" ;;\n", command.name,
                         fmt::join(option_names(command), " "));
  }
  return fmt::format(R"(# completion of gainsay for bash
_gainsay() {{
  local word="${{COMP_WORDS[COMP_CWORD]}}" words
  case "${{COMP_WORDS[1]}}" in
{}    *) words="{} --help --version" ;;
  esac
  if [ "$COMP_CWORD" -eq 1 ]; then words="{} --help --version"; fi
  COMPREPLY=($(compgen -W "$words" -- "$word") $(compgen -d -- "$word"))
}}
complete -o filenames -F _gainsay gainsay
)",
                     cases, fmt::join(command_names(), " "), fmt::join(command_names(), " "));
}

std::string quoted(std::string text) {
  for (std::size_t at = text.find('\''); at != std::string::npos; at = text.find('\'', at + 4))
    text.replace(at, 1, "'\\''");
  return "'" + text + "'";
}

std::string zsh_script() {
  std::string commands, cases;
  for (const Command& command : all_commands()) {
    commands += fmt::format("    {}\n", quoted(command.name + ":" + command.brief));
    cases += fmt::format("    {}) compadd -- {}; _files ;;\n", command.name,
                         fmt::join(option_names(command), " "));
  }
  return fmt::format(R"(#compdef gainsay
_gainsay() {{
  local -a commands=(
{}  )
  if (( CURRENT == 2 )); then
    _describe command commands
    return
  fi
  case "$words[2]" in
{}  esac
}}
_gainsay "$@"
)",
                     commands, cases);
}

std::string fish_script() {
  std::string text = "# completion of gainsay for fish\n";
  for (const Command& command : all_commands()) {
    text += fmt::format("complete -c gainsay -n __fish_use_subcommand -a {} -d {}\n", command.name,
                        quoted(command.brief));
    for (const Option& option : command.options) {
      if (option.positional()) {
        if (!option.choices.empty()) {
          text += fmt::format("complete -c gainsay -n '__fish_seen_subcommand_from {}' -a '{}'\n",
                              command.name, fmt::join(option.choices, " "));
        }
        continue;
      }
      text += fmt::format("complete -c gainsay -n '__fish_seen_subcommand_from {}' -l {}{} -d {}\n",
                          command.name, option.name.substr(2),
                          option.kind == ValueKind::None ? "" : " -r", quoted(option.brief));
    }
  }
  return text;
}

}  // namespace

std::string manual_page() {
  std::string text = fmt::format(
      ".TH GAINSAY 1 \"\" \"gainsay {}\" \"User Commands\"\n"
      ".SH NAME\ngainsay \\- find out which hypotheses of how a system is wired the data "
      "contradict\n"
      ".SH SYNOPSIS\n.B gainsay\n.I command\n[\\fIargument\\fR ...]\n"
      ".SH DESCRIPTION\nA study is a folder that holds rival mechanisms and time courses from the "
      "bench. gainsay turns each "
      "mechanism into ordinary differential equations, fits all unknowns to all experiments at "
      "once, tests whether even the "
      "best agreement is good enough, and says which mechanisms the data contradict, and why.\n.SH "
      "COMMANDS\n",
      roff(core::version()));
  for (const Command& command : all_commands()) text += manual_section(command);
  text +=
      ".SH EXIT STATUS\n.TP\n.B 0\ndone, undecided verdicts included\n.TP\n.B 2\nstudy or command "
      "line wrong; nothing was "
      "written\n.TP\n.B 3\ninterrupted or not finished\n"
      ".SH ENVIRONMENT\n.TP\n.B NO_COLOR\nif set and not empty, no colours on the terminal\n"
      ".SH CAUTION\nA hypothesis that is not rejected is not thereby true. Results do not replace "
      "safety assessment, dosing "
      "decisions or licensed practice; local rules prevail.\n";
  return text;
}

std::string completion_script(std::string_view shell) {
  if (shell == "zsh") return zsh_script();
  if (shell == "fish") return fish_script();
  return bash_script();
}

}  // namespace gainsay::cli
