#include "gainsay/cli/options.h"

#include <algorithm>

namespace gainsay::cli {
namespace {

Option positional(std::string name, std::string brief) {
  return {.name = std::move(name), .value = "", .kind = ValueKind::Text, .brief = std::move(brief)};
}

Option flag(std::string name, std::string brief) {
  return {.name = std::move(name), .value = "", .kind = ValueKind::None, .brief = std::move(brief)};
}

Option text(std::string name, std::string value, std::string brief) {
  return {.name = std::move(name),
          .value = std::move(value),
          .kind = ValueKind::Text,
          .brief = std::move(brief)};
}

Option whole_number(std::string name, std::string value, std::string brief) {
  return {.name = std::move(name),
          .value = std::move(value),
          .kind = ValueKind::WholeNumber,
          .brief = std::move(brief)};
}

Option number(std::string name, std::string value, std::string brief) {
  return {.name = std::move(name),
          .value = std::move(value),
          .kind = ValueKind::Number,
          .brief = std::move(brief)};
}

Option choice(std::string name, std::vector<std::string> choices, std::string brief) {
  Option option = text(std::move(name), "FORM", std::move(brief));
  option.choices = std::move(choices);
  return option;
}

Option required(Option option) {
  option.required = true;
  return option;
}

Option repeated(Option option) {
  option.repeated = true;
  return option;
}

Option study() { return positional("STUDY", "folder of the study [the folder one stands in]"); }
Option json() { return flag("--json", "write for a machine to read"); }

Command check_command() {
  return {
      .name = "check",
      .brief = "say all that can be said of a study without fitting",
      .description =
          "Reads a study and says what was understood: hypotheses, conserved sums, counts of data "
          "and unknowns, "
          "warnings. All errors of all files come at once.",
      .options = {study(), json()},
      .examples = {
          {"gainsay check data/nitrile-demo", "what is in this study, and what looks wrong"}}};
}

Command equations_command() {
  return {.name = "equations",
          .brief = "write a study's hypotheses as equations",
          .description =
              "The state-space form of one hypothesis or of all: derivatives, start values, "
              "measurement equations, "
              "and the three kinds of unknowns (kinetic, initial-condition, measurement).",
          .options = {study(), positional("HYPOTHESIS", "letter or title of one hypothesis [all]"),
                      choice("--as", {"text", "latex", "html"}, "text, latex or html [text]")},
          .examples = {{"gainsay equations data/nitrile-demo B", "the equations of hypothesis B"},
                       {"gainsay equations data/nitrile-demo --as latex > nitrile.tex",
                        "all of them, for a paper"}}};
}

Command simulate_command() {
  return {
      .name = "simulate",
      .brief = "integrate one hypothesis and write its curves as CSV",
      .description =
          "Integrates a hypothesis under the conditions of an experiment, or from its own start "
          "values, and "
          "writes states and readouts as CSV. The value of an unknown comes from --set, else from "
          "its first "
          "guess (`first`).",
      .options = {study(), required(text("--hypothesis", "H", "letter or title of the hypothesis")),
                  text("--experiment", "E", "its start values, inputs, doses and times"),
                  repeated(text("--set", "NAME=VALUE", "value of an unknown; may be repeated")),
                  number("--until", "T", "last time to write"),
                  number("--every", "D", "distance between the times to write"),
                  flag("--sensitivities", "also the derivatives of every state by every unknown")},
      .examples = {
          {"gainsay simulate data/nitrile-demo --hypothesis A --experiment topped-up --set kcat1=1 "
           "--set Km1=5 --set Vmax2=0.25 --set Km2=6 --set scale.absorbance=0.013 "
           "--set offset.absorbance=0.12 --set scale.titrant=2 --until 120 --every 10",
           "curves of hypothesis A in the run topped-up"}}};
}

Command judge_command() {
  return {
      .name = "judge",
      .brief = "fit every hypothesis, test it, and give the verdicts",
      .description =
          "The main job. Fits all unknowns of each hypothesis to all experiments at once, tests "
          "whether the best "
          "agreement is good enough, and says: rejected, not rejected or undecided, with the "
          "reason. Writes the "
          "report, the same facts as JSON and CSV, and the fitted values, to the study's folder "
          "`results`. "
          "Results do not replace safety assessment, dosing decisions or licensed practice; local "
          "rules prevail.",
      .options =
          {study(), whole_number("--threads", "N", "threads to work on [all cores]"),
           whole_number("--seed", "N", "seed of all draws [that of the study, else 1]"),
           whole_number(
               "--budget", "N",
               "integrations for each experiment and hypothesis [that of the study, else 20000]"),
           json()},
      .examples = {{"gainsay judge data/nitrile-demo",
                    "verdicts on the terminal, the report in data/nitrile-demo/results"},
                   {"gainsay judge --seed 7 --threads 2",
                    "the study one stands in, with other random starts"}}};
}

Command laws_command() {
  return {
      .name = "laws",
      .brief = "list the rate laws, or explain one",
      .description =
          "The rate laws that expressions may use: formula, arguments, where they hold, source.",
      .options = {positional("NAME", "one law [all]"), json(),
                  flag("--markdown", "the page of all laws, as docs/rate-laws.md")},
      .examples = {{"gainsay laws", "every law in one line"},
                   {"gainsay laws michaelis_menten", "formula, arguments and source of one"}}};
}

Command new_command() {
  return {
      .name = "new",
      .brief = "write a commented starter study",
      .description =
          "Makes a folder with a small study that judges as it is, with comments to go on from.",
      .options = {required(positional("FOLDER", "folder to make; it must not exist or be empty"))},
      .examples = {{"gainsay new my-study", "then: gainsay judge my-study"}}};
}

Command completion_command() {
  Option shell = required(positional("SHELL", "bash, zsh or fish"));
  shell.choices = {"bash", "zsh", "fish"};
  return {
      .name = "completion",
      .brief = "print the completion script of a shell",
      .description =
          "Prints a script that completes commands and options of gainsay in bash, zsh or fish.",
      .options = {std::move(shell)},
      .examples = {{"source <(gainsay completion bash)", "completion in this session"}}};
}

Command manual_command() {
  return {.name = "manual",
          .brief = "print the manual page",
          .description = "Prints the manual page in the form that man(1) reads.",
          .options = {},
          .examples = {{"gainsay manual | man -l -", "read it"}}};
}

}  // namespace

std::span<const Command> all_commands() {
  static const std::vector<Command> commands = {
      check_command(), equations_command(), simulate_command(),   judge_command(),
      laws_command(),  new_command(),       completion_command(), manual_command()};
  return commands;
}

const Command* find_command(std::string_view name) {
  const auto commands = all_commands();
  const auto found = std::ranges::find(commands, name, &Command::name);
  return found == commands.end() ? nullptr : &*found;
}

}  // namespace gainsay::cli
