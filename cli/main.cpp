#include "gainsay/cli/command_check.h"
#include "gainsay/cli/command_equations.h"
#include "gainsay/cli/command_judge.h"
#include "gainsay/cli/command_laws.h"
#include "gainsay/cli/command_line.h"
#include "gainsay/cli/command_new.h"
#include "gainsay/cli/command_simulate.h"
#include "gainsay/cli/console.h"
#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/manual.h"

#include <fmt/format.h>
#include <unistd.h>

#include <csignal>
#include <cstdlib>
#include <exception>
#include <iostream>
#include <map>
#include <string>
#include <vector>

namespace gainsay::cli {
namespace {

std::string study_of(const Invocation& invocation) {
  return invocation.text("STUDY").value_or(".");
}

int equations(const Invocation& given, const Console& console) {
  static const std::map<std::string, EquationsForm> forms = {{"text", EquationsForm::Text},
                                                             {"latex", EquationsForm::Latex},
                                                             {"html", EquationsForm::Html}};
  return run_equations({.study = study_of(given),
                        .hypothesis = given.text("HYPOTHESIS"),
                        .form = forms.at(given.text("--as").value_or("text"))},
                       console);
}

int simulate(const Invocation& given, const Console& console) {
  SimulateOptions options{.study = study_of(given),
                          .hypothesis = given.text("--hypothesis").value_or(""),
                          .experiment = given.text("--experiment"),
                          .values = {},
                          .until = given.number("--until"),
                          .every = given.number("--every"),
                          .sensitivities = given.has("--sensitivities")};
  const auto values = read_settings(given.texts("--set"));
  if (!values) {
    print_failure(console, values.failure());
    return kWrongInput;
  }
  options.values = *values;
  return run_simulate(options, console);
}

int judge(const Invocation& given, const Console& console) {
  JudgeCommandOptions options{.study = study_of(given), .json = given.has("--json")};
  if (const auto threads = given.whole_number("--threads"))
    options.threads = static_cast<unsigned>(*threads);
  if (const auto seed = given.whole_number("--seed"))
    options.seed = static_cast<std::uint64_t>(*seed);
  options.budget = given.whole_number("--budget");
  return run_judge(options, console);
}

int laws(const Invocation& given, const Console& console) {
  return run_laws({.name = given.text("NAME"),
                   .json = given.has("--json"),
                   .markdown = given.has("--markdown")},
                  console);
}

int run(const Invocation& given, const Console& console) {
  if (given.command == "check") {
    return run_check({.study = study_of(given), .json = given.has("--json")}, console);
  }
  if (given.command == "equations") return equations(given, console);
  if (given.command == "simulate") return simulate(given, console);
  if (given.command == "judge") return judge(given, console);
  if (given.command == "laws") return laws(given, console);
  if (given.command == "new") {
    return run_new({.folder = given.text("FOLDER").value_or("")}, console);
  }
  console.out << (given.command == "manual"
                      ? manual_page()
                      : completion_script(given.text("SHELL").value_or("bash")));
  return kDone;
}

int run(const std::vector<std::string>& arguments, const Console& console) {
  const auto line = read_command_line(arguments);
  if (!line) {
    print_failure(console, line.failure());
    return kWrongInput;
  }
  if (line->invocation) return run(*line->invocation, console);
  console.out << line->text;
  return kDone;
}

}  // namespace
}  // namespace gainsay::cli

int main(int count, char** words) {
  using namespace gainsay::cli;
  // A closed pipe shows as a failed stream and ends quietly.
  std::signal(SIGPIPE, SIG_IGN);
  const char* no_colour = std::getenv("NO_COLOR");
  const bool wants_colour = no_colour == nullptr || *no_colour == '\0';
  const bool messages_are_terminal = isatty(STDERR_FILENO) == 1;
  const Console console{.out = std::cout,
                        .messages = std::cerr,
                        .out_is_terminal = isatty(STDOUT_FILENO) == 1,
                        .messages_are_terminal = messages_are_terminal,
                        .colour = wants_colour && messages_are_terminal};
  try {
    const int status = run(std::vector<std::string>(words + 1, words + count), console);
    std::cout.flush();
    return status;
  } catch (const std::exception& exception) {
    std::cerr << "gainsay: a fault of the program itself: " << exception.what()
              << "\n    to do: please report it with the study that shows it\n";
    return 70;  // EX_SOFTWARE of sysexits.h
  }
}
