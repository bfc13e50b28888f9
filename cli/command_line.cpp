#include "gainsay/cli/command_line.h"

#include "gainsay/cli/options.h"
#include "gainsay/core/nearest_name.h"
#include "gainsay/core/version.h"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <CLI/CLI.hpp>
#include <algorithm>
#include <charconv>
#include <memory>

namespace gainsay::cli {
namespace {

template <class Number>
std::optional<Number> read_number(const std::string& text) {
  Number value{};
  const char* end = text.data() + text.size();
  const auto [stop, error] = std::from_chars(text.data(), end, value);
  if (error != std::errc{} || stop != end || text.empty()) return std::nullopt;
  return value;
}

/// CLI11 keeps the values as texts; what they must be is in the table.
std::string wrong_value(const Option& option, const std::string& value) {
  if (!option.choices.empty() && !std::ranges::count(option.choices, value)) {
    return fmt::format("expected one of {}", fmt::join(option.choices, ", "));
  }
  if (option.kind == ValueKind::WholeNumber && read_number<long>(value).value_or(-1) < 0) {
    return "expected a whole number, 0 or more";
  }
  if (option.kind == ValueKind::Number && !read_number<double>(value)) return "expected a number";
  return {};
}

std::string examples_text(const Command& command) {
  std::string text = "\nExamples:\n";
  for (const Example& example : command.examples) {
    text += fmt::format("  {}\n      {}\n", example.command, example.does);
  }
  return text;
}

void add_options(CLI::App& app, const Command& command, Invocation& invocation) {
  for (const Option& option : command.options) {
    if (option.kind == ValueKind::None) {
      app.add_flag_callback(
          option.name, [&invocation, &option] { invocation.given[option.name]; }, option.brief);
      continue;
    }
    const auto keep = [&invocation, &option](const std::vector<std::string>& values) {
      for (const std::string& value : values) {
        const std::string wrong = wrong_value(option, value);
        if (!wrong.empty()) {
          throw CLI::ValidationError(option.name, fmt::format("'{}': {}", value, wrong));
        }
      }
      invocation.given[option.name] = values;
      return true;
    };
    CLI::Option* added = app.add_option(option.name, keep, option.brief);
    added->type_name(option.value)->required(option.required)->expected(1);
    if (option.repeated) added->expected(1, -1)->allow_extra_args(false);
  }
}

core::Failure unknown_word(const CLI::App& app, const std::string& word) {
  std::vector<std::string> candidates;
  const Command* command = nullptr;
  if (!app.get_subcommands().empty())
    command = find_command(app.get_subcommands().front()->get_name());
  if (command != nullptr) {
    for (const Option& option : command->options) {
      if (!option.positional()) candidates.push_back(option.name);
    }
    candidates.emplace_back("--help");
  } else {
    for (const Command& known : all_commands()) candidates.push_back(known.name);
  }
  const auto nearest = core::nearest_name(word, candidates);
  return {.what = fmt::format("unknown {} '{}'", command == nullptr ? "command" : "argument", word),
          .expected = nearest ? fmt::format("perhaps '{}'", *nearest)
                              : fmt::format("one of {}", fmt::join(candidates, ", ")),
          .to_do = command == nullptr ? "see 'gainsay --help'"
                                      : fmt::format("see 'gainsay {} --help'", command->name),
          .place = {}};
}

core::Failure wrong_line(const CLI::App& app, const CLI::ParseError& error) {
  const bool in_command = !app.get_subcommands().empty();
  std::string words = error.what();
  std::replace(words.begin(), words.end(), '\n', ' ');
  return {.what = words,
          .expected = {},
          .to_do = in_command ? fmt::format("see 'gainsay {} --help'",
                                            app.get_subcommands().front()->get_name())
                              : std::string("see 'gainsay --help'"),
          .place = {}};
}

std::unique_ptr<CLI::App> make_app(Invocation& invocation) {
  auto app = std::make_unique<CLI::App>(
      "Finds out which hypotheses of how a system is wired the data contradict.", "gainsay");
  app->set_version_flag("--version", std::string("gainsay ") + core::version());
  app->set_help_flag("--help", "print this help and exit");
  app->get_formatter()->column_width(34);
  app->require_subcommand(1);
  app->footer("\nStart with 'gainsay new my-study', or see 'gainsay judge --help'.");
  for (const Command& command : all_commands()) {
    CLI::App* sub = app->add_subcommand(command.name, command.brief);
    sub->set_help_flag("--help", "print this help and exit");
    sub->description(command.description);
    sub->footer(examples_text(command));
    sub->get_formatter()->column_width(34);
    add_options(*sub, command, invocation);
    sub->callback([&invocation, &command] { invocation.command = command.name; });
  }
  return app;
}

}  // namespace

std::optional<std::string> Invocation::text(std::string_view option) const {
  const auto found = given.find(option);
  if (found == given.end() || found->second.empty()) return std::nullopt;
  return found->second.front();
}

std::vector<std::string> Invocation::texts(std::string_view option) const {
  const auto found = given.find(option);
  return found == given.end() ? std::vector<std::string>{} : found->second;
}

std::optional<long> Invocation::whole_number(std::string_view option) const {
  const auto value = text(option);
  return value ? read_number<long>(*value) : std::nullopt;
}

std::optional<double> Invocation::number(std::string_view option) const {
  const auto value = text(option);
  return value ? read_number<double>(*value) : std::nullopt;
}

core::Result<CommandLine> read_command_line(const std::vector<std::string>& arguments) {
  Invocation invocation;
  const auto app = make_app(invocation);
  if (arguments.empty()) return CommandLine{.invocation = {}, .text = app->help()};
  try {
    app->parse(std::vector<std::string>(arguments.rbegin(), arguments.rend()));
  } catch (const CLI::CallForHelp&) {
    return CommandLine{.invocation = {}, .text = app->help()};
  } catch (const CLI::CallForVersion& version) {
    return CommandLine{.invocation = {}, .text = std::string(version.what()) + "\n"};
  } catch (const CLI::ExtrasError&) {
    const std::vector<std::string> extras = app->remaining(true);
    return unknown_word(*app, extras.empty() ? std::string() : extras.front());
  } catch (const CLI::ParseError& error) {
    const std::vector<std::string> extras = app->remaining(true);
    if (!extras.empty()) return unknown_word(*app, extras.front());
    return wrong_line(*app, error);
  }
  return CommandLine{.invocation = std::move(invocation), .text = {}};
}

}  // namespace gainsay::cli
